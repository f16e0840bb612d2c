import { DEGREES, RADIANS } from '../../../src/core/angles/angles.ts';
import { sunDirection } from '../../../src/core/solar-position/solar-position.ts';
import type { SunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { sunTrack } from '../../../src/core/solar-position/sun-track.ts';

/**
 * A year in which the sun keeps one declination [degrees] and is due at noon sharp, without refraction: the only year
 * in which mirror images are exact.
 */
export function syntheticTrack(latitude: number, declination: number, stepMinutes = 5): SunTrack {
  const track = sunTrack({ latitude, longitude: 0, utcOffset: 0 }, stepMinutes);
  for (let i = 0; i <= track.steps; i++) {
    const hourAngle = ((i % track.stepsPerDay) / track.stepsPerDay) * 2 * Math.PI - Math.PI;
    const { east, north, up } = sunDirection(declination * RADIANS, hourAngle, latitude * RADIANS);
    track.east[i] = east;
    track.north[i] = north;
    track.up[i] = up;
    track.azimuth[i] = (Math.atan2(east, north) * DEGREES + 360) % 360;
    track.elevation[i] = Math.asin(up) * DEGREES;
    if (i < track.steps) track.hourAngle[i] = hourAngle + Math.PI / track.stepsPerDay;
  }
  track.declination.fill(declination * RADIANS);
  return track;
}
