import type { AccessInterval, PlaneAccess, PlaneAssessment } from '../../../core/shading/assessment.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import { roofBars } from '../../pictures/roof-bars.ts';
import type { ComparedAssessment } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import { PICTURE_WIDTH } from './picture-size.ts';
import { pictureWords } from './picture-words.ts';

/** Another visit, or the same site without some obstructions, beside this one. */
export const compared: SectionKind = {
  id: 'compared',
  part: 'letter',
  write: ({ assessment, compared: other }, speech) => {
    if (!other) return null;
    const name = shownText(other.name);
    const pairs = pairedPlanes(assessment.planes, other);
    const alone = aloneTexts(pairs, name, speech);
    const blocks = [
      ...pairs.both.map((pair): Block => ({ kind: 'answer', text: differenceText(pair, name, speech) })),
      ...sureBlocks(pairs.both, other, speech),
      ...(pairs.both.length > 0 ? [pictureBlock(pairs.both, name, speech)] : []),
      ...pairs.both.map((pair): Block => ({ kind: 'table', table: monthsTable(pair, name, speech) })),
      ...(alone.length > 0 ? [{ kind: 'list' as const, items: alone }] : []),
    ];
    return blocks.length > 0 ? { heading: speech.words['compared.heading'], blocks } : null;
  },
};

type MeasuredPlane = PlaneAssessment & { solarAccess: PlaneAccess };

interface Pair {
  name: string;
  here: MeasuredPlane;
  there: MeasuredPlane;
}

interface PairedPlanes {
  both: Pair[];
  onlyHere: string[];
  onlyThere: string[];
  /** In both, but nobody measured from it here or there. */
  notMeasured: string[];
}

const isMeasured = (plane: PlaneAssessment): plane is MeasuredPlane => plane.solarAccess !== null;

/** Planes of the same id, else of the same name; each once. */
function pairedPlanes(planes: readonly PlaneAssessment[], { assessment }: ComparedAssessment): PairedPlanes {
  const paired: PairedPlanes = { both: [], onlyHere: [], onlyThere: [], notMeasured: [] };
  const left = new Set(assessment.planes);
  const takenBy = (isSame: (other: PlaneAssessment) => boolean) => {
    const match = [...left].find(isSame);
    if (match) left.delete(match);
    return match;
  };
  const byId = new Map(planes.map((plane) => [plane, takenBy(({ id }) => id === plane.id)]));
  for (const plane of planes) {
    const match = byId.get(plane) ?? takenBy(({ name }) => name === plane.name);
    const name = shownText(plane.name);
    if (!match) paired.onlyHere.push(name);
    else if (isMeasured(plane) && isMeasured(match)) paired.both.push({ name, here: plane, there: match });
    else paired.notMeasured.push(name);
  }
  paired.onlyThere = [...left].map(({ name }) => shownText(name));
  return paired;
}

const shownAccess = ({ solarAccess }: MeasuredPlane, speech: Speech) => speech.percent(solarAccess.annual);

function differenceText({ name, here, there }: Pair, other: string, speech: Speech): string {
  const { words } = speech;
  const [now, then] = [shownAccess(here, speech), shownAccess(there, speech)];
  if (now === then) return words['compared.same'](name, now, other);
  const isMore = here.solarAccess.annual > there.solarAccess.annual;
  return words[isMore ? 'compared.more' : 'compared.less'](name, now, then, other);
}

/** What ranges that meet mean: little where they come from one survey, since both then err alike. */
function sureBlocks(pairs: readonly Pair[], { sameSurvey }: ComparedAssessment, speech: Speech): Block[] {
  const differing = pairs.filter(
    ({ here, there }) => shownAccess(here, speech) !== shownAccess(there, speech),
  );
  const mayBeChance = differing.some(({ here, there }) =>
    meet(here.solarAccess.interval, there.solarAccess.interval),
  );
  if (!mayBeChance) return [];
  const text = speech.words[sameSurvey ? 'compared.shared' : 'compared.not-sure'];
  return [{ kind: 'paragraph', text }];
}

const meet = (a: AccessInterval | undefined, b: AccessInterval | undefined): boolean =>
  a !== undefined && b !== undefined && a.low <= b.high && b.low <= a.high;

/** A bar for here and one for there, roof by roof. */
function pictureBlock(pairs: readonly Pair[], other: string, speech: Speech): Block {
  const { words } = speech;
  const bar = (name: string, plane: MeasuredPlane) => ({
    name,
    unshaded: speech.irradiationNumber(plane.unshaded.annual),
    access: plane.solarAccess.annual,
    interval: plane.solarAccess.interval ?? null,
    value: shownAccess(plane, speech),
  });
  const named = (roof: string, which: string) => (pairs.length > 1 ? `${roof} – ${which}` : which);
  const bars = pairs.flatMap(({ name, here, there }) => [
    bar(named(name, words['compared.this']), here),
    bar(named(name, other), there),
  ]);
  const axis = words['glance.axis'](speech.irradiationUnit);
  return {
    kind: 'picture',
    picture: roofBars({ bars, axis, width: PICTURE_WIDTH, mostUnderNames: 6 }, pictureWords(speech)),
    caption: words['glance.picture-caption'],
    alternative: pairs.map((pair) => differenceText(pair, other, speech)).join(' '),
  };
}

function monthsTable(
  { name, here: { solarAccess: here }, there: { solarAccess: there } }: Pair,
  other: string,
  speech: Speech,
): Table {
  const { words } = speech;
  const share = (value: number | null) => (value === null ? '–' : speech.percent(value));
  return {
    caption: words['compared.months-caption'](name),
    columns: [
      { head: words['compared.month'] },
      { head: words['compared.this'], number: true },
      { head: other, number: true },
    ],
    rows: here.monthly.map((value, month) => [
      speech.month(month),
      share(value),
      share(there.monthly[month]),
    ]),
    sums: [[words['frame.year'], share(here.annual), share(there.annual)]],
  };
}

function aloneTexts(
  { onlyHere, onlyThere, notMeasured }: PairedPlanes,
  other: string,
  { words }: Speech,
): string[] {
  return [
    ...notMeasured.map((name) => words['compared.not-both'](name)),
    ...onlyHere.map((name) => words['compared.only-here'](name)),
    ...onlyThere.map((name) => words['compared.only-there'](name, other)),
  ];
}
