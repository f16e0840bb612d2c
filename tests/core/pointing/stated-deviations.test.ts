import { describe, expect, test } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { PLANNING } from '../../../src/core/pointing/planning-values.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import { deviationAt } from '../../../src/core/pointing/run-ties.ts';
import { VirtualSurvey } from './virtual-run.ts';

/** Normal numbers from a seed: Lehmer's generator (Park and Miller, 1988) and the way of Box and Muller (1958). */
function normals(seed: number): () => number {
  let state = seed;
  const uniform = () => (state = (state * 48271) % 2147483647) / 2147483647;
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}

/**
 * A phone without a compass, drifting, with one check by shadow and the first mark sighted again at the end or not;
 * gives how far a sighting's azimuth and elevation are off, in multiples of what is stated; null where the drift was
 * so large that the run was refused.
 */
function missesOf(normal: () => number, closed: boolean): { azimuth: number; elevation: number } | null {
  const virtual = new VirtualSurvey().run('r', 'relative', {
    north: 100,
    drift: PLANNING.yawDriftPerMinute * normal(),
    index: PLANNING.elevationIndex * normal(),
  });
  const noise = () => PLANNING.pointing * normal();
  virtual.sight('r', { minutes: 0, azimuth: 40 + noise(), elevation: 10 + noise() }, { mark: 'gable' });
  virtual.check({
    method: 'known-mark',
    bearing: 300 + PLANNING.shadowAlignment * normal(),
    bearingDeviation: PLANNING.shadowAlignment,
    reading: virtual.read('r', { minutes: 2, azimuth: 300 + noise() }),
  });
  const id = virtual.sight('r', { minutes: 6, azimuth: 170 + noise(), elevation: 25 + noise() });
  if (closed)
    virtual.sight('r', { minutes: 8, azimuth: 40 + noise(), elevation: 10 + noise() }, { mark: 'gable' });
  const { runs, sightings } = pointSurvey(virtual.made());
  const { direction, random, takenAtMs } = sightings.get(id)!;
  if (!direction) return null;
  const heading = deviationAt(runs[0].heading!, takenAtMs!);
  const index = runs[0].index.camera.standardDeviation;
  return {
    azimuth: turnBetween(170, direction.azimuth) / Math.hypot(heading, random.azimuth),
    elevation: (direction.elevation - 25) / Math.hypot(index, random.elevation),
  };
}

const rms = (values: number[]) =>
  Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);

// 400 surveys tell a root mean square of 1 to about 0.035.
describe.each([
  ['closed', true, 11],
  ['not closed', false, 12],
] as const)('over 400 seeded surveys, the horizon %s', (_, closed, seed) => {
  test('sightings are off by as much as is stated, no less and no more', () => {
    const normal = normals(seed);
    const misses = Array.from({ length: 400 }, () => missesOf(normal, closed)).filter(
      (miss) => miss !== null,
    );
    expect(misses.length).toBeGreaterThan(394);
    for (const of of ['azimuth', 'elevation'] as const) {
      const spread = rms(misses.map((miss) => miss[of]));
      expect(spread).toBeGreaterThan(0.88);
      expect(spread).toBeLessThan(1.12);
    }
  });
});
