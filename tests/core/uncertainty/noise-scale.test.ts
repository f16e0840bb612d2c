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

  test('a compass that stands by its check pulls back what a closing shows', () => {
    const shown = noiseScale({ runs: [run(closing(1.2, 1.2))] });
    const pulled = noiseScale({ runs: [run({ ...closing(1.2, 1.2), checks: [check(1)] })] });
    expect(pulled).toBeLessThan(shown);
    expect(pulled).toBeGreaterThan(1);
  });
});
