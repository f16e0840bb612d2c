import type { Parsed } from '../survey/problem.ts';
import { FieldScan, splitQuoted } from './field-scan.ts';
import { HourlyYear } from './hourly-year.ts';
import type { WeatherFile } from './weather-year.ts';
import { weatherFileFrom } from './weather-file-from.ts';

/** Columns of an hour's line, counted from 0. */
const MONTH = 1;
const DAY = 2;
const HOUR = 3;
const TEMPERATURE = 6;
const GHI = 13;
const DNI = 14;
const DHI = 15;
/** The form has 35; older files leave out the last three, and some end their lines with a comma. */
const FEWEST_COLUMNS = 32;
const MOST_COLUMNS = 36;
/** The header has eight lines; none of its files has three times as many. */
const LONGEST_HEADER = 24;

const startOf = (text: string, length: number) =>
  text
    .slice(0, length)
    .replace(/^\uFEFF/, '')
    .trimStart();

/** Whether a text begins as an EPW file does. */
export const isEpw = (text: string): boolean => /^LOCATION\s*,/i.test(startOf(text, 200));

/**
 * Reads an EPW file: eight header lines, then an hour a line, stamped at its end in the file's own standard time;
 * 9999 means irradiance missing, 99.9 temperature missing.
 * Ref: EnergyPlus documentation, Auxiliary Programs, EnergyPlus Weather File (EPW) Data Dictionary.
 */
export function parseEpw(text: string, name: string): Parsed<WeatherFile> {
  const scan = new FieldScan(text);
  const year = new HourlyYear();
  scan.nextLine();
  const location = splitQuoted(scan.wholeLine());
  if (skipHeader(scan, year)) readHours(scan, year);
  year.close(scan.line);
  const [, city = '', region = '', country = ''] = location;
  return weatherFileFrom(year, {
    format: 'EPW',
    name,
    place: [city, region, country].filter((part) => part !== '' && part !== '-').join(', '),
    latitude: location[6],
    longitude: location[7],
    zone: location[8],
    altitude: location[9],
  });
}

/** Goes to the first hour's line, which begins with a year. */
function skipHeader(scan: FieldScan, year: HourlyYear): boolean {
  while (scan.line < LONGEST_HEADER && scan.nextLine()) {
    const label = scan.textAt(0).toUpperCase();
    if (label === 'DATA PERIODS' && !(scan.numberAt(2) === 1)) {
      year.problem(
        `line ${scan.line}`,
        'says the file does not have one record an hour. Choose an hourly file.',
      );
      return false;
    }
    if (/^\d{4}$/.test(label)) return true;
  }
  year.problem(
    `line ${scan.line}`,
    'ends the header, and no hours follow (lines that begin with a year). Get the file again.',
  );
  return false;
}

function readHours(scan: FieldScan, year: HourlyYear): void {
  const columns = scan.columns;
  if (columns < FEWEST_COLUMNS || columns > MOST_COLUMNS) {
    year.problem(`line ${scan.line}`, `has ${columns} columns where an EPW hour has 35. Get the file again.`);
    return;
  }
  do {
    if (scan.columns !== columns) {
      year.problem(
        `line ${scan.line}`,
        `has ${scan.columns} columns where the lines before have ${columns}: it is damaged or cut short. Get the file again.`,
      );
      return;
    }
    const { line } = scan;
    const hour = year.place(line, scan.numberAt(MONTH), scan.numberAt(DAY), scan.numberAt(HOUR));
    if (hour === null) return;
    if (hour < 0) continue;
    const ghi = scan.numberAt(GHI);
    const dni = scan.numberAt(DNI);
    const dhi = scan.numberAt(DHI);
    const temperature = scan.numberAt(TEMPERATURE);
    year.store(year.ghi, hour, ghi, ghi >= 9999, line);
    year.store(year.dni, hour, dni, dni >= 9999, line);
    year.store(year.dhi, hour, dhi, dhi >= 9999, line);
    year.store(year.temperature, hour, temperature, temperature >= 99.9, line);
  } while (scan.nextLine());
}
