/** Angles at the public edge are degrees; azimuths run clockwise from true north, elevations up from the horizontal. */

export type Brand<T, Name extends string> = T & { readonly __brand: Name };

/** Azimuth, degrees clockwise from true north, 0 to 360. */
export type TrueAzimuth = Brand<number, 'TrueAzimuth'>;
/** Azimuth, degrees clockwise from magnetic north, 0 to 360. */
export type MagneticAzimuth = Brand<number, 'MagneticAzimuth'>;
/** Elevation as seen, with refraction, degrees above the horizontal. */
export type ApparentElevation = Brand<number, 'ApparentElevation'>;
/** Elevation without refraction, degrees above the horizontal. */
export type GeometricElevation = Brand<number, 'GeometricElevation'>;

export const RADIANS = Math.PI / 180;
export const DEGREES = 180 / Math.PI;

/** Any angle brought into 0 (included) to 360 (excluded) degrees. */
export function fullCircle(angle: number): number {
  const turned = angle % 360;
  const positive = turned < 0 ? turned + 360 : turned;
  return positive === 360 ? 0 : positive; // -1e-16 + 360 rounds to 360
}

/** Turn from one azimuth to another by the shorter way, degrees in (-180, 180]; positive is clockwise. */
export function turnBetween(from: number, to: number): number {
  const turn = fullCircle(to - from);
  return turn > 180 ? turn - 360 : turn;
}

/** Arc sine of a value that rounding may have carried a little past ±1, in radians. */
export const safeAsin = (sine: number): number => Math.asin(sine > 1 ? 1 : sine < -1 ? -1 : sine);

/** Arc cosine of a value that rounding may have carried a little past ±1, in radians. */
export const safeAcos = (cosine: number): number => Math.acos(cosine > 1 ? 1 : cosine < -1 ? -1 : cosine);
