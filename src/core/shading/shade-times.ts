import type { HorizonProfile } from '../horizon/horizon-profile.ts';
import type { PlaneFacing } from '../horizon/sky-view.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import { DAYS_IN_MONTH, TRACK_DAYS, TRACK_YEAR } from '../solar-position/sun-track.ts';
import { utcOffsetMinutes } from '../solar-position/time-zone.ts';
import type { DaySpans } from './shaded-minutes.ts';
import { DAY_MINUTES, shadedMinutes, solarMidnight } from './shaded-minutes.ts';

/** Less shade than this on a day is not worth naming the day for, minutes. */
export const LEAST_OF_A_DAY = 10;
/** Gaps and spans shorter than this are not worth a clock time, minutes. */
export const SHORTEST_SPAN = 5;
/** Fewer days than this without shade do not part two stretches of days. */
export const SHORTEST_BREAK = 7;

/** When one obstruction stands between the sun and a plane, in a year of `TRACK_YEAR`. */
export interface ObstructionTimes {
  obstruction: string;
  /** Minutes of each day. */
  minutes: Uint16Array;
  /** Stretches of days with shade worth naming, in order; one over new year begins in autumn and comes last. */
  stretches: DayStretch[];
  /** By the clock, on the 21st of each month. */
  months: ClockSpan[][];
}

export interface DayStretch {
  from: DayOfYear;
  to: DayOfYear;
  /** It has no beginning and no end. */
  wholeYear: boolean;
  /** The day with the most shade, and its hours. */
  longest: DayOfYear & { minutes: number; spans: ClockSpan[] };
}

export interface DayOfYear {
  /** 0 to 11. */
  month: number;
  /** 1 to 31. */
  day: number;
}

/** Minutes after midnight as the clocks show them, summer time included; `to` runs past 1440 over midnight. */
export interface ClockSpan {
  /** 0 to 1439. */
  from: number;
  /** Over `from`, by a whole day at most. */
  to: number;
}

/**
 * When each obstruction of a station's profile shades a plane: stretches of days, and hours by the clocks of an IANA zone.
 * The obstructions are each taken alone: behind another the hours are the same. Minutes as in `shadedMinutes`.
 * Throws RangeError for a zone the platform does not know.
 */
export function shadeTimes(
  track: SunTrack,
  facing: PlaneFacing,
  profile: HorizonProfile,
  timeZone: string,
): ObstructionTimes[] {
  const clock = clockOf(track, timeZone);
  return shadedMinutes(track, facing, profile).map((days, i): ObstructionTimes => {
    const minutes = Uint16Array.from(days, lengthOf);
    const hours = (day: number) => worthNaming(days[day]).map((span) => clock(day, span));
    return {
      obstruction: profile.obstructionIds[i],
      minutes,
      stretches: stretchesOf(minutes).map(([from, to]) => {
        const longest = longestOf(minutes, from, to);
        return {
          from: dayOfYear(from),
          to: dayOfYear(to),
          wholeYear: to - from + 1 === TRACK_DAYS,
          longest: { ...dayOfYear(longest), minutes: minutes[longest], spans: hours(longest) },
        };
      }),
      months: DAYS_IN_MONTH.map((_, month) => hours(dayNumber(month, 21))),
    };
  });
}

/** Number of a day in the year, from 0; month 0 to 11, day from 1. */
export const dayNumber = (month: number, day: number): number =>
  DAYS_IN_MONTH.slice(0, month).reduce((sum, days) => sum + days, 0) + day - 1;

/** The date of a day by its number; numbers past the year go on in the next. */
export function dayOfYear(number: number): DayOfYear {
  let day = ((number % TRACK_DAYS) + TRACK_DAYS) % TRACK_DAYS;
  let month = 0;
  while (day >= DAYS_IN_MONTH[month]) day -= DAYS_IN_MONTH[month++];
  return { month, day: day + 1 };
}

function lengthOf(spans: DaySpans): number {
  let sum = 0;
  for (let i = 0; i < spans.length; i += 2) sum += spans[i + 1] - spans[i];
  return sum;
}

/** Spans of a day without gaps and pieces too short to name; one over solar midnight in one piece. */
function worthNaming(spans: DaySpans): [number, number][] {
  const joined: [number, number][] = [];
  for (let i = 0; i < spans.length; i += 2) {
    const last = joined[joined.length - 1];
    if (last && spans[i] - last[1] < SHORTEST_SPAN) last[1] = spans[i + 1];
    else joined.push([spans[i], spans[i + 1]]);
  }
  const [first, last] = [joined[0], joined[joined.length - 1]];
  if (joined.length > 1 && first[0] === 0 && last[1] === DAY_MINUTES) {
    joined.shift();
    last[1] += first[1];
  }
  return joined.filter(([from, to]) => to - from >= SHORTEST_SPAN);
}

/** First and last day of each stretch; `to` runs past the year where the stretch goes on in the next. */
function stretchesOf(minutes: Uint16Array): [from: number, to: number][] {
  const found: [number, number][] = [];
  minutes.forEach((shade, day) => {
    if (shade < LEAST_OF_A_DAY) return;
    const last = found[found.length - 1];
    if (last && day - last[1] <= SHORTEST_BREAK) last[1] = day;
    else found.push([day, day]);
  });
  const [first, last] = [found[0], found[found.length - 1]];
  if (!first || first[0] + TRACK_DAYS - last[1] > SHORTEST_BREAK) return found;
  if (found.length === 1) return [[0, TRACK_DAYS - 1]];
  return [...found.slice(1, -1), [last[0], first[1] + TRACK_DAYS]];
}

function longestOf(minutes: Uint16Array, from: number, to: number): number {
  let longest = from % TRACK_DAYS;
  for (let day = from; day <= to; day++)
    if (minutes[day % TRACK_DAYS] > minutes[longest]) longest = day % TRACK_DAYS;
  return longest;
}

/** Turns minutes after a day's solar midnight into what the clocks show. */
function clockOf(track: SunTrack, timeZone: string) {
  const startMs = Date.UTC(TRACK_YEAR, 0, 1);
  const shift = solarMidnight(track);
  return (day: number, [from, to]: [number, number]): ClockSpan => {
    const standard = day * DAY_MINUTES + shift + from - track.utcOffset;
    const shown = standard + utcOffsetMinutes(startMs + standard * 60_000, timeZone);
    const minutes = ((Math.round(shown) % DAY_MINUTES) + DAY_MINUTES) % DAY_MINUTES;
    return { from: minutes, to: minutes + to - from };
  };
}
