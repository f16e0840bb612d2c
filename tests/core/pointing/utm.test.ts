import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import {
  bandLatitudes,
  placeOfUtm,
  utmBand,
  utmOf,
  UTM_BANDS,
  utmZone,
  utmZoneNumber,
} from '../../../src/core/pointing/utm.ts';

describe('the zone of a map grid', () => {
  // Zones by definition: 6 degrees wide, zone 1 from 180 west.
  it.each([
    [{ latitude: 48, longitude: 9 }, '32N'],
    [{ latitude: -34, longitude: 151 }, '56S'],
    [{ latitude: 0, longitude: -180 }, '1N'],
    [{ latitude: 10, longitude: 180 }, '1N'],
    [{ latitude: 10, longitude: 179.999 }, '60N'],
  ])('of %o is %s', (place, zone) => expect(utmZone(place)).toBe(zone));

  // The exceptions of DMA TM 8358.1, chapter 3 (from memory): 32V from 3° E on, 31X, 33X, 35X and 37X only.
  it.each([
    [60.39, 5.32, 32],
    [60.39, 2.9, 31],
    [55.9, 5.3, 31],
    [64.1, 5.3, 31],
    [78.22, 15.63, 33],
    [78.9, 8.9, 31],
    [80, 20.9, 33],
    [80, 21.1, 35],
    [80, 33.5, 37],
    [80, 42.1, 38],
    [71.9, 8, 32],
  ])('at %d, %d is %d', (latitude, longitude, zone) => {
    expect(utmZoneNumber(latitude, longitude)).toBe(zone);
  });
});

describe('a band', () => {
  it('has eight degrees, the last one twelve, and none lies at the poles', () => {
    expect(utmBand(-80)).toBe('C');
    expect(utmBand(-0.001)).toBe('M');
    expect(utmBand(0)).toBe('N');
    expect(utmBand(52.5)).toBe('U');
    expect(utmBand(84)).toBe('X');
    expect(utmBand(84.01)).toBeNull();
    expect(utmBand(-80.01)).toBeNull();
    for (const band of UTM_BANDS) {
      const { least, most } = bandLatitudes(band);
      expect(utmBand((least + most) / 2)).toBe(band);
    }
    expect(() => bandLatitudes('I')).toThrow('got I');
  });
});

describe('a place on the grid', () => {
  it('has 500 km on the meridian, 0.9996 as scale there, and 10000 km more in the south', () => {
    expect(utmOf(0, 3)).toMatchObject({ zone: 31, easting: 500_000, northing: 0 });
    const [one, other] = [utmOf(0, 3), utmOf(0.001, 3)];
    // Radius of curvature of the meridian at the equator, a(1 - e²) = 6335439.327 m (from memory).
    expect(other.northing - one.northing).toBeCloseTo(0.9996 * 6_335_439.327 * 0.001 * (Math.PI / 180), 4);
    const south = utmOf(-45, 3);
    expect(south).toMatchObject({ hemisphere: 'south', easting: 500_000 });
    expect(south.northing).toBeCloseTo(10_000_000 - utmOf(45, 3).northing, 6);
  });

  // A tower in Toronto, 43°38'33.24" N 79°23'13.7" W: 17T 630084 4833438 (often printed; from memory).
  it('is as printed', () => {
    const { zone, easting, northing } = utmOf(43 + 38 / 60 + 33.24 / 3600, -(79 + 23 / 60 + 13.7 / 3600));
    expect(zone).toBe(17);
    expect(Math.abs(easting - 630_084)).toBeLessThan(1);
    expect(Math.abs(northing - 4_833_438)).toBeLessThan(1);
  });

  property.prop([
    fc.double({ min: -80, max: 84, noNaN: true }),
    fc.double({ min: -180, max: 180, noNaN: true }),
  ])('is read back', (latitude, longitude) => {
    const back = placeOfUtm(utmOf(latitude, longitude));
    expect(Math.abs(back.latitude - latitude)).toBeLessThan(1e-9);
    const turn = (((back.longitude - longitude) % 360) + 540) % 360;
    expect(Math.abs(turn - 180)).toBeLessThan(1e-9);
  });
});
