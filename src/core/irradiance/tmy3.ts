import type { Parsed } from '../survey/problem.ts';
import { FieldScan, MOST_COLUMNS, splitQuoted } from './field-scan.ts';
import { HourlyYear } from './hourly-year.ts';
import type { WeatherFile } from './weather-year.ts';
import { weatherFileFrom } from './weather-file-from.ts';

const secondLine = (text: string) => /^[^\r\n]*(?:\r\n|\r|\n)([^\r\n]*)/.exec(text.slice(0, 4000))?.[1] ?? '';

/** Whether a text begins as a TMY3 CSV file does: a station's line, then column names from the date on. */
export const isTmy3 = (text: string): boolean => /^\s*"?Date \(MM\/DD\/YYYY\)/i.test(secondLine(text));

/** What the columns are called. */
const WANTED = { ghi: 'GHI (W/m^2)', dni: 'DNI (W/m^2)', dhi: 'DHI (W/m^2)', temperature: 'Dry-bulb (C)' };
type Columns = Record<keyof typeof WANTED, number>;

const MISSING = -9900;

/**
 * Reads a TMY3 CSV file: station line, column names, then an hour a line, stamped at its end in local standard time;
 * -9900 means missing.
 * Ref: Wilcox and Marion, Users Manual for TMY3 Data Sets, NREL/TP-581-43156 (2008), tables 1 to 3.
 */
export function parseTmy3(text: string, name: string): Parsed<WeatherFile> {
  const scan = new FieldScan(text);
  const year = new HourlyYear();
  scan.nextLine();
  const station = splitQuoted(scan.wholeLine());
  scan.nextLine();
  const columns = columnsOf(scan.wholeLine(), year);
  if (columns) readHours(scan, year, columns);
  year.close(scan.line);
  const [, city = '', region = ''] = station;
  return weatherFileFrom(year, {
    format: 'TMY3',
    name,
    place: [city, region].filter((part) => part !== '').join(', '),
    zone: station[3],
    latitude: station[4],
    longitude: station[5],
    altitude: station[6],
  });
}

function columnsOf(header: string, year: HourlyYear): Columns | null {
  const names = splitQuoted(header).map((label) => label.toLowerCase());
  const columns: Columns = { ghi: 0, dni: 0, dhi: 0, temperature: 0 };
  for (const key of Object.keys(WANTED) as (keyof Columns)[]) {
    columns[key] = names.indexOf(WANTED[key].toLowerCase());
    if (columns[key] < 2 || columns[key] >= MOST_COLUMNS - 1)
      year.problem('line 2', `has no column "${WANTED[key]}". Choose a TMY3 CSV file with it.`);
  }
  return year.problems.length === 0 ? columns : null;
}

function readHours(scan: FieldScan, year: HourlyYear, columns: Columns): void {
  const count = scan.columns;
  const keys = Object.keys(WANTED) as (keyof Columns)[];
  while (scan.nextLine()) {
    const { line } = scan;
    if (scan.columns !== count) {
      year.problem(
        `line ${line}`,
        `has ${scan.columns} columns where line 2 names ${count}: it is damaged or cut short. Get the file again.`,
      );
      return;
    }
    const hour = placeOf(scan, year);
    if (hour === null) return;
    if (hour < 0) continue;
    for (const key of keys) {
      const value = scan.numberAt(columns[key]);
      year.store(year[key], hour, value, value === MISSING, line);
    }
  }
}

/** Date as MM/DD/YYYY in column 0, time as HH:MM in column 1, 01:00 to 24:00. */
function placeOf(scan: FieldScan, year: HourlyYear): number | null {
  const { text, starts } = scan;
  const [date, time] = starts as unknown as [number, number];
  const whole = text.charCodeAt(date + 2) === 47 && text.charCodeAt(date + 5) === 47 && time - date === 11;
  const fullHour =
    text.charCodeAt(time + 2) === 58 && twoDigits(text, time + 3) === 0 && starts[2] - time === 6;
  if (whole && fullHour)
    return year.place(scan.line, twoDigits(text, date), twoDigits(text, date + 3), twoDigits(text, time));
  year.problem(
    `line ${scan.line}`,
    'does not begin with a date MM/DD/YYYY and a full hour HH:00. Get the file again.',
  );
  return null;
}

/** NaN where there are none. */
function twoDigits(text: string, at: number): number {
  const tens = text.charCodeAt(at) - 48;
  const ones = text.charCodeAt(at + 1) - 48;
  return tens >= 0 && tens <= 9 && ones >= 0 && ones <= 9 ? tens * 10 + ones : NaN;
}
