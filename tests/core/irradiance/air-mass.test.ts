import { describe, expect, it } from 'vitest';
import { airMassAt, relativeAirMass } from '../../../src/core/irradiance/air-mass.ts';
import { RADIANS } from '../../../src/core/angles/angles.ts';
import { readTable } from '../../reference-values/read-table.ts';

describe('relativeAirMass', () => {
  it('gives the table of Kasten and Young (1989)', () => {
    const rows = readTable('airmass.csv').filter((row) => row.zenith_deg <= 90);
    expect(rows.length).toBeGreaterThan(90);
    for (const { zenith_deg, kastenyoung1989 } of rows) {
      expect(Math.abs(relativeAirMass(zenith_deg) - kastenyoung1989)).toBeLessThan(2e-5);
      expect(Math.abs(airMassAt(Math.cos(zenith_deg * RADIANS)) - kastenyoung1989)).toBeLessThan(2e-5);
    }
  });

  it('is 38 at the horizon and held below it', () => {
    // the last row of the table
    expect(relativeAirMass(90)).toBeCloseTo(37.92, 2);
    expect(relativeAirMass(120)).toBeCloseTo(relativeAirMass(90), 9);
  });

  it('refuses what is no zenith angle', () => {
    expect(() => relativeAirMass(-1)).toThrow(RangeError);
    expect(() => relativeAirMass(Number.NaN)).toThrow(/apparentZenith.*NaN/);
  });
});
