import type { SolarTimes } from '../core/solar-position/solar-times.ts';
import { solarTimes } from '../core/solar-position/solar-times.ts';
import { clockTime, isTimeZone } from '../core/solar-position/time-zone.ts';
import { UsageError } from './command.ts';
import { instantOf } from './instants.ts';
import { table } from './table.ts';

/** What the sun does in one local calendar day, for `sun --day`. */
export interface SunDay {
  day: string;
  timeZone: string;
  latitude: number;
  longitude: number;
  kind: SolarTimes['kind'];
  /** UTC; null where the day has none. */
  sunrise: string | null;
  solarNoon: string | null;
  sunset: string | null;
  /** Minutes with the sun up. */
  daylight: number;
  /** Apparent less mean solar time, minutes. */
  equationOfTime: number;
}

/** Throws UsageError for a day or a time zone that is none. */
export function sunDay(day: string, timeZone: string, latitude: number, longitude: number): SunDay {
  const parts = /^(\d{4})-(\d\d)-(\d\d)$/.exec(day);
  if (!parts || instantOf(day) === null)
    throw new UsageError(`--day must be a day such as 2026-06-21, got "${day}"`);
  if (!isTimeZone(timeZone))
    throw new UsageError(`--time-zone must be an IANA name such as Europe/Lisbon, got "${timeZone}"`);
  const [year, month, date] = parts.slice(1).map(Number);
  const times = solarTimes({ year, month, day: date }, timeZone, latitude, longitude);
  if (!times) throw new UsageError(`${timeZone} left out the day ${day}; give another.`);
  const { kind, solarNoonMs, daylight, equationOfTime } = times;
  const utc = (timeMs: number | null) => (timeMs === null ? null : new Date(timeMs).toISOString());
  return {
    day,
    timeZone,
    latitude,
    longitude,
    kind,
    sunrise: utc('sunriseMs' in times ? times.sunriseMs : null),
    solarNoon: utc(solarNoonMs),
    sunset: utc('sunsetMs' in times ? times.sunsetMs : null),
    daylight,
    equationOfTime,
  };
}

const SENTENCES: Record<SolarTimes['kind'], string> = {
  'rises-and-sets': 'The sun rises and sets.',
  'rises-only': 'The sun rises and does not set on this day.',
  'sets-only': 'The sun sets and does not rise again on this day.',
  'up-all-day': 'Polar day: the sun does not set.',
  'down-all-day': 'Polar night: the sun does not rise.',
};

export function sunDayText(day: SunDay): string {
  const { timeZone, kind, sunrise, solarNoon, sunset, daylight, equationOfTime } = day;
  const clock = (utc: string | null) => {
    if (utc === null) return 'none';
    const { hour, minute, second } = clockTime(Date.parse(utc), timeZone);
    return [hour, minute, second].map((part) => String(part).padStart(2, '0')).join(':');
  };
  const minutes = Math.round(daylight);
  const rows = [
    ['sunrise', clock(sunrise)],
    ['solar noon', clock(solarNoon)],
    ['sunset', clock(sunset)],
    ['daylight', `${Math.floor(minutes / 60)} h ${minutes % 60} min`],
    ['equation of time', `${equationOfTime.toFixed(1)} min`],
  ];
  const place = `${day.day} at latitude ${day.latitude}, longitude ${day.longitude}`;
  return `${place}. ${SENTENCES[kind]}\n\n${table([{ head: '' }, { head: `clock, ${timeZone}`, number: true }], rows)}`;
}
