import type { Parsed } from '../survey/problem.ts';
import { isEpw, parseEpw } from './epw.ts';
import { isTmy3, parseTmy3 } from './tmy3.ts';
import type { WeatherFile } from './weather-year.ts';

export type { WeatherFile } from './weather-year.ts';

/** Largest weather file read, characters. */
export const LARGEST_WEATHER_FILE = 20_000_000;

const formats = [
  { recognises: isEpw, parse: parseEpw },
  { recognises: isTmy3, parse: parseTmy3 },
];

/** Reads a weather file, its format known by its content. Problems name the line. */
export function parseWeatherFile(text: string, name: string): Parsed<WeatherFile> {
  if (text.length > LARGEST_WEATHER_FILE)
    return refused(
      'file',
      'is larger than 20 MB; a weather year has about 2 MB. Choose an EPW or TMY3 CSV file.',
    );
  const format = formats.find(({ recognises }) => recognises(text));
  if (format) return format.parse(text, name);
  return refused(
    'line 1',
    'is neither the start of an EPW file ("LOCATION,…") nor of a TMY3 CSV file (station in line 1, "Date (MM/DD/YYYY)" in line 2). Choose a weather file of 8,760 hours in one of these forms.',
  );
}

const refused = (path: string, message: string): Parsed<WeatherFile> => ({
  ok: false,
  problems: [{ path, message }],
});
