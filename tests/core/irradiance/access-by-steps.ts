import { RADIANS } from '../../../src/core/angles/angles.ts';
import type { Climate } from '../../../src/core/irradiance/climate.ts';
import { skyStates } from '../../../src/core/irradiance/climate.ts';
import { extraterrestrialNormal } from '../../../src/core/irradiance/extraterrestrial.ts';
import type { SunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { cosZenithOf, dayOf } from '../../../src/core/solar-position/sun-track.ts';

/** A horizon by azimuth: everything below the elevation it returns [degrees] is blocked. */
export type Horizon = (azimuth: number) => number;

export interface Plane {
  tilt: number;
  azimuth: number;
}

const LOWEST_COSINE = Math.cos(89 * RADIANS);
const GROUND = 0.2;

/** A year's light, split as Hay and Davies (1980) do, before any plane. */
export interface YearOfLight {
  /** Steps with light from the sun's place: the way to the sun, its azimuth [degrees], and the light normal to it. */
  steps: { east: number; north: number; up: number; azimuth: number; light: number }[];
  /** Light from the even dome and from the ground, on the horizontal. */
  dome: number;
  ground: number;
}

export function yearOfLight(climate: Pick<Climate, 'over' | 'stateCount'>, track: SunTrack): YearOfLight {
  const year: YearOfLight = { steps: [], dome: 0, ground: 0 };
  const read = climate.over(track);
  const sky = skyStates(climate.stateCount);
  for (let step = 0; step < track.steps; step++) {
    if (!read(step, sky)) continue;
    const cosZenith = cosZenithOf(track, step);
    const outside = extraterrestrialNormal(dayOf(track, step) + 1);
    let light = 0;
    for (let k = 0; k < climate.stateCount; k++) {
      const dni = cosZenith > 0 ? sky.dni[k] : 0; // not what a file holds on after sunset
      const anisotropy = dni / outside;
      light += sky.weight[k] * (dni + (sky.dhi[k] * anisotropy) / Math.max(cosZenith, LOWEST_COSINE));
      year.dome += sky.weight[k] * sky.dhi[k] * (1 - anisotropy);
      year.ground += sky.weight[k] * sky.ghi[k] * GROUND;
    }
    if (light > 0) year.steps.push({ ...middleOf(track, step), light });
  }
  return year;
}

function middleOf({ east, north, up }: SunTrack, step: number) {
  const [e, n] = [(east[step] + east[step + 1]) / 2, (north[step] + north[step + 1]) / 2];
  return {
    east: e,
    north: n,
    up: (up[step] + up[step + 1]) / 2,
    azimuth: (Math.atan2(e, n) / RADIANS + 360) % 360,
  };
}

/** Unit vector up from the plane, east-north-up. */
function normalOf({ tilt, azimuth }: Plane): [number, number, number] {
  const level = Math.sin(tilt * RADIANS);
  return [level * Math.sin(azimuth * RADIANS), level * Math.cos(azimuth * RADIANS), Math.cos(tilt * RADIANS)];
}

/** Share of a dome of even light that the plane gets above a horizon, by sums over half-degree patches. */
export function viewOfDome(plane: Plane, horizon: Horizon): number {
  const [e, n, u] = normalOf(plane);
  const size = 0.5;
  let view = 0;
  for (let azimuth = size / 2; azimuth < 360; azimuth += size) {
    const level = e * Math.sin(azimuth * RADIANS) + n * Math.cos(azimuth * RADIANS);
    for (let elevation = horizon(azimuth) + size / 2; elevation < 90; elevation += size) {
      const cosine = level * Math.cos(elevation * RADIANS) + u * Math.sin(elevation * RADIANS);
      if (cosine > 0) view += cosine * Math.cos(elevation * RADIANS) * (size * RADIANS) ** 2;
    }
  }
  return view / Math.PI;
}

/**
 * Solar access of the year, 0 to 1: with the horizon over without, step by step. `view` is the plane's view of the dome
 * above the horizon (`viewOfDome`).
 */
export function accessByYear(year: YearOfLight, plane: Plane, horizon: Horizon, view: number): number {
  const [e, n, u] = normalOf(plane);
  let open = 0;
  let all = 0;
  for (const { east, north, up, azimuth, light } of year.steps) {
    const onPlane = light * Math.max(0, e * east + n * north + u * up);
    all += onPlane;
    if (up > Math.sin(horizon(azimuth) * RADIANS)) open += onPlane;
  }
  const ground = (year.ground * (1 - u)) / 2;
  return (open + year.dome * view + ground) / (all + (year.dome * (1 + u)) / 2 + ground);
}
