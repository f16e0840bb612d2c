import type { AccessInterval, PlaneAccess, PlaneAssessment } from '../../core/shading/assessment.ts';
import type { Block, Table } from '../contents/report-contents.ts';
import type { ComparedAssessment } from '../report-input.ts';
import { shownText } from '../shown-text.ts';
import type { Speech } from '../speech.ts';
import type { SectionKind } from './section-kind.ts';

/** Another visit, or the same site without some obstructions, beside this one. */
export const compared: SectionKind = {
  id: 'compared',
  part: 'letter',
  write: ({ assessment, compared: other }, speech) => {
    if (!other) return null;
    const name = shownText(other.name);
    const pairs = pairedPlanes(assessment.planes, other);
    const blocks = pairs.both.flatMap((pair) => pairBlocks(pair, name, speech));
    const alone = aloneTexts(pairs, name, speech);
    if (alone.length > 0) blocks.push({ kind: 'list', items: alone });
    return blocks.length > 0 ? { heading: speech.words['compared.heading'], blocks } : null;
  },
};

interface Pair {
  name: string;
  here: PlaneAccess;
  there: PlaneAccess;
}

interface PairedPlanes {
  both: Pair[];
  onlyHere: string[];
  onlyThere: string[];
}

/** Planes of the same id, else of the same name; what one of them does not know cannot be compared. */
function pairedPlanes(planes: readonly PlaneAssessment[], { assessment }: ComparedAssessment): PairedPlanes {
  const paired: PairedPlanes = { both: [], onlyHere: [], onlyThere: [] };
  const left = new Set(assessment.planes);
  for (const plane of planes) {
    const match =
      assessment.planes.find(({ id }) => id === plane.id) ??
      assessment.planes.find(({ name }) => name === plane.name);
    if (match) left.delete(match);
    const name = shownText(plane.name);
    if (!match) paired.onlyHere.push(name);
    else if (plane.solarAccess && match.solarAccess)
      paired.both.push({ name, here: plane.solarAccess, there: match.solarAccess });
  }
  paired.onlyThere = [...left].map(({ name }) => shownText(name));
  return paired;
}

function pairBlocks({ name, here, there }: Pair, other: string, speech: Speech): Block[] {
  const { words } = speech;
  const [now, then] = [speech.percent(here.annual), speech.percent(there.annual)];
  const text =
    now === then
      ? words['compared.same'](name, now, other)
      : words[here.annual > there.annual ? 'compared.more' : 'compared.less'](name, now, then, other);
  const mayBeChance = now !== then && meet(here.interval, there.interval);
  return [
    { kind: 'paragraph', text },
    ...(mayBeChance ? [{ kind: 'paragraph' as const, text: words['compared.not-sure'] }] : []),
    { kind: 'table', table: monthsTable({ name, here, there }, other, speech) },
  ];
}

const meet = (a: AccessInterval | undefined, b: AccessInterval | undefined): boolean =>
  a !== undefined && b !== undefined && a.low <= b.high && b.low <= a.high;

function monthsTable({ name, here, there }: Pair, other: string, speech: Speech): Table {
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

function aloneTexts({ onlyHere, onlyThere }: PairedPlanes, other: string, { words }: Speech): string[] {
  return [
    ...onlyHere.map((name) => words['compared.only-here'](name)),
    ...onlyThere.map((name) => words['compared.only-there'](name, other)),
  ];
}
