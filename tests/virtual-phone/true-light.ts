import { blockedSpans } from '../../src/core/horizon/blocked-spans.ts';
import type { HorizonProfile } from '../../src/core/horizon/horizon-profile.ts';
import { horizonProfile } from '../../src/core/horizon/horizon-profile.ts';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { siteLight } from '../../src/core/shading/site-light.ts';
import { blockedLight } from '../../src/core/shading/blocked-light.ts';
import type { SkyMap } from '../../src/core/shading/sky-map.ts';
import { skyMap } from '../../src/core/shading/sky-map.ts';
import { monthsOf } from '../../src/core/shading/sky-year.ts';
import { worldGrid } from '../core/irradiance/world-bytes.ts';
import type { TrueScene } from './true-scene.ts';
import { trueObstructions } from './true-scene.ts';

/** A scene under its sky: what all surveys of it share. */
export interface SceneLight {
  scene: TrueScene;
  map: SkyMap;
  profile: HorizonProfile;
}

export function sceneLight(scene: TrueScene): SceneLight {
  const light = siteLight(scene.site, worldClimate(worldGrid, scene.site));
  const map = skyMap(light.year, light.grid, scene.plane.surfaceTilt, scene.plane.surfaceAzimuth);
  return { scene, map, profile: horizonProfile(trueObstructions(scene)) };
}

const sum = (values: Iterable<number>) => [...values].reduce((all, value) => all + value, 0);

/**
 * Annual access behind a profile under the map's sky with a share `more` of diffuse light added and as much direct light
 * taken off, the global light on the horizontal kept.
 */
export function annualAccess(map: SkyMap, profile: HorizonProfile, more = 0): number {
  const blocked = blockedLight(map, blockedSpans(profile));
  const diffuse = sum(monthsOf(map.year.dome));
  const less = (more * diffuse) / (sum(monthsOf(map.year.ghi)) - diffuse);
  const even = map.dome.map((dome, month) => dome + map.band[month]);
  const lostEven = map.dome.map(
    (dome, m) => dome * blocked.domeShare[m] + map.band[m] * blocked.bandShare[m],
  );
  const whole = (1 - less) * sum(map.direct) + (1 + more) * sum(even) + sum(map.ground);
  return 1 - ((1 - less) * sum(blocked.direct) + (1 + more) * sum(lostEven)) / whole;
}
