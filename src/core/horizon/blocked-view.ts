import { RADIANS } from '../angles/angles.ts';
import type { BlockedSpans } from './blocked-spans.ts';
import { blockedSpans } from './blocked-spans.ts';
import type { HorizonProfile } from './horizon-profile.ts';
import type { PlaneFacing } from './sky-view.ts';
import { planeFacing, planeHorizon, viewBelow } from './sky-view.ts';

/**
 * What the spans take of an even sky that a plane sees up to an elevation [radians], in each month: the integral of the
 * lost share times the cosine of the angle of incidence over the solid angle.
 */
export function blockedView(
  spans: BlockedSpans,
  { north, east, upward }: PlaneFacing,
  topRad = Math.PI / 2,
): Float64Array {
  const { profile, first, low, high, row, lost } = spans;
  const views = new Float64Array(12);
  for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
    const toward = north * profile.sliceCos[slice] + east * profile.sliceSin[slice];
    const horizon = planeHorizon(toward, upward);
    const width = (profile.sliceTo[slice] - profile.sliceFrom[slice]) * RADIANS;
    for (let k = first[slice]; k < first[slice + 1]; k++) {
      const lowRad = Math.max(horizon, low[k] * RADIANS);
      const highRad = Math.min(topRad, high[k] * RADIANS);
      if (highRad <= lowRad) continue; // behind the plane, or above what is asked for
      const lowView = lowRad === 0 ? 0 : viewBelow(toward, upward, lowRad);
      const view = (viewBelow(toward, upward, highRad) - lowView) * width;
      for (let month = 0, at = row[k] * 12; month < 12; month++, at++) views[month] += lost[at] * view;
    }
  }
  return views;
}

/**
 * Sky-view factor of a plane behind a horizon profile, for each month: 1 for a flat plane under an open sky, and
 * (1 + cos tilt) / 2 for a tilted one. Tilt 0 to 90, degrees; throws RangeError outside.
 */
export function skyViewFactor(
  profile: HorizonProfile,
  surfaceTilt: number,
  surfaceAzimuth: number,
): number[] {
  const facing = planeFacing(surfaceTilt, surfaceAzimuth);
  const blocked = blockedView(blockedSpans(profile), facing);
  return Array.from(blocked, (view) => Math.max(0, (1 + facing.upward) / 2 - view / Math.PI));
}
