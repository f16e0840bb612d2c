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
  readonly row: Uint32Array;
  /** Share of light lost, [row · 12 + month]. */
  readonly lost: Float64Array;
}

/**
 * Spans that the standing obstructions block; with `around`, only in slices where one of those obstructions stands,
 * which is all that taking them away can change.
 */
export function blockedSpans(
  profile: HorizonProfile,
  standing?: Standing,
  around?: ReadonlySet<number>,
): BlockedSpans {
  const slices = profile.sliceColumn.length;
  const spans = new SpanList(profile);
  const first = new Uint32Array(slices + 1);
  const here: number[] = [];
  for (let slice = 0; slice < slices; slice++) {
    first[slice] = spans.count;
    here.length = 0;
    if (around && !standsIn(profile, slice, around)) continue;
    for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
      if (!standing || standing[profile.intervalObstruction[k]]) here.push(k);
    if (here.length === 1) spans.addSingle(here[0]);
    else if (here.length > 1) spans.addOverlapping(here);
  }
  first[slices] = spans.count;
  return { profile, first, ...spans.arrays() };
}

function standsIn(profile: HorizonProfile, slice: number, obstructions: ReadonlySet<number>): boolean {
  for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
    if (obstructions.has(profile.intervalObstruction[k])) return true;
  return false;
}

class SpanList {
  count = 0;
  private readonly low: Float64Array;
  private readonly high: Float64Array;
  private readonly row: Uint32Array;
  private readonly lost: number[];
  private readonly rowOfPair = new Map<number, number>();
  private readonly ends: number[] = [];

  constructor(private readonly profile: HorizonProfile) {
    const room = 2 * profile.low.length; // n intervals have 2n ends, so under 2n spans between them
    this.low = new Float64Array(room);
    this.high = new Float64Array(room);
    this.row = new Uint32Array(room);
    this.lost = [];
    for (const passes of profile.transmittance) this.lost.push(1 - passes);
  }

  addSingle(interval: number): void {
    const { low, high, intervalObstruction } = this.profile;
    this.add(low[interval], high[interval], intervalObstruction[interval]);
  }

  /** Cuts the sky at every end of the intervals; each part between is behind those that cover it. */
  addOverlapping(intervals: readonly number[]): void {
    const { low, high, intervalObstruction } = this.profile;
    const ends = this.sortedEnds(intervals);
    for (let i = 1; i < ends.length; i++) {
      const from = ends[i - 1];
      const to = ends[i];
      if (to <= from) continue;
      let row = -1;
      for (const k of intervals)
        if (low[k] <= from && high[k] >= to)
          row = row < 0 ? intervalObstruction[k] : this.rowBehind(row, intervalObstruction[k]);
      if (row >= 0) this.add(from, to, row);
    }
  }

  private sortedEnds(intervals: readonly number[]): number[] {
    const { ends } = this;
    ends.length = 0;
    for (const k of intervals) ends.push(this.profile.low[k], this.profile.high[k]);
    for (let i = 1; i < ends.length; i++) {
      const end = ends[i];
      let j = i - 1;
      for (; j >= 0 && ends[j] > end; j--) ends[j + 1] = ends[j];
      ends[j + 1] = end;
    }
    return ends;
  }

  /** Row of what is lost where one more obstruction stands in the way of a row. */
  private rowBehind(row: number, obstruction: number): number {
    const key = row * 65536 + obstruction;
    let behind = this.rowOfPair.get(key);
    if (behind === undefined) {
      behind = this.lost.length / 12;
      this.rowOfPair.set(key, behind);
      for (let month = 0; month < 12; month++)
        this.lost.push(
          1 - (1 - this.lost[row * 12 + month]) * this.profile.transmittance[obstruction * 12 + month],
        );
    }
    return behind;
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
      lost: new Float64Array(this.lost),
    };
  }
}
