import { DEGREES, RADIANS, safeAsin } from '../angles/angles.ts';
import { PARALLAX } from './solar-position.ts';
import { refraction, standardPressure } from './refraction.ts';
import { sunEquatorial } from './sun-equatorial.ts';

/** The year whose 365 days stand for every year. */
export const TRACK_YEAR = 2025;
export const TRACK_DAYS = 365;

/** Declination and hour angle are asked for this often; linear between is within 0.0001°. */
const ASK_MINUTES = 360;
const ASKS_PER_DAY = 1440 / ASK_MINUTES;

/**
 * The sun over one site through 365 days of local standard time, in equal steps. Step i runs from boundary i to
 * boundary i + 1; boundary 0 is 1 January, 0:00 standard time. With the sun well below the horizon a boundary has
 * only `up`; its elevation stands at -90.
 */
export interface SunTrack {
  readonly latitude: number;
  readonly longitude: number;
  readonly altitude: number;
  /** Minutes the site's standard time is ahead of UTC. */
  readonly utcOffset: number;
  readonly stepMinutes: number;
  readonly stepsPerDay: number;
  readonly steps: number;
  /** Unit vector to the apparent sun at each boundary. */
  readonly east: Float32Array;
  readonly north: Float32Array;
  readonly up: Float32Array;
  /** Apparent azimuth, degrees 0 to 360, and elevation at each boundary. */
  readonly azimuth: Float32Array;
  readonly elevation: Float32Array;
  /** Hour angle at the middle of each step, radians, -pi to pi. */
  readonly hourAngle: Float32Array;
  /** Declination at the middle of each day, radians. */
  readonly declination: Float64Array;
  /** Month of each day, 0 to 11. */
  readonly monthOfDay: Uint8Array;
}

/** Cosine of the apparent zenith angle in the middle of a step. */
export const cosZenithOf = (track: SunTrack, step: number): number =>
  (track.up[step] + track.up[step + 1]) / 2;

/** Day of the year of a step, 0 to 364. */
export const dayOf = (track: SunTrack, step: number): number => (step / track.stepsPerDay) | 0;

export const DAYS_IN_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

export interface TrackSite {
  latitude: number;
  longitude: number;
  altitude?: number;
  /** Minutes the site's standard time is ahead of UTC. */
  utcOffset: number;
}

/**
 * Lays out a year of sun directions. `stepMinutes` must divide an hour, 1 to 15.
 * Positions are asked of the library every six hours only; between, declination and the departure of the hour angle
 * from mean time are linear. Parallax and refraction as in `solarPosition`, with the refraction held below -1°.
 */
export function sunTrack(site: TrackSite, stepMinutes: number): SunTrack {
  if (!(stepMinutes >= 1 && stepMinutes <= 15 && Number.isInteger(60 / stepMinutes)))
    throw new RangeError(`stepMinutes must divide an hour and be 1 to 15, got ${stepMinutes}`);
  if (!(Math.abs(site.latitude) <= 90))
    throw new RangeError(`latitude must be -90 to 90, got ${site.latitude}`);
  if (!(Math.abs(site.longitude) <= 360))
    throw new RangeError(`longitude must be -360 to 360, got ${site.longitude}`);
  const altitude = site.altitude ?? 0;
  const stepsPerDay = 1440 / stepMinutes;
  const steps = stepsPerDay * TRACK_DAYS;
  const empty = () => new Float32Array(steps + 1);
  const track = {
    latitude: site.latitude,
    longitude: site.longitude,
    altitude,
    utcOffset: site.utcOffset,
    stepMinutes,
    stepsPerDay,
    steps,
    east: empty(),
    north: empty(),
    up: empty(),
    azimuth: empty(),
    elevation: empty(),
    hourAngle: new Float32Array(steps),
    declination: new Float64Array(TRACK_DAYS),
    monthOfDay: Uint8Array.from(DAYS_IN_MONTH.flatMap((days, month) => Array<number>(days).fill(month))),
  };
  fillTrack(track);
  return track;
}

type Writable<T> = { -readonly [K in keyof T]: T[K] };

