import { localDay } from '../solar-position/local-day.ts';
import type { CalendarDay } from '../solar-position/local-day.ts';
import type { Site } from '../survey/survey.ts';
import { isUsable, shadowSun } from './shadow-error.ts';

/** Unix times [ms]. */
export interface UsableHours {
  fromMs: number;
  toMs: number;
}

const STEP_MS = 5 * 60_000;

/**
 * The spans of a local calendar day in which a check by shadow would be accepted, in order, to the minute: the sun high
 * enough to throw a shadow, and not so high that shadow and clock errors pass the limit. None on a day without.
 * Throws RangeError for a date in no calendar and for an unknown zone.
 */
export function usableShadowHours(day: CalendarDay, site: Site): UsableHours[] {
  const span = localDay(day, site.timeZone);
  if (!span) return [];
  const usable = (timeMs: number) => isUsable(shadowSun(timeMs, site));
  const hours: UsableHours[] = [];
  let fromMs = usable(span.startMs) ? span.startMs : null;
  for (let timeMs = span.startMs; timeMs < span.endMs;) {
    const nextMs = Math.min(timeMs + STEP_MS, span.endMs);
    if (usable(nextMs) !== (fromMs !== null)) {
      const changeMs = changeBetween(usable, timeMs, nextMs);
      if (fromMs !== null) hours.push({ fromMs, toMs: changeMs });
      fromMs = fromMs === null ? changeMs : null;
    }
    timeMs = nextMs;
  }
  if (fromMs !== null) hours.push({ fromMs, toMs: span.endMs });
  return hours.filter(({ fromMs, toMs }) => toMs > fromMs);
}

/** The instant at which the answer changes, on the side where the sun is usable, to the second. */
function changeBetween(usable: (timeMs: number) => boolean, lowMs: number, highMs: number): number {
  const before = usable(lowMs);
  let [low, high] = [lowMs, highMs];
  while (high - low > 1000) {
    const middle = Math.round((low + high) / 2);
    if (usable(middle) === before) low = middle;
    else high = middle;
  }
  return before ? low : high;
}
