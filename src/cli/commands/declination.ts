import type { MagneticDeclination } from '../../core/pointing/declination.ts';
import { magneticDeclination } from '../../core/pointing/declination.ts';
import type { Parsed } from '../../core/survey/problem.ts';
import type { Command, CommandCall } from '../command.ts';
import { numberOption, textOption, UsageError } from '../command.ts';
import { readCsv } from '../csv-rows.ts';
import { dateOf } from '../instants.ts';
import { refuseRowsToo, rowsAlone } from '../place-or-rows.ts';
import { problemLines } from '../problem-lines.ts';
import { table } from '../table.ts';

const DATE_FORM = 'must be a date of 1900 to 2100 such as 2026-05-14, or a decimal year such as 2026.5';

interface DeclinationRow extends MagneticDeclination {
  date: string;
  latitude: number;
  longitude: number;
  elevation: number;
}

export const declination: Command = {
  name: 'declination',
  usage: '[--date DATE --latitude DEGREES --longitude DEGREES] [--json] [< rows.csv]',
  summary: 'How far magnetic north lies from true north, by the World Magnetic Model 2025.',
  help: `
Without options, reads rows from standard input: a CSV table whose first line is
    date,latitude,longitude,elevation
with elevation in metres above sea level.

  --date DATE           2026-05-14, an instant, or a decimal year; today where it is left out
  --latitude DEGREES    -90 to 90, north positive
  --longitude DEGREES   -180 to 180, east positive
  --altitude METRES     above sea level; 0 where it is left out
  --json                a list with declination, standardDeviation, model, epoch, validUntil, withinValidity

True azimuth = magnetic azimuth + declination (east positive). Steel nearby turns a compass by far more.`,
  options: {
    date: { type: 'string' },
    latitude: { type: 'string' },
    longitude: { type: 'string' },
    altitude: { type: 'string' },
    json: { type: 'boolean' },
  },
  async run(call) {
    const rows = await rowsOf(call);
    if (!rows.ok) {
      call.terminal.err(problemLines('standard input', rows.problems));
      return 1;
    }
    const outside = rows.value.filter(({ withinValidity }) => !withinValidity);
    if (outside.length > 0)
      call.terminal.err(
        `${outside.length} of ${rows.value.length} dates lie outside the years of ${outside[0].model}; these declinations are extrapolated.\n`,
      );
    call.terminal.out(call.values.json ? `${JSON.stringify(rows.value)}\n` : declinationTable(rows.value));
    return 0;
  },
};

async function rowsOf(call: CommandCall): Promise<Parsed<DeclinationRow[]>> {
  const latitude = numberOption(call, 'latitude', -90, 90);
  const longitude = numberOption(call, 'longitude', -180, 180);
  const altitude = numberOption(call, 'altitude', -1000, 850_000);
  if (latitude !== undefined && longitude !== undefined) {
    refuseRowsToo(call);
    const date = textOption(call, 'date') ?? new Date().toISOString().slice(0, 10);
    const timeMs = dateOf(date);
    if (timeMs === null) throw new UsageError(`--date ${DATE_FORM}, got "${date}"`);
    return {
      ok: true,
      value: [declinationRow(date, timeMs, latitude, longitude, altitude ?? 0)],
      warnings: [],
    };
  }
  const csv = await rowsAlone(call, ['latitude', 'longitude', 'date', 'altitude']);
  return readCsv(csv, ['date', 'latitude', 'longitude', 'elevation'], (row) => {
    const timeMs = dateOf(row.text('date'));
    if (timeMs === null) row.problem('date', DATE_FORM);
    const [lat, lon] = [row.number('latitude', -90, 90), row.number('longitude', -180, 180)];
    const height = row.number('elevation', -1000, 850_000);
    if (timeMs === null || Number.isNaN(lat + lon + height)) return null;
    return declinationRow(row.text('date'), timeMs, lat, lon, height);
  });
}

function declinationRow(
  date: string,
  timeMs: number,
  latitude: number,
  longitude: number,
  elevation: number,
): DeclinationRow {
  const field = magneticDeclination({ latitude, longitude, altitude: elevation, timeMs });
  return { date, latitude, longitude, elevation, ...field };
}

function declinationTable(rows: readonly DeclinationRow[]): string {
  const columns = ['latitude', 'longitude', 'elevation m', 'declination', '± (1 sd)'];
  const lines = rows.map((row) => [
    row.date,
    row.latitude.toFixed(4),
    row.longitude.toFixed(4),
    row.elevation.toFixed(0),
    row.declination.toFixed(2),
    row.standardDeviation.toFixed(2),
    row.withinValidity ? row.model : `${row.model}, out of date`,
  ]);
  return table(
    [{ head: 'date' }, ...columns.map((head) => ({ head, number: true })), { head: 'model' }],
    lines,
  );
}
