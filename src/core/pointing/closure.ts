import { RADIANS, turnBetween } from '../angles/angles.ts';
import { groupedBy } from './grouped-by.ts';
import type { OffsetRate } from './heading-fit.ts';
import type { MarkPointing } from './mark-pointings.ts';
import { PLANNING } from './planning-values.ts';
import type { Closure } from './pointed-survey.ts';

/** A run whose azimuths close by more than this is refused, degrees: the greater of the two, never over the last. */
export const AZIMUTH_LIMIT = { least: 5, perMinute: 1.5, most: 20 } as const;
/** A run whose elevations close by more than this is refused, degrees. */
export const ELEVATION_LIMIT = 3;
/** A mark sighted again sooner than this says nothing of drift, minutes. */
const SHORTEST = 1;

/** What closing the horizon told of one run. */
export interface RunClosure {
  /** The longest closing. */
  closure: Closure;
  /** Change of the offset that the closings show, for the run's azimuths to be spread by. */
  rate: OffsetRate;
  /** Why the run is refused, as a sentence; null where it closes. */
  refused: string | null;
}

/** The closings of one run: each mark sighted again from the same station. Null where there is none. */
export function runClosure(marks: readonly MarkPointing[]): RunClosure | null {
  const groups = groupedBy(marks, ({ station, mark }) => JSON.stringify([station, mark]));
  const closings = [...groups.values()].filter(
    (seen) => seen.length > 1 && minutesBetween(seen[0], seen.at(-1)!) >= SHORTEST,
  );
  if (closings.length === 0) return null;
  const closures = closings.map(closureOf);
  const closure = closures.reduce((best, one) => (one.minutes > best.minutes ? one : best));
  return { closure, rate: rateOf(closings), refused: closures.map(refusal).find(Boolean) ?? null };
}

const minutesBetween = (a: MarkPointing, b: MarkPointing) =>
  (b.pointing.takenAtMs - a.pointing.takenAtMs) / 60_000;

function closureOf(seen: readonly MarkPointing[]): Closure {
  const [first, last] = [seen[0], seen.at(-1)!];
  return {
    mark: first.mark,
    station: first.station,
    minutes: minutesBetween(first, last),
    azimuth: turnBetween(first.pointing.azimuth, last.pointing.azimuth),
    elevation: last.pointing.elevation - first.pointing.elevation,
  };
}

/**
 * The common slope of the marks' azimuths by time, by least squares; with one mark sighted twice its misclosure over
 * its minutes. The offset moves against the azimuths.
 */
function rateOf(closings: readonly MarkPointing[][]): OffsetRate {
  let [moved, leverage] = [0, 0];
  for (const seen of closings) {
    const weight = Math.cos(seen[0].pointing.elevation * RADIANS) ** 2;
    const at = seen.map((one) => ({
      minutes: minutesBetween(seen[0], one),
      turn: turnBetween(seen[0].pointing.azimuth, one.pointing.azimuth),
    }));
    const mean = at.reduce((sum, { minutes }) => sum + minutes, 0) / at.length;
    for (const { minutes, turn } of at) {
      moved += weight * (minutes - mean) * turn;
      leverage += weight * (minutes - mean) ** 2;
    }
  }
  return { value: -moved / leverage, standardDeviation: PLANNING.pointing / Math.sqrt(leverage) };
}

function refusal({ mark, minutes, azimuth, elevation }: Closure): string | null {
  const { least, perMinute, most } = AZIMUTH_LIMIT;
  const limit = Math.min(most, Math.max(least, perMinute * minutes));
  const again = 'Take the run again: the phone slipped, was disturbed, or another mark was sighted.';
  if (Math.abs(azimuth) > limit)
    return `Sighted again after ${minutes.toFixed(0)} minutes, "${mark}" had moved ${Math.abs(azimuth).toFixed(1)}° in azimuth, over the limit of ${limit.toFixed(1)}°. ${again}`;
  if (Math.abs(elevation) > ELEVATION_LIMIT)
    return `Sighted again after ${minutes.toFixed(0)} minutes, "${mark}" had moved ${Math.abs(elevation).toFixed(1)}° in elevation, over the limit of ${ELEVATION_LIMIT}°. ${again}`;
  return null;
}
