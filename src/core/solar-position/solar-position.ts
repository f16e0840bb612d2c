import type { ApparentElevation, GeometricElevation, TrueAzimuth } from '../angles/angles.ts';
import { DEGREES, RADIANS, fullCircle, safeAsin } from '../angles/angles.ts';
import { refraction, standardPressure } from './refraction.ts';
import { sunEquatorial } from './sun-equatorial.ts';

export interface SolarPosition {
  /** 0 to 360, clockwise from true north. At a pole, where every way is south or north, counted as elsewhere by the limit along the meridian. */
  solarAzimuth: TrueAzimuth;
  /** With refraction; equal to the geometric elevation once the whole disc is below the horizon. */
  apparentElevation: ApparentElevation;
  /** Topocentric, without refraction. */
  geometricElevation: GeometricElevation;
}

/** Geometric elevation of the sun's centre as its upper edge leaves the horizon, degrees (USNO, NOAA: -50'). */
export const RISE_AND_SET_ELEVATION = -50 / 60;

/** Horizontal parallax of the sun, degrees (8.794"). */
export const PARALLAX = 8.794 / 3600;

/**
 * The sun's place in the sky of a site.
 *
 * `timeMs` Unix time [ms]; `latitude` -90 to 90, `longitude` any, degrees; `altitude` metres above sea, for the
 * pressure of the refraction. Throws RangeError outside.
 * Ref: Meeus, Astronomical Algorithms, 2nd ed. (1998), eq. 13.5, 13.6 (azimuth from north here); parallax in altitude
 * chapter 40; refraction eq. 16.4.
 */
export function solarPosition(
  timeMs: number,
  latitude: number,
  longitude: number,
  altitude = 0,
): SolarPosition {
  if (!(latitude >= -90 && latitude <= 90))
    throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  if (!Number.isFinite(longitude)) throw new RangeError(`longitude must be finite, got ${longitude}`);
  const { declination, greenwichHourAngle } = sunEquatorial(timeMs);
  const hourAngle = greenwichHourAngle + longitude * RADIANS;
  const { east, north, up } = sunDirection(declination, hourAngle, latitude * RADIANS);
  const geocentric = safeAsin(up) * DEGREES;
  const geometricElevation = geocentric - PARALLAX * Math.cos(geocentric * RADIANS);
  const apparent =
    geometricElevation < RISE_AND_SET_ELEVATION
      ? geometricElevation
      : geometricElevation + refraction(geometricElevation, standardPressure(altitude));
  return {
    solarAzimuth: fullCircle(Math.atan2(east, north) * DEGREES) as TrueAzimuth,
    apparentElevation: apparent as ApparentElevation,
    geometricElevation: geometricElevation as GeometricElevation,
  };
}

/** Unit vector to the sun, east-north-up, from declination, hour angle and latitude, all in radians. */
export function sunDirection(declination: number, hourAngle: number, latitude: number) {
  const equatorial = Math.cos(declination) * Math.cos(hourAngle);
  return {
    east: -Math.cos(declination) * Math.sin(hourAngle),
    north: Math.sin(declination) * Math.cos(latitude) - equatorial * Math.sin(latitude),
    up: Math.sin(declination) * Math.sin(latitude) + equatorial * Math.cos(latitude),
  };
}
