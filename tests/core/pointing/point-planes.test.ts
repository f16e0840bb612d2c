import { describe, expect, test } from 'vitest';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import type { RoofPlane } from '../../../src/core/survey/survey.ts';
import { VirtualSurvey } from './virtual-run.ts';

/** A plane with the phone put to it: its top edge up the slope, then turned end for end. */
function withPlane(
  virtual: VirtualSurvey,
  tilt: number,
  facing: number,
  recorded: Partial<RoofPlane> = {},
): RoofPlane {
  const placings = [
    virtual.read('r', { minutes: 1, azimuth: facing + 180, elevation: tilt, axis: 'top-edge' }),
    virtual.read('r', { minutes: 2, azimuth: facing, elevation: -tilt, axis: 'top-edge' }),
  ];
  const plane: RoofPlane = {
    id: 'p',
    name: 'Roof',
    surfaceTilt: tilt,
    surfaceAzimuth: facing,
    tiltPlacings: placings.map((reading, i) => ({ id: `t${i}`, reading })),
    ...recorded,
  };
  virtual.survey.planes.push(plane);
  return plane;
}
const checked = () => {
  const virtual = new VirtualSurvey().run('r', 'relative', { north: 66, index: 0.9 });
  return virtual.check({
    method: 'known-mark',
    bearing: 60,
    reading: virtual.read('r', { minutes: 1, azimuth: 60 }),
  });
};

describe('a plane’s own readings', () => {
  test.each([
    ['facing south', 30, 178],
    ['facing north, as south of the equator', 22.5, 2],
  ])('%s give its tilt and facing', (_, tilt, facing) => {
    const virtual = checked();
    withPlane(virtual, tilt, facing);
    const { planes, warnings } = pointSurvey(virtual.made());
    expect(planes[0].tilt).toMatchObject({
      value: expect.closeTo(tilt, 4) as number,
      bothWays: true,
      count: 2,
    });
    expect(planes[0].azimuth!.value).toBeCloseTo(facing, 3);
    expect(warnings).toEqual([]);
  });

  test('a sighting along the eave, either way, goes before how the phone lay', () => {
    const virtual = checked();
    const plane = withPlane(virtual, 30, 178);
    plane.azimuthSightings = [
      { id: 'a', along: 'eave', reading: virtual.read('r', { minutes: 3, azimuth: 92 }) },
      { id: 'b', along: 'eave', reading: virtual.read('r', { minutes: 3, azimuth: 272 }) },
      { id: 'c', along: 'fall', reading: virtual.read('r', { minutes: 3, azimuth: 182, elevation: -30 }) },
    ];
    expect(pointSurvey(virtual.made()).planes[0].azimuth).toMatchObject({
      value: expect.closeTo(182, 3) as number,
      count: 3,
    });
  });

  test('that differ from the record are told, field by field', () => {
    const virtual = checked();
    withPlane(virtual, 30, 178, { surfaceTilt: 35, surfaceAzimuth: 200 });
    expect(pointSurvey(virtual.made()).warnings).toEqual([
      {
        path: 'planes[0].surfaceTilt',
        message: expect.stringMatching(/read a tilt of 30\.0°; the record says 35°/) as string,
      },
      {
        path: 'planes[0].surfaceAzimuth',
        message: expect.stringMatching(/faces 178°; the record says 200°/) as string,
      },
    ]);
  });

  test('without a heading give the tilt alone', () => {
    const virtual = new VirtualSurvey().run('r', 'relative');
    withPlane(virtual, 30, 178);
    expect(pointSurvey(virtual.made()).planes[0]).toMatchObject({ tilt: { count: 2 }, azimuth: null });
  });

  test('of which there are none give nothing', () => {
    const virtual = checked();
    withPlane(virtual, 30, 178, { tiltPlacings: undefined });
    expect(pointSurvey(virtual.made()).planes[0]).toEqual({ id: 'p', tilt: null, azimuth: null });
  });
});
