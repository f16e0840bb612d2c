import { turnBetween } from '../angles/angles.ts';

/** One look at a run's offset: true azimuth less azimuth in the frame, degrees. */
export interface OffsetSeen {
  atMs: number;
  offset: number;
  standardDeviation: number;
}

/** How fast an offset changes, degrees a minute. */
export interface OffsetRate {
  value: number;
  standardDeviation: number;
}

/** An offset with its drift; both err independently at `atMs`. */
export interface FittedOffset {
  offset: number;
  standardDeviation: number;
  atMs: number;
  ratePerMinute: number;
  ratePerMinuteDeviation: number;
  /** How far the looks disagree, as a multiple of what their deviations allow; 1 or less is well. */
  disagreement: number;
}

/**
 * Weighted least squares of an offset and its rate, the rate held by what is known of it beforehand. At the weighted
 * mean time of the looks the two do not depend on each other. Where the looks disagree beyond their deviations, the
 * offset's deviation is widened by as much. Throws RangeError for no looks.
 * Ref: Birge (1932), Physical Review 40, 207: the ratio that widens.
 */
export function fitOffset(seen: readonly OffsetSeen[], rate: OffsetRate): FittedOffset {
  if (seen.length === 0) throw new RangeError('seen must hold at least one look at the offset, got none');
  const base = seen[0].offset;
  const looks = seen.map(({ atMs, offset, standardDeviation }) => ({
    minutes: (atMs - seen[0].atMs) / 60_000,
    value: turnBetween(base, offset),
    weight: 1 / standardDeviation ** 2,
  }));
  const sum = (of: (look: (typeof looks)[number]) => number) =>
    looks.reduce((total, look) => total + look.weight * of(look), 0);
  const weight = sum(() => 1);
  const minutes = sum((look) => look.minutes) / weight;
  const value = sum((look) => look.value) / weight;
  const held = 1 / Math.max(rate.standardDeviation, 1e-9) ** 2;
  const leverage = held + sum((look) => (look.minutes - minutes) ** 2);
  const slope =
    (held * rate.value + sum((look) => (look.minutes - minutes) * (look.value - value))) / leverage;
  const misfit = sum((look) => (look.value - value - slope * (look.minutes - minutes)) ** 2);
  const disagreement = looks.length > 1 ? Math.sqrt(misfit / (looks.length - 1)) : 0;
  return {
    offset: turnBetween(0, base + value),
    standardDeviation: Math.max(1, disagreement) / Math.sqrt(weight),
    atMs: seen[0].atMs + minutes * 60_000,
    ratePerMinute: slope,
    ratePerMinuteDeviation: 1 / Math.sqrt(leverage),
    disagreement,
  };
}
