import type { Block, KeyFigure } from '../contents/report-contents.ts';
import type { PlaneAssessment } from '../../core/shading/assessment.ts';
import type { ReportInput } from '../report-input.ts';
import { shownText } from '../shown-text.ts';
import type { Speech } from '../speech.ts';
import type { SectionKind } from './section-kind.ts';

/** The first page: the answer in a sentence, three figures with their ranges, one picture. */
export const atAGlance: SectionKind = {
  id: 'at-a-glance',
  part: 'letter',
  write: (report, speech) => ({
    heading: speech.words['glance.heading'],
    blocks: report.assessment.planes.flatMap((plane) => planeBlocks(plane, report, speech)),
  }),
};

/** Shade that takes less than this of the year is not worth a sentence. */
const NOTICEABLE = 0.005;

function planeBlocks(plane: PlaneAssessment, _report: ReportInput, speech: Speech): Block[] {
  const { words } = speech;
  const { solarAccess } = plane;
  const roof = shownText(plane.name);
  if (!solarAccess) return [{ kind: 'answer', text: words['glance.unknown'](roof) }];
  const answer =
    1 - solarAccess.annual < NOTICEABLE
      ? words['glance.answer-clear'](roof)
      : words['glance.answer'](roof, speech.percent(solarAccess.annual));
  return [
    { kind: 'answer', text: answer },
    { kind: 'key-figures', figures: keyFigures(plane, speech) },
    {
      kind: 'paragraph',
      text: words['glance.range-note'](speech.plural, solarAccess.count),
      small: true,
    },
  ];
}

function keyFigures(
  { solarAccess, orientationFactor, unshaded }: PlaneAssessment,
  speech: Speech,
): KeyFigure[] {
  const { words } = speech;
  const { annual, interval } = solarAccess!;
  const range = (write: (share: number) => string) =>
    interval ? speech.range(write(interval.low), write(interval.high)) : null;
  const percent = (share: number) => speech.percent(share);
  const light = (share: number) => speech.irradiation(share * unshaded.annual);
  return [
    {
      label: words['glance.access'],
      value: percent(annual),
      range: range(percent),
      note: words['glance.access-note'],
    },
    {
      label: words['glance.facing'],
      value: percent(orientationFactor),
      range: null,
      note: words['glance.facing-note'],
    },
    {
      label: words['glance.light'],
      value: light(annual),
      range: range(light),
      note: words['glance.light-note'],
    },
  ];
}
