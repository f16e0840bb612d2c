import type { MonthlyShares } from './assessment.ts';

/** Less light in a month than this is a month without sun, kWh/m2. */
export const DARK_MONTH = 1e-4;

/** Shares of two rows of twelve months; null where the month is dark. */
export const monthlyShares = (light: readonly number[], whole: readonly number[]): MonthlyShares =>
  whole.map((all, month) => (all > DARK_MONTH ? Math.min(1, light[month] / all) : null));
