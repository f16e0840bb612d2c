import { RADIANS } from '../angles/angles.ts';
import type { Vector } from '../angles/vectors.ts';
import { blended, scaled } from '../angles/vectors.ts';
import type { SightingAxis } from '../survey/survey.ts';

/** Angles of one orientation event, degrees. */
export interface DeviceAngles {
  /** Turn about the vertical, anticlockwise seen from above. */
  alpha: number;
  beta: number;
  gamma: number;
}

/** The device's own axes in east-north-up: x to the right of the screen, y to its top, z out of it. */
export interface Attitude {
  x: Vector;
  y: Vector;
  z: Vector;
}

/**
 * Attitude of a device from the angles of an orientation event, degrees, any turn; whole through the upright pose,
 * where the single angles are not. The screen's own rotation does not enter.
 * Throws RangeError for an angle that is not finite.
 * Ref: W3C Device Orientation and Motion, section A.1: intrinsic Z-X'-Y'', R = Z(alpha) X(beta) Y(gamma).
 */
export function attitude({ alpha, beta, gamma }: DeviceAngles): Attitude {
  for (const [name, value] of Object.entries({ alpha, beta, gamma }))
    if (!Number.isFinite(value)) throw new RangeError(`${name} must be finite, got ${value}`);
  const [sa, ca] = [Math.sin(alpha * RADIANS), Math.cos(alpha * RADIANS)];
  const [sb, cb] = [Math.sin(beta * RADIANS), Math.cos(beta * RADIANS)];
  const [sg, cg] = [Math.sin(gamma * RADIANS), Math.cos(gamma * RADIANS)];
  return {
    x: [ca * cg - sa * sb * sg, sa * cg + ca * sb * sg, -cb * sg],
    y: [-sa * cb, ca * cb, sb],
    z: [ca * sg + sa * sb * cg, sa * sg - ca * sb * cg, cb * cg],
  };
}

/**
 * Unit vector of the sighting axis: the rear camera (-z) or the top edge (+y). `index` [degrees] lifts the axis
 * towards the phone's top (camera) or towards its screen (top edge): the correction found by turning the phone about the axis.
 */
export function axisVector({ y, z }: Attitude, axis: SightingAxis, index = 0): Vector {
  const [sight, lift]: [Vector, Vector] = axis === 'camera' ? [scaled(z, -1), y] : [y, z];
  if (index === 0) return sight;
  return blended(sight, Math.cos(index * RADIANS), lift, Math.sin(index * RADIANS));
}

/** Unit vector of a device's sighting axis from the angles of an event. Throws RangeError as `attitude` does. */
export const sightVector = (angles: DeviceAngles, axis: SightingAxis = 'camera', index = 0): Vector =>
  axisVector(attitude(angles), axis, index);
