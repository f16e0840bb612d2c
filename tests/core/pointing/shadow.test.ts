import { describe, expect, test } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { LOWEST_SHADOW_SUN, SHADOW_LIMIT, shadowSun } from '../../../src/core/pointing/shadow-error.ts';
import { sunShadow } from '../../../src/core/pointing/sun-shadow.ts';
import { usableShadowHours } from '../../../src/core/pointing/usable-shadow-hours.ts';
import { localDay } from '../../../src/core/solar-position/local-day.ts';
import { solarTimes } from '../../../src/core/solar-position/solar-times.ts';
import { cell, readTable } from '../../reference-values/published-table.ts';

const check = { id: 'h', method: 'sun-shadow' } as const;
const reference = (time: string, latitude: number, longitude: number) =>
  sunShadow.reference({ check, site: { latitude, longitude, timeZone: 'UTC' }, takenAtMs: Date.parse(time) });

describe('the direction of a shadow', () => {
  // The azimuths are those of NOAA’s spreadsheet; a shadow points the other way.
  test('is the sun’s azimuth + 180°, in both hemispheres', () => {
    const rows = readTable('noaa_spreadsheet_day_2010-06-21_40N_105W.csv');
    expect(rows.length).toBeGreaterThan(200);
    let compared = 0;
    for (const row of rows) {
      const columns = Object.keys(row);
      const azimuth = cell(row, columns.at(-1)!);
      const daysSinceNoon = cell(row, columns[2]) - 2440587.5;
      const found = reference(new Date(daysSinceNoon * 86_400_000).toISOString(), 40, -105);
      if (!found.ok) continue;
      compared++;
      expect(Math.abs(turnBetween(found.azimuth, azimuth + 180))).toBeLessThan(0.05);
    }
    expect(compared).toBeGreaterThan(100);
    const south = reference('2026-12-21T01:00:00Z', -35, 150);
    const north = reference('2026-06-21T01:00:00Z', 35, 150);
    // at opposite seasons the sun's path is mirrored, but for the equation of time
    expect(south.ok && north.ok && Math.abs(turnBetween(south.azimuth, 180 - north.azimuth))).toBeLessThan(6);
  });

  test('is refused at night, by day’s edge and with the sun near the zenith, each with what to do', () => {
    expect(reference('2026-05-14T04:00:00Z', 44, -72)).toMatchObject({
      ok: false,
      message: expect.stringMatching(/sun was down/) as string,
    });
    expect(reference('2026-05-14T09:35:00Z', 44, -72)).toMatchObject({
      ok: false,
      message: expect.stringMatching(/too faint/) as string,
    });
    expect(reference('2026-03-20T12:05:00Z', 0.2, 0)).toMatchObject({
      ok: false,
      message: expect.stringMatching(/so high/) as string,
    });
    expect(reference('2026-03-20T09:00:00Z', 0.2, 0)).toMatchObject({ ok: true });
  });
});

describe('usable hours', () => {
  const day = { year: 2026, month: 5, day: 14 };
  const site = { latitude: 44, longitude: -72, timeZone: 'America/New_York' };

  test('of a day at 44° north begin a little after sunrise and end a little before sunset', () => {
    const [hours, ...more] = usableShadowHours(day, site);
    const sun = solarTimes(day, site.timeZone, site.latitude, site.longitude)!;
    expect(more).toEqual([]);
    if (sun.kind !== 'rises-and-sets') throw new Error(sun.kind);
    for (const minutes of [(hours.fromMs - sun.sunriseMs) / 60_000, (sun.sunsetMs - hours.toMs) / 60_000]) {
      expect(minutes).toBeGreaterThan(10);
      expect(minutes).toBeLessThan(40);
    }
  });

  test('under a sun that passes the zenith leave the middle of the day out', () => {
    const hours = usableShadowHours(
      { year: 2026, month: 3, day: 20 },
      { latitude: 0, longitude: 0, timeZone: 'UTC' },
    );
    expect(hours).toHaveLength(2);
    expect(hours[0].toMs).toBeLessThan(Date.parse('2026-03-20T12:07:00Z'));
    expect(hours[1].fromMs).toBeGreaterThan(Date.parse('2026-03-20T12:07:00Z'));
  });

  test('are none in polar night, and the whole day under the midnight sun', () => {
    const tromso = { latitude: 69.65, longitude: 18.96, timeZone: 'Europe/Oslo' };
    expect(usableShadowHours({ year: 2026, month: 12, day: 21 }, tromso)).toEqual([]);
    const north = { latitude: 80, longitude: 18.96, timeZone: 'Europe/Oslo' };
    const midsummer = { year: 2026, month: 6, day: 21 };
    const { startMs, endMs } = localDay(midsummer, north.timeZone)!;
    expect(usableShadowHours(midsummer, north)).toEqual([{ fromMs: startMs, toMs: endMs }]);
  });

  test.each([-60, -35, 0, 10, 35, 60])(
    'at latitude %d every instant inside is accepted and every one outside is not',
    (latitude) => {
      const place = { latitude, longitude: 20, timeZone: 'UTC' };
      const hours = usableShadowHours(day, place);
      const { startMs, endMs } = localDay(day, 'UTC')!;
      for (let timeMs = startMs; timeMs < endMs; timeMs += 11 * 60_000) {
        const near = hours.some(
          ({ fromMs, toMs }) => Math.min(Math.abs(timeMs - fromMs), Math.abs(timeMs - toMs)) < 2000,
        );
        const inside = hours.some(({ fromMs, toMs }) => timeMs >= fromMs && timeMs <= toMs);
        const { apparentElevation, standardDeviation } = shadowSun(timeMs, place);
        if (!near)
          expect(inside).toBe(apparentElevation >= LOWEST_SHADOW_SUN && standardDeviation <= SHADOW_LIMIT);
      }
    },
  );

  test('a worse clock narrows them', () => {
    const at = Date.parse('2026-05-14T17:00:00Z');
    expect(shadowSun(at, site, 5).standardDeviation).toBeGreaterThan(SHADOW_LIMIT);
    expect(shadowSun(at, site).standardDeviation).toBeLessThan(SHADOW_LIMIT);
  });
});
