import { describe, expect, test } from 'vitest';
import { planeArea } from '../../../src/core/survey/plane-area.ts';

describe('area of a plane', () => {
  test('width by slope length, in metres along the slope', () => {
    expect(planeArea({ width: 11, slopeLength: 5.2 })).toBeCloseTo(57.2, 9);
  });

  test('an outline stands over width and slope length, whichever way its corners run', () => {
    // a hip: a trapezium of 10 and 4 along, 3 up: (10 + 4) / 2 · 3
    const outline = [
      { x: 0, y: 0 },
      { x: 10, y: 0 },
      { x: 7, y: 3 },
      { x: 3, y: 3 },
    ];
    expect(planeArea({ outline, width: 10, slopeLength: 3 })).toBeCloseTo(21, 9);
    expect(planeArea({ outline: [...outline].reverse() })).toBeCloseTo(21, 9);
  });

  test('unknown where a length is missing or the outline has no inside', () => {
    expect(planeArea({ width: 10 })).toBeNull();
    expect(planeArea({ slopeLength: 3 })).toBeNull();
    expect(
      planeArea({
        outline: [
          { x: 0, y: 0 },
          { x: 1, y: 1 },
        ],
      }),
    ).toBeNull();
  });
});
