import type { HorizonProfile } from './horizon-profile.ts';

/** Which obstructions of a profile stand, one entry each; absent means all. */
export type Standing = readonly boolean[];

/**
 * What a set of obstructions takes from each slice of a profile: spans of elevation that do not overlap, each with the
 * share of light lost in every month. Where different obstructions stand behind each other their transmittances multiply.
 */
export interface BlockedSpans {
  readonly profile: HorizonProfile;
  /** First span of each slice of the profile, one more entry than slices. */
  readonly first: Uint32Array;
  readonly low: Float64Array;
  readonly high: Float64Array;
  /** Row of each span in `lost`. */
  readonly row: Uint16Array;
  /** Share of light lost, [row · 12 + month]. */
  readonly lost: Float64Array;
}

/** Spans that the standing obstructions block. */
export function blockedSpans(profile: HorizonProfile, standing?: Standing): BlockedSpans {
  const slices = profile.sliceColumn.length;
  const spans = new SpanList(profile);
  const first = new Uint32Array(slices + 1);
  const here: number[] = [];
  for (let slice = 0; slice < slices; slice++) {
    first[slice] = spans.count;
    here.length = 0;
    for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
      if (!standing || standing[profile.intervalObstruction[k]]) here.push(k);
    if (here.length === 1) spans.addSingle(here[0]);
    else if (here.length > 1) spans.addOverlapping(here);
  }
  first[slices] = spans.count;
  return { profile, first, ...spans.arrays() };
}

class SpanList {
  count = 0;
  private readonly low: Float64Array;
  private readonly high: Float64Array;
  private readonly row: Uint16Array;
  private readonly lost: number[];
  private readonly rowOfSet = new Map<string, number>();

  constructor(private readonly profile: HorizonProfile) {
    const room = 2 * profile.low.length; // n intervals have 2n ends, so under 2n spans between them
    this.low = new Float64Array(room);
    this.high = new Float64Array(room);
    this.row = new Uint16Array(room);
    this.lost = Array.from(profile.transmittance, (passes) => 1 - passes);
  }

  addSingle(interval: number): void {
    const { low, high, intervalObstruction } = this.profile;
    this.add(low[interval], high[interval], intervalObstruction[interval]);
  }

  addOverlapping(intervals: readonly number[]): void {
    const { low, high, intervalObstruction } = this.profile;
    const ends = [...new Set(intervals.flatMap((k) => [low[k], high[k]]))].sort((a, b) => a - b);
    for (let i = 1; i < ends.length; i++) {
      const [from, to] = [ends[i - 1], ends[i]];
      const covering = intervals
        .filter((k) => low[k] <= from && high[k] >= to)
        .map((k) => intervalObstruction[k]);
      if (covering.length > 0) this.add(from, to, this.rowOf([...new Set(covering)]));
    }
  }

  private rowOf(obstructions: number[]): number {
    if (obstructions.length === 1) return obstructions[0];
    const key = obstructions.sort((a, b) => a - b).join();
    let row = this.rowOfSet.get(key);
    if (row === undefined) {
      row = this.lost.length / 12;
      this.rowOfSet.set(key, row);
      for (let month = 0; month < 12; month++) {
        const passes = obstructions.reduce((left, o) => left * this.profile.transmittance[o * 12 + month], 1);
        this.lost.push(1 - passes);
      }
    }
    return row;
  }

  private add(low: number, high: number, row: number): void {
    this.low[this.count] = low;
    this.high[this.count] = high;
    this.row[this.count++] = row;
  }

  arrays() {
    return {
      low: this.low.subarray(0, this.count),
      high: this.high.subarray(0, this.count),
      row: this.row.subarray(0, this.count),
      lost: Float64Array.from(this.lost),
    };
  }
}
