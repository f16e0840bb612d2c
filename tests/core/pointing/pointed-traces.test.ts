import { describe, expect, test } from 'vitest';
import { stationHorizon } from '../../../src/core/horizon/station-horizon.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import type { Trace } from '../../../src/core/survey/survey.ts';
import { VirtualSurvey } from './virtual-run.ts';

/** A trace of the phone through directions, in a run whose north is true. */
function traced(directions: [azimuth: number, elevation: number][], shape: Trace['shape'] = 'skyline') {
  const virtual = new VirtualSurvey().run('r', 'true');
  const sightings = directions.map(([azimuth, elevation], i) => ({
    id: `s${i}`,
    reading: virtual.read('r', { minutes: i / 10, azimuth, elevation }),
  }));
  const edge = 'drawn' as const;
  virtual.station('A').traces.push({ id: 't', obstruction: 'wall', shape, edge, angularWidth: 1, sightings });
  const survey = virtual.made();
  const { warnings } = pointSurvey(survey);
  return {
    horizon: stationHorizon(survey, survey.stations[0]),
    warnings: warnings.filter(({ path }) => path.startsWith('stations')),
  };
}

describe('a trace that the phone read', () => {
  test('stands in the horizon where it points', () => {
    const { horizon, warnings } = traced([
      [350, 20],
      [20, 25],
    ]);
    expect(warnings).toEqual([]);
    expect(horizon.observed[0][0]).toBeCloseTo(350, 6);
    expect(horizon.observed[0][1]).toBeCloseTo(20, 6);
  });

  test('whose neighbours face each other is out, and that is told', () => {
    const { horizon, warnings } = traced([
      [10, 20],
      [190, 25],
    ]);
    expect(horizon.profile.obstructionIds).toEqual([]);
    expect(warnings).toEqual([
      {
        path: 'stations[0].traces[0].sightings[1]',
        message: expect.stringMatching(/180 degrees from its neighbour/) as string,
      },
    ]);
  });

  test('whose outline crosses itself is told', () => {
    const bow: [number, number][] = [
      [10, 10],
      [20, 20],
      [20, 10],
      [10, 20],
    ];
    expect(traced(bow, 'outline').warnings[0].message).toMatch(/crosses or touches itself/);
  });

  test('straight over the zenith holds together', () => {
    const { horizon, warnings } = traced(
      [
        [10, 70],
        [10, 85],
        [190, 85],
        [190, 70],
      ],
      'line',
    );
    expect(horizon.profile.obstructionIds).toEqual(['wall']);
    expect(warnings).toEqual([]);
  });
});
