import { describe, expect, it } from 'vitest';
import { noonmark } from './run-noonmark.ts';
import { publishedTableText } from './published-rows.ts';

interface SunRow {
  utc: string;
  latitude: number;
  longitude: number;
  solarAzimuth: number;
  apparentElevation: number;
  geometricElevation: number;
}

describe('sun', () => {
  it('reads rows from standard input and gives a list of six fields', async () => {
    // NREL SPA report (2008), Table A4.1, and NOAA's spreadsheet for 40° N 105° W at noon
    const input =
      'utc,latitude,longitude\r\n2003-10-17T19:30:30Z,39.742476,-105.1786\r\n\r\n2010-06-21T19:00:00Z,40,-105\r\n';
    const { code, out } = await noonmark(['sun', '--json'], { input });
    expect(code).toBe(0);
    const rows = JSON.parse(out) as SunRow[];
    expect(rows.map((row) => Object.keys(row))).toEqual(
      Array(2).fill([
        'utc',
        'latitude',
        'longitude',
        'solarAzimuth',
        'apparentElevation',
        'geometricElevation',
      ]),
    );
    expect(rows[0].utc).toBe('2003-10-17T19:30:30Z');
    expect(Math.abs(rows[0].geometricElevation - 39.872046)).toBeLessThan(0.02);
    expect(Math.abs(rows[0].solarAzimuth - 194.340241)).toBeLessThan(0.026);
    expect(Math.abs(rows[1].apparentElevation - 73.43848)).toBeLessThan(0.02);
  });

  it('takes columns in any order, a clock with an offset, and quotes', async () => {
    const input = '\ufefflongitude,"utc",latitude,note\n-105,"2010-06-21T12:00:00-07:00",40,noon\n';
    const { code, out } = await noonmark(['sun', '--json'], { input });
    expect(code).toBe(0);
    expect(Math.abs((JSON.parse(out) as SunRow[])[0].apparentElevation - 73.43848)).toBeLessThan(0.02);
  });

  it('takes one place by options, negative numbers too', async () => {
    const { code, out } = await noonmark([
      'sun',
      '--at',
      '2010-06-21T19:00Z',
      '--latitude',
      '40',
      '--longitude',
      '-105',
    ]);
    expect(code).toBe(0);
    expect(out).toMatch(/178[.]5\d\d +73[.]43\d/);
  });

  it('tells every bad row with its line and gives no positions', async () => {
    const input = [
      'utc,latitude,longitude',
      '2026-06-21T12:00:00Z,40,-105',
      '2026-06-21T12:00:00Z,95,-105',
      'yesterday,40,-105',
      '2026-02-30T12:00:00Z,40,-105',
      '2026-06-21T12:00:00Z,forty,-105',
      '2026-06-21T12:00:00Z,40,0x10',
      '2026-06-21T12:00:00Z,40',
      '2026-06-21T25:00:00Z,40,1',
      '2026-06-21T12:00:00Z,Infinity,NaN',
    ].join('\n');
    const { code, out, err } = await noonmark(['sun', '--json'], { input });
    expect(code).toBe(1);
    expect(out).toBe('');
    const lines = [...err.matchAll(/line (\d+)/g)].map(([, line]) => Number(line));
    expect(lines).toEqual([3, 4, 5, 6, 7, 8, 9, 10, 10]);
  });

  it.each([
    ['an empty table', '', 'line 1'],
    ['a header without longitude', 'utc,latitude\n', 'longitude'],
  ])('refuses %s', async (_what, input, words) => {
    const { code, err } = await noonmark(['sun', '--json'], { input });
    expect(code).toBe(1);
    expect(err).toContain(words);
  });
});

interface DeclinationRow {
  date: string;
  declination: number;
  withinValidity: boolean;
}

describe('declination', () => {
  it('gives the official WMM2025 test values (Technical Report, Table 6)', async () => {
    const { input, expected } = publishedTableText();
    const { code, out, err } = await noonmark(['declination', '--json'], { input });
    expect(code).toBe(0);
    expect(err).toBe('');
    const rows = JSON.parse(out) as DeclinationRow[];
    expect(rows).toHaveLength(expected.length);
    rows.forEach((row, i) => expect(Math.abs(row.declination - expected[i])).toBeLessThan(0.00501));
  });

  it('says where a date lies outside the model', async () => {
    const input = 'date,latitude,longitude,elevation\n2035-05-01,52,13,50\n2026-05-01,52,13,50\n';
    const { code, out, err } = await noonmark(['declination', '--json'], { input });
    expect(code).toBe(0);
    expect((JSON.parse(out) as DeclinationRow[]).map(({ withinValidity }) => withinValidity)).toEqual([
      false,
      true,
    ]);
    expect(err).toContain('1 of 2 dates');
  });

  it('tells a bad height with its line', async () => {
    const input = 'date,latitude,longitude,elevation\n2026-05-01,52,13,high\n';
    const { code, out, err } = await noonmark(['declination', '--json'], { input });
    expect([code, out]).toEqual([1, '']);
    expect(err).toContain('line 2, elevation');
  });
});
