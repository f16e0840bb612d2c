import type { Reading, SightingAxis } from '../survey/survey.ts';
import type { FrameDirection, Vector } from '../angles/vectors.ts';
import { angleBetween, directionOf } from '../angles/vectors.ts';
import { sightVector } from './attitude.ts';
import { meanDirection } from './average-direction.ts';

/** One row of a sweep in the frame of its run, and where it stands in the record. */
export interface SweepPoint extends FrameDirection {
  vector: Vector;
  reading: string;
  /** Milliseconds after the reading's `takenAt`: the sighting's `sampleAt`. */
  sampleAt: number;
  timeMs: number;
}

/** A sweep made ready: its points, and what was found on the way. */
export interface CleanSweep {
  points: SweepPoint[];
  /** Rows left out: without finite angles, or jumping away and back. */
  dropped: number;
  /** Places where the phone was moved so fast that an edge of this width was not followed, degrees. */
  gaps: { after: number; width: number }[];
}

/** A row this far from both its neighbours, which lie nearer to each other, is a slip of the sensor, degrees. No source. */
const SPIKE = 4;
/** Neighbouring rows further apart than this leave a gap, degrees. No source. */
const GAP = 5;
/** Rows nearer than this to the one kept before add nothing, degrees: the interface rounds to 0.1. */
const REST = 0.15;

/** The rows of a sweep's chunks in order of time, cleaned; whichever way and over whatever part of the sky it went. */
export function sweepPoints(chunks: readonly Reading[]): CleanSweep {
  const axis: SightingAxis = chunks[0]?.axis ?? 'camera';
  const rows = chunks.flatMap((chunk) => rawPoints(chunk, axis));
  const whole = rows.filter((row) => row !== null).sort((a, b) => a.timeMs - b.timeMs);
  const smooth = whole.filter((_, i) => !isSpike(whole, i));
  const points = withoutRests(smooth);
  const gaps = points.flatMap((point, i) => {
    const width = i > 0 ? angleBetween(points[i - 1].vector, point.vector) : 0;
    return width > GAP ? [{ after: i - 1, width }] : [];
  });
  return { points, dropped: rows.length - smooth.length, gaps };
}

function rawPoints({ id, takenAt, samples = [] }: Reading, axis: SightingAxis): (SweepPoint | null)[] {
  const startMs = Date.parse(takenAt);
  return samples.map(([ms, alpha, beta, gamma]) => {
    if (![ms, alpha, beta, gamma].every(Number.isFinite)) return null;
    const vector = sightVector({ alpha, beta, gamma }, axis);
    return { ...directionOf(vector), vector, reading: id, sampleAt: ms, timeMs: startMs + ms };
  });
}

/** Whether a point jumps away from its neighbours and back. */
function isSpike(points: readonly SweepPoint[], i: number): boolean {
  const [before, here, after] = [points[i - 1], points[i], points[i + 1]];
  if (!before || !after) return false;
  const away = Math.min(angleBetween(before.vector, here.vector), angleBetween(here.vector, after.vector));
  const mean = meanDirection([before.vector, after.vector]);
  return (
    away > SPIKE &&
    mean !== null &&
    angleBetween(mean.vector, here.vector) > angleBetween(before.vector, after.vector)
  );
}

/** Without the rows in which the phone rested; the last is kept. */
function withoutRests(points: readonly SweepPoint[]): SweepPoint[] {
  const kept: SweepPoint[] = [];
  points.forEach((point, i) => {
    const last = kept.at(-1);
    if (!last || angleBetween(last.vector, point.vector) >= REST || i === points.length - 1) kept.push(point);
  });
  const end = kept.at(-1);
  const rested = kept.length > 2 && end && angleBetween(kept[kept.length - 2].vector, end.vector) < REST;
  if (rested) kept.splice(-2, 1);
  return kept;
}
