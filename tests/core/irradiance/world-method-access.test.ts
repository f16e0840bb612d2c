import { describe, expect, it } from 'vitest';
import type { Climate } from '../../../src/core/irradiance/climate.ts';
import { climateFromMonthly, STATE_COUNT } from '../../../src/core/irradiance/climate-from-monthly.ts';
import { monthlyExtraterrestrial } from '../../../src/core/irradiance/extraterrestrial.ts';
import { monthlyOf } from '../../../src/core/irradiance/monthly-climate.ts';
import { weatherFileClimate } from '../../../src/core/irradiance/weather-file-climate.ts';
import type { SunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { DAYS_IN_MONTH, sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import type { Months } from '../../../src/core/survey/survey.ts';
import type { Horizon, Plane, YearOfLight } from './access-by-steps.ts';
import { accessByYear, viewOfDome, yearOfLight } from './access-by-steps.ts';
import { WEATHER_FILES, weatherFile } from './weather-files.ts';

/**
 * The world climate's method against hours: from a weather file's own monthly clearness and diffuse share, annual solar
 * access within 0.5 points of the file's hours under uniform horizons and 1.5 under one-sided ones.
 *
 * Monthly means say nothing of mornings and afternoons. On planes that face east or west the file's own asymmetry enters
 * under a uniform horizon too: giving each morning the mean of morning and afternoon, with everything else kept, already
 * moves access by up to 0.66 points (San Francisco's fog). What is not met there is listed in NOT_MET, with what it is.
 */
const UNIFORM = 0.5;
const ONE_SIDED = 1.5;

const half =
  (from: number, elevation: number): Horizon =>
  (azimuth) =>
    (azimuth - from + 360) % 360 < 180 ? elevation : 0;
const uniform = [10, 20, 30].map((height) => ({
  name: `${height}° around`,
  horizon: () => height,
  bar: UNIFORM,
}));
const sides = { east: 0, south: 90, west: 180, north: 270 };
const oneSided = [20, 30, 40].flatMap((height) =>
  Object.entries(sides).map(([side, from]) => ({
    name: `${height}° ${side}`,
    horizon: half(from, height),
    bar: ONE_SIDED,
  })),
);
const horizons = [...uniform, ...oneSided];

const planes: Record<string, Plane> = {
  flat: { tilt: 0, azimuth: 180 },
  south: { tilt: 30, azimuth: 180 },
  east: { tilt: 30, azimuth: 90 },
  west: { tilt: 30, azimuth: 270 },
};

const scenes = Object.keys(planes).flatMap((plane) =>
  horizons.map((scene) => ({ ...scene, plane, view: viewOfDome(planes[plane], scene.horizon) })),
);

/** Largest departures of planes that face east or west where a bar is not met, points; held here so that none grows. */
const NOT_MET: Record<string, { uniform?: number; oneSided?: number }> = {
  'USA_CA_San.Francisco.Intl.AP.724940_TMY3.epw': { uniform: 1.05, oneSided: 2.0 },
  'USA_AK_Barrow.700260_TMY3.epw': { uniform: 0.85 },
  'USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw': { uniform: 0.85 },
  'LKA_Colombo-Katunayake.434500_SWERA.epw': { uniform: 0.75 },
  'USA_AZ_Tucson.Intl.AP.722740_TMY3.epw': { uniform: 0.6 },
};

function ownMonths(hours: Climate, track: SunTrack): { kt: Months; kd: Months } {
  const { ghi, dhi } = monthlyOf(hours, track);
  const h0 = monthlyExtraterrestrial(track.latitude);
  return {
    kt: ghi.map((sum, month) => (h0[month] > 0 ? sum / (h0[month] * DAYS_IN_MONTH[month]) : 0)) as Months,
    kd: ghi.map((sum, month) => (sum > 0 ? Math.min(1, dhi[month] / sum) : 1)) as Months,
  };
}

describe.each(WEATHER_FILES)('$name: access from monthly means', ({ name }) => {
  const file = weatherFile(name);
  const track = sunTrack(file, 10);
  const hours = weatherFileClimate(file, file);
  const months = ownMonths(hours, track);
  const truth = yearOfLight(hours, track);
  const model = yearOfLight(
    { stateCount: STATE_COUNT, over: (over) => climateFromMonthly(months, over) },
    track,
  );
  const departures = (plane: string, bar: number) =>
    scenes
      .filter((scene) => scene.plane === plane && scene.bar === bar)
      .map(({ name: where, horizon, view }) => {
        const access = (year: YearOfLight) => accessByYear(year, planes[plane], horizon, view);
        return { where, points: 100 * (access(model) - access(truth)) };
      });
  const expectWithin = (plane: string, bar: number, limit: number) => {
    const all = departures(plane, bar);
    expect(all.every(({ points }) => Number.isFinite(points))).toBe(true);
    expect(all.filter(({ points }) => Math.abs(points) > limit)).toEqual([]);
    return Math.max(...all.map(({ points }) => Math.abs(points)));
  };

  it.each(['flat', 'south'])('meets both bars on a %s plane', (plane) => {
    expectWithin(plane, UNIFORM, UNIFORM);
    expectWithin(plane, ONE_SIDED, ONE_SIDED);
  });

  it('meets them on planes to the east and west, or misses by no more than is listed', () => {
    const limits = NOT_MET[name] ?? {};
    const worst = (bar: number, limit: number) =>
      Math.max(...['east', 'west'].map((plane) => expectWithin(plane, bar, limit)));
    const found = {
      uniform: worst(UNIFORM, limits.uniform ?? UNIFORM),
      oneSided: worst(ONE_SIDED, limits.oneSided ?? ONE_SIDED),
    };
    // a miss that has become a hit leaves the list
    if (limits.uniform) expect(found.uniform).toBeGreaterThan(UNIFORM);
    if (limits.oneSided) expect(found.oneSided).toBeGreaterThan(ONE_SIDED);
  });
});
