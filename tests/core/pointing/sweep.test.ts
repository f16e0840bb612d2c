import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { angleBetween, vectorOf } from '../../../src/core/angles/vectors.ts';
import type { FrameDirection } from '../../../src/core/angles/vectors.ts';
import { simplifiedSweep } from '../../../src/core/pointing/simplified-sweep.ts';
import { sweepPoints } from '../../../src/core/pointing/sweep-points.ts';
import type { Reading, ReadingSample } from '../../../src/core/survey/survey.ts';
import { cameraAt, rounded } from './held-phone.ts';

type Path = [azimuth: number, elevation: number][];

/** A path swept at 60 rows a second, in chunks of half a second. */
function chunksOf(path: Path): Reading[] {
  const rows = path.map(([azimuth, elevation], i): ReadingSample => {
    const { alpha, beta, gamma } = rounded(cameraAt(azimuth, elevation));
    return [(i % 30) * 17, alpha, beta, gamma];
  });
  return Array.from({ length: Math.ceil(rows.length / 30) }, (_, i) => ({
    id: `c${i}`,
    run: 'r',
    takenAt: new Date(Date.UTC(2026, 4, 14, 10) + i * 510).toISOString(),
    samples: rows.slice(i * 30, i * 30 + 30),
  }));
}

const step = (count: number, at: (share: number) => [number, number]): Path =>
  Array.from({ length: count + 1 }, (_, i) => at(i / count));
const withVectors = (path: Path) =>
  path.map(([azimuth, elevation]) => ({ azimuth, elevation, vector: vectorOf({ azimuth, elevation }) }));

/** Largest angle of any point of a path from an edge through others, sampled finely. */
function furthest(path: readonly FrameDirection[], corners: readonly FrameDirection[]): number {
  const edge = corners.slice(1).flatMap((to, i) => {
    const from = corners[i];
    const turn = ((to.azimuth - from.azimuth + 540) % 360) - 180;
    return Array.from({ length: 61 }, (_, k) =>
      vectorOf({
        azimuth: from.azimuth + (turn * k) / 60,
        elevation: from.elevation + ((to.elevation - from.elevation) * k) / 60,
      }),
    );
  });
  return Math.max(...path.map((point) => Math.min(...edge.map((on) => angleBetween(on, vectorOf(point))))));
}

describe('a sweep made ready', () => {
  test('has a point for each row that moved, in order of time, with its place in the record', () => {
    const chunks = chunksOf(step(90, (share) => [100 + 40 * share, 10]));
    const { points, dropped, gaps } = sweepPoints([...chunks].reverse());
    expect({ dropped, gaps }).toEqual({ dropped: 0, gaps: [] });
    expect(points.map(({ azimuth }) => azimuth)).toEqual(
      [...points.map(({ azimuth }) => azimuth)].sort((a, b) => a - b),
    );
    expect(points[40]).toMatchObject({ reading: 'c1', sampleAt: 170 });
  });

  test('loses rows without angles and a slip of the sensor', () => {
    const chunks = chunksOf(step(60, (share) => [100 + 40 * share, 10]));
    chunks[0].samples![5] = [85, NaN, 90, 0];
    const slip = cameraAt(160, 40);
    chunks[1].samples![10] = [170, slip.alpha, slip.beta, slip.gamma];
    const { points, dropped } = sweepPoints(chunks);
    expect(dropped).toBe(2);
    expect(Math.max(...points.map(({ elevation }) => elevation))).toBeLessThan(10.2);
  });

  test('loses the rows in which it rested, and keeps its ends', () => {
    const rest = step(120, (share) => [100 + Math.max(0, 20 * (share - 0.5)), 10]);
    const { points } = sweepPoints(chunksOf(rest));
    expect(points.length).toBeLessThan(65);
    expect(points.at(-1)!.azimuth).toBeCloseTo(110, 0);
  });

  test('names the gap where the phone was swung', () => {
    const swung = chunksOf([
      ...step(30, (share) => [10 * share, 10]),
      ...step(30, (share) => [40 + 10 * share, 10]),
    ] as Path);
    expect(sweepPoints(swung).gaps).toEqual([
      { after: expect.any(Number) as number, width: expect.closeTo(29.5, 0) as number },
    ]);
  });

  test('of nothing is nothing', () => {
    expect(sweepPoints([])).toEqual({ points: [], dropped: 0, gaps: [] });
  });
});

