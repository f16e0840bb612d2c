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

/** Share of the light that comes from beside the sun's band, from where nobody has looked. */
const shareOutside = (unseen: readonly UnseenRange[]): number =>
  unseen.reduce((sum, { inSunBand, share }) => (inSunBand ? sum : sum + share), 0);

/** Smaller shares show as nothing in whole percent. */
const LEAST_SHARE = 0.005;

/**
 * What of the sun's band nobody has looked at, the greatest share of the light, in one line, and how much of the light
 * lies outside the band; the picture shows all.
 */
export function unseenInBand(unseen: readonly UnseenRange[]): string {
  const open = unseenRanges(unseen);
  const outside = shareOutside(unseen);
  const beside = outside < LEAST_SHARE ? '' : `${percentText(outside)} outside the sun’s band`;
  if (open.length === 0) return `All of the sun’s band has been seen${beside && `; unseen: ${beside}`}.`;
  const [{ from, to, share }] = open;
  const more = open.length > 1 ? `; ${open.length - 1} more` : '';
  return `Unseen: ${whole(from)}° to ${whole(to)}°, ${percentText(share)} of light${more}${beside && `, and ${beside}`}.`;
}
