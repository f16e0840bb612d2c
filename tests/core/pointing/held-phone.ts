import { DEGREES, RADIANS, fullCircle } from '../../../src/core/angles/angles.ts';
import type { Vector } from '../../../src/core/angles/vectors.ts';
import type { DeviceAngles } from '../../../src/core/pointing/attitude.ts';
import { vectorOf } from '../../../src/core/angles/vectors.ts';

const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const sum = (a: Vector, by: number, b: Vector, times: number): Vector =>
  [0, 1, 2].map((i) => a[i] * by + b[i] * times) as unknown as Vector;

/** Level direction to the right of an azimuth, and the direction square to both, above. */
function frameAround(azimuth: number, elevation: number) {
  const ahead = vectorOf({ azimuth, elevation });
  const right = vectorOf({ azimuth: azimuth + 90, elevation: 0 });
  return { ahead, right, above: cross(right, ahead) };
}

/**
 * Angles, in the ranges of the specification, of a phone whose rear camera points in a direction; `roll` turns it
 * clockwise about the viewing axis as its holder sees it, 0 being portrait.
 */
export function cameraAt(azimuth: number, elevation: number, roll = 0): DeviceAngles {
  const { ahead, right, above } = frameAround(azimuth, elevation);
  const [sin, cos] = [Math.sin(roll * RADIANS), Math.cos(roll * RADIANS)];
  return anglesOf(sum(right, cos, above, -sin), sum(above, cos, right, sin), sum(ahead, -1, ahead, 0));
}

/** Angles of a phone whose top edge points in a direction, its screen up at `roll` 0. */
export function topEdgeAt(azimuth: number, elevation: number, roll = 0): DeviceAngles {
  const { ahead, right, above } = frameAround(azimuth, elevation);
  const [sin, cos] = [Math.sin(roll * RADIANS), Math.cos(roll * RADIANS)];
  return anglesOf(sum(right, cos, above, -sin), ahead, sum(above, cos, right, sin));
}

/** Z-X'-Y'' angles of the device's axes, brought into alpha 0 to 360, beta -180 to 180, gamma -90 to 90. */
function anglesOf(x: Vector, y: Vector, z: Vector): DeviceAngles {
  const flat = Math.hypot(y[0], y[1]);
  const beta = Math.atan2(y[2], flat) * DEGREES;
  if (flat < 1e-9) return { alpha: fullCircle(Math.atan2(x[1], x[0]) * DEGREES), beta, gamma: 0 };
  const alpha = Math.atan2(-y[0], y[1]) * DEGREES;
  const gamma = Math.atan2(-x[2], z[2]) * DEGREES;
  if (gamma >= -90 && gamma < 90) return { alpha: fullCircle(alpha), beta, gamma };
  const turned = 180 - beta;
  return {
    alpha: fullCircle(alpha + 180),
    beta: turned >= 180 ? turned - 360 : turned,
    gamma: gamma > 0 ? gamma - 180 : gamma + 180,
  };
}

/** Angles rounded to 0.1°, as browsers give them. */
export const rounded = ({ alpha, beta, gamma }: DeviceAngles): DeviceAngles => ({
  alpha: Math.round(alpha * 10) / 10,
  beta: Math.round(beta * 10) / 10,
  gamma: Math.round(gamma * 10) / 10,
});
