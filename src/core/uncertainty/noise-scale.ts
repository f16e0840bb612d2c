import type { PointedRun, PointedSurvey } from '../pointing/pointed-survey.ts';
import { PLANNING } from '../pointing/planning-values.ts';
import { REPEATS } from './planning-values.ts';

/**
 * How much worse than planned this survey was pointed, by its own repeats: a mark sighted again, a compass held against a
 * check. 1 where they agree as well as planned or better; the planned deviations of all its runs are multiplied by it.
 * A survey that repeats nothing cannot show it.
 */
export function noiseScale({ runs }: Pick<PointedSurvey, 'runs'>): number {
  const squares = runs.flatMap(repeatsOf).map((ratio) => Math.min(REPEATS.farthest, Math.abs(ratio)) ** 2);
  const sum = squares.reduce((total, square) => total + square, REPEATS.asPlanned);
  return Math.max(1, Math.sqrt(sum / (REPEATS.asPlanned + squares.length)));
}

/** Differences between repeats, in planned standard deviations. */
function repeatsOf({ closure, checks, heading }: PointedRun): number[] {
  const ratios: number[] = [];
  if (closure) {
    const twice = PLANNING.pointing * Math.SQRT2;
    // A compass frame stays; any other turns as time goes on.
    const drift =
      checks.some(({ againstCompass }) => againstCompass !== null) && heading?.ratePerMinute === 0;
    const turned = drift ? 0 : PLANNING.yawDriftPerMinute * closure.minutes;
    ratios.push(closure.elevation / twice, closure.azimuth / Math.hypot(twice, turned));
  }
  for (const { againstCompass, standardDeviation } of checks)
    if (againstCompass !== null)
      ratios.push(againstCompass / Math.hypot(PLANNING.compass, standardDeviation));
  return ratios;
}
