import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { geometricOf, refraction, standardPressure } from '../../../src/core/solar-position/refraction.ts';
import { publishedExample } from '../../reference-values/published-table.ts';

describe('refraction', () => {
  it('gives the value of Meeus, example 16.a', () => {
    const published = publishedExample('Meeus_16a').expected as Record<string, number>;
    // the example's lower limb stands at 1.246' true; upper limb at 33.246' true is bent by 24.618'
    const bent = refraction(published.true_upper_limb_arcmin / 60, 1010) * 60;
    expect(bent * (285 / 283)).toBeCloseTo(published.R_saemundsson_arcmin, 1);
  });

  const pressure = fc.double({ min: 500, max: 1060, noNaN: true });

  test.prop([fc.double({ min: -1, max: 89.9, noNaN: true }), pressure])(
    'is undone by geometricOf',
    (geometric, hPa) => {
      expect(geometricOf(geometric + refraction(geometric, hPa), hPa)).toBeCloseTo(geometric, 9);
    },
  );

  test.prop([fc.double({ min: -1, max: 89, noNaN: true }), pressure])(
    'never turns two elevations round',
    (low, hPa) => {
      const high = low + 0.01;
      expect(high + refraction(high, hPa)).toBeGreaterThan(low + refraction(low, hPa));
    },
  );

  it('refuses an elevation that is none', () => {
    expect(() => geometricOf(90.5)).toThrow(RangeError);
    expect(() => geometricOf(Number.NaN)).toThrow(RangeError);
  });
});

describe('standardPressure', () => {
  it('follows the ICAO standard atmosphere at round heights', () => {
    // ICAO Doc 7488 (1993), table 1: 0 m 1013.25, 1000 m 898.75, 3000 m 701.09 hPa (from memory, to its digits)
    expect(standardPressure(0)).toBeCloseTo(1013.25, 2);
    expect(Math.abs(standardPressure(1000) - 898.75)).toBeLessThan(0.05);
    expect(Math.abs(standardPressure(3000) - 701.09)).toBeLessThan(0.05);
  });

  it('refuses heights outside the table', () => {
    expect(() => standardPressure(12_000)).toThrow(RangeError);
    expect(() => standardPressure(Number.NaN)).toThrow(RangeError);
  });
});
