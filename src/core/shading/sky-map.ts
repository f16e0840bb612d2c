import { RADIANS } from '../angles/angles.ts';
import type { PlaneFacing } from '../horizon/sky-view.ts';
import { planeFacing } from '../horizon/sky-view.ts';
import { domeView, groundView } from '../transposition/plane-irradiance.ts';
import type { SkyGrid } from './sky-grid.ts';
import { STRIPS } from './sky-grid.ts';
import type { MonthHours, SkyYear } from './sky-year.ts';
import { monthHourOf, monthsOf } from './sky-year.ts';
import { BIN } from './sun-paths.ts';

/**
 * A year of beam and circumsolar irradiation on one plane by where in the sky it comes from, for each month, summed upward
 * in each column: what an obstruction takes is one subtraction. Beside it the even parts of the sky's light.
 */
export interface SkyMap {
  readonly year: SkyYear;
  readonly grid: SkyGrid;
  readonly surfaceTilt: number;
  readonly surfaceAzimuth: number;
  readonly facing: PlaneFacing;
  /** Irradiation from below each node of the grid, kWh/m2. */
  readonly below: Float32Array;
  /** Direct irradiation by month and hour with nothing in the way. */
  readonly directHours: MonthHours;
  /** Monthly irradiation with nothing in the way, kWh/m2, by part. `dome` has the dark band taken off. */
  readonly direct: readonly number[];
  readonly dome: readonly number[];
  readonly band: readonly number[];
  readonly ground: readonly number[];
}

/** Cosine of the angle of incidence in the middle of a step; 0 or less behind the plane. */
export function cosIncidenceOf(year: SkyYear, facing: PlaneFacing, step: number): number {
  const { east, north, up } = year.paths.track;
  return (
    (facing.east * (east[step] + east[step + 1]) +
      facing.north * (north[step] + north[step + 1]) +
      facing.upward * (up[step] + up[step + 1])) /
    2
  );
}

/** Lays a year of light on a plane of tilt 0 to 90 and azimuth, degrees. Throws RangeError for a tilt outside. */
export function skyMap(year: SkyYear, grid: SkyGrid, surfaceTilt: number, surfaceAzimuth: number): SkyMap {
  const facing = planeFacing(surfaceTilt, surfaceAzimuth);
  const below = new Float32Array(grid.first[STRIPS]);
  const directHours = deposit(year, grid, facing, below);
  const direct = sumUpward(grid, below);
  const sine = Math.sin(surfaceTilt * RADIANS);
  const darkBand = monthsOf(year.darkBand);
  return {
    year,
    grid,
    surfaceTilt,
    surfaceAzimuth,
    facing,
    below,
    directHours,
    direct,
    dome: monthsOf(year.dome).map((dome, month) => dome * domeView(surfaceTilt) + darkBand[month] * sine),
    band: monthsOf(year.brightBand).map((band) => band * sine),
    ground: monthsOf(year.ghi).map((ghi) => ghi * year.albedo * groundView(surfaceTilt)),
  };
}

/** Spreads the light of every piece of the sun's path evenly over the elevations it spans; sums it by hour. */
function deposit(year: SkyYear, grid: SkyGrid, facing: PlaneFacing, bins: Float32Array): MonthHours {
  const { step, pieceFirst, pieceStrip, pieceLow, pieceHigh, pieceShare } = year.paths;
  const { first, bottom } = grid;
  const hours: MonthHours = new Float64Array(12 * 24);
  for (let k = 0; k < step.length; k++) {
    const normal = year.direct[step[k]];
    if (normal <= 0) continue;
    const light = normal * cosIncidenceOf(year, facing, step[k]);
    if (light <= 0) continue;
    const cell = monthHourOf(year.paths.track, step[k]);
    for (let i = pieceFirst[k]; i < pieceFirst[k + 1]; i++) {
      const strip = pieceStrip[i];
      const base = first[strip] - bottom[strip];
      const low = pieceLow[i] / BIN;
      const high = pieceHigh[i] / BIN;
      const [lowBin, highBin] = [low | 0, high | 0];
      const energy = light * pieceShare[i];
      hours[cell] += energy;
      if (lowBin === highBin) {
        bins[base + lowBin] += energy;
        continue;
      }
      const perBin = energy / (high - low);
      bins[base + lowBin] += perBin * (lowBin + 1 - low);
      for (let bin = lowBin + 1; bin < highBin; bin++) bins[base + bin] += perBin;
      bins[base + highBin] += perBin * (high - highBin);
    }
  }
  return hours;
}

/** Turns bins into sums from below, in place; returns the monthly totals. */
function sumUpward(grid: SkyGrid, bins: Float32Array): number[] {
  const totals = Array<number>(12).fill(0);
  for (let strip = 0; strip < STRIPS; strip++) {
    let sum = 0;
    for (let node = grid.first[strip]; node < grid.first[strip + 1]; node++) {
      const here = bins[node];
      bins[node] = sum;
      sum += here;
    }
    totals[strip % 12] += sum;
  }
  return totals;
}

/** Monthly irradiation on the plane with nothing in the way, kWh/m2. */
export const unshadedMonths = (map: SkyMap): number[] =>
  map.direct.map((direct, m) => direct + map.dome[m] + map.band[m] + map.ground[m]);
