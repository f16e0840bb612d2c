import { DEGREES, fullCircle, RADIANS, safeAsin } from './angles.ts';

/** East, north, up in a frame whose north may be any fixed direction of the horizon; of length 1 where it points. */
export type Vector = readonly [east: number, north: number, up: number];

/** Where a vector points: degrees clockwise from the frame's north, and up from the horizontal. */
export interface FrameDirection {
  azimuth: number;
  elevation: number;
}

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
export const angleBetween = (a: Vector, b: Vector): number =>
  Math.atan2(Math.hypot(...cross(a, b)), dot(a, b)) * DEGREES;

export const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

export const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

export const scaled = ([east, north, up]: Vector, by: number): Vector => [east * by, north * by, up * by];

/** `a` times `by` and `b` times `and`, added. */
export const blended = (a: Vector, by: number, b: Vector, and: number): Vector => [
  a[0] * by + b[0] * and,
  a[1] * by + b[1] * and,
  a[2] * by + b[2] * and,
];

export const length = (a: Vector): number => Math.sqrt(dot(a, a));

/** The same direction with length 1; of a vector of any length over 0. */
export function unit(a: Vector): Vector {
  const size = length(a);
  return [a[0] / size, a[1] / size, a[2] / size];
}
