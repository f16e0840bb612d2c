import { turnBetween } from '../angles/angles.ts';
import type { PointedRun, PointedSurvey } from '../pointing/pointed-survey.ts';
import { PLANNING } from '../pointing/planning-values.ts';
import { REPEATS } from './planning-values.ts';

/**
 * How much worse than planned this survey was pointed, by its own repeats: a mark sighted again, a compass held against a
 * check, checks against each other, an inclination that turning the phone over found. 1 where they agree as well as planned
 * or better; the planned deviations of all its runs are multiplied by it. A survey that repeats nothing cannot show it.
 */
export function noiseScale({ runs }: Pick<PointedSurvey, 'runs'>): number {
  const squares = [...runs.flatMap(repeatsOf), ...turnedOver(runs)].map(
    (ratio) => Math.min(REPEATS.farthest, Math.abs(ratio)) ** 2,
  );
  const sum = squares.reduce((total, square) => total + square, REPEATS.asPlanned);
  return Math.max(1, Math.sqrt(sum / (REPEATS.asPlanned + squares.length)));
}

/** Differences between repeats, in planned standard deviations. */
const repeatsOf = (run: PointedRun): number[] => [
  ...closingOf(run),
  ...compassAgainstChecks(run),
  ...checksAgainstEachOther(run),
];

/** A mark sighted again: a compass frame stays, any other turns as time goes on. */
function closingOf({ closure, heading }: PointedRun): number[] {
  if (!closure) return [];
  const twice = PLANNING.pointing * Math.SQRT2;
  const turns = heading !== null && heading.ratePerMinute !== 0;
  const turned = turns ? PLANNING.yawDriftPerMinute * closure.minutes : 0;
  return [closure.elevation / twice, closure.azimuth / Math.hypot(twice, turned)];
}

const compassAgainstChecks = ({ checks }: PointedRun): number[] =>
  checks.flatMap(({ againstCompass, standardDeviation }) =>
    againstCompass === null ? [] : [againstCompass / Math.hypot(PLANNING.compass, standardDeviation)],
  );

function checksAgainstEachOther({ checks, heading }: PointedRun): number[] {
  const { ratePerMinute = 0, ratePerMinuteDeviation = 0 } = heading ?? {};
  const good = checks.filter(({ offset }) => offset !== null);
  return good.slice(1).map((check, i) => {
    const before = good[i];
    const minutes = (check.takenAtMs - before.takenAtMs) / 60_000;
    const moved = turnBetween(before.offset!, check.offset!) - ratePerMinute * minutes;
    const drift = ratePerMinuteDeviation * minutes;
    return moved / Math.hypot(check.standardDeviation, before.standardDeviation, drift);
  });
}

/** Inclinations that turning over found; runs of one phone share one, which counts once. */
function turnedOver(runs: readonly PointedRun[]): number[] {
  const found = runs.flatMap(({ index }) =>
    Object.values(index).flatMap(({ source, value }) => (source === 'two-face' ? [value] : [])),
  );
  return [...new Set(found)].map((value) => value / PLANNING.elevationIndex);
}
