import { describe, expect, test } from 'vitest';
import type { PointedRun } from '../../../src/core/pointing/pointed-survey.ts';
import { noiseScales } from '../../../src/core/uncertainty/noise-scale.ts';
import { NOISE } from '../../../src/core/uncertainty/planning-values.ts';
import { randomSource } from '../../../src/core/uncertainty/random-source.ts';
import { repeatsOf } from '../../../src/core/uncertainty/repeats.ts';

const index = { value: 0, standardDeviation: 0.7, source: 'planned' } as const;

function run(part: Partial<PointedRun>): PointedRun {
  return {
    id: 'run',
    heading: null,
    index: { camera: index, 'top-edge': index },
    closure: null,
    refused: null,
    checks: [],
    ...part,
  };
}

const closing = (azimuth: number, elevation: number) => ({
  closure: { mark: 'm', station: 'A', minutes: 0.01, azimuth, elevation },
});

const check = (againstCompass: number | null) => ({
  check: 'c',
  station: 'A',
  path: '',
  method: 'sun-shadow' as const,
  run: 'run',
  takenAtMs: 0,
  offset: 1,
  standardDeviation: 0.8,
  againstCompass,
  refused: null,
});

const drawn = (...runs: PointedRun[]) => noiseScales({ runs }, randomSource('noise'), 4000);
/** The scale of the spread that draws of such scales have together. */
const typical = (...runs: PointedRun[]) =>
  Math.sqrt(drawn(...runs).reduce((sum, scale) => sum + scale ** 2, 0) / 4000);

describe('how much worse than planned a survey was pointed', () => {
  test('as planned without repeats', () => {
    expect(new Set([...drawn(), ...drawn(run({})), ...drawn(run({ checks: [check(null)] }))])).toEqual(
      new Set([1]),
    );
  });

  test('a little better at most where repeats agree', () => {
    const scales = drawn(run({ ...closing(0, 0), checks: [check(0)] }));
    expect(Math.min(...scales)).toBe(NOISE.least);
    expect(typical(run(closing(0, 0)))).toBeLessThan(1);
  });

  test('grows with what repeats differ by, up to a limit', () => {
    const far = typical(run(closing(1.2, 1.2)));
    expect(far).toBeGreaterThan(1.5);
    expect(typical(run(closing(2.4, 2.4)))).toBeGreaterThan(far);
    expect(typical(run(closing(200, 200)))).toBeLessThanOrEqual(NOISE.farthest);
  });

  test('is the surer, the more repeats there are', () => {
    const spread = (runs: PointedRun[]) => {
      const logs = Array.from(drawn(...runs), Math.log);
      const mean = logs.reduce((sum, log) => sum + log, 0) / logs.length;
      return Math.sqrt(logs.reduce((sum, log) => sum + (log - mean) ** 2, 0) / logs.length);
    };
    // twice as planned, each time: two differences in a closing
    const twice = run(closing(2 * 0.3 * Math.SQRT2, 2 * 0.3 * Math.SQRT2));
    const many = Array.from({ length: 20 }, () => twice);
    expect(spread(many)).toBeLessThan(0.5 * spread([twice]));
    expect(typical(...many)).toBeGreaterThan(1.8);
    expect(typical(...many)).toBeLessThan(2.1);
  });

  test('grows with an inclination that was found far off, once for all runs of the phone', () => {
    const found = { value: 2.1, standardDeviation: 0.2, source: 'two-face' } as const;
    const turned = run({ index: { camera: found, 'top-edge': index } });
    expect(typical(turned)).toBeGreaterThan(2);
    expect(typical(turned, turned)).toBe(typical(turned));
  });

  test('a compass beside steel says less of it than a hand that shakes as far', () => {
    const steel = 3 * Math.hypot(5, 0.8);
    const beside = run({ checks: [check(steel)] });
    const shaking = run(closing(3 * 0.3 * Math.SQRT2, 0));
    expect(repeatsOf({ runs: [beside] })[0].difference).toBeCloseTo(3, 9);
    expect(typical(beside, run(closing(0.3, 0.3)))).toBeLessThan(typical(shaking, run(closing(0.3, 0.3))));
  });

  test('grows with checks that disagree, less what the run turned between them', () => {
    const pair = (later: number) => [check(null), { ...check(null), takenAtMs: 600_000, offset: 1 + later }];
    const together = typical(run({ checks: pair(0.5) }));
    const apart = typical(run({ checks: pair(4) }));
    expect(apart).toBeGreaterThan(2);
    expect(together).toBeLessThan(0.8 * apart);
    const heading = {
      offset: 1,
      standardDeviation: 0.8,
      atMs: 0,
      ratePerMinute: 0.4,
      ratePerMinuteDeviation: 0.05,
      source: 'check',
      from: null,
      ownDeviation: 0.8,
      outliers: null,
    } as const;
    expect(typical(run({ heading, checks: pair(4) }))).toBeLessThan(together);
  });

  test('a compass that stands by its check pulls back what a closing shows', () => {
    const shown = typical(run(closing(1.2, 1.2)));
    const pulled = typical(run({ ...closing(1.2, 1.2), checks: [check(1)] }));
    expect(pulled).toBeLessThan(shown);
    expect(pulled).toBeGreaterThan(1);
  });
});
