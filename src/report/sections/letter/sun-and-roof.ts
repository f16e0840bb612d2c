import type { ObstructionShading, StationAssessment } from '../../../core/shading/assessment.ts';
import type { ObstructionTimes } from '../../../core/shading/shade-times.ts';
import { obstructionKind } from '../../../core/survey/obstruction-kinds.ts';
import { obstructionsById } from '../../../core/survey/served-planes.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import type { MeasuredRoof } from './roofs.ts';
import { measuredRoofs, NOTICEABLE, obstructionNames } from './roofs.ts';
import { hoursCell, shadeSentences } from './shade-sentences.ts';
import type { SunOverSite } from './sun-picture.ts';
import { sunOverSite, sunPicture } from './sun-picture.ts';

/** What stands in the way of each roof, drawn and told by days and hours, from its darkest station. */
export const sunAndRoof: SectionKind = {
  id: 'sun-and-roof',
  part: 'letter',
  startsPage: true,
  write: (report, speech) => {
    const roofs = measuredRoofs(report);
    if (roofs.length === 0) return null;
    const sun = sunOverSite(report, speech);
    return {
      heading: speech.words['sun.heading'],
      blocks: [
        answerBlock(roofs, report, speech),
        ...roofs.flatMap((roof) => [
          ...(roofs.length > 1 ? [{ kind: 'subheading' as const, text: roof.name }] : []),
          ...roofBlocks(roof, sun, report, speech),
        ]),
      ],
    };
  },
};

/** A table has room for the hours of so many. */
const MOST_COLUMNS = 4;

/** One obstruction that takes a noticeable part, with when it does. */
interface Shader {
  row: ObstructionShading;
  times: ObstructionTimes;
}

function stationOf({ plane, evidence }: MeasuredRoof): StationAssessment {
  return plane.stations.find(({ id }) => id === evidence.lowest!.id)!;
}

/** What takes a noticeable part by itself, the most first. */
function shadersOf(roof: MeasuredRoof): Shader[] {
  const times = new Map(roof.evidence.lowest!.times.map((one) => [one.obstruction, one]));
  return [...stationOf(roof).obstructions]
    .filter(({ lossIfAlone }) => lossIfAlone >= NOTICEABLE)
    .sort((a, b) => b.lossIfAlone - a.lossIfAlone)
    .map((row) => ({ row, times: times.get(row.id)! }));
}

function answerBlock(roofs: readonly MeasuredRoof[], report: ReportInput, speech: Speech): Block {
  const { words } = speech;
  const nameOf = obstructionNames(report);
  const all = roofs.flatMap((roof) => shadersOf(roof).map((shader) => ({ roof, ...shader })));
  const worst = all
    .filter(({ times }) => times.stretches.length > 0)
    .sort((a, b) => b.row.lossIfAlone - a.row.lossIfAlone)[0];
  if (worst) return { kind: 'answer', text: words['sun.answer'](nameOf(worst.row.id), worst.roof.name) };
  return { kind: 'answer', text: words[all.length > 0 ? 'sun.answer-sky' : 'sun.answer-clear'] };
}

function roofBlocks(roof: MeasuredRoof, sun: SunOverSite, report: ReportInput, speech: Speech): Block[] {
  const { words } = speech;
  const station = stationOf(roof);
  const from = roof.plane.stations.length > 1 ? 'sun.from-lowest' : 'sun.from-only';
  const shaders = shadersOf(roof);
  const shading = shaders.filter(({ times }) => times.stretches.length > 0);
  return [
    { kind: 'paragraph', text: words[from](shownText(station.name)) },
    sunPicture(roof, sun, report, speech),
    ...sentenceBlocks(roof, shaders, report, speech),
    ...(shading.length > 0
      ? [
          { kind: 'table' as const, table: hoursTable(roof, shading.slice(0, MOST_COLUMNS), report, speech) },
          { kind: 'paragraph' as const, text: words['sun.clock'], small: true },
        ]
      : []),
  ];
}

function sentenceBlocks(
  roof: MeasuredRoof,
  shaders: readonly Shader[],
  report: ReportInput,
  speech: Speech,
): Block[] {
  const { words } = speech;
  const nameOf = obstructionNames(report);
  const known = obstructionsById(report.survey);
  const items = shaders.map(({ row, times }) =>
    times.stretches.length > 0
      ? shadeSentences(times, nameOf(row.id), roof.name, speech)
      : words['sun.never-the-sun'](nameOf(row.id)),
  );
  const rest = stationOf(roof).obstructions.filter((row) => !shaders.some((one) => one.row === row));
  const little = rest.filter(({ lossIfAlone }) => lossIfAlone < NOTICEABLE);
  if (little.length > 0) items.push(words['sun.little'](speech.list(little.map(({ id }) => nameOf(id)))));
  const hasLeaves = shaders.some(({ row }) => obstructionKind(known.get(row.id)?.kind ?? 'other').leaves);
  return [
    ...(items.length > 0 ? [{ kind: 'list' as const, items }] : []),
    ...(hasLeaves ? [{ kind: 'paragraph' as const, text: words['sun.leaves'], small: true }] : []),
  ];
}

function hoursTable(
  roof: MeasuredRoof,
  shaders: readonly Shader[],
  report: ReportInput,
  speech: Speech,
): Table {
  const nameOf = obstructionNames(report);
  const { words } = speech;
  return {
    caption: words['sun.table-caption'](roof.name),
    columns: [{ head: words['sun.month'] }, ...shaders.map(({ row }) => ({ head: nameOf(row.id) }))],
    rows: Array.from({ length: 12 }, (_, month) => [
      speech.month(month),
      ...shaders.map(({ times }) => hoursCell(times.months[month], speech)),
    ]),
  };
}
