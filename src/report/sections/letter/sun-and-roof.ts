import type { ObstructionShading, StationAssessment } from '../../../core/shading/assessment.ts';
import type { ObstructionTimes } from '../../../core/shading/shade-times.ts';
import { obstructionKind } from '../../../core/survey/obstruction-kinds.ts';
import { rangesBetween } from '../../../core/angles/azimuth-ranges.ts';
import { obstructionsById } from '../../../core/survey/served-planes.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import { smoothDensity } from '../../pictures/smooth-density.ts';
import { dayLines, hourLines } from '../../pictures/sun-lines.ts';
import { unrolledHorizon } from '../../pictures/unrolled-horizon.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { pictureWords } from './picture-words.ts';
import type { MeasuredRoof } from './roofs.ts';
import { measuredRoofs, NOTICEABLE, obstructionNames } from './roofs.ts';
import { hoursCell, shadeSentences } from './shade-sentences.ts';

/** What stands in the way of each roof, drawn and told by days and hours, from its darkest station. */
export const sunAndRoof: SectionKind = {
  id: 'sun-and-roof',
  part: 'letter',
  startsPage: true,
  write: (report, speech) => {
    const roofs = measuredRoofs(report);
    if (roofs.length === 0) return null;
    return {
      heading: speech.words['sun.heading'],
      blocks: [
        answerBlock(roofs, report, speech),
        ...roofs.flatMap((roof) => roofBlocks(roof, roofs.length, report, speech)),
      ],
    };
  },
};

/** So many obstructions are told one by one; a table has room for fewer. */
const MOST_TOLD = 6;
const MOST_COLUMNS = 4;
const PICTURE = { width: 640, height: 290 };

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
  const worst = roofs
    .flatMap((roof) =>
      shadersOf(roof)
        .slice(0, 1)
        .map(({ row }) => ({ roof, row })),
    )
    .sort((a, b) => b.row.lossIfAlone - a.row.lossIfAlone)[0];
  const text = worst ? words['sun.answer'](nameOf(worst.row.id), worst.roof.name) : words['sun.answer-clear'];
  return { kind: 'answer', text };
}

function roofBlocks(roof: MeasuredRoof, count: number, report: ReportInput, speech: Speech): Block[] {
  const { words } = speech;
  const station = stationOf(roof);
  const from = roof.plane.stations.length > 1 ? 'sun.from-lowest' : 'sun.from-only';
  const shaders = shadersOf(roof);
  const shading = shaders.filter(({ times }) => times.stretches.length > 0);
  return [
    ...(count > 1 ? [{ kind: 'subheading' as const, text: roof.name }] : []),
    { kind: 'paragraph', text: words[from](shownText(station.name)) },
    pictureBlock(roof, report, speech),
    ...sentenceBlocks(roof, shaders, report, speech),
    ...(shading.length > 0
      ? [
          { kind: 'table' as const, table: hoursTable(roof, shading.slice(0, MOST_COLUMNS), report, speech) },
          { kind: 'paragraph' as const, text: words['sun.clock'], small: true },
        ]
      : []),
  ];
}

function pictureBlock(roof: MeasuredRoof, report: ReportInput, speech: Speech): Block {
  const { words } = speech;
  const { site, obstructions } = report.survey;
  const nameOf = obstructionNames(report);
  const inPicture = pictureWords(speech);
  const { shade } = roof.evidence.stations.find(({ id }) => id === roof.evidence.lowest!.id)!;
  const picture = unrolledHorizon(
    {
      site,
      shade,
      density: smoothDensity(shade.density),
      days: dayLines(site, inPicture),
      hours: hourLines(site),
      names: new Map(obstructions.map(({ id }) => [id, nameOf(id)])),
      ...PICTURE,
      whole: false,
      plain: true,
    },
    inPicture,
  );
  const seen = shade.profile.obstructionIds.map(nameOf);
  const hasRings = rangesBetween(shade.observed).length > 0;
  return {
    kind: 'picture',
    picture,
    caption: hasRings ? `${words['sun.caption']} ${words['sun.caption-rings']}` : words['sun.caption'],
    alternative:
      seen.length > 0
        ? words['sun.alternative'](roof.name, speech.list(seen))
        : words['sun.alternative-open'](roof.name),
  };
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
  const told = shaders.slice(0, MOST_TOLD);
  const items = told.map(({ row, times }) =>
    times.stretches.length > 0
      ? shadeSentences(times, nameOf(row.id), roof.name, speech)
      : words['sun.never-the-sun'](nameOf(row.id)),
  );
  const rest = stationOf(roof).obstructions.filter((row) => !told.some((one) => one.row === row));
  const little = rest.filter(({ lossIfAlone }) => lossIfAlone < NOTICEABLE);
  if (little.length > 0) items.push(words['sun.little'](speech.list(little.map(({ id }) => nameOf(id)))));
  const hasLeaves = told.some(({ row }) => obstructionKind(known.get(row.id)?.kind ?? 'other').leaves);
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
