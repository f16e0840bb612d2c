import { describe, expect, test } from 'vitest';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { siteLight } from '../../../src/core/shading/site-light.ts';
import type { PlaneAngle, PointedPlane } from '../../../src/core/pointing/pointed-survey.ts';
import { orientationInterval } from '../../../src/core/uncertainty/orientation-interval.ts';

const site = { latitude: 45, longitude: 5, altitude: 200, timeZone: 'Europe/Paris' };
const { orientation } = siteLight(site, clearSkyClimate('ineichen'), {
  transposition: 'hay-davies',
  stepMinutes: 15,
});
const factor = (tilt: number, azimuth: number) => orientation.annual(tilt, azimuth) / orientation.best.annual;
const angle = (value: number, standardDeviation: number): PlaneAngle => ({
  value,
  standardDeviation,
  scatter: 0,
  count: 1,
  bothWays: true,
});
const read = (tilt: number, azimuth: number): Pick<PointedPlane, 'tilt' | 'azimuth'> => ({
  tilt: angle(45, tilt),
  azimuth: angle(250, azimuth),
});
const west = { id: 'west', surfaceTilt: 45, surfaceAzimuth: 250 };

describe('how sure the orientation factor is', () => {
  test('by the slope of the factor (first-order propagation, GUM 5.1.2) where that is straight', () => {
    const { low, high } = orientationInterval(orientation, west, read(0.5, 1), 'seed')!;
    const byTilt = (factor(45.5, 250) - factor(44.5, 250)) * 0.5;
    const byAzimuth = (factor(45, 251) - factor(45, 249)) / 2;
    const deviation = Math.hypot(byTilt, byAzimuth);
    // 256 draws: a 2.5 % quantile strays by about a tenth
    expect((high - low) / 2).toBeGreaterThan(1.96 * deviation * 0.8);
    expect((high - low) / 2).toBeLessThan(1.96 * deviation * 1.2);
    expect((high + low) / 2).toBeCloseTo(factor(45, 250), 2);
  });

  test('wider where the phone read the plane worse, and for typed angles by planning values', () => {
    const width = (of: Parameters<typeof orientationInterval>[2]) => {
      const { low, high } = orientationInterval(orientation, west, of, 'seed')!;
      return high - low;
    };
    expect(width(read(1, 4))).toBeGreaterThan(2.5 * width(read(0.4, 1)));
    expect(width({ tilt: null, azimuth: null })).toBe(width(undefined));
    expect(width(undefined)).toBeCloseTo(width(read(1, 2)), 12);
  });

  test('never above 1 and with the factor inside, on the best plane and on a flat one', () => {
    const { surfaceTilt, surfaceAzimuth } = orientation.best;
    const best = orientationInterval(
      orientation,
      { id: 'best', surfaceTilt, surfaceAzimuth },
      undefined,
      's',
    )!;
    expect(best.high).toBe(1);
    expect(best.low).toBeGreaterThan(0.99);
    const flat = orientationInterval(orientation, { ...west, surfaceTilt: 0 }, undefined, 's')!;
    expect(flat.low).toBeLessThanOrEqual(factor(0, 250));
    expect(flat.high).toBeGreaterThanOrEqual(factor(0, 250));
    expect(flat.high - flat.low).toBeLessThan(0.03);
  });

  test('the same for the same survey', () => {
    expect(orientationInterval(orientation, west, undefined, 'a')).toEqual(
      orientationInterval(orientation, west, undefined, 'a'),
    );
  });
});
