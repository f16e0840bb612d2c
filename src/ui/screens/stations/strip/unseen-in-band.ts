import { widthOf } from '../../../../core/angles/azimuth-ranges.ts';
import type { UnseenRange } from '../../../../core/shading/assessment.ts';
import { percentText } from '../../../value-text.ts';

/** Narrower ranges are left out, degrees. */
const NARROWEST = 1;

const whole = (azimuth: number) => Math.round(azimuth) % 360;

/** What of the sun's band nobody has looked at, the greatest share of the light first. */
export const unseenRanges = (unseen: readonly UnseenRange[]): UnseenRange[] =>
  unseen
    .filter(({ from, to, inSunBand }) => inSunBand && widthOf(from, to) >= NARROWEST)
    .sort((a, b) => b.share - a.share);

/** What of the sun's band nobody has looked at, the greatest share of the light, in one line; the picture shows all. */
export function unseenInBand(unseen: readonly UnseenRange[]): string {
  const open = unseenRanges(unseen);
  if (open.length === 0) return 'All of the sun’s band has been seen.';
  const [{ from, to, share }] = open;
  const more = open.length > 1 ? `; ${open.length - 1} more` : '';
  return `Unseen: ${whole(from)}° to ${whole(to)}°, ${percentText(share)} of light${more}.`;
}
