import { describe, expect, test } from 'vitest';
import { spreadText, withInterval } from '../../src/cli/interval-text.ts';
import type { AccessInterval } from '../../src/core/shading/assessment.ts';

const interval: AccessInterval = {
  low: 0.929,
  high: 0.953,
  standardDeviation: 0.0061,
  draws: 1000,
  sources: [
    { source: 'heading', share: 0.72, cure: 'heading-check', standardDeviationAfter: 0.0034 },
    { source: 'diffuse-share', share: 0.28, cure: null, standardDeviationAfter: null },
  ],
};

describe('an interval in words', () => {
  test('stands in brackets behind the access', () => {
    expect(withInterval(0.942, interval)).toBe('94.2 (92.9 to 95.3)');
    expect(withInterval(0.942)).toBe('94.2');
  });

  test('names what it mostly comes from and what would shrink it', () => {
    expect(spreadText(interval)).toBe(
      'Most of the spread (72 %) is the heading of the azimuths; a heading check would bring the standard deviation from ±0.6 to ±0.3 points.',
    );
    expect(spreadText({ ...interval, sources: interval.sources.slice(1) })).toBe(
      'Most of the spread (28 %) is the climate’s share of diffuse light.',
    );
    expect(spreadText({ ...interval, standardDeviation: 0, sources: [] })).toBe(
      'Nothing in this survey makes it unsure.',
    );
  });
});
