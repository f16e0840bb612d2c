import { DEGREES, RADIANS, fullCircle, safeAsin } from '../angles/angles.ts';
import type { SightingAxis } from '../survey/survey.ts';

/** East, north, up in a frame whose north may be any fixed direction of the horizon; of length 1 where it points. */
export type Vector = readonly [east: number, north: number, up: number];

/** Angles of one orientation event, degrees. */
export interface DeviceAngles {
  /** Turn about the vertical, anticlockwise seen from above. */
  alpha: number;
  beta: number;
  gamma: number;
}

/** Where an axis points: degrees clockwise from the frame's north, and up from the horizontal. */
export interface FrameDirection {
  azimuth: number;
  elevation: number;
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
  const [sin, cos] = [Math.sin(index * RADIANS), Math.cos(index * RADIANS)];
  return [0, 1, 2].map((i) => cos * sight[i] + sin * lift[i]) as unknown as Vector;
}

/** Unit vector of a device's sighting axis from the angles of an event. Throws RangeError as `attitude` does. */
export const sightVector = (angles: DeviceAngles, axis: SightingAxis = 'camera', index = 0): Vector =>
  axisVector(attitude(angles), axis, index);

/** Direction of a vector of any length over 0; azimuth 0 where it is vertical. */
export function directionOf([east, north, up]: Vector): FrameDirection {
  return {
    azimuth: fullCircle(Math.atan2(east, north) * DEGREES),
    elevation: safeAsin(up / Math.hypot(east, north, up)) * DEGREES,
  };
}

/** Unit vector of a direction [degrees]. */
export function vectorOf({ azimuth, elevation }: FrameDirection): Vector {
  const level = Math.cos(elevation * RADIANS);
  return [
    level * Math.sin(azimuth * RADIANS),
    level * Math.cos(azimuth * RADIANS),
    Math.sin(elevation * RADIANS),
  ];
}

/** Angle between two unit vectors, degrees; exact for small ones. */
export function angleBetween(a: Vector, b: Vector): number {
  const cross = Math.hypot(a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]);
  return Math.atan2(cross, dot(a, b)) * DEGREES;
}

export const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

export const scaled = ([east, north, up]: Vector, by: number): Vector => [east * by, north * by, up * by];
