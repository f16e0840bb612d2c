import { climateFromMonthly, STATE_COUNT } from './climate-from-monthly.ts';
import type { Climate } from './climate.ts';
import type { WorldGrid } from './world-grid.ts';
import { gridAt } from './world-grid.ts';

/** The climate that the world grid gives for a place: latitude -90 to 90, longitude -360 to 360 degrees. */
export function worldClimate(grid: WorldGrid, site: { latitude: number; longitude: number }): Climate {
  const { kt, kd } = gridAt(grid, site.latitude, site.longitude);
  return {
    source: 'world',
    name: `World climate, ${grid.kt.step}° grid`,
    reference: 'NASA POWER climatology 2001-2020 over land to 60°, CORE normal year elsewhere',
    warnings: [],
    stateCount: STATE_COUNT,
    over: (track) => climateFromMonthly({ kt, kd }, track),
  };
}
