import { climateFromMonthly, STATE_COUNT } from './climate-from-monthly.ts';
import type { Climate } from './climate.ts';
import type { WorldGrid } from './world-grid.ts';
import { gridAt } from './world-grid.ts';

/** Beyond this latitude the grid stands on coarser sources. */
const COARSE_LATITUDE = 60;

const REFERENCE =
  'Data obtained from the NASA Langley Research Center POWER Project, climatology 2001-2020; ' +
  'beyond 60° latitude and over the sea the CORE normal year (Large and Yeager 2004)';

/** The climate that the world grid gives for a place: latitude -90 to 90, longitude -360 to 360 degrees. */
export function worldClimate(grid: WorldGrid, site: { latitude: number; longitude: number }): Climate {
  const { kt, kd } = gridAt(grid, site.latitude, site.longitude);
  const coarse = Math.abs(site.latitude) > COARSE_LATITUDE;
  return {
    source: 'world',
    name: `World climate, ${grid.kt.step}° grid`,
    reference: REFERENCE,
    warnings: coarse
      ? [
          'Beyond 60° latitude the world climate is coarse, up to a quarter too bright; use a weather file if there is one.',
        ]
      : [],
    stateCount: STATE_COUNT,
    over: (track) => climateFromMonthly({ kt, kd }, track),
  };
}
