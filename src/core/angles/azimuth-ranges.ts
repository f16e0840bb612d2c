import { fullCircle } from './angles.ts';

/** A range of azimuth, degrees, clockwise from `from` to `to`, over north where `to` is below `from`. */
export type AzimuthRange = readonly [from: number, to: number];

/** Gaps narrower than this are rounding, degrees. */
const NARROWEST_GAP = 1e-9;

/** Ranges of azimuths 0 to 360 cut at north and joined where they touch, in order. */
export function unitedRanges(ranges: readonly AzimuthRange[]): [number, number][] {
  const cut = ranges.flatMap(([from, to]): [number, number][] =>
    from <= to
      ? [[from, to]]
      : [
          [from, 360],
          [0, to],
        ],
  );
  const joined: [number, number][] = [];
  for (const [from, to] of cut.sort((a, b) => a[0] - b[0])) {
    const last = joined[joined.length - 1];
    if (last && from <= last[1]) last[1] = Math.max(last[1], to);
    else joined.push([from, to]);
  }
  return joined;
}

/**
 * What ranges of azimuths 0 to 360 leave of the circle, in order from north; the one over north comes last and in one
 * piece, its `to` past 360.
 */
export function rangesBetween(ranges: readonly AzimuthRange[]): [number, number][] {
  const gaps: [number, number][] = [];
  let reached = 0;
  for (const [from, to] of [...unitedRanges(ranges).filter(([from, to]) => to > from), [360, 360]]) {
    if (from - reached > NARROWEST_GAP) gaps.push([reached, from]);
    reached = to;
  }
  const [first, last] = [gaps[0], gaps[gaps.length - 1]];
  if (gaps.length < 2 || first[0] > 0 || last[1] < 360) return gaps;
  return [...gaps.slice(1, -1), [last[0], 360 + first[1]]];
}

/** Degrees clockwise from one azimuth to another; where they are the same, the whole circle. */
export const widthOf = (from: number, to: number): number => fullCircle(to - from) || 360;

/** Whether an azimuth lies in a range [degrees, clockwise; `to` may run past 360]. */
export const isBetween = (azimuth: number, [from, to]: AzimuthRange): boolean =>
  fullCircle(azimuth - from) < to - from;
