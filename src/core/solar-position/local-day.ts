import { utcOffsetMinutes } from './time-zone.ts';

export interface CalendarDay {
  year: number;
  /** 1 to 12. */
  month: number;
  day: number;
}

/** From the first instant of a local day up to the first of the next, Unix time [ms]. */
export interface LocalDay {
  startMs: number;
  endMs: number;
}

const DAY_MS = 86_400_000;
/** No zone is further from UTC than this. */
const FURTHEST_MS = 1.5 * DAY_MS;

/**
 * When a calendar day begins and ends where the clocks of an IANA zone are followed: 23, 24 or 25 hours, in a few
 * zones other lengths. Null for a day that the zone left out when it crossed the date line (Samoa, 30 December 2011).
 * Throws RangeError for a date that is in no calendar and for an unknown zone.
 */
export function localDay({ year, month, day }: CalendarDay, timeZone: string): LocalDay | null {
  const midnight = Date.UTC(year, month - 1, day);
  const made = new Date(midnight);
  if (made.getUTCFullYear() !== year || made.getUTCMonth() !== month - 1 || made.getUTCDate() !== day)
    throw new RangeError(`no such date: ${year}-${month}-${day}`);
  const startMs = instantOfMidnight(midnight, timeZone);
  const endMs = instantOfMidnight(midnight + DAY_MS, timeZone);
  return endMs > startMs ? { startMs, endMs } : null;
}

/** The instant a zone's clocks pass midnight; `midnight` is that clock time written as if it were UTC. */
function instantOfMidnight(midnight: number, timeZone: string): number {
  const offsetMs = (timeMs: number) => utcOffsetMinutes(timeMs, timeZone) * 60_000;
  const before = offsetMs(midnight - FURTHEST_MS);
  const after = offsetMs(midnight + FURTHEST_MS);
  // set back over midnight, clocks pass it twice: the day begins at the second time, `after`
  for (const offset of [after, before]) if (offsetMs(midnight - offset) === offset) return midnight - offset;
  return firstInstantPast(midnight, offsetMs);
}

/** Where clocks jump over midnight, the instant of the jump, to the second. */
function firstInstantPast(midnight: number, offsetMs: (timeMs: number) => number): number {
  let low = (midnight - FURTHEST_MS) / 1000;
  let high = (midnight + FURTHEST_MS) / 1000;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (middle * 1000 + offsetMs(middle * 1000) >= midnight) high = middle;
    else low = middle;
  }
  return high * 1000;
}
