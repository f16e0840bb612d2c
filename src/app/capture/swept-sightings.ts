import { turnBetween } from '../../core/angles/angles.ts';
import { simplifiedSweep, SWEEP_TOLERANCE } from '../../core/pointing/simplified-sweep.ts';
import { sweepPoints } from '../../core/pointing/sweep-points.ts';
import type { SweepPoint } from '../../core/pointing/sweep-points.ts';
import type { Reading, Sighting } from '../../core/survey/survey.ts';

export interface SweptSightings {
  sightings: Sighting[];
  /** The sweep went all around and came back to where it began. */
  fullCircle: boolean;
}

/** Ends of a sweep all around that lie nearer than this are joined, degrees. */
const CLOSE = 20;

/** A sweep's chunks as the fewest sightings that keep its edge within a quarter of a degree. */
export function sweepSightings(chunks: readonly Reading[], newId: () => string): SweptSightings {
  const points = simplifiedSweep(sweepPoints(chunks).points, 'drawn', SWEEP_TOLERANCE);
  const sightings = points.map(({ reading, sampleAt }, order) => ({ id: newId(), order, reading, sampleAt }));
  return { sightings, fullCircle: goesAround(points) };
}

function goesAround(points: readonly SweepPoint[]): boolean {
  let turn = 0;
  for (let i = 1; i < points.length; i++) turn += turnBetween(points[i - 1].azimuth, points[i].azimuth);
  const [first, last] = [points[0], points.at(-1)];
  const apart = first && last ? Math.abs(turnBetween(first.azimuth, last.azimuth)) : 180;
  return Math.abs(turn) >= 360 - CLOSE && apart <= CLOSE;
}
