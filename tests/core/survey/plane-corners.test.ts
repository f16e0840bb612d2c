import { describe, expect, it } from 'vitest';
import { planeName } from '../../../src/core/survey/plane-name.ts';
import { planeOutline, planePointAt } from '../../../src/core/survey/plane-corners.ts';

const point = (east: number, north: number, up: number) => ({
  east: expect.closeTo(east, 9) as number,
  north: expect.closeTo(north, 9) as number,
  up: expect.closeTo(up, 9) as number,
});

// By plain geometry: looking up the slope of a plane that faces south, east is to the right and north ahead.
describe('a point of a plane', () => {
  it.each([
    [30, 180, { x: 2, y: 4 }, [2, 4 * Math.cos(Math.PI / 6), 2]],
    [0, 180, { x: 2, y: 4 }, [2, 4, 0]],
    [90, 180, { x: 2, y: 4 }, [2, 0, 4]],
    [30, 0, { x: 2, y: 4 }, [-2, -4 * Math.cos(Math.PI / 6), 2]],
    [0, 90, { x: 2, y: 4 }, [-4, 2, 0]],
    [0, 270, { x: 2, y: 4 }, [4, -2, 0]],
  ])('of tilt %d facing %d', (surfaceTilt, surfaceAzimuth, at, [east, north, up]) => {
    expect(planePointAt({ surfaceTilt, surfaceAzimuth }, at)).toEqual(point(east, north, up));
    const corner = { east: 10, north: 20, up: 3 };
    expect(planePointAt({ surfaceTilt, surfaceAzimuth, corner }, at)).toEqual(
      point(east + 10, north + 20, up + 3),
    );
  });

  it('comes from the outline, else from width by length, else from nothing', () => {
    const plane = { id: 'a', name: 'a', surfaceTilt: 0, surfaceAzimuth: 0 };
    expect(planeOutline(plane)).toBeNull();
    expect(planeOutline({ ...plane, width: 3 })).toBeNull();
    expect(planeOutline({ ...plane, width: 3, slopeLength: 2 })).toHaveLength(4);
    const outline = [
      { x: 0, y: 0 },
      { x: 1, y: 0 },
      { x: 0, y: 1 },
    ];
    expect(planeOutline({ ...plane, width: 3, slopeLength: 2, outline })).toBe(outline);
  });
});

describe('the name of a plane', () => {
  it.each([
    ['pitched', 178, 'South roof'],
    ['pitched', 350, 'North roof'],
    ['wall', 230, 'South-west wall'],
    ['flat', 12, 'Flat roof'],
    ['ground', 180, 'Ground mount'],
  ] as const)('of a %s one facing %d is %s', (sort, azimuth, name) => {
    expect(planeName(sort, azimuth, [])).toBe(name);
    expect(planeName(sort, azimuth, [name])).toBe(`${name} 2`);
  });
});
