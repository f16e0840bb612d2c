import type { CalendarDay, LocalDay } from './local-day.ts';
import { equationOfTime, timeOfHourAngle } from './hour-angle.ts';
import { localDay } from './local-day.ts';
import { RISE_AND_SET_ELEVATION, solarPosition } from './solar-position.ts';

/** What the sun does in one local calendar day. Times are Unix time [ms]. */
export type SolarTimes = DayFacts &
  (
    | { kind: 'rises-and-sets'; sunriseMs: number; sunsetMs: number }
    | { kind: 'rises-only'; sunriseMs: number }
    | { kind: 'sets-only'; sunsetMs: number }
    | { kind: 'up-all-day' }
    | { kind: 'down-all-day' }
  );

export interface DayFacts extends LocalDay {
  /** When the sun crosses the meridian, at its highest; null on a day without (a clock far off the sun's). */
  solarNoonMs: number | null;
  /** Apparent less mean solar time in the middle of the day, minutes. */
  equationOfTime: number;
  /** Time with the sun up, minutes. */
  daylight: number;
  /** Every rise and set of the day in order; near the midnight sun there may be three. */
  events: SunEvent[];
}

export interface SunEvent {
  kind: 'sunrise' | 'sunset';
  timeMs: number;
}

const STEP_MS = 10 * 60_000;

/**
 * Sunrise, sunset and solar noon of a local calendar day: upper edge of the sun on a level horizon with ordinary
 * refraction, that is its centre at -50' geometric. `latitude` -90 to 90, `longitude` in degrees. Null for a day that
 * the zone left out. Where the day has a second sunset, `sunsetMs` is the one after the sunrise.
 * Throws RangeError for a date in no calendar, an unknown zone, a latitude out of range.
 * Ref: definition of the US Naval Observatory; positions as in `solarPosition`.
 */
export function solarTimes(
  date: CalendarDay,
  timeZone: string,
  latitude: number,
  longitude: number,
): SolarTimes | null {
  const day = localDay(date, timeZone);
  if (!day) return null;
  const height = (timeMs: number) =>
    solarPosition(timeMs, latitude, longitude).geometricElevation - RISE_AND_SET_ELEVATION;
  const events = crossings(height, day);
  const facts = {
    ...day,
    solarNoonMs: solarNoon(day, longitude),
    equationOfTime: equationOfTime((day.startMs + day.endMs) / 2),
    daylight: daylight(events, day, height(day.startMs) > 0),
    events,
  };
  return { ...facts, ...kindOfDay(events, height((day.startMs + day.endMs) / 2) > 0) };
}

function kindOfDay(events: SunEvent[], up: boolean) {
  const sunrise = events.find(({ kind }) => kind === 'sunrise');
  const sets = events.filter(({ kind }) => kind === 'sunset');
  const sunset = sets.find(({ timeMs }) => sunrise && timeMs > sunrise.timeMs) ?? sets[0];
  if (sunrise && sunset)
    return { kind: 'rises-and-sets', sunriseMs: sunrise.timeMs, sunsetMs: sunset.timeMs } as const;
  if (sunrise) return { kind: 'rises-only', sunriseMs: sunrise.timeMs } as const;
  if (sunset) return { kind: 'sets-only', sunsetMs: sunset.timeMs } as const;
  return { kind: up ? 'up-all-day' : 'down-all-day' } as const;
}

function solarNoon({ startMs, endMs }: LocalDay, longitude: number): number | null {
  for (const nearMs of [(startMs + endMs) / 2, startMs, endMs]) {
    const noon = timeOfHourAngle(0, longitude, nearMs);
    if (noon >= startMs && noon < endMs) return noon;
  }
  return null;
}

function daylight(events: SunEvent[], { startMs, endMs }: LocalDay, upAtStart: boolean): number {
  let total = 0;
  let upSince: number | null = upAtStart ? startMs : null;
  for (const { kind, timeMs } of events) {
    if (kind === 'sunset' && upSince !== null) total += timeMs - upSince;
    upSince = kind === 'sunrise' ? timeMs : null;
  }
  if (upSince !== null) total += endMs - upSince;
  return total / 60_000;
}

/** Where the height changes sign. Turning points are looked at too, so that a sun that only grazes is not missed. */
function crossings(height: (timeMs: number) => number, { startMs, endMs }: LocalDay): SunEvent[] {
  const events: SunEvent[] = [];
  const points = pointsToCompare(height, startMs, endMs);
  for (let i = 1; i < points.length; i++) {
    const [from, to] = [points[i - 1], points[i]];
    if (from.height > 0 === to.height > 0) continue;
    const timeMs = crossing(height, from.timeMs, to.timeMs);
    events.push({ kind: to.height > 0 ? 'sunrise' : 'sunset', timeMs });
  }
  return events;
}

interface Point {
  timeMs: number;
  height: number;
}

function pointsToCompare(height: (timeMs: number) => number, startMs: number, endMs: number): Point[] {
  const at = (timeMs: number): Point => ({ timeMs, height: height(timeMs) });
  const steps = Math.ceil((endMs - startMs) / STEP_MS);
  const even = Array.from({ length: steps + 1 }, (_, i) => at(Math.min(startMs + i * STEP_MS, endMs)));
  const points: Point[] = [];
  for (let i = 0; i < even.length; i++) {
    const [before, here, after] = [even[i - 1], even[i], even[i + 1]];
    const turns = before && after && here.height > before.height === here.height > after.height;
    if (turns)
      points.push(at(turningPoint(height, before.timeMs, after.timeMs, here.height > before.height)));
    points.push(here);
  }
  return points.sort((a, b) => a.timeMs - b.timeMs);
}

/** Time of the highest or lowest point between two instants, by golden section, to the second. */
function turningPoint(
  height: (timeMs: number) => number,
  from: number,
  to: number,
  highest: boolean,
): number {
  const GOLDEN = 0.618034;
  let [low, high] = [from, to];
  while (high - low > 1000) {
    const left = high - GOLDEN * (high - low);
    const right = low + GOLDEN * (high - low);
    if (height(left) > height(right) === highest) high = right;
    else low = left;
  }
  return (low + high) / 2;
}

/** Where a height of different sign at both ends is zero, by halving, to 10 ms. */
function crossing(height: (timeMs: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  const upAtLow = height(low) > 0;
  while (high - low > 10) {
    const middle = (low + high) / 2;
    if (height(middle) > 0 === upAtLow) low = middle;
    else high = middle;
  }
  return Math.round((low + high) / 2);
}
