import { RADIANS, safeAsin } from '../angles/angles.ts';
import type { SunTrack } from '../solar-position/sun-track.ts';
import type { Climate, SkyReader } from './climate.ts';
import type { WeatherFile } from './weather-year.ts';

const HOURS = 8760;
const EARTH_RADIUS_KM = 6371;
/** Beyond these a weather file speaks for another place. */
const FAR_KM = 100;
const FAR_ABOVE = 300;
/** Between the tropics the two hemispheres have much the same seasons, degrees. */
const TROPIC = 23.44;

/**
 * A weather file as climate of a site. Hour h covers h - 1 to h in the file's own standard time; the days of the file
 * stand for the days of the track by position; what an hour says is held through it, its last steps after sunset too.
 */
export function weatherFileClimate(
  file: WeatherFile,
  site: { latitude: number; longitude: number; altitude?: number },
): Climate {
  return {
    source: 'weather-file',
    name: file.place,
    reference: `${file.format} file ${file.name}`,
    warnings: [...file.warnings, ...placeWarnings(file, site)],
    stateCount: 1,
    over: (track) => reader(file, track),
  };
}

function reader(file: WeatherFile, track: SunTrack): SkyReader {
  const { ghi, dni, dhi } = file;
  const { stepMinutes } = track;
  const ahead = file.utcOffset - track.utcOffset + stepMinutes / 2 + HOURS * 60; // a year on, to stay positive
  return (step, sky) => {
    const hour = (((step * stepMinutes + ahead) / 60) | 0) % HOURS;
    const global = ghi[hour];
    const beam = dni[hour];
    const diffuse = dhi[hour];
    if (global === 0 && beam === 0 && diffuse === 0) return false;
    sky.weight[0] = 1;
    sky.ghi[0] = global;
    sky.dni[0] = beam;
    sky.dhi[0] = diffuse;
    return true;
  };
}

function placeWarnings(
  file: WeatherFile,
  site: { latitude: number; longitude: number; altitude?: number },
): string[] {
  const warnings: string[] = [];
  const bothTropical = Math.abs(file.latitude) <= TROPIC && Math.abs(site.latitude) <= TROPIC;
  if (file.latitude * site.latitude < 0 && !bothTropical)
    warnings.push(
      `The weather station ${file.place} lies in the other hemisphere; its seasons are the other way round.`,
    );
  const away = distanceKm(file, site);
  if (away > FAR_KM)
    warnings.push(
      `The weather station ${file.place} is ${Math.round(away)} km from the site; a nearer one may differ.`,
    );
  const above = file.altitude - (site.altitude ?? file.altitude);
  if (Math.abs(above) > FAR_ABOVE)
    warnings.push(
      `The weather station ${file.place} lies ${Math.round(Math.abs(above))} m ${above > 0 ? 'above' : 'below'} the site; its sky may differ.`,
    );
  return warnings;
}

/** Distance along the great circle (haversine), km. */
function distanceKm(
  a: { latitude: number; longitude: number },
  b: { latitude: number; longitude: number },
): number {
  const half = (degrees: number) => Math.sin((degrees * RADIANS) / 2) ** 2;
  const across =
    half(a.longitude - b.longitude) * Math.cos(a.latitude * RADIANS) * Math.cos(b.latitude * RADIANS);
  return 2 * EARTH_RADIUS_KM * safeAsin(Math.sqrt(half(a.latitude - b.latitude) + across));
}
