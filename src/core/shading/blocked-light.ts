import { RADIANS } from '../angles/angles.ts';
import type { BlockedSpans } from '../horizon/blocked-spans.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import { BAND_TOP, planeHorizon, viewBelow } from '../horizon/sky-view.ts';
import { domeView } from '../transposition/plane-irradiance.ts';
import type { SkyMap } from './sky-map.ts';
import { BIN } from './sun-paths.ts';

/** What obstructions take from a plane in each month. */
export interface BlockedLight {
  /** Beam and circumsolar irradiation, kWh/m2. */
  direct: Float64Array;
  /** Share of the dome's light, 0 to 1. */
  domeShare: Float64Array;
  /** Share of the horizon band's light, 0 to 1. */
  bandShare: Float64Array;
}

/** Subtracts blocked spans from a sky map. */
export function blockedLight(map: SkyMap, spans: BlockedSpans): BlockedLight {
  const direct = new Float64Array(12);
  const domeLost = new Float64Array(12);
  const bandLost = new Float64Array(12);
  const { profile, first, low, high, row, lost } = spans;
  const { north, east, upward } = map.facing;
  const hasBand = map.band.some((light) => light > 0);
  for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
    const [start, end] = [first[slice], first[slice + 1]];
    if (start === end) continue;
    const width = profile.sliceTo[slice] - profile.sliceFrom[slice];
    const column = profile.sliceColumn[slice];
    const toward = north * profile.sliceCos[slice] + east * profile.sliceSin[slice];
    const horizon = planeHorizon(toward, upward);
    for (let k = start; k < end; k++) {
      const lowRad = Math.max(horizon, low[k] * RADIANS);
      const highRad = high[k] * RADIANS;
      if (highRad <= lowRad) continue; // behind the plane
      const radians = width * RADIANS;
      const lostRow = row[k] * 12;
      const lowView = lowRad === 0 ? 0 : viewBelow(toward, upward, lowRad);
      const view = (viewBelow(toward, upward, highRad) - lowView) * radians;
      for (let month = 0; month < 12; month++) domeLost[month] += lost[lostRow + month] * view;
      if (hasBand && lowRad < BAND_TOP) {
        const bandView = (viewBelow(toward, upward, Math.min(BAND_TOP, highRad)) - lowView) * radians;
        for (let month = 0; month < 12; month++) bandLost[month] += lost[lostRow + month] * bandView;
      }
      addDirect(map, column, width / COLUMN_WIDTH, low[k] / BIN, high[k] / BIN, lost, lostRow, direct);
    }
  }
  const wholeDome = Math.PI * domeView(map.surfaceTilt);
  const wholeBand = hasBand ? bandView(map) : 1;
  return {
    direct,
    domeShare: domeLost.map((view) => Math.min(1, view / wholeDome)),
    bandShare: bandLost.map((view) => Math.min(1, view / wholeBand)),
  };
}

/** Adds the direct light from a span of one column, in all months; elevations in bins. */
function addDirect(
  { grid, below }: SkyMap,
  column: number,
  share: number,
  low: number,
  high: number,
  lost: Float64Array,
  lostRow: number,
  direct: Float64Array,
): void {
  const { first, bottom } = grid;
  for (let month = 0, strip = column * 12; month < 12; month++, strip++) {
    const start = first[strip];
    const top = first[strip + 1] - 1;
    if (top <= start) continue;
    const base = bottom[strip];
    if (high <= base) continue;
    const to = lightBelow(below, start, top, high - base);
    const from = low > base ? lightBelow(below, start, top, low - base) : 0;
    direct[month] += share * lost[lostRow + month] * (to - from);
  }
}

/** Light from below a height in one strip; `height` in bins above its first node. */
function lightBelow(below: Float32Array, start: number, top: number, height: number): number {
  if (height <= 0) return 0;
  const bin = height | 0;
  const node = start + bin;
  if (node >= top) return below[top];
  const value = below[node];
  return value + (height - bin) * (below[node + 1] - value);
}

/** Light of a month and column from between two elevations, degrees, with nothing in the way, kWh/m2. */
export function directFrom(map: SkyMap, month: number, column: number, low: number, high: number): number {
  const { first, bottom } = map.grid;
  const strip = column * 12 + month;
  const [start, top] = [first[strip], first[strip + 1] - 1];
  if (top <= start) return 0;
  const at = (elevation: number) => lightBelow(map.below, start, top, elevation / BIN - bottom[strip]);
  return at(high) - at(low);
}

/** The plane's view of the whole horizon band, as `viewBelow` counts. */
function bandView(map: SkyMap): number {
  let sum = 0;
  for (let column = 0; column < COLUMNS; column++) {
    const azimuth = (column + 0.5) * COLUMN_WIDTH * RADIANS;
    const toward = map.facing.north * Math.cos(azimuth) + map.facing.east * Math.sin(azimuth);
    const horizon = planeHorizon(toward, map.facing.upward);
    if (horizon < BAND_TOP)
      sum +=
        viewBelow(toward, map.facing.upward, BAND_TOP) -
        (horizon > 0 ? viewBelow(toward, map.facing.upward, horizon) : 0);
  }
  return Math.max(sum * COLUMN_WIDTH * RADIANS, 1e-12);
}

/** Monthly irradiation on the plane behind what is blocked, kWh/m2. */
export function shadedMonths(map: SkyMap, blocked: BlockedLight): number[] {
  return map.direct.map(
    (direct, m) =>
      Math.max(0, direct - blocked.direct[m]) +
      map.dome[m] * (1 - blocked.domeShare[m]) +
      map.band[m] * (1 - blocked.bandShare[m]) +
      map.ground[m],
  );
}
