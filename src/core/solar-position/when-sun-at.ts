import { DEGREES, RADIANS, safeAsin } from '../angles/angles.ts';
import { DAY_MS, timeOfHourAngle } from './hour-angle.ts';
import { localDay } from './local-day.ts';
import { geometricOf, standardPressure } from './refraction.ts';
import { PARALLAX, RISE_AND_SET_ELEVATION } from './solar-position.ts';
import { sunEquatorial } from './sun-equatorial.ts';
import type { ClockTime } from './time-zone.ts';
import { clockTime } from './time-zone.ts';

export interface SkyDirection {
  /** Degrees clockwise from true north. */
  azimuth: number;
  /** As seen, degrees. */
  apparentElevation: number;
}

export interface ClockSite {
  latitude: number;
  longitude: number;
  /** Metres above sea level; absent means 0. */
  altitude?: number;
  /** IANA name. */
  timeZone: string;
}

/** The sun stands nearest to the direction at this instant. */
export interface SunVisit {
  timeMs: number;
  clock: ClockTime;
}

/** Half the width of the sun's disc, degrees: a direction the disc covers counts as reached. */
const DISC_RADIUS = 0.267;

/**
 * The dates and clock times of a calendar year at which the sun stands in a direction: two where its declination is
 * reached once each half year, one at a solstice, none where the sun never comes. Each is the day on which the sun
 * passes nearest, so it is at most half a day's change of declination off (0.2° at the equinoxes).
 * Throws RangeError for an azimuth or elevation that is not finite, an elevation outside -90 to 90, an unknown zone.
 * Ref: Meeus, Astronomical Algorithms, 2nd ed. (1998), chapter 13 (from the horizon to declination and hour angle).
 */
export function datesWhenSunAt(direction: SkyDirection, site: ClockSite, year: number): SunVisit[] {
  const sought = equatorialOf(direction, site);
  if (!sought) return [];
  const passages = passagesOfYear(sought.hourAngle, site, year);
  const off = passages.map((timeMs) => sunEquatorial(timeMs).declination - sought.declination);
  const visits = nearestPassages(off).map((i) => passages[i]);
  return visits.sort((a, b) => a - b).map((timeMs) => ({ timeMs, clock: clockTime(timeMs, site.timeZone) }));
}

/** Declination and hour angle [radians] of a direction; null below where the sun is up. */
function equatorialOf({ azimuth, apparentElevation }: SkyDirection, { latitude, altitude = 0 }: ClockSite) {
  if (!Number.isFinite(azimuth)) throw new RangeError(`azimuth must be finite, got ${azimuth}`);
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  const geometric = geometricOf(apparentElevation, standardPressure(altitude));
  if (geometric < RISE_AND_SET_ELEVATION) return null;
  const up = (geometric + PARALLAX * Math.cos(geometric * RADIANS)) * RADIANS;
  const phi = latitude * RADIANS;
  const north = Math.cos(up) * Math.cos(azimuth * RADIANS);
  const declination = safeAsin(Math.sin(phi) * Math.sin(up) + Math.cos(phi) * north);
  const westward = -Math.cos(up) * Math.sin(azimuth * RADIANS);
  return {
    declination,
    hourAngle: Math.atan2(westward, Math.sin(up) * Math.cos(phi) - north * Math.sin(phi)),
  };
}

/** Every instant of a local year at which the sun has this hour angle, about one a day. */
function passagesOfYear(hourAngle: number, { longitude, timeZone }: ClockSite, year: number): number[] {
  const startMs = localDay({ year, month: 1, day: 1 }, timeZone)!.startMs;
  const endMs = localDay({ year: year + 1, month: 1, day: 1 }, timeZone)!.startMs;
  const passages: number[] = [];
  let timeMs = timeOfHourAngle(hourAngle, longitude, startMs - DAY_MS / 2);
  for (; timeMs < endMs; timeMs = timeOfHourAngle(hourAngle, longitude, timeMs + DAY_MS))
    if (timeMs >= startMs) passages.push(timeMs);
  return passages;
}

/** Places in a list of a year's differences [radians] where it passes through zero, the year taken as a ring. */
function nearestPassages(off: number[]): number[] {
  const found = new Set<number>();
  let least = 0;
  off.forEach((here, i) => {
    const next = (i + 1) % off.length;
    if (here > 0 !== off[next] > 0) found.add(Math.abs(here) <= Math.abs(off[next]) ? i : next);
    if (Math.abs(here) < Math.abs(off[least])) least = i;
  });
  if (found.size === 0 && Math.abs(off[least]) * DEGREES <= DISC_RADIUS) found.add(least);
  return [...found];
}
