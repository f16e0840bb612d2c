import { DEGREES, RADIANS } from '../angles/angles.ts';
import { planeFacing } from '../horizon/sky-view.ts';
import { domeView, groundView } from '../transposition/plane-irradiance.ts';
import type { SkyYear } from './sky-year.ts';

/** Directions are gathered in cells of this size, degrees. */
const CELL = 2;
const AZIMUTHS = 360 / CELL;
const ELEVATIONS = 90 / CELL;

/** How the plane lies that gets most light at a site with nothing in the way. */
export interface BestPlane {
  surfaceTilt: number;
  surfaceAzimuth: number;
  /** What it gets, kWh/m2 a year. */
  annual: number;
}

/** Gives the annual irradiation on any plane with nothing in the way, kWh/m2, and the best-lying plane. */
export interface Orientation {
  readonly annual: (surfaceTilt: number, surfaceAzimuth: number) => number;
  readonly best: BestPlane;
}

/** Gathers a year of direct light by direction, for any number of planes. */
export function orientation(year: SkyYear): Orientation {
  const sums = directionSums(year);
  const total = (table: Float64Array) => table.reduce((sum, value) => sum + value, 0);
  const [dome, ghi] = [total(year.dome), total(year.ghi)];
  const band = total(year.brightBand) + total(year.darkBand);
  const annual = (surfaceTilt: number, surfaceAzimuth: number): number => {
    const { east, north, upward } = planeFacing(surfaceTilt, surfaceAzimuth);
    let direct = 0;
    for (let i = 0; i < sums.length; i += 3) {
      const light = east * sums[i] + north * sums[i + 1] + upward * sums[i + 2];
      if (light > 0) direct += light;
    }
    return (
      direct +
      dome * domeView(surfaceTilt) +
      band * Math.sin(surfaceTilt * RADIANS) +
      ghi * year.albedo * groundView(surfaceTilt)
    );
  };
  return { annual, best: search(annual) };
}

/** Light times direction of each cell of the sky that has any: east, north, up, east, … */
function directionSums(year: SkyYear): Float64Array {
  const { track, step } = year.paths;
  const cells = new Float64Array(AZIMUTHS * ELEVATIONS * 3);
  for (const i of step) {
    const light = year.direct[i] / 2;
    if (light <= 0) continue;
    const azimuth = Math.min(AZIMUTHS - 1, (track.azimuth[i] / CELL) | 0);
    const elevation = Math.max(0, Math.min(ELEVATIONS - 1, (track.elevation[i] / CELL) | 0));
    const cell = (elevation * AZIMUTHS + azimuth) * 3;
    cells[cell] += light * (track.east[i] + track.east[i + 1]);
    cells[cell + 1] += light * (track.north[i] + track.north[i + 1]);
    cells[cell + 2] += light * (track.up[i] + track.up[i + 1]);
  }
  const filled: number[] = [];
  for (let cell = 0; cell < cells.length; cell += 3)
    if (cells[cell] !== 0 || cells[cell + 1] !== 0 || cells[cell + 2] !== 0)
      filled.push(cells[cell], cells[cell + 1], cells[cell + 2]);
  return Float64Array.from(filled);
}

/**
 * Best plane by search over the normal's east and north parts (smooth at the flat plane, where azimuth means nothing): a
 * net, since morning and evening may each have a summit of their own, then from its best knot a step that halves.
 */
function search(annual: (surfaceTilt: number, surfaceAzimuth: number) => number): BestPlane {
  const at = (east: number, north: number): BestPlane => {
    const surfaceTilt = Math.min(90, Math.asin(Math.min(1, Math.hypot(east, north))) * DEGREES);
    const surfaceAzimuth = (Math.atan2(east, north) * DEGREES + 360) % 360;
    return { surfaceTilt, surfaceAzimuth, annual: annual(surfaceTilt, surfaceAzimuth) };
  };
  let [east, north] = [0, 0];
  let best = at(0, 0);
  const move = (e: number, n: number): boolean => {
    if (Math.hypot(e, n) > 1) return false;
    const tried = at(e, n);
    if (tried.annual <= best.annual) return false;
    [best, east, north] = [tried, e, n];
    return true;
  };
  for (let e = -0.96; e < 1; e += 0.16) for (let n = -0.96; n < 1; n += 0.16) move(e, n);
  for (let step = 0.08; step > 0.002; step /= 2) {
    let moved = true;
    while (moved) {
      moved = false;
      for (const [de, dn] of [
        [step, 0],
        [-step, 0],
        [0, step],
        [0, -step],
      ] as const)
        moved = move(east + de, north + dn) || moved;
    }
  }
  return best;
}
