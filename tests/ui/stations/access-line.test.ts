import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { rangeText } from '../../../src/ui/screens/stations/strip/access-line.tsx';

describe('the range of an access, in words', () => {
  it('is in whole percent, and one figure where both ends are the same', () => {
    expect(rangeText({ low: 0.834, high: 0.9 })).toBe('83 to 90\u00a0%');
    expect(rangeText({ low: 1, high: 1 })).toBe('100\u00a0%');
    expect(rangeText({ low: 0.57, high: 0.58 })).toBe('57 to 58\u00a0%');
  });

  test.prop([fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true })])(
    'is never narrower than the range',
    (a, b) => {
      const [low, high] = [Math.min(a, b), Math.max(a, b)];
      const ends = rangeText({ low, high }).match(/\d+/g)!.map(Number);
      expect(ends[0] / 100).toBeLessThanOrEqual(low + 1e-9);
      expect(ends[ends.length - 1] / 100).toBeGreaterThanOrEqual(high - 1e-9);
    },
  );
});
