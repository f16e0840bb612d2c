import { DEGREES, RADIANS, fullCircle } from '../../src/core/angles/angles.ts';
import type { SightingAxis } from '../../src/core/survey/survey.ts';

type Vector = readonly [number, number, number];

/** Angles of an orientation event in steps of 0.1°, as the platforms round them. */
export interface EventAngles {
  alpha: number;
  beta: number;
  gamma: number;
}

/**
 * The event angles of a phone whose rear camera, or top edge, points in a direction [degrees in the frame of the run], turned
 * about that axis by `roll` from upright (camera) or from screen up (top edge). Solved backwards from the rotation of W3C
 * Device Orientation, section A.1: R = Z(alpha) X(beta) Y(gamma).
 */
export function devicePose(
  axis: SightingAxis,
  direction: { azimuth: number; elevation: number },
  roll: number,
  step = 0.1,
): EventAngles {
  const sight = vector(direction);
  const side = unit(cross(sight, [0, 0, 1]));
  const above = cross(side, sight);
  const [s, c] = [Math.sin(roll * RADIANS), Math.cos(roll * RADIANS)];
  const lift = combine(above, c, side, s);
  const [y, z] = axis === 'camera' ? [lift, combine(sight, -1, sight, 0)] : [sight, lift];
  const x = cross(y, z);
  const level = z[2] >= 0 ? 1 : -1;
  const beta = Math.asin(Math.max(-1, Math.min(1, y[2]))) * DEGREES;
  return {
    alpha: rounded(fullCircle(Math.atan2(-y[0] * level, y[1] * level) * DEGREES), step) % 360,
    beta: rounded(level > 0 ? beta : beta > 0 ? 180 - beta : -180 - beta, step),
    gamma: rounded(Math.atan2(-x[2] * level, z[2] * level) * DEGREES, step),
  };
}

const rounded = (value: number, step: number) =>
  step > 0 ? Number((Math.round(value / step) * step).toFixed(4)) : value;

const vector = ({ azimuth, elevation }: { azimuth: number; elevation: number }): Vector => [
  Math.sin(azimuth * RADIANS) * Math.cos(elevation * RADIANS),
  Math.cos(azimuth * RADIANS) * Math.cos(elevation * RADIANS),
  Math.sin(elevation * RADIANS),
];

const combine = (a: Vector, p: number, b: Vector, q: number): Vector => [
  a[0] * p + b[0] * q,
  a[1] * p + b[1] * q,
  a[2] * p + b[2] * q,
];

const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

function unit(a: Vector): Vector {
  const size = Math.hypot(...a);
  return [a[0] / size, a[1] / size, a[2] / size];
}
