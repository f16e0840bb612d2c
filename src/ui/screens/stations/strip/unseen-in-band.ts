import { widthOf } from '../../../../core/angles/azimuth-ranges.ts';
import type { UnseenRange } from '../../../../core/shading/assessment.ts';
import { percentText } from '../../../value-text.ts';

/** Ranges told in words; the picture shows all. */
const MOST_RANGES = 3;
/** Narrower ranges are left out, degrees. */
const NARROWEST = 1;

const whole = (azimuth: number) => Math.round(azimuth) % 360;

/** What of the sun's band nobody has looked at, the greatest share of the light first, as a sentence. */
export function unseenInBand(unseen: readonly UnseenRange[]): string {
  const open = unseen
    .filter(({ from, to, inSunBand }) => inSunBand && widthOf(from, to) >= NARROWEST)
    .sort((a, b) => b.share - a.share);
  if (open.length === 0) return 'All of the sun’s band in front of the plane has been looked at.';
  const ranges = open
    .slice(0, MOST_RANGES)
    .map(({ from, to, share }) => `${whole(from)}° to ${whole(to)}° (${percentText(share)} of the light)`);
  const more = open.length > MOST_RANGES ? ` and ${open.length - MOST_RANGES} more` : '';
  return `Unseen in the sun’s band: ${ranges.join(', ')}${more}.`;
}
