import type { Climate } from '../../core/irradiance/climate.ts';
import { monthlyOf } from '../../core/irradiance/monthly-climate.ts';
import { gridAt } from '../../core/irradiance/world-grid.ts';
import { sunTrack } from '../../core/solar-position/sun-track.ts';
import type { Command } from '../command.ts';
import { numberOption, textOption, UsageError } from '../command.ts';
import { climateByOption, worldGrid } from '../climate-choice.ts';
import type { ClimatePlace } from '../climate-choice.ts';
import { problemLines } from '../problem-lines.ts';
import { shownName, shownWords } from '../shown-name.ts';
import { grouped, monthsTable } from '../table.ts';

const STEP_MINUTES = 5;

export const climate: Command = {
  name: 'climate',
  usage: '--latitude DEGREES --longitude DEGREES [options]',
  summary: 'Sunlight of each month at a place, by one of the climate sources.',
  help: `
  --latitude DEGREES           -90 to 90, north positive
  --longitude DEGREES          -180 to 180, east positive
  --altitude METRES            above sea level; 0 where it is left out
  --climate world|clear|FILE   the world grid (default), a clear sky, or a weather file (EPW, TMY3 CSV)
  --json                       { latitude, longitude, source, name, reference, warnings,
                                 ghi, dni, dhi: { annual, monthly } in kWh/m2 } and, from the world grid,
                                 { clearnessIndex, diffuseFraction, temperature }, twelve each`,
  options: {
    latitude: { type: 'string' },
    longitude: { type: 'string' },
    altitude: { type: 'string' },
    climate: { type: 'string' },
    json: { type: 'boolean' },
  },
  run(call) {
    const latitude = numberOption(call, 'latitude', -90, 90);
    const longitude = numberOption(call, 'longitude', -180, 180);
    if (latitude === undefined || longitude === undefined)
      throw new UsageError('--latitude and --longitude are needed.');
    const place = { latitude, longitude, altitude: numberOption(call, 'altitude', -430, 9000) ?? 0 };
    const option = textOption(call, 'climate') ?? 'world';
    const found = climateByOption(option, place);
    if (!found.ok) {
      call.terminal.err(problemLines('', found.problems));
      return 1;
    }
    const months = { ...place, ...monthsOf(found.value, place), ...gridMonths(option, place) };
    call.terminal.out(call.values.json ? `${JSON.stringify(months, null, 1)}\n` : climateText(months));
    return 0;
  },
};

function monthsOf(found: Climate, place: ClimatePlace) {
  const utcOffset = Math.round(place.longitude / 15) * 60; // months end at the sun's midnight, near enough
  const { ghi, dni, dhi } = monthlyOf(found, sunTrack({ ...place, utcOffset }, STEP_MINUTES));
  const { source, name, reference, warnings } = found;
  return { source, name, reference, warnings, ghi: summed(ghi), dni: summed(dni), dhi: summed(dhi) };
}

const summed = (monthly: number[]) => ({ annual: monthly.reduce((sum, value) => sum + value, 0), monthly });

function gridMonths(option: string, { latitude, longitude }: ClimatePlace) {
  const read = option === 'world' ? worldGrid() : null;
  if (!read?.ok) return {};
  const { kt, kd, t2m } = gridAt(read.value, latitude, longitude);
  return { clearnessIndex: kt, diffuseFraction: kd, temperature: t2m };
}

type ClimateMonths = ClimatePlace & ReturnType<typeof monthsOf> & ReturnType<typeof gridMonths>;

function climateText(months: ClimateMonths): string {
  const sums = ({ monthly, annual }: { monthly: number[]; annual: number }) =>
    [...monthly, annual].map((value) => grouped(value, 1));
  const rows = [
    { label: 'global horizontal, kWh/m2', cells: sums(months.ghi) },
    { label: 'direct normal, kWh/m2', cells: sums(months.dni) },
    { label: 'diffuse horizontal, kWh/m2', cells: sums(months.dhi) },
  ];
  const { clearnessIndex, diffuseFraction, temperature } = months;
  if (clearnessIndex)
    rows.push({ label: 'clearness index', cells: clearnessIndex.map((value) => value.toFixed(2)) });
  if (diffuseFraction)
    rows.push({ label: 'diffuse fraction', cells: diffuseFraction.map((value) => value.toFixed(2)) });
  if (temperature)
    rows.push({ label: 'air temperature, °C', cells: temperature.map((value) => value.toFixed(1)) });
  const notes = months.warnings.map((warning) => `Note: ${shownWords(warning)}\n`).join('');
  return `${shownName(months.name)}\n${shownWords(months.reference)}\nLatitude ${months.latitude}, longitude ${months.longitude}\n${notes}\n${monthsTable(rows)}`;
}
