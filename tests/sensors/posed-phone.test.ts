import { fc, test } from '@fast-check/vitest';
import { describe, expect } from 'vitest';
import { turnBetween } from '../../src/core/angles/angles.ts';
import { directionOf } from '../../src/core/angles/vectors.ts';
import { sightVector } from '../../src/core/pointing/attitude.ts';
import { cameraAt, laidOn, topEdgeAt } from './posed-phone.ts';

const azimuth = fc.double({ min: 0, max: 359.99, noNaN: true });
const elevation = fc.double({ min: -85, max: 85, noNaN: true });

describe('a posed phone', () => {
  test.prop([azimuth, elevation])('looks with its camera where it is told to', (a, e) => {
    const seen = directionOf(sightVector(cameraAt(a, e), 'camera'));
    expect(Math.abs(turnBetween(seen.azimuth, a))).toBeLessThan(1e-6);
    expect(seen.elevation).toBeCloseTo(e, 6);
  });

  test.prop([azimuth, elevation])('points with its top edge where it is told to', (a, e) => {
    const seen = directionOf(sightVector(topEdgeAt(a, e), 'top-edge'));
    expect(Math.abs(turnBetween(seen.azimuth, a))).toBeLessThan(1e-6);
    expect(seen.elevation).toBeCloseTo(e, 6);
  });

  test.prop([azimuth, fc.double({ min: 1, max: 80, noNaN: true }), fc.boolean()])(
    'lies on a plane with its screen square to it',
    (facing, tilt, turned) => {
      // the camera looks into the plane: down along its normal
      const seen = directionOf(sightVector(laidOn(tilt, facing, turned), 'camera'));
      expect(seen.elevation).toBeCloseTo(tilt - 90, 6);
      expect(Math.abs(turnBetween(seen.azimuth, facing + 180))).toBeLessThan(1e-6);
    },
  );
});
