import { expect, test } from 'vitest';
import { accessTimesOrientation } from '../../../src/core/assessment/access-times-orientation.ts';
import type { PlaneAccess } from '../../../src/core/shading/assessment.ts';

const access = (annual: number, low?: number, high?: number): PlaneAccess => ({
  annual,
  monthly: [],
  method: 'stations-mean',
  lowest: annual,
  count: 1,
  ...(low !== undefined && high !== undefined
    ? { interval: { low, high, standardDeviation: (high - low) / 4, draws: 1000, sources: [] } }
    : {}),
});

test('is the product, with relative half-widths added in squares (GUM 5.1.6): 3 % and 4 % make 5 %', () => {
  const found = accessTimesOrientation({
    solarAccess: access(0.5, 0.485, 0.515),
    orientationFactor: 0.8,
    orientationInterval: { low: 0.768, high: 0.832 },
  })!;
  expect(found.value).toBeCloseTo(0.4, 12);
  expect(found.low).toBeCloseTo(0.38, 12);
  expect(found.high).toBeCloseTo(0.42, 12);
});

test('has the ends of its value where nothing is known of them, and none where nobody measured', () => {
  const bare = accessTimesOrientation({ solarAccess: access(0.9), orientationFactor: 0.9 })!;
  expect(bare.low).toBeCloseTo(0.81, 12);
  expect(bare.high).toBeCloseTo(0.81, 12);
  expect(accessTimesOrientation({ solarAccess: null, orientationFactor: 0.9 })).toBeNull();
});

test('follows an interval that lies below its value, as where sky that nobody looked at counts as clear', () => {
  const found = accessTimesOrientation({ solarAccess: access(0.95, 0.8, 0.9), orientationFactor: 1 })!;
  expect(found.low).toBeCloseTo(0.8, 12);
  expect(found.high).toBeCloseTo(0.9, 12);
});
