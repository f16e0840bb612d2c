import { RADIANS } from '../angles/angles.ts';
import { COLUMNS } from '../horizon/horizon-profile.ts';
import { BAND_TOP, planeHorizon, viewBelow } from '../horizon/sky-view.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import { BIN } from '../shading/sun-paths.ts';

/** Columns of azimuth that draws are counted in: coarser than the map's, since only differences are used. */
export const DRAW_COLUMNS = 360;
export const DRAW_COLUMN_WIDTH = 360 / DRAW_COLUMNS;
/** Elevation between two nodes, degrees. */
export const NODE = 0.25;
export const NODES = 90 / NODE + 1;

const SPLIT = COLUMNS / DRAW_COLUMNS;
const BINS_PER_NODE = NODE / BIN;

/**
 * A sky map condensed to the year, for many look-ups: the light from below each node of elevation in each column. Months in
 * which every obstruction lets through the same share are one class, so the draws can change what a tree lets through.
 */
export interface AnnualLight {
  /** Number of classes of months. */
  readonly classes: number;
  /** Class of each month. */
  readonly classOfMonth: readonly number[];
  /** kWh/m2 from below: [(column · NODES + node) · (classes + 1) + class]; the last entry is even light of all classes. */
  readonly below: Float32Array;
  /** Share of the year's even light (dome and band) in each class. */
  readonly evenShare: Float64Array;
  /** Annual irradiation with nothing in the way, kWh/m2: from the sun's place, from the sky evenly, from the ground. */
  readonly direct: number;
  readonly even: number;
  readonly ground: number;
}

/** Stations of one plane mostly group the months alike, so what was condensed once is kept as long as its map is. */
const condensed = new WeakMap<SkyMap, Map<string, AnnualLight>>();

/** Condenses a sky map; months with equal keys become one class. */
export function annualLight(map: SkyMap, monthKeys: readonly string[]): AnnualLight {
  const keys = [...new Set(monthKeys)];
  const classOfMonth = monthKeys.map((key) => keys.indexOf(key));
  const known = condensed.get(map) ?? new Map<string, AnnualLight>();
  condensed.set(map, known);
  const name = classOfMonth.join();
  const light = known.get(name) ?? condense(map, classOfMonth, keys.length);
  known.set(name, light);
  return light;
}

function condense(map: SkyMap, classOfMonth: readonly number[], classes: number): AnnualLight {
  const below = new Float32Array(DRAW_COLUMNS * NODES * (classes + 1));
  addDirect(map, classOfMonth, classes, below);
  addEven(map, classes, below);
  const even = sum(map.dome) + sum(map.band);
  const evenShare = new Float64Array(classes);
  classOfMonth.forEach((k, month) => (evenShare[k] += (map.dome[month] + map.band[month]) / (even || 1)));
  return {
    classes,
    classOfMonth,
    below,
    evenShare,
    direct: sum(map.direct),
    even,
    ground: sum(map.ground),
  };
}

/** Writes what each pair of nodes adds, then sums upward. */
function addDirect(map: SkyMap, classOfMonth: readonly number[], classes: number, below: Float32Array): void {
  const stride = classes + 1;
  const { first, bottom } = map.grid;
  for (let column = 0; column < COLUMNS; column++) {
    const base = Math.floor(column / SPLIT) * NODES * stride;
    for (let month = 0; month < 12; month++) {
      const strip = column * 12 + month;
      const [start, top] = [first[strip], first[strip + 1] - 1];
      if (top <= start) continue;
      let before = 0;
      const at = base + classOfMonth[month];
      for (let node = Math.floor(bottom[strip] / BINS_PER_NODE) + 1; ; node++) {
        const height = node * BINS_PER_NODE - bottom[strip];
        const light = lightAt(map.below, start, top, height);
        below[at + Math.min(node, NODES - 1) * stride] += light - before;
        before = light;
        if (start + height >= top) break;
      }
    }
  }
  for (let column = 0; column < DRAW_COLUMNS; column++)
    for (let at = (column * NODES + 1) * stride; at < (column + 1) * NODES * stride; at++)
      below[at] += below[at - stride];
}

/** Light below a height in bins above a strip's first node. */
function lightAt(below: Float32Array, start: number, top: number, height: number): number {
  const bin = height | 0;
  const node = start + bin;
  return node >= top ? below[top] : below[node] + (height - bin) * (below[node + 1] - below[node]);
}

function addEven(map: SkyMap, classes: number, below: Float32Array): void {
  const views = nodeViews(map, Math.PI / 2);
  const bandViews = nodeViews(map, BAND_TOP);
  const [dome, band] = [sum(map.dome) / total(views), sum(map.band) / total(bandViews)];
  const stride = classes + 1;
  for (let at = 0; at < DRAW_COLUMNS * NODES; at++)
    below[at * stride + classes] = dome * views[at] + band * bandViews[at];
}

/** The plane's view of an even sky below each node, up to an elevation [radians]. */
function nodeViews({ facing }: SkyMap, topRad: number): Float64Array {
  const views = new Float64Array(DRAW_COLUMNS * NODES);
  for (let column = 0; column < DRAW_COLUMNS; column++) {
    const azimuth = (column + 0.5) * DRAW_COLUMN_WIDTH * RADIANS;
    const toward = facing.north * Math.cos(azimuth) + facing.east * Math.sin(azimuth);
    const horizon = planeHorizon(toward, facing.upward);
    const start = viewBelow(toward, facing.upward, horizon);
    for (let node = 0; node < NODES; node++) {
      const height = Math.min(topRad, node * NODE * RADIANS);
      views[column * NODES + node] = height > horizon ? viewBelow(toward, facing.upward, height) - start : 0;
    }
  }
  return views;
}

/** Whole view of all columns; never 0. */
function total(views: Float64Array): number {
  let view = 0;
  for (let column = 0; column < DRAW_COLUMNS; column++) view += views[(column + 1) * NODES - 1];
  return Math.max(view, 1e-12);
}

const sum = (values: readonly number[]) => values.reduce((all, value) => all + value, 0);
