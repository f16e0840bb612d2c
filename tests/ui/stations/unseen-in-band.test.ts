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
    expect(unseenInBand([part(310, 50, 0.004, false), part(180, 180.9, 0.01)])).toBe(nothing);
    expect(unseenInBand([])).toBe(nothing);
  });

  it('says how much of the light lies unseen outside the band, so that it adds up with what is covered', () => {
    const outside = [part(310, 30, 0.03, false), part(30, 50, 0.02, false)];
    expect(unseenInBand([...outside, part(227, 229, 0.01)])).toMatch(
      /^Unseen: 227° to 229°, 1\s% of light, and 5\s% outside the sun’s band\.$/,
    );
    expect(unseenInBand(outside)).toMatch(
      /^All of the sun’s band has been seen; unseen: 5\s% outside the sun’s band\.$/,
    );
  });
});
