import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import { datesWhenSunAt } from '../../../src/core/solar-position/when-sun-at.ts';

const home = { latitude: 44.9, longitude: -72.2, timeZone: 'America/New_York' };

describe('datesWhenSunAt', () => {
  it('gives two dates about the same time from the solstice, at the same solar time', () => {
    const visits = datesWhenSunAt({ azimuth: 180, apparentElevation: 45.1 }, home, 2026);
    // the noon sun stands at 90 - latitude at the equinoxes: 20 March 2026 14:46 UTC, 23 September 0:05 UTC, which is
    // the evening of the 22nd here
    expect(visits.map(({ clock }) => [clock.month, clock.day])).toEqual([
      [3, 20],
      [9, 22],
    ]);
    expect(visits[0].clock.hour).toBe(12);
  });

  it('gives one date at a solstice', () => {
    const noon = 90 - home.latitude + 23.44; // obliquity of the ecliptic
    const visits = datesWhenSunAt({ azimuth: 180, apparentElevation: noon + 0.15 }, home, 2026);
    expect(visits.map(({ clock }) => [clock.month, clock.day])).toEqual([[6, 21]]);
  });

  it.each([
    [0, 30],
    [180, 80],
    [180, -5],
    [90, 60],
  ])('gives none at azimuth %d, elevation %d, where the sun never is', (azimuth, apparentElevation) => {
    expect(datesWhenSunAt({ azimuth, apparentElevation }, home, 2026)).toEqual([]);
  });

  it('shows summer time in the clock', () => {
    const [march, september] = datesWhenSunAt({ azimuth: 180, apparentElevation: 35 }, home, 2026);
    expect(march.clock.hour).toBe(12); // February, standard time
    expect(september.clock.hour).toBe(12); // October, summer time: equation of time 14 min, 12:33
    expect(march.clock.minute).not.toBe(september.clock.minute);
    expect(september.clock.month).toBe(10);
  });

  it('answers in the southern hemisphere, at the equator and at the pole', () => {
    const sydney = { latitude: -33.9, longitude: 151.2, timeZone: 'Australia/Sydney' };
    expect(datesWhenSunAt({ azimuth: 0, apparentElevation: 40 }, sydney, 2026)).toHaveLength(2);
    const quito = { latitude: 0, longitude: -78.5, timeZone: 'America/Guayaquil' };
    expect(datesWhenSunAt({ azimuth: 0, apparentElevation: 89.9 }, quito, 2026)).toHaveLength(2);
    const pole = { latitude: 90, longitude: 0, timeZone: 'UTC' };
    expect(datesWhenSunAt({ azimuth: 77, apparentElevation: 12 }, pole, 2026)).toHaveLength(2);
  });

  const place = fc.record({
    latitude: fc.double({ min: -70, max: 70, noNaN: true }),
    longitude: fc.double({ min: -180, max: 180, noNaN: true }),
    altitude: fc.integer({ min: 0, max: 3000 }),
    timeZone: fc.constant('UTC'),
  });
  const time = fc.integer({ min: Date.UTC(2026, 0, 2), max: Date.UTC(2026, 11, 30) });

  test.prop([place, time])('finds the day on which the sun was seen there', (site, timeMs) => {
    const seen = solarPosition(timeMs, site.latitude, site.longitude, site.altitude);
    fc.pre(seen.apparentElevation > 1);
    const visits = datesWhenSunAt(
      { azimuth: seen.solarAzimuth, apparentElevation: seen.apparentElevation },
      site,
      2026,
    );
    expect(visits.length).toBeGreaterThanOrEqual(1);
    expect(visits.length).toBeLessThanOrEqual(2);
    const nearest = Math.min(...visits.map((visit) => Math.abs(visit.timeMs - timeMs))) / 86_400_000;
    expect(nearest).toBeLessThan(1e-5); // under a second
  });

  test.prop([place, time])('puts the sun within half a day of change there', (site, timeMs) => {
    const seen = solarPosition(timeMs, site.latitude, site.longitude, site.altitude);
    fc.pre(seen.apparentElevation > 1 && seen.apparentElevation < 85);
    const direction = { azimuth: seen.solarAzimuth, apparentElevation: seen.apparentElevation };
    for (const visit of datesWhenSunAt(direction, site, 2026)) {
      const then = solarPosition(visit.timeMs, site.latitude, site.longitude, site.altitude);
      const across =
        turnBetween(then.solarAzimuth, seen.solarAzimuth) *
        Math.cos((seen.apparentElevation * Math.PI) / 180);
      expect(Math.hypot(across, then.apparentElevation - seen.apparentElevation)).toBeLessThan(0.21); // half of 0.4° a day at the equinoxes
    }
  });

  it('refuses directions that are none', () => {
    expect(() => datesWhenSunAt({ azimuth: Number.NaN, apparentElevation: 5 }, home, 2026)).toThrow(
      RangeError,
    );
    expect(() => datesWhenSunAt({ azimuth: 5, apparentElevation: 91 }, home, 2026)).toThrow(RangeError);
  });
});
