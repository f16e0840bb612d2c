import { describe, expect, test } from 'vitest';
import type { PointedRun } from '../../../src/core/pointing/pointed-survey.ts';
import { noiseScale } from '../../../src/core/uncertainty/noise-scale.ts';

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

describe('how much worse than planned a survey was pointed', () => {
  test('1 without repeats, and where repeats agree', () => {
    expect(noiseScale({ runs: [] })).toBe(1);
    expect(noiseScale({ runs: [run({})] })).toBe(1);
    expect(noiseScale({ runs: [run(closing(0.1, -0.1))] })).toBe(1);
    expect(noiseScale({ runs: [run({ checks: [check(null)] })] })).toBe(1);
  });

  test('grows with what repeats differ by, up to a limit', () => {
    const far = noiseScale({ runs: [run(closing(1.2, 1.2))] });
    expect(far).toBeGreaterThan(1.5);
    expect(noiseScale({ runs: [run(closing(2.4, 2.4))] })).toBeGreaterThan(far);
    expect(noiseScale({ runs: [run(closing(200, 200))] })).toBeLessThanOrEqual(4);
  });

  test('grows with an inclination that was found far off, once for all runs of the phone', () => {
    const found = { value: 2.1, standardDeviation: 0.2, source: 'two-face' } as const;
    const turned = run({ index: { camera: found, 'top-edge': index } });
    expect(noiseScale({ runs: [turned] })).toBeGreaterThan(2);
    expect(noiseScale({ runs: [turned, turned] })).toBe(noiseScale({ runs: [turned] }));
  });

  test('grows with checks that disagree, less what the run turned between them', () => {
    const pair = (later: number) => [check(null), { ...check(null), takenAtMs: 600_000, offset: 1 + later }];
    expect(noiseScale({ runs: [run({ checks: pair(0.5) })] })).toBe(1);
    const apart = noiseScale({ runs: [run({ checks: pair(4) })] });
    expect(apart).toBeGreaterThan(2);
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
    expect(noiseScale({ runs: [run({ heading, checks: pair(4) })] })).toBe(1);
  });

  test('a compass that stands by its check pulls back what a closing shows', () => {
    const shown = noiseScale({ runs: [run(closing(1.2, 1.2))] });
    const pulled = noiseScale({ runs: [run({ ...closing(1.2, 1.2), checks: [check(1)] })] });
    expect(pulled).toBeLessThan(shown);
    expect(pulled).toBeGreaterThan(1);
  });
});
