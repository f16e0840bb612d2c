import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { angleBetween, vectorOf } from '../../../src/core/angles/vectors.ts';
import { averageDirection, meanDirection } from '../../../src/core/pointing/average-direction.ts';
import type { EventSample } from '../../../src/core/pointing/steadiness.ts';
import { steadiness } from '../../../src/core/pointing/steadiness.ts';
import type { ReadingSample } from '../../../src/core/survey/survey.ts';
import { cameraAt, rounded } from './held-phone.ts';

const row = (ms: number, azimuth: number, elevation: number): ReadingSample => {
  const { alpha, beta, gamma } = rounded(cameraAt(azimuth, elevation));
  return [ms, alpha, beta, gamma];
};
/** A hold of half a second at 60 events a second, trembling by 0.3° each way. */
const hold = (azimuth: number, elevation: number) =>
  Array.from({ length: 30 }, (_, i) =>
    row(i * 17, azimuth + 0.4 * Math.sin(i), elevation + 0.4 * Math.cos(2.3 * i)),
  );

describe('the mean of a hold', () => {
  property.prop([
    fc.double({ min: 0, max: 359.9, noNaN: true }),
    fc.double({ min: -80, max: 80, noNaN: true }),
  ])('lies where the phone pointed, over north, upright and in every other pose', (azimuth, elevation) => {
    const mean = averageDirection(hold(azimuth, elevation))!;
    expect(angleBetween(mean.vector, vectorOf({ azimuth, elevation }))).toBeLessThan(0.15);
    expect(mean.scatter).toBeLessThan(0.7);
  });

  test('of directions all around the zenith is the zenith', () => {
    const around = [0, 90, 180, 270].map((azimuth) => vectorOf({ azimuth, elevation: 80 }));
    const mean = meanDirection(around)!;
    expect(mean.elevation).toBeCloseTo(90, 5);
    expect(mean.scatter).toBeCloseTo(10, 9);
  });

  test('of none, and of opposite ones, is not there', () => {
    expect(averageDirection([])).toBe(null);
    expect(
      meanDirection([vectorOf({ azimuth: 0, elevation: 0 }), vectorOf({ azimuth: 180, elevation: 0 })]),
    ).toBe(null);
  });
});

describe('a hold is refused', () => {
  const reasonOf = (samples: readonly EventSample[], kind = {}) => {
    const judged = steadiness(samples, kind);
    return judged.steady ? 'steady' : judged.reason;
  };

  test('not while it trembles as a hand does, wherever it points', () => {
    for (const [azimuth, elevation] of [
      [0, 0],
      [359.9, 45],
      [180, 85],
      [90, -30],
    ])
      expect(reasonOf(hold(azimuth, elevation))).toBe('steady');
  });

  test('while the phone swings', () => {
    expect(reasonOf(Array.from({ length: 30 }, (_, i) => row(i * 17, i / 10, 10)))).toBe('moving');
  });

  test('while it shakes', () => {
    expect(reasonOf(Array.from({ length: 30 }, (_, i) => row(i * 17, i % 2 ? 3 : 0, 10)))).toBe('moving');
  });

  test('without angles, as a browser without a sensor gives them', () => {
    expect(reasonOf([])).toBe('no-angles');
    expect(reasonOf([[0, null, null, null]])).toBe('no-angles');
    expect(reasonOf([[0, NaN, 90, 0]])).toBe('no-angles');
  });

  test('with too few', () => {
    expect(reasonOf([row(0, 0, 0), row(17, 0, 0)])).toBe('too-few');
  });

  test('where the angles stand still longer than a hand can hold, unless the phone lies', () => {
    const still = Array.from({ length: 100 }, (_, i) => row(i * 17, 20, 10));
    expect(reasonOf(still)).toBe('frozen');
    expect(reasonOf(still, { handHeld: false })).toBe('steady');
  });

  test('rows with missing angles among sound ones are left out', () => {
    const judged = steadiness([[0, null, 90, 0], ...hold(20, 10), [600, Infinity, 0, 0]]);
    expect(judged.steady && judged.rows).toHaveLength(30);
  });
});
