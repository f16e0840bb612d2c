import { RADIANS, turnBetween } from '../angles/angles.ts';
import { groupedBy } from './grouped-by.ts';
import { LeastFirst } from './least-first.ts';
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

/** A pointing is tied to so many later ones of its mark; more would add nothing. */
const MOST_TIES = 20;

/**
 * Hands headings on from the runs that are known best: by marks that two runs sighted from one station, and among runs
 * of one compass with a widened deviation. A run with a check of its own keeps it. Changes the states.
 */
export function tieRuns(states: readonly RunState[], marks: readonly MarkPointing[]): void {
  const byId = new Map(states.map((state) => [state.id, state]));
  const ties = tiesOf(marks);
  const settled = new Set<RunState>();
  const shared = new Set<string | undefined>();
  const queue = new LeastFirst<RunState>();
  const offer = (state: RunState | undefined, heading: RunHeading | null) => {
    if (!state || !heading || settled.has(state) || state.heading?.source === 'check') return;
    if (heading.standardDeviation >= (state.heading?.standardDeviation ?? Infinity)) return;
    state.heading = heading;
    queue.push(heading.standardDeviation, state);
  };
  for (const state of states) if (state.heading) queue.push(state.heading.standardDeviation, state);
  for (let next = queue.pop(); next; next = queue.pop()) {
    const best = next.item;
    if (settled.has(best)) continue;
    settled.add(best);
    for (const [to, between] of ties.get(best.id) ?? []) {
      const state = byId.get(to);
      if (state && !settled.has(state)) offer(state, tiedHeading(best, state, between));
    }
    if (!isShareable(best) || shared.has(best.device)) continue;
    shared.add(best.device); // the surest check of a device comes first
    for (const state of states) offer(state, sharedHeading(best, state));
  }
}

/** Ties by the run they come from, then by the run they go to. */
function tiesOf(marks: readonly MarkPointing[]): Map<string, Map<string, Tie[]>> {
  const seen = groupedBy(marks, ({ station, mark }) => JSON.stringify([station, mark]));
  const ties = [...seen.values()].flatMap((group) =>
    group.flatMap((one, i) =>
      group
        .slice(i + 1, i + 1 + MOST_TIES)
        .filter((other) => other.pointing.run !== one.pointing.run)
        .flatMap((other) => [
          { from: one, to: other },
          { from: other, to: one },
        ]),
    ),
  );
  const byRun = groupedBy(ties, ({ from }) => from.pointing.run);
  return new Map([...byRun].map(([run, of]) => [run, groupedBy(of, ({ to }) => to.pointing.run)]));
}

/** Offset of a heading at an instant, degrees. */
export const offsetAt = ({ offset, ratePerMinute, atMs }: RunHeading, timeMs: number): number =>
  offset + (ratePerMinute * (timeMs - atMs)) / 60_000;

/** Standard deviation of a heading's offset at an instant, degrees. */
export const deviationAt = (
  { standardDeviation, ratePerMinuteDeviation, atMs }: RunHeading,
  timeMs: number,
): number => Math.hypot(standardDeviation, (ratePerMinuteDeviation * (timeMs - atMs)) / 60_000);

function tiedHeading(from: RunState, to: RunState, ties: readonly Tie[]): RunHeading {
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

const isShareable = ({ isMagnetic, heading }: RunState) => isMagnetic && heading?.source === 'check';

/** The check of another run of the same compass. */
function sharedHeading(from: RunState, to: RunState): RunHeading | null {
  if (!to.isMagnetic || from.device !== to.device || from === to) return null;
  const source = from.heading!;
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
