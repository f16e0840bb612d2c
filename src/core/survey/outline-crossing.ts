import { turnBetween } from '../angles/angles.ts';
import type { Vector } from '../angles/vectors.ts';
import { cross, dot, vectorOf } from '../angles/vectors.ts';
import type { TraceEdge } from './survey.ts';

interface Direction {
  azimuth: number;
  elevation: number;
}

/**
 * Whether a closed outline meets itself: the places in the list (from 0) at which two such edges start, or null.
 * Sightings that repeat the one before are passed over. `drawn` edges are linear in azimuth and elevation, on the
 * unrolled horizon that repeats every 360°, so an outline around the zenith closes onto its own beginning; `straight`
 * edges are great circles. Directions in degrees, neighbours under 180° apart.
 */
export function outlineCrossing(sightings: readonly Direction[], edge: TraceEdge): [number, number] | null {
  const kept = sightings.flatMap((_, i) => (isRepeat(sightings, i) ? [] : [i]));
  const count = kept.length;
  if (count < 3) return null;
  const meet = edge === 'drawn' ? drawnEdgesMeet(kept, sightings) : straightEdgesMeet(kept, sightings);
  const meeting = firstMeeting(count, meet);
  return meeting && [kept[meeting[0]], kept[meeting[1]]];
}

/**
 * Whether a polygon in a plane meets itself: the places in the list (from 0) at which two such edges start, or null.
 * Corners that repeat the one before are passed over.
 */
export function polygonCrossing(corners: readonly Point[]): [number, number] | null {
  const kept = corners.flatMap(({ x, y }, i) => {
    const before = corners.at(i - 1)!;
    return x === before.x && y === before.y ? [] : [i];
  });
  const corner = (k: number) => corners[kept[k % kept.length]];
  const meeting = firstMeeting(kept.length, (i, j) =>
    segmentsMeet(corner(i), corner(i + 1), corner(j), corner(j + 1)),
  );
  return meeting && [kept[meeting[0]], kept[meeting[1]]];
}

/** The first two edges of a closed chain that meet without being neighbours. */
function firstMeeting(count: number, meet: EdgesMeet): [number, number] | null {
  for (let i = 0; i < count; i++)
    for (let j = i + 2; j < count; j++) if (!(i === 0 && j === count - 1) && meet(i, j)) return [i, j];
  return null;
}

function isRepeat(sightings: readonly Direction[], i: number): boolean {
  const here = sightings[i];
  const before = sightings.at(i - 1)!;
  return turnBetween(before.azimuth, here.azimuth) === 0 && before.elevation === here.elevation;
}

type EdgesMeet = (i: number, j: number) => boolean;

function drawnEdgesMeet(kept: number[], sightings: readonly Direction[]): EdgesMeet {
  const x = [sightings[kept[0]].azimuth];
  const y = kept.map((k) => sightings[k].elevation);
  y.push(y[0]);
  for (let i = 1; i <= kept.length; i++) {
    const turn = turnBetween(sightings[kept[i - 1]].azimuth, sightings[kept[i % kept.length]].azimuth);
    x.push(x[i - 1] + turn);
  }
  return (i, j) => {
    if (Math.min(y[i], y[i + 1]) > Math.max(y[j], y[j + 1])) return false;
    if (Math.min(y[j], y[j + 1]) > Math.max(y[i], y[i + 1])) return false;
    const middle = (x[i] + x[i + 1] - x[j] - x[j + 1]) / 2;
    const shift = 360 * Math.round(middle / 360);
    const at = (k: number, moved: number): Point => ({ x: x[k] + moved, y: y[k] });
    return segmentsMeet(at(i, 0), at(i + 1, 0), at(j, shift), at(j + 1, shift));
  };
}

interface Point {
  x: number;
  y: number;
}

/** Which side of a line through a and b the point p is on: positive left, 0 on it. */
const side = (a: Point, b: Point, p: Point) => (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x);

const within = (a: Point, b: Point, p: Point) =>
  Math.min(a.x, b.x) <= p.x &&
  p.x <= Math.max(a.x, b.x) &&
  Math.min(a.y, b.y) <= p.y &&
  p.y <= Math.max(a.y, b.y);

function segmentsMeet(a: Point, b: Point, c: Point, d: Point): boolean {
  const sideC = side(a, b, c);
  const sideD = side(a, b, d);
  const sideA = side(c, d, a);
  const sideB = side(c, d, b);
  if (sideC * sideD < 0 && sideA * sideB < 0) return true;
  return (
    (sideC === 0 && within(a, b, c)) ||
    (sideD === 0 && within(a, b, d)) ||
    (sideA === 0 && within(c, d, a)) ||
    (sideB === 0 && within(c, d, b))
  );
}

function straightEdgesMeet(kept: number[], sightings: readonly Direction[]): EdgesMeet {
  const corners = kept.map((k) => vectorOf(sightings[k]));
  const corner = (i: number) => corners[i % corners.length];
  return (i, j) => arcsMeet(corner(i), corner(i + 1), corner(j), corner(j + 1));
}

/** Whether the great-circle arcs ab and cd cross: the ends of each on different sides of the other, on one side of the globe. */
function arcsMeet(a: Vector, b: Vector, c: Vector, d: Vector): boolean {
  const normalAb = cross(a, b);
  const normalCd = cross(c, d);
  if (dot(normalAb, c) * dot(normalAb, d) > 0 || dot(normalCd, a) * dot(normalCd, b) > 0) return false;
  const meeting = cross(normalAb, normalCd);
  return (
    onArc(a, b, normalAb, meeting) === onArc(c, d, normalCd, meeting) && onArc(a, b, normalAb, meeting) !== 0
  );
}

/** 1 where the point is on the arc, -1 where its opposite is, 0 where neither. */
function onArc(a: Vector, b: Vector, normal: Vector, point: Vector): number {
  const fromA = dot(cross(normal, a), point);
  const toB = dot(cross(b, normal), point);
  if (fromA >= 0 && toB >= 0) return fromA === 0 && toB === 0 ? 0 : 1;
  return fromA <= 0 && toB <= 0 ? -1 : 0;
}
