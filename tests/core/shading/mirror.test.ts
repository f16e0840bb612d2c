import { describe, expect, test } from 'vitest';
import { blockedSpans } from '../../../src/core/horizon/blocked-spans.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import type { TracedObstruction } from '../../../src/core/horizon/traced-obstruction.ts';
import type { Climate } from '../../../src/core/irradiance/climate.ts';
import { blockedLight, shadedMonths } from '../../../src/core/shading/blocked-light.ts';
import { hourlyAccess } from '../../../src/core/shading/hourly-access.ts';
import { skyGrid } from '../../../src/core/shading/sky-grid.ts';
import { skyMap, unshadedMonths } from '../../../src/core/shading/sky-map.ts';
import { skyYear } from '../../../src/core/shading/sky-year.ts';
import { sunPaths } from '../../../src/core/shading/sun-paths.ts';
import { cosZenithOf } from '../../../src/core/solar-position/sun-track.ts';
import { TRANSPOSITIONS } from '../../../src/core/transposition/transposition-models.ts';
import { THIN_SCENES } from './thin-scenes.ts';
import { syntheticTrack } from './synthetic-track.ts';

/** A sky that knows nothing of the date: light from the height of the sun alone. */
const evenClimate: Climate = {
  source: 'clear-sky',
  name: 'made up',
  reference: 'made up for mirror images',
  warnings: [],
  stateCount: 1,
  over: (track) => (step, sky) => {
    const cosZenith = cosZenithOf(track, step);
    if (cosZenith <= 0) return false;
    sky.weight[0] = 1;
    sky.dni[0] = 900 * cosZenith ** 0.3;
    sky.dhi[0] = 120 * cosZenith;
    sky.ghi[0] = sky.dni[0] * cosZenith + sky.dhi[0];
    return true;
  },
};

type Mirror = (azimuth: number) => number;
const eastWest: Mirror = (azimuth) => (360 - azimuth) % 360;
const northSouth: Mirror = (azimuth) => (540 - azimuth) % 360;

const mirrored = (scene: readonly TracedObstruction[], mirror: Mirror): TracedObstruction[] =>
  scene.map((one) => ({
    ...one,
    traces: one.traces.map((trace) => ({
      ...trace,
      points: trace.points.map((p) => ({ ...p, azimuth: mirror(p.azimuth) })),
    })),
  }));

function result(
  latitude: number,
  declination: number,
  azimuth: number,
  scene: readonly TracedObstruction[],
  model: number,
) {
  const paths = sunPaths(syntheticTrack(latitude, declination));
  const map = skyMap(skyYear(paths, evenClimate, TRANSPOSITIONS[model], 0.2), skyGrid(paths), 35, azimuth);
  const spans = blockedSpans(horizonProfile(scene));
  const blocked = blockedLight(map, spans);
  const [whole, light] = [unshadedMonths(map), shadedMonths(map, blocked)];
  return { monthly: light.map((value, m) => value / whole[m]), hourly: hourlyAccess(map, spans, blocked) };
}

const places = [
  [44, 12],
  [44, -20],
  [8, 15],
] as const;

describe.each(places)('latitude %d, declination %d', (latitude, declination) => {
  // the extraterrestrial distance of the date enters Hay and Davies and Perez alike on both sides of each mirror
  describe.each(TRANSPOSITIONS.map((model, i) => [model.name, i] as const))('%s', (_, model) => {
    test.each(THIN_SCENES)('$name: the day mirrored at the meridian', ({ scene }) => {
      const plain = result(latitude, declination, 160, scene, model);
      const other = result(latitude, declination, eastWest(160), mirrored(scene, eastWest), model);
      plain.monthly.forEach((share, m) => expect(other.monthly[m]).toBeCloseTo(share, 4));
      plain.hourly.forEach((hours, m) =>
        hours.forEach((share, hour) => {
          const reflected = other.hourly[m][23 - hour];
          if (share === null) expect(reflected).toBeNull();
          else expect(Math.abs(reflected! - share)).toBeLessThan(0.01);
        }),
      );
    });

    test.each(THIN_SCENES)('$name: the southern hemisphere mirrors the northern', ({ scene }) => {
      const north = result(latitude, declination, 160, scene, model);
      const south = result(-latitude, -declination, northSouth(160), mirrored(scene, northSouth), model);
      north.monthly.forEach((share, m) => expect(south.monthly[m]).toBeCloseTo(share, 4));
    });
  });
});
