import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { projected, unprojected } from '../../../src/core/pointing/transverse-mercator.ts';

const RADIANS = Math.PI / 180;
// WGS 84 (NIMA TR8350.2): equatorial radius and flattening.
const RADIUS = 6_378_137;
const E2 = (1 / 298.257223563) * (2 - 1 / 298.257223563);

/** Radius of curvature of the meridian, and of the circle of latitude, metres; by their definitions. */
const meridianRadius = (latitude: number) =>
  (RADIUS * (1 - E2)) / (1 - E2 * Math.sin(latitude * RADIANS) ** 2) ** 1.5;
const parallelRadius = (latitude: number) =>
  (RADIUS * Math.cos(latitude * RADIANS)) / Math.sqrt(1 - E2 * Math.sin(latitude * RADIANS) ** 2);

/** Length of the meridian from the equator, metres, by Simpson's rule on its radius of curvature. */
function meridianArc(latitude: number): number {
  const steps = 2000;
  const h = (latitude * RADIANS) / steps;
  let sum = 0;
  for (let i = 0; i <= steps; i++)
    sum += (i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2) * meridianRadius((latitude * i) / steps);
  return (sum * h) / 3;
}

// The projection is the one that is conformal and true to length on its central meridian: both together define it.
describe('the transverse Mercator projection', () => {
  it.each([-90, -45, -0.5, 0, 1, 30, 51.5, 84, 90])(
    'is true to length on its meridian up to %d°',
    (latitude) => {
      const { east, north } = projected(latitude, 9, 9);
      expect(east).toBe(0);
      expect(north).toBeCloseTo(meridianArc(latitude), 5);
    },
  );

  // Quadrant of the WGS 84 meridian, 10001965.729 m (common value, from memory).
  it('has the pole a quadrant from the equator', () => {
    expect(projected(90, 0, 0).north).toBeCloseTo(10_001_965.729, 3);
  });

  const place = [
    fc.double({ min: -84, max: 84, noNaN: true }),
    fc.double({ min: -30, max: 30, noNaN: true }),
  ] as const;

  property.prop([...place])('is conformal: alike in both directions, and square', (latitude, east) => {
    const step = 1e-4;
    const at = (dLatitude: number, dLongitude: number) =>
      projected(latitude + dLatitude * step, east + dLongitude * step, 0);
    const metresNorth = 2 * step * RADIANS * meridianRadius(latitude);
    const metresEast = 2 * step * RADIANS * parallelRadius(latitude);
    const [s, n, w, e] = [at(-1, 0), at(1, 0), at(0, -1), at(0, 1)];
    const alongNorth = [(n.east - s.east) / metresNorth, (n.north - s.north) / metresNorth];
    const alongEast = [(e.east - w.east) / metresEast, (e.north - w.north) / metresEast];
    expect(alongEast[0]).toBeCloseTo(alongNorth[1], 6);
    expect(alongEast[1]).toBeCloseTo(-alongNorth[0], 6);
  });

  property.prop([...place, fc.integer({ min: -180, max: 180 })])(
    'is undone to a thousand-millionth of a degree',
    (latitude, east, meridian) => {
      const back = unprojected(projected(latitude, meridian + east, meridian), meridian);
      expect(Math.abs(back.latitude - latitude)).toBeLessThan(1e-9);
      const turn = (((back.longitude - meridian - east) % 360) + 540) % 360;
      expect(Math.abs(turn - 180)).toBeLessThan(1e-9);
    },
  );

  it('refuses what it cannot show', () => {
    expect(() => projected(91, 0, 0)).toThrow('latitude must be -90 to 90, got 91');
    expect(() => projected(0, 100, 0)).toThrow('longitude must be within 60° of the meridian 0, got 100');
    expect(() => projected(NaN, 0, 0)).toThrow(RangeError);
    expect(() => unprojected({ east: 6e6, north: 0 }, 0)).toThrow('east must be within 5000 km');
    expect(() => unprojected({ east: 0, north: 2e7 }, 0)).toThrow('north must be within 10100 km');
  });
});
