import type { AccessInterval, Assessment, PlaneAssessment } from '../shading/assessment.ts';
import type { IntervalSourceId } from '../uncertainty/interval-source.ts';

/** Standard deviations either way that hold 95 of 100 draws. */
const EITHER_WAY = 1.96;

/** Less than this is not worth a sentence, percentage points. */
const LEAST_NARROWED = 0.1;

/** A 95 % interval from end to end, percentage points. */
export const width = ({ low, high }: AccessInterval): number => 100 * (high - low);

/** What an access may be off by for one source alone, 95 times in 100, percentage points; 0 where it is not listed. */
export function sourceEffect(
  { standardDeviation, sources }: AccessInterval,
  source: IntervalSourceId,
): number {
  const share = sources.find((one) => one.source === source)?.share ?? 0;
  return 100 * EITHER_WAY * standardDeviation * Math.sqrt(share);
}

/**
 * What one source at some stations moves a plane's mean access by, percentage points: the greatest of all planes. The
 * stations err together, as those of one run do. Null where the assessment has no interval of any of them.
 */
export function effectThrough(
  assessment: Assessment | null,
  stations: ReadonlySet<string>,
  source: IntervalSourceId,
): number | null {
  const effects = (assessment?.planes ?? []).flatMap((plane) => {
    const own = stationEffects(plane, source).filter(({ station }) => stations.has(station));
    return own.length > 0 ? [own.reduce((sum, { effect }) => sum + effect, 0)] : [];
  });
  return effects.length > 0 ? Math.max(...effects) : null;
}

/** What one source at each station moves the plane's mean access by, percentage points. */
export function stationEffects(
  { stations }: PlaneAssessment,
  source: IntervalSourceId,
): { station: string; effect: number }[] {
  return stations.flatMap(({ id, solarAccess: { interval } }) =>
    interval ? [{ station: id, effect: sourceEffect(interval, source) / stations.length }] : [],
  );
}

/** What the cure of one source would make of the interval that it narrows most, as a sentence; null where it narrows none. */
export function narrowing(assessment: Assessment | null, source: IntervalSourceId): string | null {
  const narrowed = (assessment?.planes ?? []).flatMap(({ name, solarAccess }) => {
    const interval = solarAccess?.interval;
    const after = interval?.sources.find((one) => one.source === source)?.standardDeviationAfter ?? null;
    if (!interval || after === null || !(interval.standardDeviation > 0)) return [];
    const before = width(interval);
    return [{ name, before, after: before * (after / interval.standardDeviation) }];
  });
  const [most] = narrowed.sort((a, b) => b.before - b.after - (a.before - a.after));
  if (!most || most.before - most.after < LEAST_NARROWED) return null;
  return `It would narrow the range of the yearly access from ${most.before.toFixed(1)} to ${most.after.toFixed(1)} points (${most.name}).`;
}
