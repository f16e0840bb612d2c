import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { fitOffset } from '../../../src/core/pointing/heading-fit.ts';

const look = (minutes: number, offset: number, standardDeviation = 1) => ({
  atMs: minutes * 60_000,
  offset: turnBetween(0, offset),
  standardDeviation,
});
const unknown = { value: 0, standardDeviation: 0.5 };

describe('an offset and its drift from looks at it', () => {
  test('of one look are that look, and what was known of the drift', () => {
    expect(fitOffset([look(3, 40)], { value: 0.1, standardDeviation: 0.2 })).toMatchObject({
      offset: 40,
      standardDeviation: 1,
      atMs: 180_000,
      ratePerMinute: expect.closeTo(0.1, 9) as number,
      ratePerMinuteDeviation: expect.closeTo(0.2, 9) as number,
    });
  });

  test('weigh the looks by their deviations', () => {
    const { offset, standardDeviation } = fitOffset([look(0, 10, 1), look(0, 16, 2)], {
      value: 0,
      standardDeviation: 0,
    });
    expect(offset).toBeCloseTo(11.2, 9); // (10 + 16/4) / (1 + 1/4)
    expect(standardDeviation).toBeGreaterThan(1 / Math.sqrt(1.25));
  });

  property.prop([
    fc.double({ min: -180, max: 180, noNaN: true }),
    fc.double({ min: -0.4, max: 0.4, noNaN: true }),
  ])('find a steady drift again, over 180° too', (start, rate) => {
    const looks = [0, 10, 20].map((minutes) => look(minutes, start + rate * minutes, 0.01));
    const fit = fitOffset(looks, unknown);
    expect(fit.ratePerMinute).toBeCloseTo(rate, 3);
    expect(Math.abs(turnBetween(fit.offset, start + rate * 10))).toBeLessThan(1e-3);
  });

  test('that disagree beyond their deviations are as unsure as they differ', () => {
    const held = { value: 0, standardDeviation: 0 };
    const { standardDeviation, disagreement } = fitOffset([look(0, 0), look(1, 10)], held);
    expect(disagreement).toBeCloseTo(Math.sqrt(50), 6);
    expect(standardDeviation).toBeCloseTo(5, 6);
  });

  test('of no looks is refused', () => {
    expect(() => fitOffset([], unknown)).toThrow(/at least one look/);
  });
});
