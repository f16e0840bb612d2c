import { RADIANS, turnBetween } from '../angles/angles.ts';
import { solarPosition } from '../solar-position/solar-position.ts';
import { PLANNING } from './planning-values.ts';

/** A check by shadow is refused where its standard deviation would be over this, degrees. */
export const SHADOW_LIMIT = 2;
/** Below this the sun throws no usable shadow: it is faint in haze and soft at the edge, degrees. Common practice, no source. */
export const LOWEST_SHADOW_SUN = 3;

export interface ShadowSun {
  /** True azimuth of the sun and its apparent elevation, degrees. */
  solarAzimuth: number;
  apparentElevation: number;
  /** Standard deviation of a direction taken from its shadow, degrees: shadow and clock together. */
  standardDeviation: number;
}

type Place = { latitude: number; longitude: number; altitude?: number };

/**
 * The sun of an instant as a mark for headings. The deviation has three parts: laying the axis along the shadow; the
 * lean of the edge that throws it, by the tangent of the elevation; the clock, by how fast the azimuth moves.
 * `clockMinutes` is the clock's standard deviation. Throws RangeError for a place out of range.
 */
export function shadowSun(
  timeMs: number,
  { latitude, longitude, altitude }: Place,
  clockMinutes: number = PLANNING.clockMinutes,
): ShadowSun {
  const at = (ms: number) => solarPosition(ms, latitude, longitude, altitude);
  const { solarAzimuth, apparentElevation } = at(timeMs);
  const perMinute = turnBetween(at(timeMs - 30_000).solarAzimuth, at(timeMs + 30_000).solarAzimuth);
  const lean = PLANNING.shadowLean * Math.abs(Math.tan(apparentElevation * RADIANS));
  return {
    solarAzimuth,
    apparentElevation,
    standardDeviation: Math.hypot(PLANNING.shadowAlignment, lean, clockMinutes * perMinute),
  };
}

/** Whether a sun is usable for a check by shadow. */
export const isUsable = ({ apparentElevation, standardDeviation }: ShadowSun): boolean =>
  apparentElevation >= LOWEST_SHADOW_SUN && standardDeviation <= SHADOW_LIMIT;
