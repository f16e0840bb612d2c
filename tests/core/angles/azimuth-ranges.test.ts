import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { isBetween, rangesBetween } from '../../../src/core/angles/azimuth-ranges.ts';

describe('what ranges leave of the circle', () => {
  const range = fc.tuple(fc.integer({ min: 0, max: 359 }), fc.integer({ min: 1, max: 359 }));
  test.prop([fc.array(range, { maxLength: 6 })])('are exactly the azimuths in no range', (pairs) => {
    const ranges = pairs.map(([from, width]): [number, number] => [from, (from + width) % 360]);
    const left = rangesBetween(ranges);
    for (let azimuth = 0.5; azimuth < 360; azimuth++) {
      const inside = pairs.some(([from, width]) => (azimuth - from + 360) % 360 < width);
      expect(left.some((gap) => isBetween(azimuth, gap))).toBe(!inside);
    }
  });

  it('is the whole circle where there are none, and nothing after a full one', () => {
    expect(rangesBetween([])).toEqual([[0, 360]]);
    expect(rangesBetween([[0, 360]])).toEqual([]);
  });

  it('is in one piece over north', () => {
    expect(
      rangesBetween([
        [20, 100],
        [150, 330],
      ]),
    ).toEqual([
      [100, 150],
      [330, 380],
    ]);
    expect(rangesBetween([[350, 10]])).toEqual([[10, 350]]);
  });

  it('is not cut by a range without width, nor by rounding', () => {
    expect(rangesBetween([[200, 200]])).toEqual([[0, 360]]);
    const touching = rangesBetween([
      [0, 100],
      [100 + 1e-12, 360],
    ]);
    expect(touching).toEqual([]);
  });
});
