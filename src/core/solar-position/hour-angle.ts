import { RADIANS } from '../angles/angles.ts';
import { sunEquatorial } from './sun-equatorial.ts';

export const DAY_MS = 86_400_000;
const TURN = 2 * Math.PI;

/** Any angle brought into -pi to pi, radians. */
const halfCircle = (angleRad: number) => angleRad - TURN * Math.round(angleRad / TURN);

/** Hour angle of the sun at a longitude [degrees], radians from -pi to pi: 0 on the meridian, growing westward. */
export const hourAngle = (timeMs: number, longitude: number): number =>
  halfCircle(sunEquatorial(timeMs).greenwichHourAngle + longitude * RADIANS);

/** The instant [ms] nearest to `nearMs` at which the sun has an hour angle [radians] at a longitude [degrees]. */
export function timeOfHourAngle(angleRad: number, longitude: number, nearMs: number): number {
  let timeMs = nearMs;
  // the sun keeps mean time within half a minute a day, so each round leaves 1/3000 of the error before
  for (let round = 0; round < 3; round++)
    timeMs -= (halfCircle(hourAngle(timeMs, longitude) - angleRad) / TURN) * DAY_MS;
  return timeMs;
}

/**
 * Equation of time, minutes: apparent solar time less mean solar time; positive where the sundial is fast.
 * Ref: Meeus, Astronomical Algorithms, 2nd ed. (1998), chapter 28.
 */
export function equationOfTime(timeMs: number): number {
  const sinceMidnight = ((timeMs % DAY_MS) + DAY_MS) % DAY_MS;
  const mean = (sinceMidnight / DAY_MS - 0.5) * TURN;
  return (halfCircle(hourAngle(timeMs, 0) - mean) / TURN) * 1440;
}
