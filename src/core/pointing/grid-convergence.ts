import { DEGREES, RADIANS, turnBetween } from '../angles/angles.ts';

/**
 * Grid convergence of a transverse Mercator grid, degrees: true bearing = grid bearing + convergence; positive east of
 * the central meridian in the north, west of it in the south. `latitude` -90 to 90, within 30° of the meridian.
 * The sphere's formula; the ellipsoid changes it by less than 0.001° within a zone's width.
 * Ref: Snyder, Map Projections: A Working Manual, USGS Professional Paper 1395 (1987), chapter 8; from memory.
 */
export function gridConvergence(latitude: number, longitude: number, meridian: number): number {
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  const east = turnBetween(meridian, longitude);
  if (!(Math.abs(east) <= 30))
    throw new RangeError(`longitude must be within 30° of the meridian ${meridian}, got ${longitude}`);
  return Math.atan(Math.tan(east * RADIANS) * Math.sin(latitude * RADIANS)) * DEGREES;
}
