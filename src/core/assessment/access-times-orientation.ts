import type { PlaneAssessment } from '../shading/assessment.ts';

/** A value with the ends between which it is expected 95 times in 100; the ends are the value where nothing is known. */
export interface ValueBetween {
  value: number;
  low: number;
  high: number;
}

/** A plane's annual solar access; null where no station serves it. */
export function accessBetween({ solarAccess }: Pick<PlaneAssessment, 'solarAccess'>): ValueBetween | null {
  if (!solarAccess) return null;
  const { annual: value, interval } = solarAccess;
  return { value, low: interval?.low ?? value, high: interval?.high ?? value };
}

/** A plane's orientation factor. */
export const orientationBetween = ({
  orientationFactor: value,
  orientationInterval,
}: Pick<PlaneAssessment, 'orientationFactor' | 'orientationInterval'>): ValueBetween => ({
  value,
  low: orientationInterval?.low ?? value,
  high: orientationInterval?.high ?? value,
});

/**
 * Solar access times orientation factor: what the plane receives over what an unshaded one lying best would. The errors of
 * the two have nothing in common, so that relative half-widths add in squares (GUM, 5.1.6), each side by itself.
 */
export function accessTimesOrientation(
  plane: Pick<PlaneAssessment, 'solarAccess' | 'orientationFactor' | 'orientationInterval'>,
): ValueBetween | null {
  const access = accessBetween(plane);
  if (!access) return null;
  const factor = orientationBetween(plane);
  const value = access.value * factor.value;
  const side = (end: 'low' | 'high') =>
    Math.hypot((access[end] - access.value) * factor.value, (factor[end] - factor.value) * access.value);
  // the access itself may lie outside its interval: then that side does not reach it
  const low = access.low <= access.value ? value - side('low') : value + side('low');
  const high = access.high >= access.value ? value + side('high') : value - side('high');
  return { value, low: Math.max(0, low), high: Math.min(1, Math.max(low, high)) };
}
