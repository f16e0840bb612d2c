import { DEGREES, RADIANS, safeAsin } from '../angles/angles.ts';
import { PARALLAX } from './solar-position.ts';
import { refraction, standardPressure } from './refraction.ts';
import { sunEquatorial } from './sun-equatorial.ts';

/** The year whose 365 days stand for every year. */
export const TRACK_YEAR = 2025;
export const TRACK_DAYS = 365;

const DAY_MS = 86_400_000;
/** Declination and hour angle are asked for this often; linear between is within 0.0001°. */
const ASK_MS = DAY_MS / 4;

/**
 * The sun over one site through 365 days of local standard time, in equal steps. Step i runs from boundary i to
 * boundary i + 1; boundary 0 is 1 January, 0:00 standard time. A direction well below the horizon is left at its
 * elevation (without azimuth 0 meaning anything).
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
export const cosZenithOf = (track: SunTrack, step: number): number => (track.up[step] + track.up[step + 1]) / 2;

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
export function sunTrack(site: TrackSite, stepMinutes = 2): SunTrack {
  if (!(stepMinutes >= 1 && stepMinutes <= 15 && Number.isInteger(60 / stepMinutes)))
    throw new RangeError(`stepMinutes must divide an hour and be 1 to 15, got ${stepMinutes}`);
  if (!(Math.abs(site.latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${site.latitude}`);
  if (!(Math.abs(site.longitude) <= 360)) throw new RangeError(`longitude must be -360 to 360, got ${site.longitude}`);
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
  const startMs = Date.UTC(TRACK_YEAR, 0, 1) - track.utcOffset * 60_000;
  const sun = interpolatedSun(startMs);
  const sinLatitude = Math.sin(track.latitude * RADIANS);
  const cosLatitude = Math.cos(track.latitude * RADIANS);
  const pressure = standardPressure(track.altitude);
  const longitude = track.longitude * RADIANS;
  const stepMs = stepMinutes * 60_000;
  const wellBelow = Math.sin((-stepMinutes / 4 - 2) * RADIANS); // a step later the sun is still down
  for (let i = 0; i <= steps; i++) {
    const at = sun(i * stepMs);
    const hourAngle = at.greenwichHourAngle + longitude;
    if (i < steps) track.hourAngle[i] = wrapped(hourAngle + (Math.PI * stepMinutes) / 1440);
    if (i % stepsPerDay === stepsPerDay / 2) track.declination[(i / stepsPerDay) | 0] = at.declination;
    const cosDeclination = Math.cos(at.declination);
    const equatorial = cosDeclination * Math.cos(hourAngle);
    const sine = Math.sin(at.declination) * sinLatitude + equatorial * cosLatitude;
    if (sine < wellBelow) {
      track.up[i] = sine;
      track.elevation[i] = Math.asin(sine) * DEGREES;
      continue;
    }
    const east = -cosDeclination * Math.sin(hourAngle);
    const north = Math.sin(at.declination) * cosLatitude - equatorial * sinLatitude;
    const horizontal = Math.sqrt(Math.max(0, 1 - sine * sine));
    const geometric = safeAsin(sine) * DEGREES - PARALLAX * horizontal;
    const elevation = geometric + refraction(geometric, pressure);
    const azimuth = Math.atan2(east, north) * DEGREES;
    const stretched = horizontal > 1e-9 ? Math.cos(elevation * RADIANS) / horizontal : 0;
    track.east[i] = east * stretched;
    track.north[i] = north * stretched;
    track.up[i] = Math.sin(elevation * RADIANS);
    track.azimuth[i] = azimuth < 0 ? azimuth + 360 : azimuth;
    track.elevation[i] = elevation;
  }
}

const wrapped = (angleRad: number) => angleRad - 2 * Math.PI * Math.round(angleRad / (2 * Math.PI));

/** Reads declination and hour angle at milliseconds after `startMs`, one object reused. */
function interpolatedSun(startMs: number) {
  const asked = (TRACK_DAYS * DAY_MS) / ASK_MS + 1;
  const declination = new Float64Array(asked + 1);
  const departure = new Float64Array(asked + 1); // of the hour angle from mean time, small and smooth
  for (let k = 0; k <= asked; k++) {
    const sun = sunEquatorial(startMs + k * ASK_MS);
    declination[k] = sun.declination;
    departure[k] = wrapped(sun.greenwichHourAngle - meanAngle(startMs + k * ASK_MS));
  }
  const at = { declination: 0, greenwichHourAngle: 0 };
  return (sinceStart: number) => {
    const k = (sinceStart / ASK_MS) | 0;
    const share = sinceStart / ASK_MS - k;
    at.declination = declination[k] + share * (declination[k + 1] - declination[k]);
    at.greenwichHourAngle =
      meanAngle(startMs + sinceStart) + departure[k] + share * (departure[k + 1] - departure[k]);
    return at;
  };
}

/** Hour angle of the mean sun at longitude 0, radians. */
const meanAngle = (timeMs: number) => (((timeMs % DAY_MS) / DAY_MS - 0.5) * 2 * Math.PI);
