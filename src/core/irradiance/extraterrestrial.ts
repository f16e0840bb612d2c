import { DEGREES, RADIANS, safeAcos } from '../angles/angles.ts';
import { DAYS_IN_MONTH } from '../solar-position/sun-track.ts';
import type { Months } from '../survey/survey.ts';

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
export const extraterrestrialNormal = (dayOfYear: number): number =>
  SOLAR_CONSTANT * eccentricityFactor(dayOfYear);

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

/** Extraterrestrial irradiance normal to the sun, W/m2, on each of 365 days. */
export const dailyExtraterrestrialNormal = (): Float64Array =>
  Float64Array.from({ length: 365 }, (_, day) => extraterrestrialNormal(day + 1));

/**
 * Extraterrestrial irradiation of a horizontal plane on a day of the year, kWh/m2, at a latitude of -90 to 90 degrees.
 * Ref: Iqbal, An Introduction to Solar Radiation (1983), eq. 4.2.18, with day and night of the poles.
 */
export function dailyExtraterrestrial(latitude: number, dayOfYear: number): number {
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  const f = latitude * RADIANS;
  const d = spencerDeclination(dayOfYear) * RADIANS;
  const ws = safeAcos(-Math.tan(f) * Math.tan(d));
  const sum = Math.cos(f) * Math.cos(d) * Math.sin(ws) + ws * Math.sin(f) * Math.sin(d);
  return ((24 / Math.PI) * extraterrestrialNormal(dayOfYear) * Math.max(0, sum)) / 1000;
}

/** Mean daily extraterrestrial irradiation of each month of a 365-day year, kWh/m2: H0 of the clearness index. */
export function monthlyExtraterrestrial(latitude: number): Months {
  let day = 0;
  return DAYS_IN_MONTH.map((days) => {
    let sum = 0;
    for (let k = 0; k < days; k++) sum += dailyExtraterrestrial(latitude, ++day);
    return sum / days;
  }) as Months;
}
