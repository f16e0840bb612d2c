import { describe, expect, it } from 'vitest';
import { checkAzimuth, checkValue } from '../../../src/core/self-check/check-row.ts';
import type { CheckRow } from '../../../src/core/self-check/check-row.ts';
import { runSelfCheck } from '../../../src/core/self-check/run-self-check.ts';
import { CLOCK_UNIT, shownRow } from '../../../src/core/self-check/shown-row.ts';
import { cell, publishedExample, readTable } from '../../reference-values/published-table.ts';

const groups = runSelfCheck();
const rowsOf = (id: string): CheckRow[] => groups.find((group) => group.id === id)?.rows ?? [];
const published = (id: string, quantity?: string) =>
  rowsOf(id)
    .filter((row) => quantity === undefined || row.quantity === quantity)
    .map((row) => row.published);

describe('runSelfCheck', () => {
  it.each(groups)('$title: every value is met', ({ rows }) => {
    expect(rows.length).toBeGreaterThan(0);
    expect(rows.filter(({ ok }) => !ok)).toEqual([]);
  });

  it('names its sources and gives each row a name of its own', () => {
    for (const { source, allowance, rows } of groups) {
      expect(source.length).toBeGreaterThan(10);
      expect(allowance).toMatch(/^Allowed:/);
      expect(new Set(rows.map(({ name, quantity }) => `${name} ${quantity}`)).size).toBe(rows.length);
    }
  });

  it('gives the same on every call', () => expect(runSelfCheck()).toEqual(groups));
});

describe('the published values built in', () => {
  it('are those of the NOAA spreadsheet', () => {
    const rows = readTable('noaa_spreadsheet_day_2010-06-21_40N_105W.csv');
    const hourly = [6, 8, 10, 12, 14, 16, 18].map((hour) => rows[hour * 10 - 1]);
    const column = (name: string) => hourly.map((row) => Number(cell(row, name).toFixed(5)));
    expect(published('noaa-positions', 'geometric elevation')).toEqual(column('Solar Elevation Angle (deg)'));
    expect(published('noaa-positions', 'apparent elevation')).toEqual(
      column('Solar Elevation corrected for atm refraction (deg)'),
    );
    expect(published('noaa-positions', 'azimuth')).toEqual(column('Solar Azimuth Angle (deg cw from N)'));
  });

  it('are those of Table A4.1 and of Meeus', () => {
    const spa = publishedExample('SPA_A4.1').expected as Record<string, number>;
    expect(published('spa-example')).toEqual([spa.e0_deg, spa.e_deg, spa.azimuth_deg]);
    const meeus = publishedExample('Meeus_28').expected as { eot_28b_rad: number };
    expect(published('equation-of-time')[0]).toBeCloseTo((meeus.eot_28b_rad / (2 * Math.PI)) * 1440, 3);
  });

  it('are the times of NOAA and NREL', () => {
    const minutes = (clock: string) => {
      const [hour, minute, second = 0] = clock.split(':').map(Number);
      return hour * 60 + minute + second / 60;
    };
    const noaa = publishedExample('NOAA_web').expected as Record<'sunrise' | 'noon' | 'sunset', string>[];
    expect(published('noaa-sunrise')).toEqual(
      noaa.flatMap(({ sunrise, noon, sunset }) => [sunrise, noon, sunset].map(minutes)),
    );
    const nrel = publishedExample('SPA_riseset').expected as Record<string, string>[];
    const clocks = [nrel[0], nrel[1]].flatMap((row) => [row.sunrise_utc, row.transit_utc, row.sunset_utc]);
    expect(published('nrel-sunrise')).toEqual(
      [...clocks, nrel[3].sunrise, nrel[3].transit, nrel[3].sunset].map(minutes),
    );
  });

  it('are those of Table 6 of the WMM2025 report', () => {
    expect(published('wmm2025')).toEqual(readTable('wmm2025_12.csv').map((row) => cell(row, 'D_deg')));
  });
});

describe('a row', () => {
  const row = {
    name: 'x',
    quantity: 'y',
    unit: '°',
    decimals: 2,
    published: 10,
    computed: 10.02,
    allowed: 0.01,
  };

  it('fails beyond what is allowed, and where there is no number', () => {
    expect(checkValue(row).ok).toBe(false);
    expect(checkValue({ ...row, allowed: 0.03 }).ok).toBe(true);
    expect(checkValue({ ...row, computed: NaN, allowed: 1e9 }).ok).toBe(false);
  });

  it('compares directions around the circle', () => {
    const north = checkAzimuth({ ...row, published: 359.99, computed: 0.01, allowed: 0.03 });
    expect(north.difference).toBeCloseTo(0.02, 10);
    expect(north.ok).toBe(true);
  });

  it('is shown with its sign and its unit, a time of day as a clock shows it', () => {
    expect(shownRow(checkValue(row))).toEqual({
      published: '10.00°',
      computed: '10.02°',
      difference: '+0.02°',
      allowed: '0.01°',
    });
    const time = checkValue({ ...row, unit: CLOCK_UNIT, published: 434, computed: 433.95, allowed: 0.5 });
    expect(shownRow(time)).toEqual({
      published: '7:14:00',
      computed: '7:13:57',
      difference: '-3 s',
      allowed: '30 s',
    });
  });
});
