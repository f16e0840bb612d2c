import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import type { AzimuthRange } from '../angles/azimuth-ranges.ts';
import { observedShares } from '../shading/coverage.ts';
import type { AnnualLight } from './annual-light.ts';
import { DRAW_COLUMNS, NODE, NODES } from './annual-light.ts';
import type { Taken } from './blocked-annual.ts';
import { UNSEEN } from './planning-values.ts';
import type { RandomSource } from './random-source.ts';

/** A patch of sky that nobody looked at, with what an opaque skyline of each height would take there, kWh/m2. */
export interface UnseenPatch {
  readonly direct: Float64Array;
  readonly even: Float64Array;
  readonly beside: Beside;
}

/** What was traced right beside a patch. */
export interface Beside {
  /** Degrees; 0 for nothing. */
  height: number;
  /** One obstruction on both sides: it hardly ends and begins again. */
  goesOn: boolean;
}

const NOTHING: Beside = { height: 0, goesOn: false };

const PER_COLUMN = COLUMNS / DRAW_COLUMNS;
/** Patches that bring less than this share of the plane's light are left out. */
const LEAST_SHARE = 1e-5;

/** The patches that matter to a plane: in front of it and not observed. */
export function unseenPatches(
  light: AnnualLight,
  observed: readonly AzimuthRange[],
  profile: HorizonProfile,
): UnseenPatch[] {
  const unseen = observedShares(observed).map((share) => 1 - Math.min(1, share));
  const patches: UnseenPatch[] = [];
  for (const [from, to] of openRuns(unseen)) {
    const pieces = Math.ceil(((to - from) * COLUMN_WIDTH) / UNSEEN.patch);
    const beside = besideOf(profile, from - 1, to, pieces === 1);
    for (let k = 0; k < pieces; k++) {
      const part = (share: number) => from + Math.round(((to - from) * share) / pieces);
      patches.push(
        patchOf(light, unseen, part(k), part(k + 1), k === 0 || k === pieces - 1 ? beside : NOTHING),
      );
    }
  }
  const least = LEAST_SHARE * (light.direct + light.even);
  return patches.filter(({ direct, even }) => direct[NODES - 1] + even[NODES - 1] > least);
}

/** Runs of columns that are not wholly seen, over north in one piece: [first, after the last]. */
function openRuns(unseen: Float64Array): [number, number][] {
  const open = (column: number) => unseen[(column + COLUMNS) % COLUMNS] > 1e-9;
  const start = unseen.findIndex((_, column) => open(column) && !open(column - 1));
  if (start < 0) return open(0) ? [[0, COLUMNS]] : [];
  const runs: [number, number][] = [];
  for (let column = start; column < start + COLUMNS; column++) {
    if (!open(column)) continue;
    const last = runs[runs.length - 1];
    if (last && last[1] === column) last[1]++;
    else runs.push([column, column + 1]);
  }
  return runs;
}

function besideOf(profile: HorizonProfile, left: number, right: number, narrow: boolean): Beside {
  const [a, b] = [standingAt(profile, left), standingAt(profile, right)];
  const goesOn = narrow && [...a.obstructions].some((one) => b.obstructions.has(one));
  return { height: goesOn ? (a.height + b.height) / 2 : Math.max(a.height, b.height), goesOn };
}

/** What stands in a column, and how high it reaches. */
function standingAt(
  { columnFirst, intervalFirst, intervalObstruction, high }: HorizonProfile,
  column: number,
) {
  const c = (column + COLUMNS) % COLUMNS;
  const obstructions = new Set<number>();
  let height = 0;
  for (let k = intervalFirst[columnFirst[c]]; k < intervalFirst[columnFirst[c + 1]]; k++) {
    obstructions.add(intervalObstruction[k]);
    height = Math.max(height, high[k]);
  }
  return { obstructions, height };
}

function patchOf(
  { below, classes }: AnnualLight,
  unseen: Float64Array,
  from: number,
  to: number,
  beside: Beside,
): UnseenPatch {
  const direct = new Float64Array(NODES);
  const even = new Float64Array(NODES);
  for (let column = from; column < to; column++) {
    const weight = unseen[column % COLUMNS] / PER_COLUMN;
    let at = Math.floor((column % COLUMNS) / PER_COLUMN) * NODES * (classes + 1);
    for (let node = 0; node < NODES; node++) {
      for (let k = 0; k < classes; k++) direct[node] += weight * below[at++];
      even[node] += weight * below[at++];
    }
  }
  return { direct, even, beside };
}

/** Draws what may stand in the patches, and adds what it takes. */
export function takeUnseen(patches: readonly UnseenPatch[], random: RandomSource, taken: Taken): void {
  for (const { direct, even, beside } of patches) {
    const [choice, size] = [random.uniform(), random.uniform()];
    const { open, alike } = beside.goesOn ? UNSEEN.between : UNSEEN;
    if (choice < open) continue;
    const height =
      beside.height > 0 && choice < open + alike
        ? beside.height * (UNSEEN.alikeFrom + size * (UNSEEN.alikeTo - UNSEEN.alikeFrom))
        : -UNSEEN.height * Math.log(1 - size);
    const node = Math.min(NODES - 1, Math.round(Math.min(UNSEEN.highest, height) / NODE));
    taken.direct += direct[node];
    taken.even += even[node];
  }
}
