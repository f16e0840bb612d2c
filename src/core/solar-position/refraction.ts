import { RADIANS } from '../angles/angles.ts';

/** Air temperature the refraction is taken at, °C. */
const TEMPERATURE = 12;
/** Lowest geometric elevation the formula is used at, degrees; below, its value there is held. */
const LOWEST = -1;

/**
 * Pressure of the standard atmosphere, hPa, at an altitude of -1000 to 11000 m; RangeError outside.
 * Ref: ICAO standard atmosphere (1993), eq. 12: 1013.25 (1 - 2.25577e-5 h)^5.25588.
 */
export function standardPressure(altitude: number): number {
  if (!(altitude >= -1000 && altitude <= 11000))
    throw new RangeError(`altitude must be -1000 to 11000 m, got ${altitude}`);
  return 1013.25 * (1 - 2.25577e-5 * altitude) ** 5.25588;
}

/**
 * Refraction: what the air adds to a geometric elevation [degrees], in degrees, at a pressure [hPa].
 * Ref: Saemundsson (1986), in Meeus, Astronomical Algorithms, 2nd ed. (1998), eq. 16.4, with the factors for pressure
 * and temperature given there.
 */
export function refraction(geometricElevation: number, pressure = 1010): number {
  const h = geometricElevation < LOWEST ? LOWEST : geometricElevation;
  const arcMinutes = 1.02 / Math.tan((h + 10.3 / (h + 5.11)) * RADIANS) + 0.0019279; // zero at 90°
  return ((arcMinutes / 60) * (pressure / 1010) * 283) / (273 + TEMPERATURE);
}

/**
 * Geometric elevation [degrees] of a direction seen at an apparent elevation [degrees, -90 to 90] through air of a
 * pressure [hPa]: the inverse of adding `refraction`, to 1e-10°.
 */
export function geometricOf(apparentElevation: number, pressure = 1010): number {
  if (!(Math.abs(apparentElevation) <= 90))
    throw new RangeError(`apparentElevation must be -90 to 90, got ${apparentElevation}`);
  let geometric = apparentElevation - refraction(apparentElevation, pressure);
  // the refraction changes by at most a quarter of a change of elevation, so this closes in
  for (let round = 0; round < 40; round++) geometric = apparentElevation - refraction(geometric, pressure);
  return geometric;
}
