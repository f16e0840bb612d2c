import { turnBetween } from '../../core/angles/angles.ts';
import { solarPosition } from '../../core/solar-position/solar-position.ts';
import { standardOffsetMinutes } from '../../core/solar-position/time-zone.ts';
import type { Site } from '../../core/survey/survey.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';
import type { SkyPlace } from './sky-frame.ts';

/** Where the sun goes on one day. */
export interface DayLine {
  /** Months whose 21st share the line within half a degree. */
  label: string;
  path: SkyPlace[][];
}

/** Where the sun stands at one hour of standard time through the year. */
export interface HourLine {
  hour: number;
  path: SkyPlace[][];
}

const YEAR = 2025;
const MINUTE_MS = 60_000;
const DAY_MINUTES = 1440;
/** The 21st of December to June; the later month passes almost the same way. The first named is drawn. */
const DAYS = [[5], [11], [2, 8], [3, 7], [1, 9], [4, 6], [0, 10]];
/** Near the zenith the azimuth runs; points further apart than this get one between, degrees. */
const WIDEST = 4;

type SunAt = (minutes: number) => SkyPlace;

function sunOver({ latitude, longitude, altitude }: Site, startMs: number): SunAt {
  return (minutes) => {
    const sun = solarPosition(startMs + minutes * MINUTE_MS, latitude, longitude, altitude);
    return { azimuth: sun.solarAzimuth, elevation: sun.apparentElevation };
  };
}

/** The sun's way on the 21st of each month, solstices first. */
export function dayLines(site: Site, { months }: PictureWords = ENGLISH): DayLine[] {
  // solar midnight to solar midnight, so that a day is one unbroken arc wherever the clocks stand
  const midnight = -site.longitude * 4;
  return DAYS.map((alike) => {
    const sun = sunOver(site, Date.UTC(YEAR, alike[0], 21));
    const at = Array.from({ length: 145 }, (_, i) => midnight + i * 10);
    return { label: alike.map((month) => months[month]).join(' '), path: partsUp(at, sun) };
  });
}

/** The sun at each whole hour of local standard time, through the year: a narrow figure of eight. */
export function hourLines(site: Site): HourLine[] {
  const offset = standardOffsetMinutes(site.timeZone, YEAR);
  return Array.from({ length: 24 }, (_, hour) => {
    const sun = sunOver(site, Date.UTC(YEAR, 0, 1));
    const at = Array.from({ length: 74 }, (_, i) => hour * 60 - offset + Math.min(i * 5, 365) * DAY_MINUTES);
    return { hour, path: partsUp(at, sun) };
  }).filter(({ path }) => path.length > 0);
}

/** Stretches of a row of times with the sun up, cut at the horizon. */
function partsUp(times: readonly number[], sun: SunAt): SkyPlace[][] {
  const parts: SkyPlace[][] = [];
  let part: SkyPlace[] | null = null;
  let [lastTime, last] = [times[0], sun(times[0])];
  if (last.elevation >= 0) parts.push((part = [last]));
  for (const time of times.slice(1)) {
    const here = sun(time);
    if (last.elevation < 0 !== here.elevation < 0) {
      const share = last.elevation / (last.elevation - here.elevation);
      const edge = { azimuth: last.azimuth + share * turnBetween(last.azimuth, here.azimuth), elevation: 0 };
      if (part) part.push(edge);
      else parts.push((part = [edge]));
    }
    if (here.elevation < 0) part = null;
    else if (part) {
      if (last.elevation >= 0 && time - lastTime < DAY_MINUTES)
        between(part, lastTime, last, time, here, sun, 6);
      part.push(here);
    }
    [lastTime, last] = [time, here];
  }
  return parts.filter(({ length }) => length > 1);
}

function between(
  part: SkyPlace[],
  fromTime: number,
  from: SkyPlace,
  toTime: number,
  to: SkyPlace,
  sun: SunAt,
  depth: number,
): void {
  if (depth === 0 || Math.abs(turnBetween(from.azimuth, to.azimuth)) < WIDEST) return;
  const time = (fromTime + toTime) / 2;
  const middle = sun(time);
  between(part, fromTime, from, time, middle, sun, depth - 1);
  part.push(middle);
  between(part, time, middle, toTime, to, sun, depth - 1);
}
