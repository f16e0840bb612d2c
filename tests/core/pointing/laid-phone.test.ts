import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { facingFromEdge, laidPlane } from '../../../src/core/pointing/laid-phone.ts';
import type { ReadingSample } from '../../../src/core/survey/survey.ts';
import { topEdgeAt } from './held-phone.ts';

/** A phone on a plane that faces `facing`, its top up the slope, or turned end for end; its sensor off by `index`. */
function laid(tilt: number, facing: number, turned: boolean, index = 0): ReadingSample {
  const up = turned ? -tilt : tilt;
  const { alpha, beta, gamma } = topEdgeAt(turned ? facing : facing + 180, up + index);
  return [0, alpha, beta, gamma];
}
const placing = (row: ReadingSample, held: 'flat' | 'edge' = 'flat') => ({ rows: [row], held });

const tilt = fc.double({ min: 2, max: 75, noNaN: true });
const facing = fc.double({ min: 0, max: 359.9, noNaN: true });
const held = fc.constantFrom('flat' as const, 'edge' as const);

describe('a phone laid on a plane', () => {
  property.prop([tilt, facing, held, fc.double({ min: -1.5, max: 1.5, noNaN: true })])(
    'both ways round gives tilt and facing without the sensor’s own tilt',
    (slope, azimuth, way, index) => {
      const plane = laidPlane([
        placing(laid(slope, azimuth, false, index), way),
        placing(laid(slope, azimuth, true, index), way),
      ])!;
      expect(plane.tilt).toBeCloseTo(slope, 4);
      expect(Math.abs(turnBetween(plane.facing!, azimuth))).toBeLessThan(1e-4);
      expect(plane.bothWays).toBe(true);
    },
  );

  test('one way round it keeps the sensor’s tilt, and says so', () => {
    const plane = laidPlane([placing(laid(30, 178, false, 0.8))])!;
    expect(plane.tilt).toBeCloseTo(30.8, 6);
    expect(plane.bothWays).toBe(false);
    expect(plane.tiltDeviation).toBeGreaterThan(0.7);
  });

  test('the two ways count alike, however often each was taken', () => {
    const up = placing(laid(30, 178, false, 1));
    expect(laidPlane([up, up, up, placing(laid(30, 178, true, 1))])!.tilt).toBeCloseTo(30, 6);
  });

  test('scatter is the spread of the placings about their way’s mean', () => {
    const rows = [29, 31, 29, 31].map((slope) => placing(laid(slope, 90, false)));
    expect(laidPlane(rows)).toMatchObject({ count: 4, scatter: expect.closeTo(1, 6) as number });
  });

  test('with the screen down the plane is the same', () => {
    const { alpha, beta, gamma } = topEdgeAt(358, 30, 180);
    expect(laidPlane([placing([0, alpha, beta, gamma])])!.tilt).toBeCloseTo(30, 6);
  });

  test('a level plane has no facing, and a wall has', () => {
    expect(laidPlane([placing(laid(0.2, 90, false))])!.facing).toBe(null);
    const wall = laidPlane([placing(laid(89.9, 225, false))])!;
    expect(wall.tilt).toBeCloseTo(89.9, 6);
    expect(wall.facing).toBeCloseTo(225, 4);
  });

  test('no rows are no plane', () => {
    expect(laidPlane([])).toBe(null);
    expect(laidPlane([{ rows: [], held: 'flat' }])).toBe(null);
  });
});

describe('facing from an edge', () => {
  property.prop([facing, fc.double({ min: -80, max: 80, noNaN: true })])(
    'is square to the eave sighted either way, nearest to what is thought; in both hemispheres alike',
    (azimuth, off) => {
      for (const along of [azimuth + 90, azimuth - 90])
        expect(Math.abs(turnBetween(facingFromEdge(along, 'eave', azimuth + off), azimuth))).toBeLessThan(
          1e-9,
        );
      for (const along of [azimuth, azimuth + 180])
        expect(Math.abs(turnBetween(facingFromEdge(along, 'fall', azimuth + off), azimuth))).toBeLessThan(
          1e-9,
        );
    },
  );
});
