import { readFileSync } from 'node:fs';
import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { fullCircle, turnBetween } from '../../../src/core/angles/angles.ts';
import { angleBetween, directionOf, dot, vectorOf } from '../../../src/core/angles/vectors.ts';
import { attitude, axisVector, sightVector } from '../../../src/core/pointing/attitude.ts';
import type { Vector } from '../../../src/core/angles/vectors.ts';
import { cell, readTable } from '../../reference-values/published-table.ts';
import { cameraAt, rounded, topEdgeAt } from './held-phone.ts';

const spec = JSON.parse(
  readFileSync(new URL('../../reference-values/device_orientation_spec.json', import.meta.url), 'utf8'),
) as { worked_example: string; spec_introduction_facts: string[] };

describe('against the table computed with another library (device_orientation.csv)', () => {
  const rows = readTable('device_orientation.csv');
  const angles = (row: Record<string, string>) => ({
    alpha: cell(row, 'alpha_deg'),
    beta: cell(row, 'beta_deg'),
    gamma: cell(row, 'gamma_deg'),
  });
  const vector = (row: Record<string, string>, name: string): Vector => [
    cell(row, `${name}_E`),
    cell(row, `${name}_N`),
    cell(row, `${name}_U`),
  ];

  test('camera, top edge and right edge of all 500 attitudes, as vectors', () => {
    expect(rows).toHaveLength(500);
    for (const row of rows) {
      // the table prints nine decimals or more
      expect(angleBetween(sightVector(angles(row)), vector(row, 'cam'))).toBeLessThan(1e-6);
      expect(angleBetween(sightVector(angles(row), 'top-edge'), vector(row, 'top'))).toBeLessThan(1e-6);
      expect(angleBetween(attitude(angles(row)).x, vector(row, 'right'))).toBeLessThan(1e-6);
    }
  });

  test('azimuth and elevation, where the table has an azimuth', () => {
    let compared = 0;
    for (const row of rows)
      for (const [axis, name] of [
        ['camera', 'cam'],
        ['top-edge', 'top'],
      ] as const) {
        const { azimuth, elevation } = directionOf(sightVector(angles(row), axis));
        expect(Math.abs(elevation - cell(row, `${name}_elevation_deg`))).toBeLessThan(1e-4);
        if (row[`${name}_azimuth_deg`] === '') continue;
        compared++;
        const across = Math.cos((elevation * Math.PI) / 180);
        expect(Math.abs(turnBetween(azimuth, cell(row, `${name}_azimuth_deg`))) * across).toBeLessThan(1e-4);
      }
    expect(compared).toBeGreaterThan(900);
  });
});

describe('what the W3C specification says', () => {
  test('flat on a table, top of the screen to the west: alpha 90', () => {
    expect(spec.spec_introduction_facts[0]).toMatch(/pointing west: alpha=90/);
    expect(directionOf(sightVector({ alpha: 90, beta: 0, gamma: 0 }, 'top-edge')).azimuth).toBeCloseTo(
      270,
      9,
    );
  });

  property.prop([fc.integer({ min: 0, max: 359 })])(
    'the compass heading of a flat device is 360 - alpha',
    (alpha) => {
      const { azimuth } = directionOf(sightVector({ alpha, beta: 0, gamma: 0 }, 'top-edge'));
      expect(Math.abs(turnBetween(azimuth, 360 - alpha))).toBeLessThan(1e-9);
    },
  );

  property.prop([fc.integer({ min: 0, max: 359 })])(
    'screen upright, its top to the right of a holder who faces h: alpha 270 - h, beta 0, gamma 90',
    (h) => {
      const held = { alpha: 270 - h, beta: 0, gamma: 90 };
      expect(Math.abs(turnBetween(directionOf(sightVector(held)).azimuth, h))).toBeLessThan(1e-9);
      const top = directionOf(sightVector(held, 'top-edge'));
      expect(Math.abs(turnBetween(top.azimuth, h + 90))).toBeLessThan(1e-9);
    },
  );

  const angle = fc.double({ min: -180, max: 180, noNaN: true });
  property.prop([angle, angle, angle])(
    'its worked example: the vector out of the back of the screen',
    (a, b, g) => {
      const [alpha, beta, gamma] = [a, b, g].map((degrees) => (degrees * Math.PI) / 180);
      const { sin, cos } = Math;
      expect(spec.worked_example).toContain('-cos a sin g - sin a sin b cos g');
      const expected = [
        -cos(alpha) * sin(gamma) - sin(alpha) * sin(beta) * cos(gamma),
        -sin(alpha) * sin(gamma) + cos(alpha) * sin(beta) * cos(gamma),
        -cos(beta) * cos(gamma),
      ];
      const found = sightVector({ alpha: a, beta: b, gamma: g });
      for (const i of [0, 1, 2]) expect(found[i]).toBeCloseTo(expected[i], 12);
    },
  );
});

