import { DEGREES, RADIANS, fullCircle } from '../../src/core/angles/angles.ts';
import type { Vector } from '../../src/core/angles/vectors.ts';
import type { DeviceAngles } from '../../src/core/pointing/attitude.ts';
import { vectorOf } from '../../src/core/angles/vectors.ts';

type Axes = { x: Vector; y: Vector; z: Vector };

const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const minus = ([a, b, c]: Vector): Vector => [-a, -b, -c];

/** To the right of an azimuth, level. */
const rightOf = (azimuth: number): Vector => [Math.cos(azimuth * RADIANS), -Math.sin(azimuth * RADIANS), 0];

/** Angles of a device whose axes lie so: the inverse of the W3C matrix Z(alpha) X(beta) Y(gamma). */
export function anglesOf({ x, y, z }: Axes): DeviceAngles {
  const side = z[2] < 0 ? -1 : 1;
  const rise = Math.atan2(y[2], Math.hypot(y[0], y[1])) * DEGREES;
  const beta = side > 0 ? rise : rise >= 0 ? 180 - rise : -180 - rise;
  // upright, alpha and gamma turn about one axis: all of the turn is given to alpha
  if (Math.hypot(y[0], y[1]) < 1e-9)
    return { alpha: fullCircle(Math.atan2(x[1], x[0]) * DEGREES), beta: rise, gamma: 0 };
  return {
    alpha: fullCircle(Math.atan2(-y[0] * side, y[1] * side) * DEGREES),
    beta,
    gamma: Math.atan2(-x[2] * side, z[2] * side) * DEGREES,
  };
}

/** A phone held upright whose rear camera looks there; azimuth in the frame of its sensor. */
export function cameraAt(azimuth: number, elevation: number): DeviceAngles {
  const z = minus(vectorOf({ azimuth, elevation }));
  const x = rightOf(azimuth);
  return anglesOf({ x, y: cross(z, x), z });
}

/** The same held upside down. */
export function cameraTurnedOver(azimuth: number, elevation: number): DeviceAngles {
  const z = minus(vectorOf({ azimuth, elevation }));
  const x = minus(rightOf(azimuth));
  return anglesOf({ x, y: cross(z, x), z });
}

/** A phone whose top edge points there, screen up. */
export function topEdgeAt(azimuth: number, elevation: number): DeviceAngles {
  const y = vectorOf({ azimuth, elevation });
  const x = rightOf(azimuth);
  return anglesOf({ x, y, z: cross(x, y) });
}

/** A phone laid on a plane, screen up, its top edge up the slope (or down it). */
export function laidOn(surfaceTilt: number, surfaceAzimuth: number, turned = false): DeviceAngles {
  const up = topEdgeAt(fullCircle(surfaceAzimuth + 180), surfaceTilt);
  return turned ? topEdgeAt(surfaceAzimuth, -surfaceTilt) : up;
}
