import { basename } from 'node:path';
import type { WeatherFile } from '../../core/irradiance/weather-file.ts';
import { parseWeatherFile } from '../../core/irradiance/weather-file.ts';
import { DAYS_IN_MONTH } from '../../core/solar-position/sun-track.ts';
import type { Command } from '../command.ts';
import { problemLines, warningLines } from '../problem-lines.ts';
import { readWeatherText } from '../read-file.ts';
import { shownName, shownWords } from '../shown-name.ts';
import { grouped, monthsTable } from '../table.ts';

export const weather: Command = {
  name: 'weather',
  usage: 'FILE [--json]',
  summary: 'Reads a weather file (EPW or TMY3 CSV) and sums it by month.',
  help: `
  --json   { file, place, format, latitude, longitude, altitude, utcOffset, ghi, dni, dhi: { annual, monthly },
             temperature: { annual, monthly }, warnings }; irradiation in kWh/m2, temperature in °C,
             utcOffset in minutes`,
  options: { json: { type: 'boolean' } },
  run({ files: [file], values, terminal }) {
    const read = readWeatherText(file);
    const parsed = read.ok ? parseWeatherFile(read.value.text, basename(file)) : read;
    if (!parsed.ok) {
      if (values.json) terminal.out(`${JSON.stringify({ file, problems: parsed.problems }, null, 1)}\n`);
      terminal.err(problemLines(file, parsed.problems));
      return 1;
    }
    terminal.err(warningLines(file, parsed.warnings));
    const sums = { file, ...weatherSums(parsed.value) };
    terminal.out(values.json ? `${JSON.stringify(sums, null, 1)}\n` : weatherText(sums));
    return 0;
  },
};

interface Sums {
  annual: number;
  monthly: number[];
}

function weatherSums(weatherFile: WeatherFile) {
  const { place, format, latitude, longitude, altitude, utcOffset, warnings } = weatherFile;
  const kilowattHours = (values: Float32Array): Sums => {
    const monthly = monthSums(values).map((sum) => sum / 1000);
    return { monthly, annual: monthly.reduce((sum, value) => sum + value, 0) };
  };
  const warmth = monthSums(weatherFile.temperature);
  return {
    ...{ place, format, latitude, longitude, altitude, utcOffset },
    ghi: kilowattHours(weatherFile.ghi),
    dni: kilowattHours(weatherFile.dni),
    dhi: kilowattHours(weatherFile.dhi),
    temperature: {
      annual: warmth.reduce((sum, value) => sum + value, 0) / 8760,
      monthly: warmth.map((sum, month) => sum / (DAYS_IN_MONTH[month] * 24)),
    },
    warnings,
  };
}

/** Sums of 8,760 hourly values by month. */
function monthSums(values: Float32Array): number[] {
  let hour = 0;
  return DAYS_IN_MONTH.map((days) => {
    let sum = 0;
    for (const end = hour + days * 24; hour < end; hour++) sum += values[hour];
    return sum;
  });
}

function weatherText(sums: ReturnType<typeof weatherSums> & { file: string }): string {
  const row = (label: string, { monthly, annual }: Sums, decimals: number) => ({
    label,
    cells: [...monthly, annual].map((value) => grouped(value, decimals)),
  });
  const hours = sums.utcOffset / 60;
  return [
    `${shownName(sums.place)} (${sums.format} file ${shownWords(sums.file)})`,
    `Latitude ${sums.latitude}, longitude ${sums.longitude}, ${sums.altitude} m above sea level, UTC${hours < 0 ? '' : '+'}${hours}`,
    '',
    monthsTable([
      row('global horizontal, kWh/m2', sums.ghi, 1),
      row('direct normal, kWh/m2', sums.dni, 1),
      row('diffuse horizontal, kWh/m2', sums.dhi, 1),
      row('air temperature, °C', sums.temperature, 1),
    ]),
  ].join('\n');
}
