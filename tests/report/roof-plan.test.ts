import { describe, expect, it } from 'vitest';
import type { RoofPlane } from '../../src/core/survey/survey.ts';
import type { PathMark, Picture } from '../../src/report/marks.ts';
import { roofPlan } from '../../src/report/pictures/roof-plan.ts';

const WIDTH = 360;
const plane = (id: string, change: Partial<RoofPlane> = {}): RoofPlane => ({
  id,
  name: id,
  surfaceTilt: 0,
  surfaceAzimuth: 180,
  width: 10,
  slopeLength: 5,
  ...change,
});

/** The planes' outlines as ranges on the sheet. */
function outlines({ marks }: Picture) {
  return marks
    .filter((mark): mark is PathMark => mark.kind === 'path' && mark.closed === true)
    .map(({ lines: [line], pen }) => {
      const [xs, ys] = [0, 1].map((parity) => line.filter((_, i) => i % 2 === parity));
      return {
        left: Math.min(...xs),
        right: Math.max(...xs),
        top: Math.min(...ys),
        bottom: Math.max(...ys),
        isDashed: pen?.dash !== undefined,
      };
    });
}

describe('the plan of a roof', () => {
  it('keeps the planes on the sheet, in true proportion', () => {
    const picture = roofPlan([plane('one')], WIDTH);
    const [{ left, right, top, bottom }] = outlines(picture);
    expect(left).toBeGreaterThanOrEqual(0);
    expect(right).toBeLessThanOrEqual(WIDTH);
    expect(bottom).toBeLessThanOrEqual(picture.height);
    expect((right - left) / (bottom - top)).toBeCloseTo(2, 9);
  });

  it('has north up and east to the right', () => {
    const at = (east: number, north: number) => ({ corner: { east, north, up: 0 } });
    const [south, north, east] = outlines(
      roofPlan([plane('s', at(0, 0)), plane('n', at(0, 20)), plane('e', at(30, 0))], WIDTH),
    );
    expect(north.bottom).toBeLessThan(south.top);
    expect(east.left).toBeGreaterThan(south.right);
  });

  it('sets planes without a place beside each other, and dashes those of unknown size', () => {
    const ranges = outlines(
      roofPlan(
        [plane('a', { corner: { east: 0, north: 0, up: 0 } }), plane('b'), plane('c', { width: undefined })],
        WIDTH,
      ),
    );
    expect(ranges.map(({ isDashed }) => isDashed)).toEqual([false, false, true]);
    expect(ranges[1].left).toBeGreaterThan(ranges[0].right);
    expect(ranges[2].left).toBeGreaterThan(ranges[1].right);
  });

  it('draws flat, steep and upright planes of every direction with finite marks', () => {
    for (const surfaceTilt of [0, 30, 90])
      for (const surfaceAzimuth of [0, 77, 180, 359])
        for (const { left, right, top, bottom } of outlines(
          roofPlan([plane('x', { surfaceTilt, surfaceAzimuth })], WIDTH),
        )) {
          expect([left, right, top, bottom].every(Number.isFinite)).toBe(true);
          expect(right - left).toBeGreaterThan(1);
        }
  });
});
