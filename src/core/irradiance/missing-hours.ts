import type { HourlyColumn, HourlyYear } from './hourly-year.ts';

/** Missing hours of irradiance that are filled; more make the year another one. */
const FILLED_IRRADIANCE = 24;
/** Missing hours of temperature that are filled, a tenth of the year: they do not touch the light. */
const FILLED_TEMPERATURE = 876;
const HOURS = 8760;

/** Fills the few hours that a file marks as missing from the same hour of the days around, with a warning. */
export function fillMissingHours(year: HourlyYear): void {
  for (const column of [year.ghi, year.dni, year.dhi]) fillColumn(year, column, FILLED_IRRADIANCE);
  fillColumn(year, year.temperature, FILLED_TEMPERATURE);
}

function fillColumn(year: HourlyYear, column: HourlyColumn, most: number): void {
  const count = column.missing.length;
  if (count === 0) return;
  if (count > most) {
    year.problem(
      'file',
      `lacks ${column.label} in ${count} hours; at most ${most} are filled. Choose a complete file.`,
    );
    return;
  }
  const missing = new Set(column.missing);
  for (const hour of missing) column.values[hour] = fromDaysAround(column.values, missing, hour);
  year.warnings.push({
    path: 'file',
    message: `lacks ${column.label} in ${count} ${count === 1 ? 'hour' : 'hours'}; filled from the same hour of the days around.`,
  });
}

/** Between the nearest days before and after that have this hour, in proportion to time; the year is a circle. */
function fromDaysAround(values: Float32Array, missing: Set<number>, hour: number): number {
  const before = nearest(missing, hour, -24);
  const after = nearest(missing, hour, 24);
  const share = before.days / (before.days + after.days);
  return values[before.hour] * (1 - share) + values[after.hour] * share;
}

function nearest(missing: Set<number>, hour: number, step: number): { hour: number; days: number } {
  let days = 0;
  let at = hour;
  do {
    at = (at + step + HOURS) % HOURS;
    days++;
  } while (missing.has(at) && days < 365);
  return { hour: at, days };
}