function fillTrack(track: Writable<SunTrack>): void {
  const { steps, stepMinutes, stepsPerDay } = track;
  const asked = askedSun(track);
  const stepsPerAsk = ASK_MINUTES / stepMinutes;
  const turnPerStep = (2 * Math.PI) / stepsPerDay; // of the mean sun
  for (let day = 0; day < TRACK_DAYS; day++)
    track.declination[day] = asked.declination[day * ASKS_PER_DAY + ASKS_PER_DAY / 2];
  const placeSun = sunPlacer(track);
  for (let k = 0, i = 0; i <= steps; k++) {
    const [departure, sine, cosine] = [asked.departure[k], asked.sine[k], asked.cosine[k]];
    const departurePerStep = (asked.departure[k + 1] - departure) / stepsPerAsk;
    const sinePerStep = (asked.sine[k + 1] - sine) / stepsPerAsk;
    const cosinePerStep = (asked.cosine[k + 1] - cosine) / stepsPerAsk;
    const quarter = (k % ASKS_PER_DAY) * stepsPerAsk;
    for (let n = 0; n < stepsPerAsk && i <= steps; n++, i++) {
      const hourAngle = departure + n * departurePerStep + (quarter + n) * turnPerStep;
      if (i < steps) track.hourAngle[i] = wrapped(hourAngle + turnPerStep / 2);
      placeSun(i, hourAngle, sine + n * sinePerStep, cosine + n * cosinePerStep);
    }
  }
}

/** Writes one boundary of the track from the hour angle [radians] and the sine and cosine of the declination. */
function sunPlacer(track: Writable<SunTrack>) {
  const { east, north, up, azimuth, elevation, stepMinutes } = track;
  const sinLatitude = Math.sin(track.latitude * RADIANS);
  const cosLatitude = Math.cos(track.latitude * RADIANS);
  const pressure = standardPressure(track.altitude);
  const wellBelow = Math.sin((-stepMinutes / 4 - 2) * RADIANS); // a step later the sun is still down
  return (i: number, hourAngle: number, sinDeclination: number, cosDeclination: number): void => {
    const equatorial = cosDeclination * Math.cos(hourAngle);
    const sine = sinDeclination * sinLatitude + equatorial * cosLatitude;
    if (sine < wellBelow) {
      up[i] = sine;
      elevation[i] = -90;
      return;
    }
    const eastward = -cosDeclination * Math.sin(hourAngle);
    const northward = sinDeclination * cosLatitude - equatorial * sinLatitude;
    const horizontal = Math.sqrt(Math.max(0, 1 - sine * sine));
    const geocentric = safeAsin(sine) * DEGREES;
    const geometric = geocentric - PARALLAX * horizontal;
    const lifted = geometric + refraction(geometric, pressure) - geocentric;
    const angle = lifted * RADIANS; // under half a degree: sine and cosine by their series
    const cosLifted = 1 - (angle * angle) / 2;
    const sinLifted = angle - (angle * angle * angle) / 6;
    const stretched = horizontal > 1e-9 ? cosLifted - (sine / horizontal) * sinLifted : 0;
    const bearing = Math.atan2(eastward, northward) * DEGREES;
    east[i] = eastward * stretched;
    north[i] = northward * stretched;
    up[i] = sine * cosLifted + horizontal * sinLifted;
    azimuth[i] = bearing < 0 ? bearing + 360 : bearing;
    elevation[i] = geocentric + lifted;
  };
}

const wrapped = (angleRad: number) => angleRad - 2 * Math.PI * Math.round(angleRad / (2 * Math.PI));

/**
 * Declination (with its sine and cosine) and the departure of the site's hour angle from the mean sun's, radians, every
 * ASK_MINUTES from the start of the track. At local standard midnight the mean sun's hour angle counts as 0.
 */
function askedSun({ longitude, utcOffset }: SunTrack) {
  const startMs = Date.UTC(TRACK_YEAR, 0, 1) - utcOffset * 60_000;
  const count = (TRACK_DAYS * 1440) / ASK_MINUTES + 2;
  const departure = new Float64Array(count); // small steps, so that linear between them is exact enough
  const declination = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    const minutes = k * ASK_MINUTES;
    const sun = sunEquatorial(startMs + minutes * 60_000);
    const hourAngle = sun.greenwichHourAngle + longitude * RADIANS - (minutes / 1440) * 2 * Math.PI;
    const before = k > 0 ? departure[k - 1] : 0;
    departure[k] = before + wrapped(hourAngle - before);
    declination[k] = sun.declination;
  }
  return { departure, declination, sine: declination.map(Math.sin), cosine: declination.map(Math.cos) };
}
