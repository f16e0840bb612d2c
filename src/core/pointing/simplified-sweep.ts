import { RADIANS, turnBetween } from '../angles/angles.ts';
import type { TraceEdge } from '../survey/survey.ts';
import type { FrameDirection, Vector } from '../angles/vectors.ts';
import { angleBetween, dot, scaled, vectorOf } from '../angles/vectors.ts';

/** A simplified sweep stays this near to the raw one, degrees, where nothing else is asked for. */
export const SWEEP_TOLERANCE = 0.25;

/** A direct step may not turn further than this: at 180° it could go either way. */
const WIDEST_TURN = 175;

type Point = FrameDirection & { vector: Vector };

/**
 * The fewest points of a sweep such that the edge through them stays within a tolerance [degrees on the sphere] of
 * every point left out: great circles between them for a straight edge, lines in azimuth and elevation for a drawn
 * one. First and last stay. Neighbours that are left turn by less than 175°, unless they are neighbours in the sweep.
 * Throws RangeError for a tolerance that is not over 0.
 * Ref: Douglas and Peucker (1973), Cartographica 10, 112.
 */
export function simplifiedSweep<P extends Point>(
  points: readonly P[],
  edge: TraceEdge,
  tolerance: number = SWEEP_TOLERANCE,
): P[] {
  if (!(tolerance > 0)) throw new RangeError(`tolerance must be over 0, got ${tolerance}`);
  if (points.length <= 2) return [...points];
  const keep = new Set([0, points.length - 1]);
  const open: [number, number][] = [[0, points.length - 1]];
  for (let span = open.pop(); span; span = open.pop()) {
    const worst = worstBetween(points, span, edge);
    if (!worst || worst.off <= tolerance) continue;
    keep.add(worst.at);
    open.push([span[0], worst.at], [worst.at, span[1]]);
  }
  return points.filter((_, i) => keep.has(i));
}

/** The point between two that lies furthest from the edge between them; null where there is none. */
function worstBetween(points: readonly Point[], [from, to]: [number, number], edge: TraceEdge) {
  if (to - from < 2) return null;
  if (Math.abs(totalTurn(points, from, to)) > WIDEST_TURN) return { at: (from + to) >> 1, off: Infinity };
  const offOf = edge === 'straight' ? offGreatCircle : offDrawnLine;
  let worst = { at: from + 1, off: -1 };
  for (let at = from + 1; at < to; at++) {
    const off = offOf(points[at], points[from], points[to]);
    if (off > worst.off) worst = { at, off };
  }
  return worst;
}

/** How far the sweep turned on its way, not by the shorter one, degrees. */
function totalTurn(points: readonly Point[], from: number, to: number): number {
  let turn = 0;
  for (let i = from + 1; i <= to; i++) turn += turnBetween(points[i - 1].azimuth, points[i].azimuth);
  return turn;
}

/** Angle of a point from the arc between two others, degrees. */
function offGreatCircle({ vector }: Point, from: Point, to: Point): number {
  const [a, b] = [from.vector, to.vector];
  const ends = Math.min(angleBetween(vector, a), angleBetween(vector, b));
  const normal = cross(a, b);
  const length = Math.hypot(...normal);
  if (length < 1e-9) return ends;
  const pole = scaled(normal, 1 / length);
  const isBeside = dot(cross(pole, a), vector) >= 0 && dot(cross(b, pole), vector) >= 0;
  return isBeside ? Math.abs(90 - angleBetween(vector, pole)) : ends;
}

/** Angle of a point from the line in azimuth and elevation between two others, degrees. */
function offDrawnLine(point: Point, from: Point, to: Point): number {
  const level = Math.cos(point.elevation * RADIANS);
  const across = turnBetween(from.azimuth, to.azimuth);
  const along = turnBetween(from.azimuth, point.azimuth);
  const [dx, dy] = [across * level, to.elevation - from.elevation];
  const [px, py] = [along * level, point.elevation - from.elevation];
  const square = dx * dx + dy * dy;
  const share = square > 0 ? Math.min(1, Math.max(0, (px * dx + py * dy) / square)) : 0;
  const nearest = vectorOf({
    azimuth: from.azimuth + share * across,
    elevation: from.elevation + share * dy,
  });
  return angleBetween(point.vector, nearest);
}

const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
