import { solarPosition } from '../../core/solar-position/solar-position.ts';
import type { Parsed } from '../../core/survey/problem.ts';
import type { Command, CommandCall } from '../command.ts';
import { numberOption, textOption, UsageError } from '../command.ts';
import { readCsv } from '../csv-rows.ts';
import { INSTANT_FORM, instantOf } from '../instants.ts';
import { refuseRowsToo, rowsAlone } from '../place-or-rows.ts';
import { problemLines } from '../problem-lines.ts';
import type { SunDay } from '../sun-day.ts';
import { sunDay, sunDayText } from '../sun-day.ts';
import { table } from '../table.ts';

interface SunRow {
  utc: string;
  latitude: number;
  longitude: number;
  solarAzimuth: number;
  apparentElevation: number;
  geometricElevation: number;
}

export const sun: Command = {
  name: 'sun',
  usage: '[--latitude DEGREES --longitude DEGREES [--at UTC | --day DAY]] [--json] [< rows.csv]',
  summary: 'Where the sun stands at an instant and place, or at many; sunrise and sunset of a day.',
  help: `
Without options, reads rows from standard input: a CSV table whose first line is
    utc,latitude,longitude
(a column altitude, metres, may be there too). Instants are UTC unless they carry an offset.

  --at UTC              instant such as 2026-06-21T12:00:00Z; now where it is left out
  --day DAY             instead: sunrise, solar noon and sunset of a calendar day such as 2026-06-21
  --time-zone ZONE      of that day, an IANA name such as Europe/Lisbon; UTC where it is left out
  --latitude DEGREES    -90 to 90, north positive
  --longitude DEGREES   -180 to 180, east positive
  --altitude METRES     above sea level, for the pressure that bends the light; 0 where it is left out
  --json                a list of { utc, latitude, longitude, solarAzimuth, apparentElevation, geometricElevation };
                        with --day { day, timeZone, kind, sunrise, solarNoon, sunset, daylight, equationOfTime },
                        instants in UTC or null, minutes

Azimuth is in degrees clockwise from true north. Apparent elevation is what is seen, with refraction.
Never look at the sun, nor point a lens at it.`,
  options: {
    at: { type: 'string' },
    day: { type: 'string' },
    'time-zone': { type: 'string' },
    latitude: { type: 'string' },
    longitude: { type: 'string' },
    altitude: { type: 'string' },
    json: { type: 'boolean' },
  },
  async run(call) {
    const day = dayOf(call);
    if (day) {
      call.terminal.out(call.values.json ? `${JSON.stringify(day)}\n` : sunDayText(day));
      return 0;
    }
    const rows = await rowsOf(call);
    if (!rows.ok) {
      call.terminal.err(problemLines('standard input', rows.problems));
      return 1;
    }
    call.terminal.out(call.values.json ? `${JSON.stringify(rows.value)}\n` : sunTable(rows.value));
    return 0;
  },
};

function dayOf(call: CommandCall): SunDay | null {
  const day = textOption(call, 'day');
  if (day === undefined) {
    if (call.values['time-zone'] !== undefined) throw new UsageError('--time-zone goes with --day.');
    return null;
  }
  const latitude = numberOption(call, 'latitude', -90, 90);
  const longitude = numberOption(call, 'longitude', -180, 180);
  if (latitude === undefined || longitude === undefined || call.values.at !== undefined)
    throw new UsageError('With --day give --latitude and --longitude, and no --at.');
  if (call.values.altitude !== undefined)
    throw new UsageError('--altitude does not go with --day: rise and set are by the usual refraction.');
  refuseRowsToo(call);
  return sunDay(day, textOption(call, 'time-zone') ?? 'UTC', latitude, longitude);
}

async function rowsOf(call: CommandCall): Promise<Parsed<SunRow[]>> {
  const latitude = numberOption(call, 'latitude', -90, 90);
  const longitude = numberOption(call, 'longitude', -180, 180);
  const altitude = numberOption(call, 'altitude', -430, 9000);
  if (latitude !== undefined && longitude !== undefined) {
    refuseRowsToo(call);
    const utc = textOption(call, 'at') ?? new Date().toISOString();
    const timeMs = instantOf(utc);
    if (timeMs === null) throw new UsageError(`--at ${INSTANT_FORM}, got "${utc}"`);
    return { ok: true, value: [sunRow(utc, timeMs, latitude, longitude, altitude)], warnings: [] };
  }
  const csv = await rowsAlone(call, ['latitude', 'longitude', 'at', 'altitude']);
  return readCsv(csv, ['utc', 'latitude', 'longitude'], (row) => {
    const timeMs = instantOf(row.text('utc'));
    if (timeMs === null) row.problem('utc', INSTANT_FORM);
    const [lat, lon] = [row.number('latitude', -90, 90), row.number('longitude', -180, 180)];
    const height = row.text('altitude') === '' ? 0 : row.number('altitude', -430, 9000);
    if (timeMs === null || Number.isNaN(lat + lon + height)) return null;
    return sunRow(row.text('utc'), timeMs, lat, lon, height);
  });
}

function sunRow(utc: string, timeMs: number, latitude: number, longitude: number, altitude = 0): SunRow {
  return { utc, latitude, longitude, ...solarPosition(timeMs, latitude, longitude, altitude) };
}

function sunTable(rows: readonly SunRow[]): string {
  const columns = ['latitude', 'longitude', 'azimuth', 'apparent elevation', 'geometric elevation'];
  return table(
    [{ head: 'utc' }, ...columns.map((head) => ({ head, number: true }))],
    rows.map((row) => [
      row.utc,
      row.latitude.toFixed(4),
      row.longitude.toFixed(4),
      row.solarAzimuth.toFixed(3),
      row.apparentElevation.toFixed(3),
      row.geometricElevation.toFixed(3),
    ]),
  );
}
