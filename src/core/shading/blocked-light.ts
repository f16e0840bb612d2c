import { RADIANS } from '../angles/angles.ts';
import type { BlockedSpans } from '../horizon/blocked-spans.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import { blockedView } from '../horizon/blocked-view.ts';
import { BAND_TOP, viewUpTo } from '../horizon/sky-view.ts';
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
  const hasBand = map.band.some((light) => light > 0);
  const wholeDome = Math.PI * domeView(map.surfaceTilt);
  const shares = (views: Float64Array, whole: number) => views.map((view) => Math.min(1, view / whole));
  return {
    direct: blockedDirect(map, spans),
    domeShare: shares(blockedView(spans, map.facing), wholeDome),
    bandShare: hasBand
      ? shares(blockedView(spans, map.facing, BAND_TOP), wholeView(map, BAND_TOP))
      : new Float64Array(12),
  };
}

/** Beam and circumsolar irradiation from behind the spans in each month, kWh/m2. */
function blockedDirect(map: SkyMap, { profile, first, low, high, row, lost }: BlockedSpans): Float64Array {
  const direct = new Float64Array(12);
  for (let slice = 0; slice < profile.sliceColumn.length; slice++) {
    const share = (profile.sliceTo[slice] - profile.sliceFrom[slice]) / COLUMN_WIDTH;
    for (let k = first[slice]; k < first[slice + 1]; k++)
      addDirect(
        map,
        profile.sliceColumn[slice],
        share,
        low[k] / BIN,
        high[k] / BIN,
        lost,
        row[k] * 12,
        direct,
      );
  }
  return direct;
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

/** The plane's view of the whole sky up to an elevation [radians], as `blockedView` counts. */
function wholeView({ facing }: SkyMap, topRad: number): number {
  let sum = 0;
  for (let column = 0; column < COLUMNS; column++)
    sum += viewUpTo(facing, (column + 0.5) * COLUMN_WIDTH, topRad);
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
