import { turnBetween } from '../../core/angles/angles.ts';
import type { HorizonProfile } from '../../core/horizon/horizon-profile.ts';

/** A piece of an obstruction's outline: upper and lower edge from left to right, clockwise without a break. */
export interface SilhouettePart {
  /** Azimuths, degrees; they may run past 360. */
  azimuth: number[];
  low: number[];
  high: number[];
}

/** Neighbouring slices whose edges differ by more are joined by an upright wall, degrees. */
const WALL = 2;

/**
 * The shape of one obstruction of a profile, from the very intervals that are computed with: an edge goes through the
 * middle of each slice at the interval's end.
 */
export function silhouette(profile: HorizonProfile, obstruction: number): SilhouettePart[] {
  const done: SilhouettePart[] = [];
  let open: { part: SilhouettePart; to: number; low: number; high: number }[] = [];
  for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
    const [from, to] = [profile.sliceFrom[slice], profile.sliceTo[slice]];
    const next: typeof open = [];
    for (const { low, high } of intervalsOf(profile, slice, obstruction)) {
      const before = open.find((run) => Math.abs(run.to - from) < 1e-6 && run.low < high && run.high > low);
      const part = before?.part ?? { azimuth: [], low: [], high: [] };
      if (before) {
        open = open.filter((run) => run !== before);
        if (Math.abs(before.high - high) > WALL || Math.abs(before.low - low) > WALL) {
          add(part, from, before.low, before.high);
          add(part, from, low, high);
        }
      } else {
        done.push(part);
        add(part, from, low, high);
      }
      add(part, (from + to) / 2, low, high);
      next.push({ part, to, low, high });
    }
    open.forEach(close);
    open = next;
  }
  open.forEach(close);
  return joinedOverNorth(done);
}

function intervalsOf(profile: HorizonProfile, slice: number, obstruction: number) {
  const found: { low: number; high: number }[] = [];
  for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
    if (profile.intervalObstruction[k] === obstruction && profile.high[k] > profile.low[k])
      found.push({ low: profile.low[k], high: profile.high[k] });
  return found.sort((a, b) => a.low - b.low);
}

function add(part: SilhouettePart, azimuth: number, low: number, high: number): void {
  part.azimuth.push(azimuth);
  part.low.push(low);
  part.high.push(high);
}

const close = ({ part, to, low, high }: { part: SilhouettePart; to: number; low: number; high: number }) =>
  add(part, to, low, high);

/** A part that ends at 360 goes on in the one that begins at 0. */
function joinedOverNorth(parts: SilhouettePart[]): SilhouettePart[] {
  const ending = parts.find(({ azimuth }) => azimuth[azimuth.length - 1] > 360 - 1e-6 && azimuth[0] > 1e-6);
  const starting = parts.find(({ azimuth }) => azimuth[0] < 1e-6);
  if (!ending || !starting || ending === starting) return parts;
  const joined = {
    azimuth: [...ending.azimuth, ...starting.azimuth.map((azimuth) => azimuth + 360)],
    low: [...ending.low, ...starting.low],
    high: [...ending.high, ...starting.high],
  };
  return [...parts.filter((part) => part !== ending && part !== starting), joined];
}

/** Turn of each point of a part from a centre, without a jump inside the part. */
export function turnsFrom(centre: number, { azimuth }: SilhouettePart): number[] {
  const first = turnBetween(centre, azimuth[0]);
  return azimuth.map((value) => first + (value - azimuth[0]));
}

/** Which obstruction of a profile is in the way of a direction: their places in its list. */
export function obstructionsAt(profile: HorizonProfile, azimuth: number, elevation: number): number[] {
  const found = new Set<number>();
  for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
    if (azimuth < profile.sliceFrom[slice] || azimuth >= profile.sliceTo[slice]) continue;
    for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
      if (elevation >= profile.low[k] && elevation < profile.high[k])
        found.add(profile.intervalObstruction[k]);
  }
  return [...found];
}
