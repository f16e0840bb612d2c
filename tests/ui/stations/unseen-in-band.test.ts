import { describe, expect, it } from 'vitest';
import type { UnseenRange } from '../../../src/core/shading/assessment.ts';
import { unseenInBand } from '../../../src/ui/screens/stations/strip/unseen-in-band.ts';

const part = (from: number, to: number, share: number, inSunBand = true): UnseenRange => ({
  from,
  to,
  share,
  inSunBand,
});

describe('what is unseen of the sun’s band, in words', () => {
  it('is told with its share of the light, the greatest first, over north too', () => {
    expect(unseenInBand([part(95.2, 120.4, 0.04), part(342, 12, 0.31)])).toMatch(
      /^Unseen in the sun’s band: 342° to 12° \(31\s%.* of the light\), 95° to 120° \(4/,
    );
  });

  it('leaves out what lies outside the band and what is narrower than a degree', () => {
    const nothing = 'All of the sun’s band in front of the plane has been looked at.';
    expect(unseenInBand([part(310, 50, 0.06, false), part(180, 180.9, 0.01)])).toBe(nothing);
    expect(unseenInBand([])).toBe(nothing);
  });

  it('counts those beyond three', () => {
    const parts = [part(60, 70, 0.01), part(80, 90, 0.02), part(100, 110, 0.03), part(200, 210, 0.04)];
    expect(unseenInBand(parts)).toMatch(/ and 1 more\.$/);
    expect(unseenInBand(parts)).not.toContain('60°');
  });
});
