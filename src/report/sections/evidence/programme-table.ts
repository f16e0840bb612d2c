import {
  accessBetween,
  accessTimesOrientation,
  orientationBetween,
} from '../../../core/assessment/access-times-orientation.ts';
import type { PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { askedTable } from './asked-table.ts';

/** What incentive programmes and building codes that go by solar access ask of each plane. */
export const programmeTable: SectionKind = {
  id: 'programme-table',
  part: 'evidence',
  startsPage: true,
  write: ({ assessment, choices, survey }, speech) => {
    const { words } = speech;
    const { planes } = assessment;
    if (planes.length === 0) return null;
    const asked = askedTable(planes, choices.thresholds, speech);
    const blocks: Block[] = [
      { kind: 'table', table: annualTable(planes, speech) },
      ...(hasIntervals(planes) ? [{ kind: 'table' as const, table: intervalTable(planes, speech) }] : []),
      { kind: 'paragraph', text: methodText(planes, survey, speech), small: true },
      { kind: 'paragraph', text: words['programme.explained'], small: true },
      ...(asked ? [{ kind: 'table' as const, table: asked }] : []),
      { kind: 'table', table: monthlyTable(planes, speech) },
    ];
    return { heading: words['programme.heading'], blocks };
  },
};

function annualTable(planes: readonly PlaneAssessment[], speech: Speech): Table {
  const { words } = speech;
  return {
    caption: words['programme.caption'],
    columns: [
      { head: words['programme.plane'] },
      ...(['tilt', 'azimuth', 'access', 'orientation', 'product'] as const).map((column) => ({
        head: words[`programme.${column}`],
        number: true,
      })),
    ],
    rows: planes.map((plane) => [
      shownText(plane.name),
      speech.angle(plane.surfaceTilt, 1),
      speech.azimuth(plane.surfaceAzimuth, 1),
      ...annualFigures(plane).map((found) =>
        found ? speech.percent(found.value, 1) : words['programme.unknown'],
      ),
    ]),
  };
}

function intervalTable(planes: readonly PlaneAssessment[], speech: Speech): Table {
  const { words } = speech;
  const share = (value: number) => speech.percent(value, 1);
  return {
    caption: words['programme.interval'],
    columns: [
      { head: words['programme.plane'] },
      ...(['access', 'orientation', 'product'] as const).map((column) => ({
        head: words[`programme.${column}`],
        number: true,
      })),
    ],
    rows: planes.map((plane) => [
      shownText(plane.name),
      ...annualFigures(plane).map((found) =>
        found ? speech.range(share(found.low), share(found.high)) : words['programme.unknown'],
      ),
    ]),
  };
}

/** Solar access, orientation factor and their product. */
const annualFigures = (plane: PlaneAssessment) => [
  accessBetween(plane),
  orientationBetween(plane),
  accessTimesOrientation(plane),
];

/** Whether intervals were asked for. */
const hasIntervals = (planes: readonly PlaneAssessment[]): boolean =>
  planes.some(({ orientationInterval }) => orientationInterval);

function monthlyTable(planes: readonly PlaneAssessment[], speech: Speech): Table {
  const { words } = speech;
  const share = (value: number | null | undefined) =>
    value === null || value === undefined ? '–' : speech.percent(value, 1);
  return {
    caption: words['programme.monthly-caption'],
    columns: [
      { head: words['programme.month'] },
      ...planes.map(({ name }) => ({ head: shownText(name, 40), number: true })),
    ],
    rows: Array.from({ length: 12 }, (_, month) => [
      speech.month(month),
      ...planes.map(({ solarAccess }) => share(solarAccess?.monthly[month])),
    ]),
    sums: [[words['frame.year'], ...planes.map(({ solarAccess }) => share(solarAccess?.annual))]],
  };
}

function methodText(
  planes: readonly PlaneAssessment[],
  survey: ReportInput['survey'],
  speech: Speech,
): string {
  const counts = planes.map(({ name, solarAccess }) => `${shownText(name)}: ${solarAccess?.count ?? 0}`);
  const { words } = speech;
  const day = survey.surveyedOn ? ` ${words['frame.visited'](speech.day(survey.surveyedOn))}.` : '';
  return `${words['programme.method'](counts.join('; '))}${day}`;
}
