import { DEGREES, RADIANS } from '../angles/angles.ts';
import type { AnnualLight } from './annual-light.ts';
import { DRAW_COLUMNS, DRAW_COLUMN_WIDTH, NODE, NODES } from './annual-light.ts';
import type { DrawnRegion, DrawnRegions } from './drawn-regions.ts';

/** What a draw moves, and what it lets through. */
export interface Deviations {
  /** Of each sighting, degrees of azimuth and elevation. */
  readonly azimuth: Float64Array;
  readonly elevation: Float64Array;
  /** Of the middle of each edge, degrees. */
  readonly stray: Float64Array;
  /** Share of light lost, [obstruction · classes + class]. */
  readonly lost: Float64Array;
}

/** Annual irradiation that obstructions take, kWh/m2. */
export interface Taken {
  direct: number;
  even: number;
}

const HIGHEST = 89.9999;
/** A ring around the zenith, among the signs of `DrawnRegion.top`. */
const AROUND = 2;
const COLUMN_SINE = Float64Array.from({ length: DRAW_COLUMNS }, (_, c) => Math.sin(middleRad(c)));
const COLUMN_COSINE = Float64Array.from({ length: DRAW_COLUMNS }, (_, c) => Math.cos(middleRad(c)));

/**
 * Counts, over and over, what the moved traces of a station take from a plane in a year. In each column of one degree every
 * region is its mean span of elevation and the share of the column it covers; regions that meet in a column are laid
 * over each other there. Memory is taken once, for all draws.
 */
export class BlockedAnnual {
  private readonly count = new Uint16Array(DRAW_COLUMNS);
  private readonly room: number;
  private readonly entryRegion: Uint16Array;
  private readonly topWidth: Float64Array;
  private readonly topSum: Float64Array;
  private readonly bottomWidth: Float64Array;
  private readonly bottomSum: Float64Array;
  private readonly cornerAzimuth: Float64Array;
  private readonly cornerElevation: Float64Array;
  private readonly low: Float64Array;
  private readonly high: Float64Array;
  private readonly width: Float64Array;
  private readonly lostEven: Float64Array;
  private readonly cuts: Float64Array;
  private readonly regionObstruction: Uint16Array;
  private readonly regionTop: Int8Array;
  private readonly entryObstruction: Uint16Array;
  private readonly passing: Float64Array;
  private readonly taken: Taken = { direct: 0, even: 0 };

  constructor(
    private readonly light: AnnualLight,
    private readonly drawn: DrawnRegions,
    private readonly obstructions: number,
  ) {
    this.room = Math.max(1, drawn.regions.length);
    const entries = DRAW_COLUMNS * this.room;
    this.entryRegion = new Uint16Array(entries);
    this.topWidth = new Float64Array(entries);
    this.topSum = new Float64Array(entries);
    this.bottomWidth = new Float64Array(entries);
    this.bottomSum = new Float64Array(entries);
    this.cornerAzimuth = new Float64Array(drawn.azimuth.length);
    this.cornerElevation = new Float64Array(drawn.azimuth.length);
    this.low = new Float64Array(this.room);
    this.high = new Float64Array(this.room);
    this.width = new Float64Array(this.room);
    this.lostEven = new Float64Array(obstructions);
    this.passing = new Float64Array(light.classes);
    this.cuts = new Float64Array(2 * this.room);
    this.regionObstruction = Uint16Array.from(drawn.regions, ({ obstruction }) => obstruction);
    this.regionTop = Int8Array.from(drawn.regions, ({ top, zenith }) => (zenith ? AROUND : top));
    this.entryObstruction = new Uint16Array(this.room);
  }

  /** The result is overwritten by the next call. */
  take(deviations: Deviations): Readonly<Taken> {
    this.count.fill(0);
    this.taken.direct = this.taken.even = 0;
    this.moveCorners(deviations);
    this.drawn.regions.forEach((region, index) => this.layRegion(region, index, deviations.stray));
    this.weighEven(deviations.lost);
    for (let column = 0; column < DRAW_COLUMNS; column++) {
      const entries = this.count[column];
      if (entries === 0) continue;
      this.settle(column, entries);
      if (entries === 1) this.takeSingle(column, deviations.lost);
      else this.takeOverlapping(column, entries, deviations.lost);
    }
    return this.taken;
  }

  private moveCorners({ azimuth, elevation }: Deviations): void {
    const { drawn, cornerAzimuth, cornerElevation } = this;
    for (let i = 0; i < cornerAzimuth.length; i++) {
      const [before, after, share] = [drawn.before[i], drawn.after[i], drawn.share[i]];
      cornerAzimuth[i] = drawn.azimuth[i] + azimuth[before] + share * (azimuth[after] - azimuth[before]);
      cornerElevation[i] =
        drawn.elevation[i] + elevation[before] + share * (elevation[after] - elevation[before]);
    }
  }

