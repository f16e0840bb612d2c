import { turnBetween } from '../../core/angles/angles.ts';
import { simplifiedSweep, SWEEP_TOLERANCE } from '../../core/pointing/simplified-sweep.ts';
import { sweepPoints } from '../../core/pointing/sweep-points.ts';
import type { SweepPoint } from '../../core/pointing/sweep-points.ts';
import type { Reading, Sighting, Station } from '../../core/survey/survey.ts';
import { inOrder } from './station-edits.ts';

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

/** Marks that were noted while a sweep went by. */
export function marksInSweep({ markSightings = [] }: Station, { readings = [] }: Sighting): Sighting[] {
  const chunks = new Set(readings);
  return markSightings.filter(
    ({ mark, reading, sampleAt }) =>
      mark !== undefined && sampleAt !== undefined && reading !== undefined && chunks.has(reading),
  );
}

/** A sweep's sightings with the marks noted in it at their places in time; a point at the same instant gives way. */
export function withMarksIn(
  sightings: readonly Sighting[],
  marks: readonly Sighting[],
  chunks: readonly Reading[],
): Sighting[] {
  const startMs = new Map(chunks.map(({ id, takenAt }) => [id, Date.parse(takenAt)]));
  const atMs = ({ reading = '', sampleAt = 0 }: Sighting) => (startMs.get(reading) ?? 0) + sampleAt;
  const noted = new Set(marks.map(atMs));
  return inOrder(
    [...sightings.filter((one) => !noted.has(atMs(one))), ...marks].sort((a, b) => atMs(a) - atMs(b)),
  );
}
