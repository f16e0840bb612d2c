import type { ValueBetween } from '../../../core/assessment/access-times-orientation.ts';
import {
  accessBetween,
  accessTimesOrientation,
  orientationBetween,
} from '../../../core/assessment/access-times-orientation.ts';
import type { PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { Table } from '../../contents/report-contents.ts';
import type { Thresholds } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';

const QUANTITIES = {
  solarAccess: { word: 'programme.access', of: accessBetween },
  orientationFactor: { word: 'programme.orientation', of: orientationBetween },
  product: { word: 'programme.product', of: accessTimesOrientation },
} as const;

/** What a programme asks for at least and what was found; null where nothing is asked. */
export function askedTable(
  planes: readonly PlaneAssessment[],
  thresholds: Thresholds,
  speech: Speech,
): Table | null {
  const { words } = speech;
  const rows = (Object.keys(QUANTITIES) as (keyof Thresholds)[]).flatMap((quantity) => {
    const least = thresholds[quantity];
    if (least === undefined) return [];
    const { word, of } = QUANTITIES[quantity];
    return planes.map((plane) => [
      shownText(plane.name),
      words[word],
      speech.percent(least, 1),
      resultText(of(plane), least, speech),
    ]);
  });
  if (rows.length === 0) return null;
  const columns = [
    { head: words['programme.plane'] },
    { head: words['programme.asked-quantity'] },
    { head: words['programme.asked-least'], number: true },
    { head: words['programme.asked-result'] },
  ];
  return { caption: words['programme.asked-caption'], columns, rows };
}

function resultText(found: ValueBetween | null, least: number, speech: Speech): string {
  const { words } = speech;
  if (!found) return words['programme.unknown'];
  const value = speech.percent(found.value, 1);
  if (found.low < least && found.high > least) return words['programme.within-interval'](value);
  return found.value >= least ? words['programme.met'](value) : words['programme.not-met'](value);
}
