import { blockedSpans } from '../../src/core/horizon/blocked-spans.ts';
import { horizonProfile } from '../../src/core/horizon/horizon-profile.ts';
import type { Climate } from '../../src/core/irradiance/climate.ts';
import { blockedLight, shadedMonths } from '../../src/core/shading/blocked-light.ts';
import type { SkyMap } from '../../src/core/shading/sky-map.ts';
import { unshadedMonths } from '../../src/core/shading/sky-map.ts';
import { hayDavies } from '../../src/core/transposition/hay-davies.ts';
import { minuteByMinute } from '../core/shading/minute-by-minute.ts';
import { THIN_SCENES } from '../core/shading/thin-scenes.ts';

export interface Exactness {
  profile: string;
  /** Shading loss over the year, percentage points. */
  loss: number;
  /** Difference of solar access from a pass over every minute, percentage points. */
  annual: number;
  worstMonth: number;
}

/** How far the map's solar access is from a pass over every minute, for profiles that are hard for it. */
export function exactness(
  map: SkyMap,
  climate: Climate,
  site: { latitude: number; longitude: number; altitude: number; utcOffset: number },
): Exactness[] {
  const plane = { tilt: map.surfaceTilt, azimuth: map.surfaceAzimuth };
  const whole = unshadedMonths(map);
  return THIN_SCENES.map(({ name, scene }) => {
    const light = shadedMonths(map, blockedLight(map, blockedSpans(horizonProfile(scene))));
    const minute = minuteByMinute(site, plane, climate, hayDavies, scene);
    const loss = 1 - sum(minute.light) / sum(minute.whole);
    const months = whole.map((all, m) => Math.abs(light[m] / all - minute.light[m] / minute.whole[m]));
    return {
      profile: name,
      loss: 100 * loss,
      annual: 100 * Math.abs(1 - sum(light) / sum(whole) - loss),
      worstMonth: 100 * Math.max(...months),
    };
  });
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
