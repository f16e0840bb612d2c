import type { ObstructionProspects } from '../../../core/shading/prospects.ts';
import type { Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import type { Speech } from '../../speech.ts';
import { changeOf } from './changeable.ts';
import type { MeasuredRoof } from './roofs.ts';
import { obstructionNames, smallShare } from './roofs.ts';

/** A cut that gives less than this is not worth a row, share of the year's light. */
const LEAST = 0.0005;

/** What a roof would get back, by what is changed: gone, or some metres off the top. */
export function gainsTable(
  roof: MeasuredRoof,
  rows: readonly ObstructionProspects[],
  report: ReportInput,
  speech: Speech,
): Table {
  const { words } = speech;
  const written = (what: string, gain: number) => [
    what,
    smallShare(gain, speech),
    speech.irradiation(gain * roof.plane.unshaded.annual),
  ];
  return {
    caption: words['done.table-caption'](roof.name),
    columns: [
      { head: words['done.what'] },
      { head: words['done.gain'], number: true },
      { head: words['done.light'], number: true },
    ],
    rows: rows.flatMap((row) => changesOf(row, report, speech).map(({ what, gain }) => written(what, gain))),
  };
}

function changesOf(
  { id, gainIfRemoved, lower, clear }: ObstructionProspects,
  report: ReportInput,
  speech: Speech,
): { what: string; gain: number }[] {
  const { words } = speech;
  const name = obstructionNames(report)(id);
  if (changeOf(report)(id) === 'move') return [{ what: words['done.moved'](name), gain: gainIfRemoved }];
  const cuts = lower.filter(({ by, gain }) => gain >= LEAST && (clear === null || by < clear.by));
  return [
    { what: words['done.gone'](name), gain: gainIfRemoved },
    ...(clear ? [{ what: words['done.clear'](name, cutText(clear.by, speech)), gain: clear.gain }] : []),
    ...cuts.reverse().map(({ by, gain }) => ({ what: words['done.lower'](name, cutText(by, speech)), gain })),
  ];
}

const cutText = (metres: number, speech: Speech) => speech.length(metres, Number.isInteger(metres) ? 0 : 1);
