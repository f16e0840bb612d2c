import { RADIANS } from '../angles/angles.ts';

/**
 * The sky as a tilted plane sees it, in slices of azimuth: at elevation h the cosine of the angle of incidence is
 * `toward`·cos h + `upward`·sin h, where toward = sin(tilt)·cos(azimuth - surfaceAzimuth) and upward = cos(tilt).
 */
export interface PlaneFacing {
  /** sin(tilt)·cos(surfaceAzimuth) and sin(tilt)·sin(surfaceAzimuth). */
  readonly north: number;
  readonly east: number;
  /** cos(tilt). */
  readonly upward: number;
}

/** Degrees; throws RangeError for a tilt outside 0 to 90. */
export function planeFacing(surfaceTilt: number, surfaceAzimuth: number): PlaneFacing {
  if (!(surfaceTilt >= 0 && surfaceTilt <= 90))
    throw new RangeError(`surfaceTilt must be 0 to 90, got ${surfaceTilt}`);
  const [tilt, azimuth] = [surfaceTilt * RADIANS, surfaceAzimuth * RADIANS];
  return {
    north: Math.sin(tilt) * Math.cos(azimuth),
    east: Math.sin(tilt) * Math.sin(azimuth),
    upward: Math.cos(tilt),
  };
}

/** Lowest elevation in front of the plane at an azimuth, radians: 0 before it, up to its own slope behind it. */
export const planeHorizon = (toward: number, upward: number): number =>
  toward >= 0 ? 0 : Math.atan2(-toward, upward);

/**
 * Antiderivative over elevation h [radians] of (toward·cos h + upward·sin h)·cos h: the light an even sky sends to the
 * plane from one radian of azimuth, from the horizontal to h, for a radiance of 1.
 * (toward·(h + sin h cos h) + upward·sin² h) / 2.
 */
export function viewBelow(toward: number, upward: number, elevationRad: number): number {
  const sine = Math.sin(elevationRad);
  return (toward * (elevationRad + sine * Math.cos(elevationRad)) + upward * sine * sine) / 2;
}

/** What `viewBelow` gives between two elevations [radians], only where the plane faces. */
export function viewBetween(toward: number, upward: number, lowRad: number, highRad: number): number {
  const horizon = planeHorizon(toward, upward);
  const low = lowRad > horizon ? lowRad : horizon;
  return highRad > low ? viewBelow(toward, upward, highRad) - viewBelow(toward, upward, low) : 0;
}

/** What `viewBetween` gives from the horizontal up to an elevation [radians] at an azimuth [degrees]. */
export function viewUpTo({ north, east, upward }: PlaneFacing, azimuth: number, topRad: number): number {
  const angle = azimuth * RADIANS;
  return viewBetween(north * Math.cos(angle) + east * Math.sin(angle), upward, 0, topRad);
}

/** Elevation up to which a brightened horizon reaches, radians: 6.5°, our reading of the model's thin band. */
export const BAND_TOP = 6.5 * RADIANS;
