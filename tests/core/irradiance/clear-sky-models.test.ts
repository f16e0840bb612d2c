import { describe, expect, it } from 'vitest';
import { RADIANS } from '../../../src/core/angles/angles.ts';
import { erbsDiffuse, erbsDiffuseFraction } from '../../../src/core/irradiance/erbs.ts';
import { haurwitz } from '../../../src/core/irradiance/haurwitz.ts';
import { ineichen } from '../../../src/core/irradiance/ineichen.ts';
import { readTable } from '../../reference-values/read-table.ts';

const cosine = (degrees: number) => Math.cos(degrees * RADIANS);

describe('ineichen', () => {
  it('gives the 2,000 rows of clearsky_dense.csv (Ineichen and Perez 2002, no enhancement factor)', () => {
    const rows = readTable('clearsky_dense.csv').filter((row) => row.apparent_zenith_deg < 90);
    expect(rows.length).toBeGreaterThan(1500);
    const light = { ghi: 0, dni: 0, dhi: 0 };
    for (const row of rows) {
      const sky = ineichen(row.altitude_m, row.linke_turbidity);
      sky(cosine(row.apparent_zenith_deg), row.airmass_abs, row.dni_extra, light);
      expect(Math.abs(light.ghi - row.ineichen_ghi)).toBeLessThan(0.01);
      expect(Math.abs(light.dni - row.ineichen_dni)).toBeLessThan(0.01);
      expect(Math.abs(light.dhi - row.ineichen_dhi)).toBeLessThan(0.01);
    }
  });

  it('has no light with the sun down', () => {
    const light = { ghi: 1, dni: 1, dhi: 1 };
    ineichen(0, 3)(-0.1, 38, 1361, light);
    expect(light).toEqual({ ghi: 0, dni: 0, dhi: 0 });
  });

  it('refuses turbidity and altitude that cannot be', () => {
    expect(() => ineichen(0, 0.5)).toThrow(/linkeTurbidity.*0.5/);
    expect(() => ineichen(20_000, 3)).toThrow(/altitude.*20000/);
  });
});

describe('haurwitz', () => {
  it('gives the rows of clearsky_dense.csv', () => {
    const rows = readTable('clearsky_dense.csv');
    expect(rows).toHaveLength(2000);
    for (const row of rows)
      expect(Math.abs(haurwitz(cosine(row.apparent_zenith_deg)) - row.haurwitz_ghi)).toBeLessThan(0.01);
  });
});

describe('erbs', () => {
  it('gives the diffuse and the beam of decomposition_dense.csv (Erbs, Klein and Duffie 1982)', () => {
    const rows = readTable('decomposition_dense.csv').filter((row) => Number.isFinite(row.erbs_dhi));
    expect(rows.length).toBeGreaterThan(1500);
    for (const row of rows) {
      const cosZenith = cosine(row.solar_zenith_deg);
      const dhi = erbsDiffuse(row.ghi, cosZenith, row.dni_extra_1366p1_spencer);
      expect(Math.abs(dhi - row.erbs_dhi)).toBeLessThan(0.01);
      expect(Math.abs(dhi + row.erbs_dni * Math.max(cosZenith, 0) - row.ghi)).toBeLessThan(0.01);
    }
  });

  it('gives the diffuse share of example 2.15.1 of Duffie and Beckman (computed from the equation)', () => {
    expect(erbsDiffuseFraction(0.44542)).toBeCloseTo(0.76548, 4);
  });
});
