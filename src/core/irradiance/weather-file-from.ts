import type { Parsed } from '../survey/problem.ts';
import type { HourlyYear } from './hourly-year.ts';
import { fillMissingHours } from './missing-hours.ts';
import { weatherDoubts } from './weather-doubts.ts';
import type { WeatherFile, WeatherFormat } from './weather-year.ts';

/** What a file's header says of its station, as text. */
export interface StationHeader {
  format: WeatherFormat;
  name: string;
  place: string;
  latitude: string | undefined;
  longitude: string | undefined;
  altitude: string | undefined;
  /** Hours ahead of UTC. */
  zone: string | undefined;
}

/** Joins the hours of a file with its header. */
export function weatherFileFrom(year: HourlyYear, header: StationHeader): Parsed<WeatherFile> {
  if (year.problems.length === 0) fillMissingHours(year);
  if (year.problems.length === 0 && !year.ghi.values.some((value) => value > 0))
    year.problem('file', 'has no sunlight in any hour. Choose a file with irradiance.');
  const number = (text: string | undefined, label: string, lowest: number, highest: number): number => {
    const value = text ? Number(text) : NaN;
    if (!(value >= lowest && value <= highest))
      year.problem(
        'line 1',
        `has no ${label} of ${lowest} to ${highest} (found "${(text ?? '').slice(0, 40)}"). Get the file again.`,
      );
    return value;
  };
  const station = {
    latitude: number(header.latitude, 'latitude', -90, 90),
    longitude: number(header.longitude, 'longitude', -180, 180),
    altitude: number(header.altitude, 'altitude', -430, 9000),
    utcOffset: 60 * number(header.zone, 'time zone', -12, 14),
  };
  if (year.problems.length > 0) return { ok: false, problems: year.problems };
  const warnings = [...year.warnings, ...weatherDoubts(year.ghi.values, station)];
  const value: WeatherFile = {
    name: header.name,
    place: header.place || header.name,
    ...station,
    ghi: year.ghi.values,
    dni: year.dni.values,
    dhi: year.dhi.values,
    temperature: year.temperature.values,
    format: header.format,
    warnings: warnings.map(({ message }) => `The file ${message}`),
  };
  return { ok: true, value, warnings };
}
