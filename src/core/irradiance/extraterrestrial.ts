import { DEGREES } from '../angles/angles.ts';

/** Solar constant, W/m2 (Kopp and Lean 2011, rounded). */
export const SOLAR_CONSTANT = 1361;

const dayAngle = (dayOfYear: number) => (2 * Math.PI * (dayOfYear - 1)) / 365;

/**
 * Square of (mean / actual) sun-earth distance on a day of the year, 1 to 366.
 * Ref: Spencer (1971), in Iqbal, An Introduction to Solar Radiation (1983), eq. 1.2.1.
 */
export function eccentricityFactor(dayOfYear: number): number {
  const b = dayAngle(dayOfYear);
  return (
    1.00011 +
    0.034221 * Math.cos(b) +
    0.00128 * Math.sin(b) +
    0.000719 * Math.cos(2 * b) +
    0.000077 * Math.sin(2 * b)
  );
}

/** Extraterrestrial irradiance normal to the sun, W/m2, on a day of the year, 1 to 366. */
export const extraterrestrialNormal = (dayOfYear: number): number => SOLAR_CONSTANT * eccentricityFactor(dayOfYear);

/**
 * Declination of the sun, degrees, for daily sums; the sky map uses the ephemeris.
 * Ref: Spencer (1971), in Iqbal (1983), eq. 1.3.1.
 */
export function spencerDeclination(dayOfYear: number): number {
  const b = dayAngle(dayOfYear);
  return (
    DEGREES *
    (0.006918 -
      0.399912 * Math.cos(b) +
      0.070257 * Math.sin(b) -
      0.006758 * Math.cos(2 * b) +
      0.000907 * Math.sin(2 * b) -
      0.002697 * Math.cos(3 * b) +
      0.00148 * Math.sin(3 * b))
  );
}
