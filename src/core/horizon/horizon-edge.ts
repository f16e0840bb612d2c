import { DEGREES, RADIANS, turnBetween } from '../angles/angles.ts';

/** A direction in the sky, degrees: true azimuth and apparent elevation. */
export interface SkyPoint {
  azimuth: number;
  elevation: number;
}

/**
 * One stretch of an edge, as elevation over azimuth. `from` is 0 to 360 and below `to`, at most 360; a stretch over
 * north is cut there.
 */
export interface HorizonEdge {
  from: number;
  to: number;
  straight: boolean;
  /** Straight: tan(elevation) = a·sin(azimuth) + b·cos(azimuth). Drawn: elevation = a + b·azimuth, degrees. */
  a: number;
  b: number;
}

/** Elevation [degrees] of an edge at an azimuth [degrees] within its stretch. */
export function edgeElevation(edge: HorizonEdge, azimuth: number): number {
  if (!edge.straight) return edge.a + edge.b * azimuth;
  const angle = azimuth * RADIANS;
  return Math.atan(edge.a * Math.sin(angle) + edge.b * Math.cos(angle)) * DEGREES;
}

/** Nearer the zenith than this the tangent is no longer of use, degrees. */
const STEEPEST = 89.9999;

/**
 * The stretches that join two neighbouring points of a trace by the shorter way round, none where they stand one above
 * the other. Throws RangeError for neighbours 180° or more apart, which no edge joins in one way only.
 *
 * `straight`: the great circle through both, as a straight edge in space is seen: with e1 at a1 and e2 at a2,
 * tan e = (tan e1 sin(a2 - a) + tan e2 sin(a - a1)) / sin(a2 - a1), the plane through the eye and both points.
 * `drawn`: elevation linear in azimuth.
 */
export function edgesBetween(start: SkyPoint, end: SkyPoint, straight: boolean): HorizonEdge[] {
  const turn = turnBetween(start.azimuth, end.azimuth);
  if (Math.abs(turn) >= 180)
    throw new RangeError(`neighbours must be under 180° apart, got ${Math.abs(turn)}`);
  if (Math.abs(turn) < 1e-9) return [];
  const [first, last] = turn > 0 ? [start, end] : [end, start];
  const from = ((first.azimuth % 360) + 360) % 360;
  const to = from + Math.abs(turn);
  const whole = { from, to, straight, ...coefficients(from, to, first.elevation, last.elevation, straight) };
  if (to <= 360) return [whole];
  const shifted = straight ? whole : { ...whole, a: whole.a + whole.b * 360 };
  return [
    { ...whole, to: 360 },
    { ...shifted, from: 0, to: to - 360 },
  ];
}

function coefficients(from: number, to: number, first: number, last: number, straight: boolean) {
  if (!straight) {
    const slope = (last - first) / (to - from);
    return { a: first - slope * from, b: slope };
  }
  const tangent = (elevation: number) =>
    Math.tan(Math.max(-STEEPEST, Math.min(STEEPEST, elevation)) * RADIANS);
  const [a1, a2] = [from * RADIANS, to * RADIANS];
  const [t1, t2] = [tangent(first), tangent(last)];
  const sine = Math.sin(a2 - a1);
  return {
    a: (t2 * Math.cos(a1) - t1 * Math.cos(a2)) / sine,
    b: (t1 * Math.sin(a2) - t2 * Math.sin(a1)) / sine,
  };
}
