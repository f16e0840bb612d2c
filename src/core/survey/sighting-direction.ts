import type { ApparentElevation, TrueAzimuth } from '../angles/angles.ts';
import type { Sighting } from './survey.ts';

export interface SightingDirection {
  azimuth: TrueAzimuth;
  elevation: ApparentElevation;
}

/**
 * Where a sighting points, degrees: its last amendment, else its typed values; null for one that has only a raw
 * reading, which is pointed elsewhere.
 */
export function sightingDirection(sighting: Sighting): SightingDirection | null {
  const { azimuth, elevation } = sighting.amendments?.at(-1) ?? sighting;
  if (azimuth === undefined || elevation === undefined) return null;
  return { azimuth: azimuth as TrueAzimuth, elevation: elevation as ApparentElevation };
}
