import { CURE_WORDS, SOURCE_WORDS } from '../core/completeness/source-words.ts';
import type { AccessInterval } from '../core/shading/assessment.ts';
import { percent } from './table.ts';

/** An access with its interval, percent: "94.2 (92.9 to 95.3)". */
export const withInterval = (annual: number, interval?: Pick<AccessInterval, 'low' | 'high'>): string =>
  interval ? `${percent(annual)} (${percent(interval.low)} to ${percent(interval.high)})` : percent(annual);

/** What the interval mostly comes from, and what would shrink it. */
export function spreadText({ standardDeviation, sources }: AccessInterval): string {
  const [main] = sources;
  if (!main || standardDeviation === 0) return 'Nothing in this survey makes it unsure.';
  const points = (deviation: number) => `±${(100 * deviation).toFixed(1)}`;
  const most = `Most of the spread (${(100 * main.share).toFixed(0)} %) is ${SOURCE_WORDS[main.source]}`;
  return main.cure === null || main.standardDeviationAfter === null
    ? `${most}.`
    : `${most}; ${CURE_WORDS[main.cure]} would bring the standard deviation from ${points(standardDeviation)} to ${points(main.standardDeviationAfter)} points.`;
}
