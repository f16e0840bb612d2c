/** One published value, recomputed. */
export interface CheckRow {
  /** What is computed, and where and when. */
  name: string;
  quantity: string;
  unit: string;
  /** Decimals to show. */
  decimals: number;
  /** What the source prints. */
  published: number;
  computed: number;
  /** Computed less published. */
  difference: number;
  /** Largest difference that still counts as agreement. */
  allowed: number;
  ok: boolean;
}

export interface SelfCheckGroup {
  id: string;
  title: string;
  /** Where the published values stand. */
  source: string;
  /** Why the allowed difference is what it is. */
  allowance: string;
  rows: CheckRow[];
}

type Compared = Omit<CheckRow, 'difference' | 'ok'>;

const judged = (row: Compared, difference: number): CheckRow => ({
  ...row,
  difference,
  ok: Math.abs(difference) <= row.allowed, // false for NaN
});

/** A row from its two values. A value that is not finite never agrees. */
export const checkValue = (row: Compared): CheckRow => judged(row, row.computed - row.published);

/** The same for directions around the circle, degrees. */
export function checkAzimuth(row: Compared): CheckRow {
  const turn = row.computed - row.published;
  return judged(row, turn - 360 * Math.round(turn / 360));
}
