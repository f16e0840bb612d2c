import type { AnnualLight } from './annual-light.ts';
import { DRAW_COLUMNS, NODE, NODES } from './annual-light.ts';
import { ColumnSpans } from './column-spans.ts';
import type { DrawnRegions } from './drawn-regions.ts';
import type { Moves } from './moved-regions.ts';
import { MovedRegions } from './moved-regions.ts';

/** What a draw moves, and what it lets through. */
export interface Deviations extends Moves {
  /** Share of light lost, [obstruction · classes + class]. */
  readonly lost: Float64Array;
}

/** Annual irradiation that obstructions take, kWh/m2. */
export interface Taken {
  direct: number;
  even: number;
}

/**
 * Counts, over and over, what the moved traces of a station take from a plane in a year; regions that meet in a column
 * are laid over each other there. Memory is taken once, for all draws.
 */
export class BlockedAnnual {
  private readonly columns: ColumnSpans;
  private readonly moved: MovedRegions;
  private readonly lostEven: Float64Array;
  private readonly cuts: Float64Array;
  private readonly regionObstruction: Uint16Array;
  private readonly entryObstruction: Uint16Array;
  private readonly passing: Float64Array;
  private readonly taken: Taken = { direct: 0, even: 0 };

  constructor(
    private readonly light: AnnualLight,
    drawn: DrawnRegions,
    private readonly obstructions: number,
  ) {
    const { regions } = drawn;
    this.columns = new ColumnSpans(regions);
    this.moved = new MovedRegions(drawn, this.columns);
    this.lostEven = new Float64Array(obstructions);
    this.passing = new Float64Array(light.classes);
    this.cuts = new Float64Array(2 * regions.length);
    this.regionObstruction = Uint16Array.from(regions, ({ obstruction }) => obstruction);
    this.entryObstruction = new Uint16Array(regions.length);
  }

  /** The result is overwritten by the next call. */
  take(deviations: Deviations): Readonly<Taken> {
    const { columns } = this;
    this.taken.direct = this.taken.even = 0;
    columns.clear();
    this.moved.lay(deviations);
    this.weighEven(deviations.lost);
    for (let column = 0; column < DRAW_COLUMNS; column++) {
      const entries = columns.count[column];
      if (entries === 0) continue;
      columns.settle(column);
      if (entries === 1) this.takeSingle(column, deviations.lost);
      else this.takeOverlapping(column, entries, deviations.lost);
    }
    return this.taken;
  }

  private weighEven(lost: Float64Array): void {
    const { classes, evenShare } = this.light;
    for (let o = 0; o < this.obstructions; o++) {
      let sum = 0;
      for (let k = 0; k < classes; k++) sum += lost[o * classes + k] * evenShare[k];
      this.lostEven[o] = sum;
    }
  }

  private takeSingle(column: number, lost: Float64Array): void {
    const obstruction = this.regionObstruction[this.columns.regionAt(column, 0)];
    const row = obstruction * this.light.classes;
    const { low, high, width } = this.columns;
    this.span(column, high[0], width[0], lost, row, this.lostEven[obstruction]);
    if (low[0] > 0) this.span(column, low[0], -width[0], lost, row, this.lostEven[obstruction]);
  }

  /** Adds the light from below an elevation, times a weight and the share lost in each class. */
  private span(
    column: number,
    elevation: number,
    weight: number,
    lost: Float64Array,
    row: number,
    lostEven: number,
  ): void {
    const { below, classes } = this.light;
    const height = elevation / NODE;
    const node = height >= NODES - 1 ? NODES - 2 : height | 0;
    const share = height - node;
    const stride = classes + 1;
    let at = (column * NODES + node) * stride;
    let direct = 0;
    for (let k = 0; k < classes; k++, at++)
      direct += lost[row + k] * (below[at] + share * (below[at + stride] - below[at]));
    this.taken.direct += weight * direct;
    this.taken.even += weight * lostEven * (below[at] + share * (below[at + stride] - below[at]));
  }

  /** Cuts the column at every end; in each part the obstructions that stand there multiply what they let through. */
  private takeOverlapping(column: number, entries: number, lost: Float64Array): void {
    const { cuts, columns } = this;
    const { low, high } = columns;
    let count = 0;
    for (let k = 0; k < entries; k++) {
      this.entryObstruction[k] = this.regionObstruction[columns.regionAt(column, k)];
      if (low[k] > 0) count = insert(cuts, count, low[k]);
      if (high[k] > 0) count = insert(cuts, count, high[k]);
    }
    let from = 0;
    for (let i = 0; i < count; i++) {
      if (cuts[i] > from) this.takePart(column, entries, from, cuts[i], lost);
      from = cuts[i];
    }
  }

  private takePart(column: number, entries: number, from: number, to: number, lost: Float64Array): void {
    const { passing, entryObstruction } = this;
    const { low, high, width } = this.columns;
    const { classes, evenShare } = this.light;
    passing.fill(1);
    let stands = false;
    for (let k = 0; k < entries; k++) {
      if (low[k] > from || high[k] < to) continue;
      const obstruction = entryObstruction[k];
      let covered = width[k];
      for (let j = k + 1; j < entries && entryObstruction[j] === obstruction; j++)
        if (low[j] <= from && high[j] >= to) {
          covered += width[j];
          k = j;
        }
      if (covered > 1) covered = 1;
      stands = true;
      for (let c = 0; c < classes; c++) passing[c] *= 1 - covered * lost[obstruction * classes + c];
    }
    if (!stands) return;
    let even = 0;
    for (let c = 0; c < classes; c++) {
      passing[c] = 1 - passing[c];
      even += passing[c] * evenShare[c];
    }
    this.span(column, to, 1, passing, 0, even);
    if (from > 0) this.span(column, from, -1, passing, 0, even);
  }
}

/** Puts a value into its place among `count` sorted ones; gives the new count. */
function insert(sorted: Float64Array, count: number, value: number): number {
  let i = count;
  for (; i > 0 && sorted[i - 1] > value; i--) sorted[i] = sorted[i - 1];
  sorted[i] = value;
  return count + 1;
}
