import { describe, expect, test } from 'vitest';
import { RandomSource, randomSource } from '../../../src/core/uncertainty/random-source.ts';

describe('the generator', () => {
  test('gives the first numbers of xoshiro128** from the state 1, 2, 3, 4', () => {
    const random = new RandomSource([1, 2, 3, 4]);
    // Computed from the published recurrence by a program of its own in unbounded integers; the first is
    // rotl(2 · 5, 7) · 9 = 11,520.
    expect(Array.from({ length: 10 }, () => random.next())).toEqual([
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ]);
  });

  test('gives the same numbers for the same names, others for others', () => {
    const draw = (...names: string[]) =>
      Array.from(
        { length: 5 },
        (
          (r) => () =>
            r.next()
        )(randomSource(...names)),
      );
    expect(draw('a', 'b')).toEqual(draw('a', 'b'));
    expect(draw('a', 'b')).not.toEqual(draw('ab', ''));
    expect(draw('a', 'b')).not.toEqual(draw('b', 'a'));
  });

  test('refuses a state that would stay 0', () => {
    expect(() => new RandomSource([0, 0, 0, 0])).toThrow(RangeError);
    expect(() => new RandomSource([1, 2])).toThrow(RangeError);
  });
});

describe('distributions, within five standard errors of 20,000 numbers', () => {
  const count = 20_000;
  const moments = (draw: () => number) => {
    const values = Array.from({ length: count }, draw);
    const mean = values.reduce((sum, value) => sum + value, 0) / count;
    const variance = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / count;
    return { mean, variance, beyond: values.filter((value) => Math.abs(value) > 1.959964).length / count };
  };

  test('even', () => {
    const random = randomSource('even');
    const { mean, variance } = moments(() => random.uniform());
    expect(Math.abs(mean - 0.5)).toBeLessThan(5 * Math.sqrt(1 / 12 / count));
    expect(Math.abs(variance - 1 / 12)).toBeLessThan(5 * Math.sqrt(1 / 180 / count));
  });

  test('normal: 5 % beyond 1.96', () => {
    const random = randomSource('normal');
    const { mean, variance, beyond } = moments(() => random.normal());
    expect(Math.abs(mean)).toBeLessThan(5 / Math.sqrt(count));
    expect(Math.abs(variance - 1)).toBeLessThan(5 * Math.sqrt(2 / count));
    expect(Math.abs(beyond - 0.05)).toBeLessThan(5 * Math.sqrt((0.05 * 0.95) / count));
  });

  test('a triangle: mean (a + b + c) / 3', () => {
    const random = randomSource('triangle');
    const { mean, variance } = moments(() => random.triangular(0.02, 0.15, 0.3));
    const expected = (0.02 ** 2 + 0.15 ** 2 + 0.3 ** 2 - 0.02 * 0.15 - 0.02 * 0.3 - 0.15 * 0.3) / 18;
    expect(Math.abs(mean - 0.47 / 3)).toBeLessThan(5 * Math.sqrt(expected / count));
    expect(variance / expected).toBeCloseTo(1, 1);
    expect(random.triangular(0.1, 0.1, 0.1)).toBe(0.1);
  });
});