  private layRegion({ firstEdge, lastEdge, top }: DrawnRegion, region: number, stray: Float64Array): void {
    const { edgeStart, edgeEnd, edgeTurn, edgeStraight, azimuth } = this.drawn;
    for (let edge = firstEdge; edge < lastEdge; edge++) {
      const [i, j] = [edgeStart[edge], edgeEnd[edge]];
      const moved = this.cornerAzimuth[j] - azimuth[j] - (this.cornerAzimuth[i] - azimuth[i]);
      const turn = Math.max(-179.9, Math.min(179.9, edgeTurn[edge] + moved));
      const [e1, e2] = [this.cornerElevation[i], this.cornerElevation[j]];
      const from = turn > 0 ? this.cornerAzimuth[i] : this.cornerAzimuth[i] + turn;
      const above = top === 0 || top > 0 === turn > 0;
      const [first, last] = turn > 0 ? [e1, e2] : [e2, e1];
      if (edgeStraight[edge]) this.layStraight(region, above, from, Math.abs(turn), first, last, stray[edge]);
      else this.layDrawn(region, above, from, Math.abs(turn), first, last, stray[edge]);
    }
  }

  /** Elevation linear in azimuth, with the middle astray by a parabola. */
  private layDrawn(
    region: number,
    above: boolean,
    from: number,
    turn: number,
    e1: number,
    e2: number,
    stray: number,
  ): void {
    if (turn < 1e-9) return;
    const start = from - 360 * Math.floor(from / 360);
    const end = start + turn;
    for (let column = (start / DRAW_COLUMN_WIDTH) | 0; column * DRAW_COLUMN_WIDTH < end; column++) {
      const low = Math.max(start, column * DRAW_COLUMN_WIDTH);
      const high = Math.min(end, (column + 1) * DRAW_COLUMN_WIDTH);
      const u = ((low + high) / 2 - start) / turn;
      const elevation = e1 + u * (e2 - e1 + 4 * (1 - u) * stray);
      this.add(column, region, above, (high - low) / DRAW_COLUMN_WIDTH, elevation);
    }
  }

  /** A great circle: tan e = a·sin(azimuth) + b·cos(azimuth), see `edgesBetween`. */
  private layStraight(
    region: number,
    above: boolean,
    from: number,
    turn: number,
    e1: number,
    e2: number,
    stray: number,
  ): void {
    if (turn < 1e-9) return;
    const start = from - 360 * Math.floor(from / 360);
    const end = start + turn;
    const [t1, t2] = [tangent(e1), tangent(e2)];
    const sine = Math.sin(turn * RADIANS);
    const [startRad, endRad] = [start * RADIANS, end * RADIANS];
    const a = (t2 * Math.cos(startRad) - t1 * Math.cos(endRad)) / sine;
    const b = (t1 * Math.sin(endRad) - t2 * Math.sin(startRad)) / sine;
    for (let column = (start / DRAW_COLUMN_WIDTH) | 0; column * DRAW_COLUMN_WIDTH < end; column++) {
      const low = Math.max(start, column * DRAW_COLUMN_WIDTH);
      const high = Math.min(end, (column + 1) * DRAW_COLUMN_WIDTH);
      const width = (high - low) / DRAW_COLUMN_WIDTH;
      const middle = (low + high) / 2;
      const c = column % DRAW_COLUMNS;
      const slope =
        width === 1
          ? a * COLUMN_SINE[c] + b * COLUMN_COSINE[c]
          : a * Math.sin(middle * RADIANS) + b * Math.cos(middle * RADIANS);
      const u = (middle - start) / turn;
      this.add(column, region, above, width, Math.atan(slope) * DEGREES + 4 * u * (1 - u) * stray);
    }
  }

  private add(column: number, region: number, above: boolean, width: number, elevation: number): void {
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
  private settle(column: number, entries: number): void {
    const { low, high, width } = this;
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

  private weighEven(lost: Float64Array): void {
    const { classes, evenShare } = this.light;
    for (let o = 0; o < this.obstructions; o++) {
      let sum = 0;
      for (let k = 0; k < classes; k++) sum += lost[o * classes + k] * evenShare[k];
      this.lostEven[o] = sum;
    }
  }

  private takeSingle(column: number, lost: Float64Array): void {
    const obstruction = this.regionObstruction[this.entryRegion[column * this.room]];
    const { classes } = this.light;
    const low = this.low[0];
    this.span(column, this.high[0], this.width[0], lost, obstruction * classes, this.lostEven[obstruction]);
    if (low > 0)
      this.span(column, low, -this.width[0], lost, obstruction * classes, this.lostEven[obstruction]);
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
    const { cuts, low, high } = this;
    let count = 0;
    for (let k = 0; k < entries; k++) {
      this.entryObstruction[k] = this.regionObstruction[this.entryRegion[column * this.room + k]];
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
    const { passing, low, high, width, entryObstruction } = this;
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

function middleRad(column: number): number {
  return (column + 0.5) * DRAW_COLUMN_WIDTH * RADIANS;
}

const tangent = (elevation: number) =>
  Math.tan((elevation > HIGHEST ? HIGHEST : elevation < -HIGHEST ? -HIGHEST : elevation) * RADIANS);
