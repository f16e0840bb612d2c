import type { WeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { weatherText } from '../../reference-values/weather-text.ts';

/** Names of the weather files kept for the tests, and what else is known of them. */
export const WEATHER_FILES = [
  // GHI a day as the notes of the collection give it, kWh/m2
  { name: 'USA_AZ_Tucson.Intl.AP.722740_TMY3.epw', ghi: 5.65 },
  { name: 'USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw', ghi: 3.85 },
  { name: 'USA_CA_San.Francisco.Intl.AP.724940_TMY3.epw', ghi: 4.7 },
  { name: 'USA_AK_Barrow.700260_TMY3.epw', ghi: 1.95 },
  { name: 'USA_AZ_Phoenix.722780.tmy3.csv', ghi: 5.74 },
  { name: 'USA_AK_Sand.Point.703165_TMY3.csv', ghi: 2.27 },
  { name: 'LKA_Colombo-Katunayake.434500_SWERA.epw', ghi: 5.4 },
];

/** One of the files, read; a file that cannot be read fails the test. */
export function weatherFile(name: string): WeatherFile {
  const parsed = parseWeatherFile(weatherText(name), name);
  if (!parsed.ok) throw new Error(`${name}: ${parsed.problems[0].path} ${parsed.problems[0].message}`);
  return parsed.value;
}
