import { describe, expect, it } from 'vitest';
import {
  dailyExtraterrestrial,
  dailyExtraterrestrialNormal,
  extraterrestrialNormal,
  monthlyExtraterrestrial,
  spencerDeclination,
} from '../../../src/core/irradiance/extraterrestrial.ts';
import { publishedExample } from '../../reference-values/published-table.ts';
import { readTable } from '../../reference-values/read-table.ts';

/** kWh to MJ. */
const MJ = 3.6;
/** Books before 2011 take 1367 W/m2 for the solar constant. */
const OLD_CONSTANT = 1367 / 1361;

describe('the earth around the sun', () => {
  it('follows Spencer (1971) on each day, as in daily_earth_sun.csv', () => {
    const rows = readTable('daily_earth_sun.csv');
    expect(rows).toHaveLength(365);
    const normals = dailyExtraterrestrialNormal();
    for (const row of rows) {
      const day = row.day_of_year;
      expect(Math.abs(extraterrestrialNormal(day) - row.spencer1971_E0n_1361)).toBeLessThan(0.001);
      expect(normals[day - 1]).toBe(extraterrestrialNormal(day));
      expect(Math.abs(spencerDeclination(day) - row.declination_spencer_deg)).toBeLessThan(0.001);
    }
  });
});

describe('monthlyExtraterrestrial', () => {
  it('is the mean over the days of each month, as in extraterrestrial_H0_computed.csv', () => {
    const rows = readTable('extraterrestrial_H0_computed.csv');
    expect(rows.length).toBe(444);
    for (const { lat_deg, month, H0_meanday_spencer_1361 } of rows)
      expect(
        Math.abs(monthlyExtraterrestrial(lat_deg)[month - 1] * MJ - H0_meanday_spencer_1361),
      ).toBeLessThan(0.002);
  });

  it('agrees with the printed table 1.10.1 of Duffie and Beckman (2013) within 60° of latitude', () => {
    // the print is for one average day of a month with Cooper's declination; the mean of all days departs up to 1.4
    const rows = readTable('extraterrestrial_H0_published.csv').filter((row) => Math.abs(row.lat_deg) <= 60);
    expect(rows.length).toBeGreaterThan(60);
    let departure = 0;
    for (const { lat_deg, month, H0_published_MJ_m2 } of rows) {
      const value = monthlyExtraterrestrial(lat_deg)[month - 1] * MJ * OLD_CONSTANT;
      expect(Math.abs(value - H0_published_MJ_m2)).toBeLessThan(1.4);
      departure += Math.abs(value - H0_published_MJ_m2) / rows.length;
    }
    expect(departure).toBeLessThan(0.3);
  });
});

describe('dailyExtraterrestrial', () => {
  it('gives example 1.10.1 of Duffie and Beckman (2013)', () => {
    const { H0_MJ_m2 } = publishedExample('DB_1.10.1').expected as Record<string, number>;
    expect(Math.abs(dailyExtraterrestrial(43, 105) * MJ * OLD_CONSTANT - H0_MJ_m2)).toBeLessThan(0.25);
  });

  it('gives the 41.8 MJ/m2 of example 2.12.1 (the 33.0 of 2.11.1 is not used: the book equation gives 33.25)', () => {
    const { H0_43N_n162 } = publishedExample('DB_2.11.1_2.12.1').expected as Record<string, number>;
    expect(Math.abs(dailyExtraterrestrial(43, 162) * MJ * OLD_CONSTANT - H0_43N_n162)).toBeLessThan(0.25);
  });

  it('is nothing in polar night and has no gap at the pole', () => {
    expect(dailyExtraterrestrial(80, 355)).toBe(0);
    expect(dailyExtraterrestrial(-90, 172)).toBe(0);
    expect(dailyExtraterrestrial(90, 172)).toBeCloseTo(dailyExtraterrestrial(89.999, 172), 4);
    expect(() => dailyExtraterrestrial(91, 1)).toThrow(RangeError);
  });
});
