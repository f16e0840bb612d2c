import { DEGREES, RADIANS } from '../../../../core/angles/angles.ts';
import { planeFacing, planeHorizon } from '../../../../core/horizon/sky-view.ts';

/** The sun's declination goes this far from the equator, degrees. */
const TROPIC = 23.44;
/** Width of a column and step of elevation, degrees. */
export const COLUMN = 2;
const STEP = 0.5;

/** Lowest and highest elevation at which the sun ever stands in one column of azimuth, in front of a plane. */
export interface BandColumn {
  /** Azimuth of the column's left edge. */
  azimuth: number;
  low: number;
  high: number;
}

/**
 * Where the sun comes in a year over a site of that latitude and in front of a plane, by azimuth; columns it never
 * enters are left out. Degrees; refraction is left out, which moves the foot by half a degree.
 */
export function sunBand(latitude: number, surfaceTilt: number, surfaceAzimuth: number): BandColumn[] {
  const { east, north, upward } = planeFacing(surfaceTilt, surfaceAzimuth);
  const phi = latitude * RADIANS;
  return Array.from({ length: 360 / COLUMN }, (_, i) => {
    const azimuth = i * COLUMN;
    const angle = (azimuth + COLUMN / 2) * RADIANS;
    const toward = north * Math.cos(angle) + east * Math.sin(angle);
    const behind = Math.max(0, planeHorizon(toward, upward) * DEGREES);
    const up: number[] = [];
    for (let elevation = 0; elevation <= 90; elevation += STEP) {
      const h = elevation * RADIANS;
      const sine = Math.sin(phi) * Math.sin(h) + Math.cos(phi) * Math.cos(h) * Math.cos(angle);
      if (elevation >= behind && Math.abs(Math.asin(Math.min(1, Math.max(-1, sine))) * DEGREES) <= TROPIC)
        up.push(elevation);
    }
    return { azimuth, low: up[0] ?? 0, high: up.at(-1) ?? 0 };
  }).filter(({ low, high }) => high > low);
}
