import { describe, expect, it } from 'vitest';
import { readTable } from '../reference-values/read-table.ts';
import { noonmark } from './run-noonmark.ts';

const day = async (...options: string[]) => noonmark(['sun', '--day', ...options]);

describe('sun --day', () => {
  /** NOAA's spreadsheet for 40° N 105° W on 21 June 2010 (see PROVENANCE-sun.md): sunrise 04:31, sunset 19:32 local. */
  it('gives the times of a published day in the clocks of its zone', async () => {
    const { code, out } = await day(
      '2010-06-21',
      '--time-zone',
      'Etc/GMT+7',
      '--latitude',
      '40',
      '--longitude',
      '-105',
      '--json',
    );
    expect(code).toBe(0);
    const { kind, sunrise, sunset } = JSON.parse(out) as { kind: string; sunrise: string; sunset: string };
    expect(kind).toBe('rises-and-sets');
    const noaa = readTable('noaa_spreadsheet_day_2010-06-21_40N_105W.csv')[120];
    const fraction = (utc: string) => ((Date.parse(utc) - Date.UTC(2010, 5, 21, 7)) / 86_400_000 + 1) % 1;
    expect(Math.abs(fraction(sunrise) - noaa['Sunrise Time (LST)']) * 1440).toBeLessThan(0.5);
    expect(Math.abs(fraction(sunset) - noaa['Sunset Time (LST)']) * 1440).toBeLessThan(0.5);
  });

  it.each([
    ['2026-06-21', 'Polar day: the sun does not set.'],
    ['2026-12-21', 'Polar night: the sun does not rise.'],
  ])('answers for a place beyond the polar circle on %s', async (date, sentence) => {
    const { code, out } = await day(
      date,
      '--latitude',
      '69.65',
      '--longitude',
      '18.96',
      '--time-zone',
      'Europe/Oslo',
    );
    expect(code).toBe(0);
    expect(out).toContain(sentence);
    expect(out).toMatch(/sunrise +none/);
  });

  it.each([
    [['2026-02-30', '--latitude', '1', '--longitude', '1'], '--day must be a day'],
    [
      ['2026-06-21', '--latitude', '1', '--longitude', '1', '--time-zone', 'Mars/Olympus'],
      '--time-zone must be an IANA name',
    ],
    [['2026-06-21', '--latitude', '1'], 'give --latitude and --longitude'],
    [
      ['2011-12-30', '--latitude', '-13.8', '--longitude', '-171.8', '--time-zone', 'Pacific/Apia'],
      'left out the day 2011-12-30',
    ],
  ])('refuses %j as wrong usage', async (options, sentence) => {
    const { code, err } = await day(...options);
    expect(code).toBe(2);
    expect(err).toContain(sentence);
  });
});
