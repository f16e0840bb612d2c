import { RADIANS } from '../angles/angles.ts';

/** Cosine of the zenith angle that the clearness index is held at for a lower sun. */
const LOWEST_COSINE = 0.065;
/** Beyond this zenith angle all light counts as diffuse. */
const COSINE_OF_87 = Math.cos(87 * RADIANS);

/**
 * Share of diffuse in global horizontal irradiance at a clearness index of 0 to 1.
 * Ref: Erbs, Klein and Duffie, Estimation of the diffuse radiation fraction for hourly, daily and monthly-average
 * global radiation, Solar Energy 28 (1982), eq. 1.
 */
export function erbsDiffuseFraction(kt: number): number {
  if (kt <= 0.22) return 1 - 0.09 * kt;
  if (kt > 0.8) return 0.165;
  return 0.9511 + kt * (-0.1604 + kt * (4.388 + kt * (-16.638 + kt * 12.336)));
}

/**
 * Diffuse horizontal irradiance, W/m2, that belongs to a global one by the hourly correlation of Erbs. The clearness
 * index is taken over at least cos zenith 0.065 and is at most 1; beyond a zenith angle of 87 degrees all is diffuse.
 * `dniExtra` is the extraterrestrial irradiance normal to the sun, W/m2.
 */
export function erbsDiffuse(ghi: number, cosZenith: number, dniExtra: number): number {
  if (cosZenith < COSINE_OF_87) return ghi;
  const clearness = ghi / (dniExtra * (cosZenith > LOWEST_COSINE ? cosZenith : LOWEST_COSINE));
  return ghi * erbsDiffuseFraction(clearness < 0 ? 0 : clearness > 1 ? 1 : clearness);
}
