import { turnBetween } from '../../core/angles/angles.ts';
import type { HorizonProfile } from '../../core/horizon/horizon-profile.ts';
import { COLUMNS, COLUMN_WIDTH } from '../../core/horizon/horizon-profile.ts';

/** A piece of an obstruction's shape without a break: its lower and upper edge from left to right. */
export interface SilhouettePart {
  /** Azimuths, degrees; they may run past 360. */
  azimuth: number[];
  low: number[];
  high: number[];
  /** Upright ends that nothing of the same obstruction touches. */
  walls: Wall[];
}

export interface Wall {
  azimuth: number;
  low: number;
  high: number;
}

interface Interval {
  low: number;
  high: number;
}

interface Run extends Interval {
  part: SilhouettePart;
  to: number;
}

/** Neighbouring slices whose edges differ by more meet at an upright wall, degrees. */
const STEP = 2;
/** Nearer to north than this is at north, degrees. */
const NORTH = 1e-6;

/**
 * The shape of one obstruction of a profile, from the very intervals that are computed with: an edge goes through the
 * middle of each slice at the interval's end.
 */
export function silhouette(profile: HorizonProfile, obstruction: number): SilhouettePart[] {
  const done: SilhouettePart[] = [];
  let open: Run[] = [];
  const overNorth = intervalsByNorth(profile, obstruction);
  for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
    const [from, to] = [profile.sliceFrom[slice], profile.sliceTo[slice]];
    const here = intervalsOf(profile, slice, obstruction);
    const before = open.filter((run) => Math.abs(run.to - from) < 1e-6);
    const next = here.map((interval): Run => {
      const run = before.find((other) => open.includes(other) && goesOn(other, interval));
      open = open.filter((other) => other !== run);
      const part = run?.part ?? { azimuth: [], low: [], high: [], walls: [] };
      if (!run) {
        done.push(part);
        begin(part, from, interval, from < NORTH ? overNorth.before : before);
      }
      add(part, (from + to) / 2, interval);
      return { part, to, ...interval };
    });
    open.forEach((run) => end(run, before.includes(run) ? here : []));
    open = next;
  }
  open.forEach((run) => end(run, run.to > 360 - NORTH ? overNorth.after : []));
  return joinedOverNorth(done);
}

/** What stands on either side of north, where the list of slices ends and begins. */
function intervalsByNorth(
  profile: HorizonProfile,
  obstruction: number,
): { before: Interval[]; after: Interval[] } {
  const last = profile.sliceColumn.length - 1;
  if (last < 0) return { before: [], after: [] };
  return {
    before: profile.sliceTo[last] > 360 - NORTH ? intervalsOf(profile, last, obstruction) : [],
    after: profile.sliceFrom[0] < NORTH ? intervalsOf(profile, 0, obstruction) : [],
  };
}

const goesOn = (run: Interval, { low, high }: Interval): boolean =>
  Math.abs(run.high - high) <= STEP && Math.abs(run.low - low) <= STEP && run.low < high && run.high > low;

function intervalsOf(profile: HorizonProfile, slice: number, obstruction: number): Interval[] {
  const found: Interval[] = [];
  for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
    if (profile.intervalObstruction[k] === obstruction && profile.high[k] > profile.low[k])
      found.push({ low: profile.low[k], high: profile.high[k] });
  return found.sort((a, b) => a.low - b.low);
}

function add(part: SilhouettePart, azimuth: number, { low, high }: Interval): void {
  part.azimuth.push(azimuth);
  part.low.push(low);
  part.high.push(high);
}

function begin(
  part: SilhouettePart,
  azimuth: number,
  interval: Interval,
  touching: readonly Interval[],
): void {
  add(part, azimuth, interval);
  part.walls.push(...without(interval, touching).map((wall) => ({ azimuth, ...wall })));
}

function end({ part, to, low, high }: Run, touching: readonly Interval[]): void {
  add(part, to, { low, high });
  part.walls.push(...without({ low, high }, touching).map((wall) => ({ azimuth: to, ...wall })));
}

/** What of an interval those beside it leave free; nothing where it goes on in one of them. */
function without(whole: Interval, others: readonly Interval[]): Interval[] {
  if (others.some((other) => goesOn(other, whole))) return [];
  let free = [whole];
  for (const other of others)
    free = free.flatMap(({ low, high }) =>
      [
        { low, high: Math.min(high, other.low) },
        { low: Math.max(low, other.high), high },
      ].filter((piece) => piece.high > piece.low),
    );
  return free;
}

/** A part that ends at 360 goes on in the one that begins at 0. */
function joinedOverNorth(parts: SilhouettePart[]): SilhouettePart[] {
  const ending = parts.find(({ azimuth }) => azimuth[azimuth.length - 1] > 360 - NORTH && azimuth[0] > NORTH);
  const starting = parts.find(({ azimuth }) => azimuth[0] < NORTH);
  if (!ending || !starting || ending === starting) return parts;
  const joined = {
    azimuth: [...ending.azimuth, ...starting.azimuth.map((azimuth) => azimuth + 360)],
    low: [...ending.low, ...starting.low],
    high: [...ending.high, ...starting.high],
    walls: [...ending.walls, ...starting.walls.map((wall) => ({ ...wall, azimuth: wall.azimuth + 360 }))],
  };
  return [...parts.filter((part) => part !== ending && part !== starting), joined];
}

/** Turn of each point of a part from a centre, without a jump inside the part. */
export function turnsFrom(centre: number, { azimuth }: SilhouettePart): number[] {
  const first = turnBetween(centre, azimuth[0]);
  return azimuth.map((value) => first + (value - azimuth[0]));
}

/** Which obstructions of a profile are in the way of a direction, azimuth 0 to 360: their places in its list. */
export function obstructionsAt(profile: HorizonProfile, azimuth: number, elevation: number): number[] {
  const found = new Set<number>();
  const column = Math.min(COLUMNS - 1, Math.floor(azimuth / COLUMN_WIDTH));
  for (let slice = profile.columnFirst[column]; slice < profile.columnFirst[column + 1]; slice++) {
    if (azimuth < profile.sliceFrom[slice] || azimuth >= profile.sliceTo[slice]) continue;
    for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
      if (elevation >= profile.low[k] && elevation < profile.high[k])
        found.add(profile.intervalObstruction[k]);
  }
  return [...found];
}
