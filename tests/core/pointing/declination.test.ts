import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { magneticDeclination } from '../../../src/core/pointing/declination.ts';
import { cell, readTable } from '../../reference-values/published-table.ts';

/** Instant of a decimal year. */
function instantOf(decimalYear: number): number {
  const year = Math.floor(decimalYear);
  const start = Date.UTC(year, 0, 1);
  return start + (decimalYear - year) * (Date.UTC(year + 1, 0, 1) - start);
}

function fieldOf(row: Record<string, string>, altitudeColumn: string) {
  return magneticDeclination({
    latitude: cell(row, 'lat_deg'),
    longitude: cell(row, 'lon_deg'),
    altitude: cell(row, altitudeColumn) * 1000,
    timeMs: instantOf(cell(row, 'decimal_year')),
  });
}

const off = (row: Record<string, string>, declination: number) =>
  Math.abs(turnBetween(cell(row, 'D_deg'), declination));

describe('magneticDeclination', () => {
  // Both official tables print two decimals of the declination. Heights are over the ellipsoid, 0 to 100 km.
  it('gives the 100 official test values of WMM2025 (2025.0 to 2029.5) to their printed digits', () => {
    const rows = readTable('wmm2025_100.csv');
    expect(rows).toHaveLength(100);
    for (const row of rows) {
      const field = fieldOf(row, 'altitude_km');
      expect(off(row, field.declination)).toBeLessThan(0.00501);
      expect(Math.abs(field.horizontalIntensity - cell(row, 'H_nT'))).toBeLessThan(0.01);
    }
  });

  it('gives the 12 values of Table 6 of the WMM2025 report to their printed digits', () => {
    const rows = readTable('wmm2025_12.csv');
    expect(rows).toHaveLength(12);
    for (const row of rows) expect(off(row, fieldOf(row, 'altitude_km').declination)).toBeLessThan(0.00501);
  });

  it('agrees with an independent evaluation of the coefficients at 400 places', () => {
    const rows = readTable('wmm2025_declination_computed_400.csv');
    expect(rows).toHaveLength(400);
    for (const row of rows)
      expect(off(row, fieldOf(row, 'altitude_km_ellipsoid').declination)).toBeLessThan(0.0005);
  });

  it('says when the model is in force', () => {
    const at = (timeMs: number) => magneticDeclination({ latitude: 52, longitude: 13, timeMs });
    expect(at(Date.UTC(2026, 5, 1))).toMatchObject({
      model: 'WMM2025',
      epoch: 2025,
      validUntil: '2030-01-01',
      withinValidity: true,
    });
    expect(at(Date.UTC(2024, 10, 12)).withinValidity).toBe(false);
    expect(at(Date.UTC(2029, 11, 31)).withinValidity).toBe(true);
    expect(at(Date.UTC(2030, 0, 1)).withinValidity).toBe(false);
  });

  it('goes on without a break after the last year of the model', () => {
    const at = (timeMs: number) => magneticDeclination({ latitude: 52, longitude: 13, timeMs }).declination;
    const [before, after] = [at(Date.UTC(2029, 11, 31)), at(Date.UTC(2030, 0, 1))];
    expect(Math.abs(after - before)).toBeLessThan(0.001);
  });

  it('is less sure near the magnetic pole', () => {
    const timeMs = Date.UTC(2026, 0, 1);
    const arctic = magneticDeclination({ latitude: 82, longitude: -130, timeMs });
    const lisbon = magneticDeclination({ latitude: 38.7, longitude: -9.1, timeMs });
    expect(arctic.standardDeviation).toBeGreaterThan(1);
    expect(lisbon.standardDeviation).toBeLessThan(0.4);
  });

  const time = fc.integer({ min: Date.UTC(2024, 0, 1), max: Date.UTC(2032, 0, 1) });
  test.prop([fc.double({ min: -90, max: 90, noNaN: true }), time])(
    'is the same at longitude 180 and -180, and finite at the poles',
    (latitude, timeMs) => {
      const [east, west] = [180, -180].map((longitude) =>
        magneticDeclination({ latitude, longitude, timeMs }),
      );
      expect(Number.isFinite(east.declination)).toBe(true);
      expect(Math.abs(turnBetween(east.declination, west.declination))).toBeLessThan(1e-6);
    },
  );

  it.each([
    [{ latitude: 91, longitude: 0, timeMs: 0 }],
    [{ latitude: 0, longitude: Number.NaN, timeMs: 0 }],
    [{ latitude: 0, longitude: 0, altitude: -2000, timeMs: 0 }],
    [{ latitude: 0, longitude: 0, timeMs: Number.NaN }],
  ])('refuses %o', (query) => {
    expect(() => magneticDeclination(query)).toThrow(RangeError);
  });
});
