import { RADIANS, turnBetween } from '../angles/angles.ts';
import { groupedBy } from './grouped-by.ts';
import type { OffsetRate } from './heading-fit.ts';
import { fitOffset } from './heading-fit.ts';
import type { MarkPointing } from './mark-pointings.ts';
import { PLANNING } from './planning-values.ts';
import type { RunHeading } from './pointed-survey.ts';

/** One mark that two runs saw from one station. */
interface Tie {
  from: MarkPointing;
  to: MarkPointing;
}

/** A run on the way to its heading. */
export interface RunState {
  id: string;
  device: string | undefined;
  isMagnetic: boolean;
  heading: RunHeading | null;
  /** What is known of its drift beside the looks at its offset. */
  rate: OffsetRate;
}

/**
 * Hands headings on from the runs that are known best: by marks that two runs sighted from one station, and among runs
 * of one compass with a widened deviation. A run with a check of its own keeps it. Changes the states.
 */
export function tieRuns(states: readonly RunState[], marks: readonly MarkPointing[]): void {
  const ties = tiesOf(marks);
  const open = new Set(states);
  for (;;) {
    const best = [...open]
      .filter(({ heading }) => heading !== null)
      .sort((a, b) => a.heading!.standardDeviation - b.heading!.standardDeviation)[0];
    if (!best) return;
    open.delete(best);
    for (const state of open) {
      if (state.heading?.source === 'check') continue;
      for (const offer of [tiedHeading(best, state, ties), sharedHeading(best, state)])
        if (offer && offer.standardDeviation < (state.heading?.standardDeviation ?? Infinity))
          state.heading = offer;
    }
  }
}

const pairKey = (from: string, to: string) => JSON.stringify([from, to]);

function tiesOf(marks: readonly MarkPointing[]): Map<string, Tie[]> {
  const seen = [...groupedBy(marks, ({ station, mark }) => JSON.stringify([station, mark])).values()];
  const ties = seen.flatMap((group) =>
    group.flatMap((from) =>
      group.filter((to) => to.pointing.run !== from.pointing.run).map((to) => ({ from, to })),
    ),
  );
  return groupedBy(ties, ({ from, to }) => pairKey(from.pointing.run, to.pointing.run));
}

/** Offset of a heading at an instant, degrees. */
export const offsetAt = ({ offset, ratePerMinute, atMs }: RunHeading, timeMs: number): number =>
  offset + (ratePerMinute * (timeMs - atMs)) / 60_000;

/** Standard deviation of a heading's offset at an instant, degrees. */
export const deviationAt = (
  { standardDeviation, ratePerMinuteDeviation, atMs }: RunHeading,
  timeMs: number,
): number => Math.hypot(standardDeviation, (ratePerMinuteDeviation * (timeMs - atMs)) / 60_000);

function tiedHeading(from: RunState, to: RunState, all: Map<string, Tie[]>): RunHeading | null {
  const ties = all.get(pairKey(from.id, to.id));
  if (!ties) return null;
  const source = from.heading!;
  const fit = fitOffset(
    ties.map((tie) => {
      const [here, there] = [tie.from.pointing, tie.to.pointing];
      const across = PLANNING.pointing / Math.max(0.05, Math.cos(there.elevation * RADIANS));
      const drift = (source.ratePerMinuteDeviation * (here.takenAtMs - source.atMs)) / 60_000;
      return {
        atMs: there.takenAtMs,
        offset: turnBetween(there.azimuth, here.azimuth + offsetAt(source, here.takenAtMs)),
        standardDeviation: Math.hypot(across * Math.SQRT2, drift),
      };
    }),
    to.rate,
  );
  return {
    offset: fit.offset,
    atMs: fit.atMs,
    ratePerMinute: fit.ratePerMinute,
    ratePerMinuteDeviation: fit.ratePerMinuteDeviation,
    standardDeviation: Math.hypot(source.standardDeviation, fit.standardDeviation),
    source: 'tied',
    from: from.id,
    ownDeviation: fit.standardDeviation,
    outliers: source.outliers,
  };
}

/** The check of another run of the same compass. */
function sharedHeading(from: RunState, to: RunState): RunHeading | null {
  const source = from.heading!;
  const sameCompass = from.isMagnetic && to.isMagnetic && from.device === to.device;
  if (!sameCompass || source.source !== 'check') return null;
  const own = PLANNING.compassBetweenRuns;
  return {
    ...source,
    ratePerMinute: to.rate.value,
    ratePerMinuteDeviation: to.rate.standardDeviation,
    standardDeviation: Math.hypot(source.standardDeviation, own),
    source: 'shared',
    from: from.id,
    ownDeviation: own,
    outliers: null,
  };
}
