import type { Problem } from '../survey/problem.ts';
import { DAYS_IN_MONTH } from '../solar-position/sun-track.ts';

const HOURS = 8760;
/** Problems listed before the rest is only counted. */
const LISTED = 12;
const MONTH_NAMES =
  'January February March April May June July August September October November December'.split(' ');

/** Largest irradiance counted as possible, W/m2: extraterrestrial, with room for light from the edges of clouds. */
const LARGEST_IRRADIANCE = 1500;
const COLDEST = -95;
const HOTTEST = 65;

/** One kind of value through the year, filled hour by hour. */
export interface HourlyColumn {
  label: string;
  unit: string;
  lowest: number;
  highest: number;
  values: Float32Array;
  missing: number[];
}

const column = (label: string, unit: string, lowest: number, highest: number): HourlyColumn => ({
  label,
  unit,
  lowest,
  highest,
  values: new Float32Array(HOURS),
  missing: [],
});

/** First hour of each month of a 365-day year. */
const monthStarts = DAYS_IN_MONTH.map(
  (_, month) => 24 * DAYS_IN_MONTH.slice(0, month).reduce((sum, n) => sum + n, 0),
);

/** Collects the hours of a file in the order of its lines, and what is wrong with them. */
export class HourlyYear {
  readonly problems: Problem[] = [];
  readonly warnings: Problem[] = [];
  readonly ghi = column('global irradiance', 'W/m2', 0, LARGEST_IRRADIANCE);
  readonly dni = column('direct normal irradiance', 'W/m2', 0, LARGEST_IRRADIANCE);
  readonly dhi = column('diffuse irradiance', 'W/m2', 0, LARGEST_IRRADIANCE);
  readonly temperature = column('air temperature', '°C', COLDEST, HOTTEST);
  private hours = 0;
  private leapHours = 0;
  private unlisted = 0;

  /** Notes a problem; the first dozen are listed, the rest counted. */
  problem(path: string, message: string): void {
    if (this.problems.length < LISTED) this.problems.push({ path, message });
    else this.unlisted++;
  }

  /**
   * Finds the place of an hour stamped at its end (1 to 24): the hour's number, -1 for an hour of 29 February, null for
   * one out of order, after which reading is given up.
   */
  place(line: number, month: number, day: number, hour: number): number | null {
    const start = monthStarts[month - 1];
    const lastDay = month === 2 ? 29 : DAYS_IN_MONTH[month - 1];
    if (start === undefined || !(day >= 1 && day <= lastDay && hour >= 1 && hour <= 24)) {
      this.problem(
        `line ${line}`,
        `has no date and hour that exist (month ${month}, day ${day}, hour ${hour}; hours run from 1 to 24). Correct the line or get the file again.`,
      );
      return null;
    }
    if (month === 2 && day === 29) return this.leapDay(line, hour);
    const found = start + 24 * (day - 1) + hour - 1;
    if (found === this.hours) return this.hours++;
    this.problem(`line ${line}`, this.disorder(found));
    return null;
  }

  /** Stores a value, or notes that it is missing or impossible. */
  store(into: HourlyColumn, hour: number, value: number, isMissing: boolean, line: number): void {
    if (isMissing) into.missing.push(hour);
    else if (value >= into.lowest && value <= into.highest) into.values[hour] = value;
    else this.problem(`line ${line}`, impossible(into, value));
  }

  /** Says whether the year is whole, once all lines are read. */
  close(line: number): void {
    if (this.problems.length === 0 && this.hours < HOURS)
      this.problem(
        `line ${line}`,
        `is the last, after ${this.hours} of 8,760 hours: the file is cut short. Get the file again.`,
      );
    if (this.problems.length === 0 && this.leapHours > 0)
      this.warnings.push({
        path: 'file',
        message: 'has a 29 February; that day was left out of the 365-day year.',
      });
    if (this.unlisted > 0)
      this.problems.push({ path: 'file', message: `has ${this.unlisted} more problems like these.` });
  }

  private leapDay(line: number, hour: number): number | null {
    const expected = this.hours === monthStarts[2] ? this.leapHours + 1 : 0;
    if (hour === expected) {
      this.leapHours++;
      return -1;
    }
    this.problem(
      `line ${line}`,
      `is out of order: hour ${hour} of 29 February stands where ${this.expected()} should.`,
    );
    return null;
  }

  private expected(): string {
    return this.hours < HOURS ? nameOf(this.hours) : 'the end of the year';
  }

  private disorder(found: number): string {
    const advice = 'Hours must run from 1 January to 31 December without gaps; get the file again.';
    if (found === this.hours - 1) return `repeats ${nameOf(found)}. ${advice}`;
    if (found > this.hours && this.hours > 0)
      return `is ${nameOf(found)} where ${this.expected()} should be: hours are missing or shuffled. ${advice}`;
    return `is ${nameOf(found)} where ${this.expected()} should be: hours are out of order. ${advice}`;
  }
}

function impossible({ label, unit, lowest, highest }: HourlyColumn, value: number): string {
  if (Number.isNaN(value)) return `has no number for ${label}. Correct the line or get the file again.`;
  return `has ${label} ${value} ${unit}, which cannot be (${lowest} to ${highest}). Correct the line or get the file again.`;
}

function nameOf(hour: number): string {
  let month = 11;
  while (monthStarts[month] > hour) month--;
  const inMonth = hour - monthStarts[month];
  return `${Math.floor(inMonth / 24) + 1} ${MONTH_NAMES[month]}, hour ${(inMonth % 24) + 1}`;
}
