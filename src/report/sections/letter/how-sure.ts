import { fullCircle } from '../../../core/angles/angles.ts';
import type { UnseenRange } from '../../../core/shading/assessment.ts';
import type { CureId, IntervalSourceId } from '../../../core/uncertainty/interval-source.ts';
import type { Block } from '../../contents/report-contents.ts';
import type { ReportInput } from '../../report-input.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';
import type { MeasuredRoof } from './roofs.ts';
import { measuredRoofs, NOTICEABLE, roofsOf, smallShare } from './roofs.ts';

/** The range, why it is so wide, what nobody could see, and what would help. */
export const howSure: SectionKind = {
  id: 'how-sure',
  part: 'letter',
  write: (report, speech) => {
    const roofs = measuredRoofs(report);
    if (roofs.length === 0) return null;
    return {
      heading: speech.words['sure.heading'],
      blocks: [
        ...answerBlocks(roofs, speech),
        ...sourceBlocks(roofs, speech),
        ...unseenBlocks(roofs, speech),
        ...unmeasuredBlocks(report, speech),
      ],
    };
  },
};

/** A source that makes less of the variance is not worth a line. */
const LEAST_PART = 0.05;

function answerBlocks(roofs: readonly MeasuredRoof[], speech: Speech): Block[] {
  const { words } = speech;
  const texts = roofs.flatMap(({ name, access: { interval } }) => {
    if (!interval) return [];
    const [low, high] = [speech.percent(interval.low), speech.percent(interval.high)];
    return [low === high ? words['sure.answer-same'](low, name) : words['sure.answer'](low, high, name)];
  });
  if (texts.length === 0) return [{ kind: 'answer', text: words['sure.answer-none'] }];
  return [
    ...texts.map((text): Block => ({ kind: 'answer', text })),
    { kind: 'paragraph', text: words['sure.times'] },
  ];
}

/** Sources of all roofs by how much they move any of them, and what would cure them. */
function sourceBlocks(roofs: readonly MeasuredRoof[], speech: Speech): Block[] {
  const { words } = speech;
  const most = new Map<IntervalSourceId, { spread: number; cure: CureId | null }>();
  for (const { access } of roofs) {
    if (!access.interval || access.interval.high - access.interval.low < NOTICEABLE) continue;
    for (const { source, share, cure } of access.interval.sources) {
      const spread = access.interval.standardDeviation * Math.sqrt(share);
      if (share >= LEAST_PART && spread > (most.get(source)?.spread ?? 0)) most.set(source, { spread, cure });
    }
  }
  if (most.size === 0) return [];
  const ranked = [...most].sort(([, a], [, b]) => b.spread - a.spread);
  const cures = [...new Set(ranked.flatMap(([, { cure }]) => cure ?? []))];
  return [
    { kind: 'paragraph', text: words['sure.why'] },
    { kind: 'list', items: ranked.map(([source]) => words[`sure.source-${source}`]) },
    ...(cures.length > 0
      ? [
          { kind: 'paragraph' as const, text: words['sure.cures'] },
          { kind: 'list' as const, items: cures.map((cure) => words[`sure.cure-${cure}`]) },
        ]
      : []),
  ];
}

function unseenBlocks(roofs: readonly MeasuredRoof[], speech: Speech): Block[] {
  const { words } = speech;
  const items = roofs.flatMap(({ name, plane }) => {
    const station = plane.stations.reduce((least, one) => (one.coverage < least.coverage ? one : least));
    const places = unseenPlaces(station.unseen, speech).map(({ where, share }) =>
      words['sure.unseen-place'](where, smallShare(share, speech)),
    );
    const [from, unseen] = [shownText(station.name, 60), smallShare(1 - station.coverage, speech)];
    return places.length > 0 ? [words['sure.unseen-from'](name, from, unseen, speech.list(places))] : [];
  });
  if (items.length === 0) return [{ kind: 'paragraph', text: words['sure.all-seen'] }];
  const hasChoice = roofs.some(({ plane: { stations } }) => stations.length > 1);
  return [
    { kind: 'subheading', text: words['sure.unseen'] },
    { kind: 'list', items },
    {
      kind: 'paragraph',
      text: hasChoice
        ? `${words['sure.unseen-note']} ${words['sure.unseen-least']}`
        : words['sure.unseen-note'],
    },
  ];
}

/** Unseen parts in words, the largest share first; parts of the same words together. */
function unseenPlaces(ranges: readonly UnseenRange[], speech: Speech): { where: string; share: number }[] {
  const shares = new Map<string, number>();
  for (const range of joined(ranges)) {
    const where = whereText(range, speech);
    shares.set(where, (shares.get(where) ?? 0) + range.share);
  }
  return [...shares]
    .map(([where, share]) => ({ where, share }))
    .filter(({ share }) => share >= NOTICEABLE)
    .sort((a, b) => b.share - a.share);
}

type Unseen = Pick<UnseenRange, 'from' | 'to' | 'share'>;

/** Ranges that were cut only where the sun's band begins, in one piece again. */
function joined(ranges: readonly Unseen[]): Unseen[] {
  const pieces: Unseen[] = [];
  for (const { from, to, share } of ranges) {
    const last = pieces[pieces.length - 1];
    if (last && touches(last.to, from))
      pieces[pieces.length - 1] = { from: last.from, to, share: last.share + share };
    else pieces.push({ from, to, share });
  }
  const [first, last] = [pieces[0], pieces[pieces.length - 1]];
  if (pieces.length < 2 || !touches(last.to, first.from)) return pieces;
  return [...pieces.slice(1, -1), { from: last.from, to: first.to, share: last.share + first.share }];
}

const touches = (to: number, from: number) => Math.abs(fullCircle(to) - fullCircle(from)) < 1e-6;

function whereText({ from, to }: Unseen, speech: Speech): string {
  const { words } = speech;
  const width = to > from ? to - from : to - from + 360;
  if (width >= 359.9) return words['sure.all-around'];
  const [start, end] = [speech.compass(from), speech.compass(to)];
  return start === end || width < 22.5
    ? words['sure.toward'](speech.compass(from + width / 2))
    : words['sure.between'](start, end);
}

function unmeasuredBlocks(report: ReportInput, speech: Speech): Block[] {
  const names = roofsOf(report).flatMap(({ name, plane }) => (plane.solarAccess ? [] : [name]));
  if (names.length === 0) return [];
  return [{ kind: 'paragraph', text: speech.words['sure.unmeasured'](speech.list(names)) }];
}
