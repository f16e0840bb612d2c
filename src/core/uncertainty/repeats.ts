import { turnBetween } from '../angles/angles.ts';
import type { PointedRun, PointedSurvey } from '../pointing/pointed-survey.ts';
import { PLANNING } from '../pointing/planning-values.ts';

/** Two looks at one thing: how far they differ, in planned standard deviations of that difference. */
export interface Repeat {
  difference: number;
  /** The kind that is now and then far off whatever the phone: how often (0 to 1), and how far in the same unit. */
  outliers: { share: number; reach: number } | null;
}

/**
 * What a survey looked at twice: a mark sighted again, a compass held against a check, checks against each other, an
 * inclination that turning the phone over found.
 */
export function repeatsOf({ runs }: Pick<PointedSurvey, 'runs'>): Repeat[] {
  const plain = [...runs.flatMap(closingOf), ...runs.flatMap(checksAgainstEachOther), ...turnedOver(runs)];
  return [
    ...plain.map((difference) => ({ difference, outliers: null })),
    ...runs.flatMap(compassAgainstChecks),
  ];
}

/** A mark sighted again: a compass frame stays, any other turns as time goes on. */
function closingOf({ closure, heading }: PointedRun): number[] {
  if (!closure) return [];
  const twice = PLANNING.pointing * Math.SQRT2;
  const turns = heading !== null && heading.ratePerMinute !== 0;
  const turned = turns ? PLANNING.yawDriftPerMinute * closure.minutes : 0;
  return [closure.elevation / twice, closure.azimuth / Math.hypot(twice, turned)];
}

/** Steel puts a compass far off, which says nothing of the hand or the phone. */
const compassAgainstChecks = ({ checks }: PointedRun): Repeat[] =>
  checks.flatMap(({ againstCompass, standardDeviation }) => {
    if (againstCompass === null) return [];
    const unit = Math.hypot(PLANNING.compass, standardDeviation);
    const outliers = { share: PLANNING.compassOutlierShare, reach: PLANNING.compassOutlierReach / unit };
    return [{ difference: againstCompass / unit, outliers }];
  });

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
