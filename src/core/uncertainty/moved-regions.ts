import { DEGREES, RADIANS } from '../angles/angles.ts';
import { DRAW_COLUMNS, DRAW_COLUMN_WIDTH } from './annual-light.ts';
import type { ColumnSpans } from './column-spans.ts';
import type { DrawnRegion, DrawnRegions } from './drawn-regions.ts';

/** How far a draw moves what was traced. */
export interface Moves {
  /** Of each sighting, degrees of azimuth and elevation. */
  readonly azimuth: Float64Array;
  readonly elevation: Float64Array;
  /** Of the middle of each edge, degrees. */
  readonly stray: Float64Array;
}

const HIGHEST = 89.9999;
const COLUMN_SINE = Float64Array.from({ length: DRAW_COLUMNS }, (_, c) => Math.sin(middleRad(c)));
const COLUMN_COSINE = Float64Array.from({ length: DRAW_COLUMNS }, (_, c) => Math.cos(middleRad(c)));

/** Lays the moved regions of a station into columns, edge by edge, over and over. Memory is taken once, for all draws. */
export class MovedRegions {
  private readonly cornerAzimuth: Float64Array;
  private readonly cornerElevation: Float64Array;

  constructor(
    private readonly drawn: DrawnRegions,
    private readonly columns: ColumnSpans,
  ) {
    this.cornerAzimuth = new Float64Array(drawn.azimuth.length);
    this.cornerElevation = new Float64Array(drawn.azimuth.length);
  }

  lay(moves: Moves): void {
    this.moveCorners(moves);
    this.drawn.regions.forEach((region, index) => this.layRegion(region, index, moves.stray));
  }

  private moveCorners({ azimuth, elevation }: Moves): void {
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
      const line = edgeStraight[edge] ? greatCircle(from, Math.abs(turn), first, last) : null;
      this.layEdge(region, above, from, Math.abs(turn), first, last, stray[edge], line);
    }
  }

  /** Without a line: elevation linear in azimuth. The middle is astray by a parabola. */
  private layEdge(
    region: number,
    above: boolean,
    from: number,
    turn: number,
    e1: number,
    e2: number,
    stray: number,
    line: GreatCircle | null,
  ): void {
    if (turn < 1e-9) return;
    const start = inCircle(from);
    const end = start + turn;
    for (let column = (start / DRAW_COLUMN_WIDTH) | 0; column * DRAW_COLUMN_WIDTH < end; column++) {
      const low = Math.max(start, column * DRAW_COLUMN_WIDTH);
      const high = Math.min(end, (column + 1) * DRAW_COLUMN_WIDTH);
      const width = (high - low) / DRAW_COLUMN_WIDTH;
      const middle = (low + high) / 2;
      const u = (middle - start) / turn;
      const elevation = line
        ? elevationOn(line, middle, width === 1 ? column % DRAW_COLUMNS : -1) + 4 * u * (1 - u) * stray
        : e1 + u * (e2 - e1 + 4 * (1 - u) * stray);
      this.columns.add(column, region, above, width, elevation);
    }
  }
}

/** tan e = a·sin(azimuth) + b·cos(azimuth), see `edgesBetween`. */
interface GreatCircle {
  a: number;
  b: number;
}

/** Null for two ends in one azimuth. */
function greatCircle(from: number, turn: number, e1: number, e2: number): GreatCircle | null {
  if (turn < 1e-9) return null;
  const start = inCircle(from);
  const [t1, t2] = [tangent(e1), tangent(e2)];
  const sine = Math.sin(turn * RADIANS);
  const [startRad, endRad] = [start * RADIANS, (start + turn) * RADIANS];
  return {
    a: (t2 * Math.cos(startRad) - t1 * Math.cos(endRad)) / sine,
    b: (t1 * Math.sin(endRad) - t2 * Math.sin(startRad)) / sine,
  };
}

/** Elevation at an azimuth, degrees; `column` where that is the middle of a whole one, else -1. */
function elevationOn({ a, b }: GreatCircle, azimuth: number, column: number): number {
  const slope =
    column >= 0
      ? a * COLUMN_SINE[column] + b * COLUMN_COSINE[column]
      : a * Math.sin(azimuth * RADIANS) + b * Math.cos(azimuth * RADIANS);
  return Math.atan(slope) * DEGREES;
}

const inCircle = (azimuth: number) => azimuth - 360 * Math.floor(azimuth / 360);

function middleRad(column: number): number {
  return (column + 0.5) * DRAW_COLUMN_WIDTH * RADIANS;
}

const tangent = (elevation: number) =>
  Math.tan((elevation > HIGHEST ? HIGHEST : elevation < -HIGHEST ? -HIGHEST : elevation) * RADIANS);
