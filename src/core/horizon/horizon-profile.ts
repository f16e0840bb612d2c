import { RADIANS } from '../angles/angles.ts';
import type { HorizonEdge } from './horizon-edge.ts';
import { edgeElevation } from './horizon-edge.ts';
import type { TracedObstruction } from './traced-obstruction.ts';
import { blockedRegions } from './traced-obstruction.ts';

/** The horizon is cut into this many columns of equal azimuth. */
export const COLUMNS = 720;
/** Width of a column, degrees. */
export const COLUMN_WIDTH = 360 / COLUMNS;
/** An edge that climbs more than this within a column cuts it again, degrees. */
const STEEP = 1;
const MOST_STEEP_CUTS = 16;
const MOST_CUTS = 64;
/** Slices narrower than this are rounding, degrees. */
const THINNEST = 1e-7;

/**
 * What stands around one station: for each slice of azimuth, the blocked intervals of elevation, grouped by obstruction
 * and, within one obstruction, apart from each other. A slice is a column or a part of one, cut wherever a trace
 * begins, ends or turns, so thin masts and upright walls count by their true width. Slices with nothing are left out.
 */
export interface HorizonProfile {
  readonly obstructionIds: readonly string[];
  /** Share of light that passes, [obstruction · 12 + month]. */
  readonly transmittance: Float64Array;
  /** First slice of each column, COLUMNS + 1 entries. */
  readonly columnFirst: Uint32Array;
  readonly sliceColumn: Uint16Array;
  /** Start and end azimuth of each slice, degrees. */
  readonly sliceFrom: Float64Array;
  readonly sliceTo: Float64Array;
  /** Means over each slice of the sine and cosine of azimuth. */
  readonly sliceSin: Float64Array;
  readonly sliceCos: Float64Array;
  /** First interval of each slice, one more entry than slices. */
  readonly intervalFirst: Uint32Array;
  readonly intervalObstruction: Uint16Array;
  /** Ends of each interval, degrees 0 to 90. */
  readonly low: Float64Array;
  readonly high: Float64Array;
}

interface BoundedEdge extends HorizonEdge {
  obstruction: number;
  /** Regions are numbered through; edges of one region follow each other. */
  region: number;
  skyline: boolean;
}

/** Lays the traces of a station's obstructions around the horizon. Throws RangeError as `blockedRegions` does. */
export function horizonProfile(obstructions: readonly TracedObstruction[]): HorizonProfile {
  const edges = boundedEdges(obstructions);
  const { first, members } = edgesByColumn(edges);
  const slices = new SliceList();
  const columnFirst = new Uint32Array(COLUMNS + 1);
  for (let column = 0; column < COLUMNS; column++) {
    columnFirst[column] = slices.count;
    if (first[column] !== first[column + 1]) {
      const here = members.subarray(first[column], first[column + 1]);
      sliceColumn(column, here, edges, slices);
    }
  }
  columnFirst[COLUMNS] = slices.count;
  return {
    obstructionIds: obstructions.map(({ id }) => id),
    transmittance: new Float64Array(obstructions.flatMap(({ transmittance }) => transmittance)),
    columnFirst,
    ...slices.arrays(),
  };
}

function boundedEdges(obstructions: readonly TracedObstruction[]): BoundedEdge[] {
  const edges: BoundedEdge[] = [];
  let region = 0;
  obstructions.forEach(({ traces }, obstruction) => {
    for (const trace of traces)
      for (const blocked of blockedRegions(trace)) {
        const skyline = blocked.kind === 'skyline';
        for (const { from, to, straight, a, b } of blocked.edges)
          edges.push({ from, to, straight, a, b, obstruction, region, skyline });
        region++;
      }
  });
  return edges;
}

/** Which edges touch which column, in the order of the edges. */
function edgesByColumn(edges: readonly BoundedEdge[]) {
  const lastColumn = ({ to }: BoundedEdge) => Math.min(COLUMNS - 1, Math.ceil(to / COLUMN_WIDTH) - 1);
  const first = new Uint32Array(COLUMNS + 1);
  for (const edge of edges)
    for (let c = Math.floor(edge.from / COLUMN_WIDTH); c <= lastColumn(edge); c++) first[c + 1]++;
  for (let c = 0; c < COLUMNS; c++) first[c + 1] += first[c];
  const members = new Uint32Array(first[COLUMNS]);
  const next = first.slice();
  edges.forEach((edge, index) => {
    for (let c = Math.floor(edge.from / COLUMN_WIDTH); c <= lastColumn(edge); c++) members[next[c]++] = index;
  });
  return { first, members };
}

