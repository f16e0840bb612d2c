import type { SunTrack } from '../solar-position/sun-track.ts';
import { cosZenithOf, dayOf } from '../solar-position/sun-track.ts';
import { airMassAt } from './air-mass.ts';

/** Intervals that the cosine of the zenith angle is divided into, 0 to 1. */
export const INTERVALS = 96;
export const NODES = INTERVALS + 1;

/** Relative air mass at each node. */
export const airMassOfNodes = Float64Array.from({ length: NODES }, (_, node) => airMassAt(node / INTERVALS));

/**
 * Extraterrestrial light on the horizontal, summed over the steps of each month [W/m2 times steps], by the cosine of the
 * zenith angle: entry `month * NODES + node`. A step between two nodes is shared by them, so that for any f that is
 * linear between nodes the sum of f over all steps is exactly the sum of entry times f(node).
 * `normal` is the extraterrestrial irradiance normal to the sun on each day.
 */
export function lightByHeight(track: SunTrack, normal: Float64Array): Float64Array {
  const sums = new Float64Array(12 * NODES);
  for (let step = 0; step < track.steps; step++) {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) continue;
    const day = dayOf(track, step);
    const light = normal[day] * cosZenith;
    const node = nodeBelow(cosZenith);
    const share = cosZenith * INTERVALS - node;
    const at = track.monthOfDay[day] * NODES + node;
    sums[at] += light * (1 - share);
    sums[at + 1] += light * share;
  }
  return sums;
}

/** The node at or below a cosine of 0 to 1, so that there is one above. */
export const nodeBelow = (cosZenith: number): number =>
  cosZenith < 1 ? (cosZenith * INTERVALS) | 0 : INTERVALS - 1;
