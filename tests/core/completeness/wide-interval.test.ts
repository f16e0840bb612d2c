import { describe, expect, test } from 'vitest';
import { sourceEffect, width } from '../../../src/core/completeness/interval-effect.ts';
import { openPoints } from '../../../src/core/completeness/open-points.ts';
import type { AccessInterval } from '../../../src/core/shading/assessment.ts';
import { completeSurvey } from './complete-survey.ts';
import { assessed, ofKind } from './found-points.ts';

/** Ten points wide: seven tenths of the variance from the trees, two from a heading without check, one from the climate. */
const WIDE: AccessInterval = {
  low: 0.85,
  high: 0.95,
  standardDeviation: 0.0255,
  draws: 1000,
  sources: [
    { source: 'transmittance', share: 0.7, cure: 'measure-transmittance', standardDeviationAfter: 0.018 },
    { source: 'heading', share: 0.2, cure: 'heading-check', standardDeviationAfter: 0.023 },
    { source: 'diffuse-share', share: 0.1, cure: null, standardDeviationAfter: null },
  ],
};

async function withInterval(interval: AccessInterval) {
  const survey = completeSurvey();
  const assessment = await assessed(survey);
  assessment.planes[0].solarAccess!.interval = interval;
  return ofKind(openPoints(survey, assessment), 'wide-interval');
}

describe('a wide interval', () => {
  test('is told by what can be cured and has no point of its own', async () => {
    const points = await withInterval(WIDE);
    expect(points).toHaveLength(1);
    expect(points[0]).toMatchObject({
      subject: 'South roof',
      cure: { at: 'site' },
      shrunkBy: 'measure-transmittance',
    });
    expect(points[0].sentence).toBe(
      'Its yearly access is known to a range of 10.0 points, in part for what the trees let through. Measuring what the crowns let through would shrink it.',
    );
    // 1.96 · 2.55 · √0.7
    expect(points[0].effect).toBeCloseTo(4.18, 2);
  });

  test('is let be where it is under four points wide', async () => {
    expect(await withInterval({ ...WIDE, low: 0.9, high: 0.93 })).toEqual([]);
  });

  test('leads to the light where a weather file would help', async () => {
    const climate = { ...WIDE.sources[2], cure: 'weather-file', standardDeviationAfter: 0.025 } as const;
    const points = await withInterval({ ...WIDE, sources: [climate] });
    expect(points.map(({ cure }) => cure.at)).toEqual(['light']);
  });
});

describe('effects', () => {
  test('of independent sources sum in squares to that of the whole', () => {
    const parts = WIDE.sources.map(({ source }) => sourceEffect(WIDE, source));
    expect(Math.hypot(...parts)).toBeCloseTo(100 * 1.96 * WIDE.standardDeviation, 9);
    expect(width(WIDE)).toBeCloseTo(10, 9);
  });

  test('of a source that is not listed are none', () => {
    expect(sourceEffect(WIDE, 'gaps')).toBe(0);
  });
});
