import { DRAW_COLUMNS } from './annual-light.ts';
import type { DrawnRegion } from './drawn-regions.ts';

/** A ring around the zenith, among the signs of `DrawnRegion.top`. */
const AROUND = 2;

/**
 * In each column of azimuth the regions that stand there: summed edge by edge, then each as its mean span of elevation
 * and the share of the column it covers. Memory is taken once, for all draws.
 */
export class ColumnSpans {
  /** How many regions stand in each column. */
  readonly count = new Uint16Array(DRAW_COLUMNS);
  /** Ends of the spans of the column settled last, degrees, and the share of the column that each covers. */
  readonly low: Float64Array;
  readonly high: Float64Array;
  readonly width: Float64Array;
  private readonly room: number;
  private readonly entryRegion: Uint16Array;
  private readonly topWidth: Float64Array;
  private readonly topSum: Float64Array;
  private readonly bottomWidth: Float64Array;
  private readonly bottomSum: Float64Array;
  private readonly regionTop: Int8Array;

  constructor(regions: readonly DrawnRegion[]) {
    this.room = Math.max(1, regions.length);
    const entries = DRAW_COLUMNS * this.room;
    this.entryRegion = new Uint16Array(entries);
    this.topWidth = new Float64Array(entries);
    this.topSum = new Float64Array(entries);
    this.bottomWidth = new Float64Array(entries);
    this.bottomSum = new Float64Array(entries);
    this.low = new Float64Array(this.room);
    this.high = new Float64Array(this.room);
    this.width = new Float64Array(this.room);
    this.regionTop = Int8Array.from(regions, ({ top, zenith }) => (zenith ? AROUND : top));
  }

  clear(): void {
    this.count.fill(0);
  }

  /** Index of the region that is the k-th in a column. */
  regionAt(column: number, k: number): number {
    return this.entryRegion[column * this.room + k];
  }

  /**
   * Adds a piece of an edge of a region: its mean elevation [degrees] and the share of the column it goes over, from 0; columns
   * may run past the circle once.
   */
  add(column: number, region: number, above: boolean, width: number, elevation: number): void {
    const c = column >= DRAW_COLUMNS ? column - DRAW_COLUMNS : column;
    let at = c * this.room + this.count[c] - 1;
    if (this.count[c] === 0 || this.entryRegion[at] !== region) {
      at++;
      this.count[c]++;
      this.entryRegion[at] = region;
      this.topWidth[at] = this.topSum[at] = this.bottomWidth[at] = this.bottomSum[at] = 0;
    }
    const height = elevation > 0 ? (elevation < 90 ? elevation : 90) : 0;
    if (above) {
      this.topWidth[at] += width;
      this.topSum[at] += width * height;
    } else {
      this.bottomWidth[at] += width;
      this.bottomSum[at] += width * height;
    }
  }

  /** Turns the sums of a column into spans: `low`, `high` and the width covered. */
  settle(column: number): void {
    const { low, high, width } = this;
    const entries = this.count[column];
    for (let k = 0, at = column * this.room; k < entries; k++, at++) {
      const sense = this.regionTop[this.entryRegion[at]];
      const top = this.topWidth[at];
      const upper = top > 0 ? this.topSum[at] / top : 0;
      low[k] = 0;
      high[k] = upper;
      width[k] = top;
      if (sense === AROUND) {
        low[k] = upper;
        high[k] = 90;
      } else if (sense !== 0 && this.bottomWidth[at] > 0) low[k] = this.bottomSum[at] / this.bottomWidth[at];
      if (sense === 0 && top > 1) width[k] = 1; // a skyline that comes back over itself counts once
    }
  }
}
