import { describe, expect, it } from 'vitest';
import type { UnseenRange } from '../../../src/core/shading/assessment.ts';
import { unseenInBand } from '../../../src/ui/screens/stations/strip/unseen-in-band.ts';

const part = (from: number, to: number, share: number, inSunBand = true): UnseenRange => ({
  from,
  to,
  share,
  inSunBand,
});

describe('what is unseen of the sun’s band, in one line', () => {
  it('is the part with the greatest share of the light, over north too; the others are counted', () => {
    expect(unseenInBand([part(95.2, 120.4, 0.04), part(342, 12, 0.31)])).toMatch(
      /^Unseen: 342° to 12°, 31\s% of light; 1 more\.$/,
    );
    expect(unseenInBand([part(95.2, 120.4, 0.04)])).toMatch(/^Unseen: 95° to 120°, 4\s% of light\.$/);
  });

  it('leaves out what lies outside the band and what is narrower than a degree', () => {
    const nothing = 'All of the sun’s band has been seen.';
    expect(unseenInBand([part(310, 50, 0.06, false), part(180, 180.9, 0.01)])).toBe(nothing);
    expect(unseenInBand([])).toBe(nothing);
  });
});
