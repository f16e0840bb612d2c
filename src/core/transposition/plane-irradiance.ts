import { RADIANS } from '../angles/angles.ts';
import type { SkyMoment, SkyParts, Transposition } from './transposition.ts';

/** Irradiance on a tilted plane with nothing in the way, W/m2, by where it comes from. */
export interface PlaneIrradiance {
  beam: number;
  circumsolar: number;
  isotropic: number;
  horizonBand: number;
  ground: number;
}

export interface IncidentLight extends SkyMoment {
  ghi: number;
  /** Share of light the ground reflects, 0 to 1. */
  albedo: number;
  /** Cosine of the angle of incidence; 0 or less with the sun behind the plane. */
  cosIncidence: number;
}

/**
 * Light on a plane of `surfaceTilt` 0 to 90 degrees, each part separate. Where a negative band would take more than the
 * sky gives, all sky parts are 0. Throws RangeError for a tilt outside.
 * Ref: Duffie and Beckman, Solar Engineering of Thermal Processes, 4th ed. (2013), eq. 2.15.1, 2.16.1.
 */
export function planeIrradiance(
  transposition: Transposition,
  light: IncidentLight,
  surfaceTilt: number,
): PlaneIrradiance {
  if (!(surfaceTilt >= 0 && surfaceTilt <= 90))
    throw new RangeError(`surfaceTilt must be 0 to 90, got ${surfaceTilt}`);
  const parts: SkyParts = { circumsolarNormal: 0, dome: 0, band: 0 };
  transposition.split(light, parts);
  const incidence = Math.max(0, light.cosIncidence);
  const sky = {
    circumsolar: parts.circumsolarNormal * incidence,
    isotropic: parts.dome * domeView(surfaceTilt),
    horizonBand: parts.band * Math.sin(surfaceTilt * RADIANS),
  };
  const none = sky.circumsolar + sky.isotropic + sky.horizonBand < 0;
  return {
    beam: light.cosZenith > 0 ? light.dni * incidence : 0,
    ...(none ? { circumsolar: 0, isotropic: 0, horizonBand: 0 } : sky),
    ground: light.ghi * light.albedo * groundView(surfaceTilt),
  };
}

/** Share of the dome's horizontal irradiance that a plane sees with nothing in the way. Ref: Liu and Jordan (1963). */
export const domeView = (surfaceTilt: number): number => (1 + Math.cos(surfaceTilt * RADIANS)) / 2;

/** Share of the ground's light that a plane sees. Ref: Liu and Jordan (1963). */
export const groundView = (surfaceTilt: number): number => (1 - Math.cos(surfaceTilt * RADIANS)) / 2;
