import { fullCircle } from '../angles/angles.ts';
import type { HeadingMethod, HeadingReference } from './heading-method.ts';
import { LOWEST_SHADOW_SUN, SHADOW_LIMIT, isUsable, shadowSun } from './shadow-error.ts';

/** Sun by shadow: the axis laid along a shadow, away from the sun, points to the sun's azimuth + 180°. */
export const sunShadow: HeadingMethod = {
  id: 'sun-shadow',
  name: 'Sun by shadow',
  needsBearing: false,
  needsSun: true,
  howTo:
    'Lay the phone’s top edge along the shadow of an upright edge, pointing away from the sun, and hold still.',
  caution: 'Never look at the sun, and never point the camera at it: use the shadow only.',
  reference({ takenAtMs, site }): HeadingReference {
    const sun = shadowSun(takenAtMs, site);
    if (isUsable(sun))
      return {
        ok: true,
        azimuth: fullCircle(sun.solarAzimuth + 180),
        standardDeviation: sun.standardDeviation,
      };
    return { ok: false, field: 'reading', message: refusal(sun.apparentElevation, sun.standardDeviation) };
  },
};

function refusal(elevation: number, deviation: number): string {
  const stood = `${Math.abs(elevation).toFixed(1)}° ${elevation < 0 ? 'below' : 'above'} the horizon`;
  if (elevation < 0)
    return `By the reading’s time the sun was down (${stood}), so there was no shadow. Correct the clock if it was wrong, or use a mark of known bearing.`;
  if (elevation < LOWEST_SHADOW_SUN)
    return `The sun stood ${stood}; under ${LOWEST_SHADOW_SUN}° its shadow is too faint to go by. Take the check at another hour.`;
  return `The sun stood so high (${stood}) that shadow and clock could be off by ${deviation.toFixed(1)}°, over the limit of ${SHADOW_LIMIT}°. Take the check earlier or later in the day.`;
}