const azimuth = fc.double({ min: 0, max: 359.99, noNaN: true });
const elevation = fc.oneof(
  fc.double({ min: -89.9, max: 89.9, noNaN: true }),
  fc.constantFrom(0, 89.9, -89.9),
);
const roll = fc.oneof(fc.double({ min: -180, max: 180, noNaN: true }), fc.constantFrom(0, 90, -90, 180));

describe('in every pose', () => {
  property.prop([azimuth, elevation, roll])('a phone held at a direction points there', (at, up, turned) => {
    const aim = vectorOf({ azimuth: at, elevation: up });
    expect(angleBetween(sightVector(cameraAt(at, up, turned)), aim)).toBeLessThan(1e-6);
    expect(angleBetween(sightVector(topEdgeAt(at, up, turned), 'top-edge'), aim)).toBeLessThan(1e-6);
  });

  property.prop([azimuth, roll])(
    'through the upright pose, where alpha and gamma jump, the direction does not',
    (at, turned) => {
      for (const up of [-0.05, -1e-7, 0, 1e-7, 0.05]) {
        const aim = vectorOf({ azimuth: at, elevation: up });
        expect(angleBetween(sightVector(cameraAt(at, up, turned)), aim)).toBeLessThan(1e-6);
      }
    },
  );

  property.prop([azimuth, elevation, roll])(
    'rounding to 0.1° moves it by less than 0.15°',
    (at, up, turned) => {
      const aim = vectorOf({ azimuth: at, elevation: up });
      expect(angleBetween(sightVector(rounded(cameraAt(at, up, turned))), aim)).toBeLessThan(0.15);
    },
  );

  property.prop([azimuth, elevation, roll, azimuth])(
    'turning about the vertical turns the azimuth alone',
    (at, up, turned, by) => {
      const held = cameraAt(at, up, turned);
      const before = directionOf(sightVector(held));
      const after = directionOf(sightVector({ ...held, alpha: held.alpha + by }));
      expect(after.elevation).toBeCloseTo(before.elevation, 9);
      const across = Math.cos((up * Math.PI) / 180);
      expect(turnBetween(fullCircle(before.azimuth - by), after.azimuth) * across).toBeCloseTo(0, 6);
    },
  );

  property.prop([azimuth, elevation, roll])('the axes are square to each other', (at, up, turned) => {
    const { x, y, z } = attitude(cameraAt(at, up, turned));
    for (const [a, b] of [
      [x, y],
      [y, z],
      [z, x],
    ])
      expect(dot(a, b)).toBeCloseTo(0, 9);
  });
});

describe('an index correction', () => {
  property.prop([
    azimuth,
    fc.double({ min: -60, max: 60, noNaN: true }),
    fc.double({ min: -3, max: 3, noNaN: true }),
  ])('lifts an upright camera, and lowers one held upside down', (at, up, index) => {
    const elevationOf = (turned: number) =>
      directionOf(axisVector(attitude(cameraAt(at, up, turned)), 'camera', index)).elevation;
    expect(elevationOf(0)).toBeCloseTo(up + index, 6);
    expect(elevationOf(180)).toBeCloseTo(up - index, 6);
  });

  test('lifts a top edge with the screen up', () => {
    expect(directionOf(axisVector(attitude(topEdgeAt(40, 10)), 'top-edge', 2)).elevation).toBeCloseTo(12, 9);
  });
});

test('an angle that is not finite is refused by name', () => {
  expect(() => attitude({ alpha: 0, beta: NaN, gamma: 0 })).toThrow(
    new RangeError('beta must be finite, got NaN'),
  );
});
