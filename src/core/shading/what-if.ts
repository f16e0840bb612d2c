import { DEGREES, RADIANS } from '../angles/angles.ts';
import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import type { Months } from '../survey/survey.ts';

/** A change imagined to one obstruction; heights in metres, `distance` horizontal from the station. */
export type ObstructionChange = { obstruction: string } & (
  | { kind: 'gone' }
  /** Nothing of it stays above this height over the instrument. */
  | { kind: 'cut-to-height'; height: number; distance: number }
  /** Its upper edge rises by this much, as a tree does in some years. */
  | { kind: 'grown'; by: number; distance: number }
  /** Other light passes, as through a bare crown. */
  | { kind: 'transmittance'; transmittance: Months }
);

/**
 * The horizon as it would be after some changes. Each edge is taken to stand at the one distance given, so that height
 * over the instrument is distance · tan(elevation). Throws RangeError for an obstruction the profile does not have, a
 * distance not above 0 or a growth below 0.
 */
export function changedProfile(
  profile: HorizonProfile,
  changes: readonly ObstructionChange[],
): HorizonProfile {
  return changes.reduce(changedOnce, profile);
}

function changedOnce(profile: HorizonProfile, change: ObstructionChange): HorizonProfile {
  const index = profile.obstructionIds.indexOf(change.obstruction);
  if (index < 0) throw new RangeError(`obstruction ${change.obstruction} is not in this profile`);
  if (change.kind === 'transmittance') {
    const transmittance = profile.transmittance.slice();
    transmittance.set(change.transmittance, index * 12);
    return { ...profile, transmittance };
  }
  const top = newTop(change);
  const low = profile.low.slice();
  const high = profile.high.slice();
  profile.intervalObstruction.forEach((obstruction, k) => {
    if (obstruction !== index) return;
    high[k] = top(high[k]);
    low[k] = Math.min(low[k], high[k]); // an interval of no height blocks nothing
  });
  return { ...profile, low, high };
}

/** Upper end of an interval after a change, from the one before, degrees. */
function newTop(change: Exclude<ObstructionChange, { kind: 'transmittance' }>): (high: number) => number {
  if (change.kind === 'gone') return () => 0;
  if (!(change.distance > 0)) throw new RangeError(`distance must be above 0 m, got ${change.distance}`);
  if (change.kind === 'cut-to-height') {
    const limit = Math.max(0, Math.atan(change.height / change.distance) * DEGREES);
    return (high) => Math.min(high, limit);
  }
  if (!(change.by >= 0)) throw new RangeError(`growth must be 0 m or more, got ${change.by}`);
  return (high) =>
    high >= 90 ? 90 : Math.atan(Math.tan(high * RADIANS) + change.by / change.distance) * DEGREES;
}
