import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import { PLANNING } from '../../../src/core/pointing/planning-values.ts';
import type { SightingAxis } from '../../../src/core/survey/survey.ts';
import { VirtualSurvey } from './virtual-run.ts';

function twoFace(
  virtual: VirtualSurvey,
  run: string,
  elevation: number,
  axis?: SightingAxis,
  turned = 180,
): void {
  const station = virtual.station('A');
  const id = `i${station.indexChecks?.length ?? 0}`;
  station.indexChecks = [
    ...(station.indexChecks ?? []),
    {
      id,
      upright: virtual.read(run, { minutes: 1, azimuth: 50, elevation, axis }),
      turned: virtual.read(run, { minutes: 2, azimuth: 50, elevation, axis, roll: turned }),
    },
  ];
}
const indexOf = (virtual: VirtualSurvey, run = 0) => pointSurvey(virtual.made()).runs[run].index;

describe('the two-face check', () => {
  property.prop([
    fc.double({ min: -2, max: 2, noNaN: true }),
    fc.double({ min: -20, max: 50, noNaN: true }),
    fc.constantFrom(undefined, 'top-edge' as const),
  ])('takes the index error out of every elevation of its axis', (index, elevation, axis) => {
    const virtual = new VirtualSurvey().run('r', 'true', { index });
    twoFace(virtual, 'r', elevation, axis);
    const id = virtual.sight('r', { minutes: 3, azimuth: 120, elevation: 33, axis });
    const { runs, sightings } = pointSurvey(virtual.made());
    expect(runs[0].index[axis ?? 'camera']).toMatchObject({
      source: 'two-face',
      value: expect.closeTo(-index, 5) as number,
    });
    expect(runs[0].index[axis ? 'camera' : 'top-edge']).toMatchObject({ source: 'planned', value: 0 });
    expect(sightings.get(id)!.direction!.elevation).toBeCloseTo(33, 5);
  });

  test('leaves a smaller deviation than the planned one', () => {
    const virtual = new VirtualSurvey().run('r', 'true', { index: 1 });
    expect(indexOf(virtual).camera.standardDeviation).toBe(PLANNING.elevationIndex);
    twoFace(virtual, 'r', 10);
    expect(indexOf(virtual).camera.standardDeviation).toBeLessThan(PLANNING.elevationIndex / 2);
  });

  test('holds for the other runs of the phone, and for no other phone', () => {
    const virtual = new VirtualSurvey()
      .run('one', 'true', { index: 1 }, 'mine')
      .run('two', 'true', { index: 1 }, 'mine')
      .run('other', 'true', {}, 'yours');
    twoFace(virtual, 'one', 10);
    expect(indexOf(virtual, 1).camera.value).toBeCloseTo(-1, 6);
    expect(indexOf(virtual, 2).camera.value).toBe(0);
  });

  test.each([
    [
      'the phone not turned',
      (virtual: VirtualSurvey) => twoFace(virtual, 'r', 10, undefined, 20),
      /not turned upside down/,
    ],
    [
      'two marks',
      (virtual: VirtualSurvey) => {
        twoFace(virtual, 'r', 10);
        virtual.station('A').indexChecks![0].turned = virtual.read('r', {
          minutes: 2,
          azimuth: 90,
          roll: 180,
        });
      },
      /not of one mark/,
    ],
    [
      'two axes',
      (virtual: VirtualSurvey) => {
        twoFace(virtual, 'r', 10);
        virtual.station('A').indexChecks![0].turned = virtual.read('r', {
          minutes: 2,
          azimuth: 50,
          axis: 'top-edge',
        });
      },
      /different phones or axes/,
    ],
    [
      'no angles',
      (virtual: VirtualSurvey) => {
        twoFace(virtual, 'r', 10);
        virtual.survey.readings.forEach((reading) => delete reading.beta);
      },
      /no angles/,
    ],
  ])('with %s counts for nothing, and says so', (_, make, message) => {
    const virtual = new VirtualSurvey().run('r', 'true', { index: 1 });
    make(virtual);
    const { runs, warnings } = pointSurvey(virtual.made());
    expect(runs[0].index.camera.source).toBe('planned');
    expect(warnings).toEqual([
      { path: 'stations[0].indexChecks[0]', message: expect.stringMatching(message) as string },
    ]);
  });
});
