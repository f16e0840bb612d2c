import type { AccessInterval, Assessment, PlaneAssessment } from '../shading/assessment.ts';
import type { IntervalSourceId } from '../uncertainty/interval-source.ts';

/** Standard deviations either way that hold 95 of 100 draws. */
const EITHER_WAY = 1.96;

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