function sliceColumn(
  column: number,
  here: Uint32Array,
  edges: readonly BoundedEdge[],
  slices: SliceList,
): void {
  const cuts = columnCuts(column * COLUMN_WIDTH, here, edges);
  for (let k = 1; k < cuts.length; k++) {
    const [from, to] = [cuts[k - 1], cuts[k]];
    const middle = (from + to) / 2;
    slices.open();
    for (let i = 0; i < here.length;) i = blockRegion(i, here, edges, middle, slices);
    slices.close(column, from, to);
  }
}

function columnCuts(start: number, here: Uint32Array, edges: readonly BoundedEdge[]): number[] {
  const end = start + COLUMN_WIDTH;
  const cuts = [start, end];
  for (const index of here) {
    const edge = edges[index];
    const [from, to] = [Math.max(start, edge.from), Math.min(end, edge.to)];
    if (from > start) cuts.push(from);
    if (to < end) cuts.push(to);
    if (!edge.straight && Math.abs(edge.b) * (to - from) <= STEEP) continue;
    const climb = Math.abs(edgeElevation(edge, to) - edgeElevation(edge, from));
    const pieces = Math.min(MOST_STEEP_CUTS, Math.ceil(climb / STEEP));
    for (let k = 1; k < pieces; k++) cuts.push(from + (k / pieces) * (to - from));
  }
  if (cuts.length === 2) return cuts;
  const apart = cuts.sort((a, b) => a - b).filter((cut, i) => i === 0 || cut - cuts[i - 1] > THINNEST);
  return apart.length <= MOST_CUTS
    ? apart
    : Array.from({ length: MOST_CUTS + 1 }, (_, k) => start + (k / MOST_CUTS) * COLUMN_WIDTH);
}

const crossings: number[] = [];

/** Adds what one region blocks at an azimuth; returns the index after its last edge. */
function blockRegion(
  start: number,
  here: Uint32Array,
  edges: readonly BoundedEdge[],
  azimuth: number,
  slices: SliceList,
): number {
  const { region, skyline, obstruction } = edges[here[start]];
  crossings.length = 0;
  let i = start;
  for (; i < here.length; i++) {
    const edge = edges[here[i]];
    if (edge.region !== region) break;
    if (azimuth >= edge.from && azimuth < edge.to) crossings.push(edgeElevation(edge, azimuth));
  }
  if (skyline) {
    for (const elevation of crossings) slices.add(obstruction, 0, elevation);
    return i;
  }
  crossings.sort((a, b) => a - b);
  if (crossings.length % 2) crossings.push(90);
  for (let k = 0; k < crossings.length; k += 2) slices.add(obstruction, crossings[k], crossings[k + 1]);
  return i;
}

/** Slices and intervals as they grow. */
class SliceList {
  count = 0;
  private readonly column: number[] = [];
  private readonly from: number[] = [];
  private readonly to: number[] = [];
  private readonly first: number[] = [0];
  private readonly obstruction: number[] = [];
  private readonly low: number[] = [];
  private readonly high: number[] = [];
  private opened = 0;

  open(): void {
    this.opened = this.low.length;
  }

  /** Adds an interval, cut to the sky, united with those of the same obstruction that it touches. */
  add(obstruction: number, low: number, high: number): void {
    low = Math.max(0, low);
    high = Math.min(90, high);
    if (!(high > low)) return;
    for (let k = this.low.length - 1; k >= this.opened && this.obstruction[k] === obstruction; k--) {
      if (this.low[k] > high || this.high[k] < low) continue;
      low = Math.min(low, this.low[k]);
      high = Math.max(high, this.high[k]);
      this.remove(k);
    }
    this.obstruction.push(obstruction);
    this.low.push(low);
    this.high.push(high);
  }

  private remove(k: number): void {
    this.obstruction.splice(k, 1);
    this.low.splice(k, 1);
    this.high.splice(k, 1);
  }

  close(column: number, from: number, to: number): void {
    if (this.low.length === this.opened) return;
    this.column.push(column);
    this.from.push(from);
    this.to.push(to);
    this.first.push(this.low.length);
    this.count++;
  }

  arrays() {
    const sine = new Float64Array(this.count);
    const cosine = new Float64Array(this.count);
    for (let i = 0; i < this.count; i++) {
      const middle = ((this.from[i] + this.to[i]) / 2) * RADIANS;
      const half = ((this.to[i] - this.from[i]) / 2) * RADIANS;
      const mean = Math.sin(half) / half;
      sine[i] = Math.sin(middle) * mean;
      cosine[i] = Math.cos(middle) * mean;
    }
    return {
      sliceColumn: new Uint16Array(this.column),
      sliceFrom: new Float64Array(this.from),
      sliceTo: new Float64Array(this.to),
      sliceSin: sine,
      sliceCos: cosine,
      intervalFirst: new Uint32Array(this.first),
      intervalObstruction: new Uint16Array(this.obstruction),
      low: new Float64Array(this.low),
      high: new Float64Array(this.high),
    };
  }
}
