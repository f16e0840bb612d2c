import { RADIANS } from '../angles/angles.ts';
import { sunDirection } from '../solar-position/solar-position.ts';
import { sunEquatorial } from '../solar-position/sun-equatorial.ts';
import { TRACK_DAYS, TRACK_YEAR } from '../solar-position/sun-track.ts';

/** The sun counts as down below this, degrees: its upper edge below the horizon (-50'), and a day's change of declination. */
const DOWN = -50 / 60 - 0.25;
const HOUR = Math.PI / 12;
const FULL_TURN = 2 * Math.PI;

/**
 * Share (0 to 1) of a year's light that falls in hours wholly with the sun down. `hourly` has 8,760 values from 1 January
 * 0:00 in the place's standard time; `latitude` and `longitude` in degrees, `utcOffset` in minutes ahead of UTC. 0 where
 * there is no light. The sun is asked for once a day, at clock noon.
 */
export function lightAfterDark(
  hourly: Float32Array,
  { latitude, longitude, utcOffset }: { latitude: number; longitude: number; utcOffset: number },
): number {
  const firstNoonMs = Date.UTC(TRACK_YEAR, 0, 1, 12) - utcOffset * 60_000;
  const down = Math.sin(DOWN * RADIANS);
  let all = 0;
  let dark = 0;
  for (let day = 0; day < TRACK_DAYS; day++) {
    const { declination, greenwichHourAngle } = sunEquatorial(firstNoonMs + day * 86_400_000);
    const atNoon = greenwichHourAngle + longitude * RADIANS;
    for (let hour = 0; hour < 24; hour++) {
      const light = hourly[day * 24 + hour];
      if (light === 0) continue;
      all += light;
      const nearestNoon = nearestToNoon(atNoon + (hour - 12) * HOUR);
      if (sunDirection(declination, nearestNoon, latitude * RADIANS).up < down) dark += light;
    }
  }
  return all > 0 ? dark / all : 0;
}

/** The hour angle of least size in the hour that begins at `start`, all in radians. */
function nearestToNoon(start: number): number {
  const from = start - FULL_TURN * Math.round(start / FULL_TURN); // -pi to pi
  if (from >= 0) return Math.min(from, FULL_TURN - from - HOUR);
  return Math.min(0, from + HOUR);
}
