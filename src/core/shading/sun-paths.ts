import { DEGREES, safeAsin } from '../angles/angles.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import { dayOf } from '../solar-position/sun-track.ts';

/** Height of an elevation bin, degrees. */
export const BIN = 0.1;
/** A step that turns further than this is followed along the sky instead of straight over azimuth, degrees. */
const WIDEST_TURN = 10;

/**
 * Where the sun goes, cut for a sky map: every step with the sun up is a list of pieces, each inside one column of
 * azimuth, with the elevations it spans and its share of the step. The pieces do not depend on a plane or a climate.
 */
export interface SunPaths {
  readonly track: SunTrack;
  /** Steps with the sun up for some part. */
  readonly step: Uint32Array;
  /** First piece of each of those, one more entry. */
  readonly pieceFirst: Uint32Array;
  /** Strip of each piece: column · 12 + month. */
  readonly pieceStrip: Uint16Array;
  readonly pieceLow: Float32Array;
  readonly pieceHigh: Float32Array;
  /** Share of the step's time; over a step with the sun wholly up they sum to 1. */
  readonly pieceShare: Float32Array;
}

/** Cuts the year of a track into pieces. */
export function sunPaths(track: SunTrack): SunPaths {
  const pieces = new PieceList(track);
  for (let step = 0; step < track.steps; step++)
    if (track.elevation[step] > 0 || track.elevation[step + 1] > 0) pieces.follow(step);
  return pieces.done();
}

class PieceList {
  private steps = 0;
  private pieces = 0;
  private readonly step: Uint32Array;
  private readonly first: Uint32Array;
  private strip: Uint16Array;
  private low: Float32Array;
  private high: Float32Array;
  private share: Float32Array;
  private month = 0;

  constructor(private readonly track: SunTrack) {
    const room = track.steps * 2;
    this.step = new Uint32Array(track.steps);
    this.first = new Uint32Array(track.steps + 1);
    this.strip = new Uint16Array(room);
    this.low = new Float32Array(room);
    this.high = new Float32Array(room);
    this.share = new Float32Array(room);
  }

  follow(step: number): void {
    const { track } = this;
    this.step[this.steps] = step;
    this.month = track.monthOfDay[dayOf(track, step)];
    let [a, b] = [track.azimuth[step], track.azimuth[step + 1]];
    let [e, f] = [track.elevation[step], track.elevation[step + 1]];
    let turn = shorter(b - a);
    let whole = 1;
    if (e < 0 || f < 0) {
      const up = e < 0 ? f / (f - e) : e / (e - f);
      if (e < 0) [a, e] = [b - turn * up, 0];
      else [b, f] = [a + turn * up, 0];
      turn *= up;
      whole = up;
    }
    if (Math.abs(turn) > WIDEST_TURN) this.followCurve(step, Math.ceil(Math.abs(turn) / WIDEST_TURN) * 4);
    else this.followStraight(a, turn, e, f, whole);
    this.first[++this.steps] = this.pieces;
  }

  /** Near the zenith azimuth runs away: go along the chord between the ends in small parts. */
  private followCurve(step: number, parts: number): void {
    const { east, north, up } = this.track;
    let [azimuth, elevation] = [NaN, NaN];
    for (let k = 0; k <= parts; k++) {
      const share = k / parts;
      const at = (values: Float32Array) => values[step] + share * (values[step + 1] - values[step]);
      const [x, y, z] = [at(east), at(north), at(up)];
      const nextAzimuth = Math.atan2(x, y) * DEGREES;
      const nextElevation = safeAsin(z / Math.sqrt(x * x + y * y + z * z)) * DEGREES;
      if (k > 0 && elevation >= 0 && nextElevation >= 0)
        this.followStraight(azimuth, shorter(nextAzimuth - azimuth), elevation, nextElevation, 1 / parts);
      [azimuth, elevation] = [nextAzimuth, nextElevation];
    }
  }

  private followStraight(azimuth: number, turn: number, low: number, high: number, whole: number): void {
    const from = turn < 0 ? azimuth + turn : azimuth;
    const width = Math.abs(turn);
    const [atFrom, atTo] = turn < 0 ? [high, low] : [low, high];
    const firstColumn = Math.floor(from / COLUMN_WIDTH);
    const lastColumn = Math.floor((from + width) / COLUMN_WIDTH);
    const rise = width > 0 ? (atTo - atFrom) / width : 0;
    if (firstColumn === lastColumn) return this.add(firstColumn, low, high, whole);
    for (let column = firstColumn; column <= lastColumn; column++) {
      const start = Math.max(from, column * COLUMN_WIDTH);
      const end = Math.min(from + width, (column + 1) * COLUMN_WIDTH);
      if (end > start)
        this.add(
          column,
          atFrom + rise * (start - from),
          atFrom + rise * (end - from),
          (whole * (end - start)) / width,
        );
    }
  }

  private add(column: number, a: number, b: number, share: number): void {
    if (this.pieces === this.strip.length) this.grow();
    const i = this.pieces++;
    this.strip[i] = ((column + COLUMNS) % COLUMNS) * 12 + this.month;
    this.low[i] = a < b ? a : b;
    this.high[i] = a < b ? b : a;
    this.share[i] = share;
  }

  private grow(): void {
    const room = this.strip.length * 2;
    const copy = <T extends Uint16Array | Float32Array>(to: T, from: T): T => {
      to.set(from);
      return to;
    };
    this.strip = copy(new Uint16Array(room), this.strip);
    this.low = copy(new Float32Array(room), this.low);
    this.high = copy(new Float32Array(room), this.high);
    this.share = copy(new Float32Array(room), this.share);
  }

  done(): SunPaths {
    return {
      track: this.track,
      step: this.step.subarray(0, this.steps),
      pieceFirst: this.first.subarray(0, this.steps + 1),
      pieceStrip: this.strip.subarray(0, this.pieces),
      pieceLow: this.low.subarray(0, this.pieces),
      pieceHigh: this.high.subarray(0, this.pieces),
      pieceShare: this.share.subarray(0, this.pieces),
    };
  }
}

const shorter = (turn: number) => (turn > 180 ? turn - 360 : turn <= -180 ? turn + 360 : turn);
