import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { gridConvergence } from '../../../src/core/pointing/grid-convergence.ts';
import { centralMeridian } from '../../../src/core/pointing/utm.ts';

const RADIANS = Math.PI / 180;

/**
 * Easting and northing of a transverse Mercator grid on the WGS 84 ellipsoid, metres over scale, by the series of
 * Krüger (1912), as in Karney (2011), Journal of Geodesy 85, 475, to the third order; an independent way to the same
 * angle.
 */
function project(latitude: number, longitude: number, meridian: number): [number, number] {
  const f = 1 / 298.257223563;
  const n = f / (2 - f);
  const e = Math.sqrt(f * (2 - f));
  const sin = Math.sin(latitude * RADIANS);
  const tan = Math.sinh(Math.atanh(sin) - e * Math.atanh(e * sin));
  const east = (longitude - meridian) * RADIANS;
  const xi = Math.atan2(tan, Math.cos(east));
  const eta = Math.atanh(Math.sin(east) / Math.hypot(1, tan));
  const series = [
    n / 2 - (2 * n * n) / 3 + (5 * n ** 3) / 16,
    (13 * n * n) / 48 - (3 * n ** 3) / 5,
    (61 * n ** 3) / 240,
  ];
  let [x, y] = [eta, xi];
  series.forEach((by, i) => {
    const k = 2 * (i + 1);
    x += by * Math.cos(k * xi) * Math.sinh(k * eta);
    y += by * Math.sin(k * xi) * Math.cosh(k * eta);
  });
  return [x, y];
}

/** Grid bearing of true north at a place, degrees: minus the convergence. */
function bearingOfNorth(latitude: number, longitude: number, meridian: number): number {
  const step = 1e-4;
  const [x0, y0] = project(latitude - step, longitude, meridian);
  const [x1, y1] = project(latitude + step, longitude, meridian);
  return Math.atan2(x1 - x0, y1 - y0) / RADIANS;
}

describe('convergence', () => {
  property.prop([
    fc.double({ min: -80, max: 80, noNaN: true }),
    fc.double({ min: -3.5, max: 3.5, noNaN: true }),
    fc.integer({ min: 1, max: 60 }),
  ])(
    'turns a grid bearing into a true one, as a projection of the ellipsoid has it',
    (latitude, off, zone) => {
      const meridian = centralMeridian(zone);
      const longitude = meridian + off;
      const convergence = gridConvergence(latitude, longitude, meridian);
      // true north has true bearing 0 = grid bearing + convergence
      expect(bearingOfNorth(latitude, longitude, meridian) + convergence).toBeCloseTo(0, 2);
    },
  );

  test('is 0 on the meridian and on the equator, and mirrored across both', () => {
    expect(gridConvergence(50, 15, 15)).toBe(0);
    expect(Math.abs(gridConvergence(0, 17, 15))).toBe(0);
    expect(gridConvergence(-50, 17, 15)).toBeCloseTo(-gridConvergence(50, 17, 15), 12);
    expect(gridConvergence(50, 13, 15)).toBeCloseTo(-gridConvergence(50, 17, 15), 12);
  });

  test('over the date line the shorter way counts', () => {
    expect(gridConvergence(-17, -179, centralMeridian(60))).toBeCloseTo(gridConvergence(-17, 181, 177), 12);
  });

  // UTM zones (DMA TM 8358.2): zone 1 is centred on 177° W, zone 31 on 3° E.
  test.each([
    [1, -177],
    [31, 3],
    [33, 15],
    [60, 177],
  ])('zone %d has its meridian at %d', (zone, meridian) => {
    expect(centralMeridian(zone)).toBe(meridian);
  });

  test('what is in no zone is refused', () => {
    expect(() => centralMeridian(61)).toThrow(/zone must be a whole number from 1 to 60, got 61/);
    expect(() => gridConvergence(50, 60, 15)).toThrow(/longitude must be within 30°/);
  });
});
