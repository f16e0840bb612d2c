import { DEGREES, RADIANS, safeAcos } from '../angles/angles.ts';

/**
 * Relative optical air mass at an apparent zenith angle of 0 to 90 degrees; beyond 90 its value there is held (37.9).
 * Ref: Kasten and Young, Revised optical air mass tables and approximation formula, Applied Optics 28 (1989), eq. 3.
 */
export function relativeAirMass(apparentZenith: number): number {
  if (!(apparentZenith >= 0 && apparentZenith <= 180))
    throw new RangeError(`apparentZenith must be 0 to 180 degrees, got ${apparentZenith}`);
  return airMassAt(apparentZenith > 90 ? 0 : Math.cos(apparentZenith * RADIANS));
}

/** The same from the cosine of the apparent zenith angle, 0 to 1, for inner loops: no check. */
export const airMassAt = (cosZenith: number): number =>
  1 / (cosZenith + 0.50572 * (96.07995 - safeAcos(cosZenith) * DEGREES) ** -1.6364);
