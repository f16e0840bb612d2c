import { fc, test as property } from '@fast-check/vitest';
import { expect, test } from 'vitest';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { stationHorizon } from '../../../src/core/horizon/station-horizon.ts';
import type { Sighting, Survey } from '../../../src/core/survey/survey.ts';
import { obstruction, points, trace } from './made-up-traces.ts';

const line = (at: [number, number][], angularWidth: number, straight: boolean) =>
  horizonProfile([obstruction([trace('line', points(...at), { straight, angularWidth })])]);

test.each([
  [
    'ends at the zenith',
    [
      [20, 30],
      [20, 90],
    ],
  ],
  [
    'begins at the zenith',
    [
      [0, 90],
      [77, 10],
    ],
  ],
  [
    'goes over the zenith',
    [
      [30, 70],
      [210.5, 70],
    ],
  ],
  [
    'passes the zenith at half its width',
    [
      [270, 20],
      [0, 85],
      [90, 20],
    ],
  ],
  [
    'plunges to the nadir',
    [
      [10, 40],
      [12, -90],
      [200, -89],
      [210, 30],
    ],
  ],
] as [string, [number, number][]][])('a wire that %s is a wire', (_, at) => {
  for (const straight of [true, false]) {
    const profile = line(at, 10, straight);
    expect(profile.low.length).toBeGreaterThan(0);
    expect([...profile.low, ...profile.high].every((end) => end >= 0 && end <= 90)).toBe(true);
  }
});

const elevation = fc.oneof(fc.double({ min: -90, max: 90, noNaN: true }), fc.constantFrom(90, -90, 0, 85));
property.prop([
  fc.array(fc.tuple(fc.integer({ min: 0, max: 359 }), elevation), { minLength: 2, maxLength: 6 }),
  fc.constantFrom(0.01, 0.5, 10, 20),
  fc.boolean(),
])('no line is too hard', (at, width, straight) => {
  fc.pre(at.every(([azimuth], i) => i === 0 || Math.abs(azimuth - at[i - 1][0]) % 360 !== 180));
  expect(line(at, width, straight).low.every(Number.isFinite)).toBe(true);
});

test('a trace that falls apart without its undirected sightings is left out', () => {
  const survey = (...sightings: Sighting[]): Survey => ({
    format: 'noonmark-survey',
    version: 1,
    id: 'made-up',
    title: 'Made up',
    site: { latitude: 45, longitude: 5, timeZone: 'Europe/Paris' },
    climate: { source: 'world' },
    planes: [],
    obstructions: [{ id: 'wall', name: 'Wall', kind: 'building' }],
    runs: [],
    readings: [],
    stations: [
      {
        id: 'A',
        name: 'A',
        serves: [],
        traces: [{ id: 't', obstruction: 'wall', shape: 'skyline', sightings }],
      },
    ],
  });
  const at = (id: string, azimuth: number): Sighting => ({ id, azimuth, elevation: 20 });
  const apart = survey(at('a', 0), { id: 'b', reading: 'r' }, at('c', 180));
  expect(stationHorizon(apart, apart.stations[0])).toMatchObject({
    observed: [],
    profile: { obstructionIds: [] },
  });
  const together = survey(at('a', 0), { id: 'b', reading: 'r' }, at('c', 170));
  expect(stationHorizon(together, together.stations[0]).observed).toEqual([[0, 170]]);
});