describe('a simplified sweep', () => {
  const skyline = (share: number): [number, number] => [
    320 + 80 * share,
    15 + 8 * Math.sin(7 * share) + 3 * Math.sin(31 * share),
  ];
  const raw = withVectors(step(600, skyline));

  test('over north stays within the tolerance with far fewer points', () => {
    for (const tolerance of [0.1, 0.25, 1]) {
      const kept = simplifiedSweep(raw, 'drawn', tolerance);
      expect(kept.length).toBeLessThan(80);
      expect(furthest(raw, kept)).toBeLessThan(tolerance + 0.02);
    }
  });

  test('is the same edge swept the other way', () => {
    const there = simplifiedSweep(raw, 'drawn');
    const back = simplifiedSweep([...raw].reverse(), 'drawn');
    expect(furthest(raw, back)).toBeLessThan(0.27);
    expect(Math.abs(back.length - there.length)).toBeLessThanOrEqual(2);
  });

  test('of a level skyline is its two ends where it is drawn, and more where it is straight in space', () => {
    const level = withVectors(step(100, (share) => [60 * share, 30]));
    expect(simplifiedSweep(level, 'drawn')).toHaveLength(2);
    expect(simplifiedSweep(level, 'straight').length).toBeGreaterThan(3);
  });

  test('of a ridge straight in space is its two ends', () => {
    // atan(tan(h) cos(azimuth)) is the great circle that tops at h
    const ridge = withVectors(
      step(100, (share) => {
        const azimuth = -50 + 100 * share;
        return [azimuth, (Math.atan(Math.tan(0.5) * Math.cos((azimuth * Math.PI) / 180)) * 180) / Math.PI];
      }),
    );
    expect(simplifiedSweep(ridge, 'straight', 0.01)).toHaveLength(2);
    expect(simplifiedSweep(ridge, 'drawn', 0.25).length).toBeGreaterThan(3);
  });

  test('over the zenith keeps to its way, and every step is less than half a circle', () => {
    const over = withVectors(
      step(200, (share) => {
        const along = 30 + 120 * share;
        return along <= 90 ? [21, along] : [200, 180 - along];
      }),
    );
    const kept = simplifiedSweep(over, 'drawn');
    expect(kept.length).toBeLessThan(10);
    expect(furthest(over, kept)).toBeLessThan(1.5);
    for (let i = 1; i < kept.length; i++)
      expect(Math.abs(((kept[i].azimuth - kept[i - 1].azimuth + 540) % 360) - 180)).toBeLessThan(180);
  });

  property.prop([
    fc.array(fc.tuple(fc.integer({ min: 0, max: 359 }), fc.integer({ min: -10, max: 88 })), {
      minLength: 3,
      maxLength: 40,
    }),
    fc.constantFrom('straight' as const, 'drawn' as const),
    fc.constantFrom(0.1, 1, 5),
  ])(
    'of any points keeps first and last, in order, and nothing that was not there',
    (path, edge, tolerance) => {
      const all = withVectors(path);
      const kept = simplifiedSweep(all, edge, tolerance);
      expect([kept[0], kept.at(-1)]).toEqual([all[0], all.at(-1)]);
      const places = kept.map((point) => all.indexOf(point));
      expect(places).toEqual([...places].sort((a, b) => a - b));
    },
  );

  test('by a tolerance of 0 is refused', () => {
    expect(() => simplifiedSweep(raw, 'drawn', 0)).toThrow(/tolerance must be over 0, got 0/);
  });
});
