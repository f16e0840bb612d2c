import type { Problem } from '../survey/problem.ts';
import { lightAfterDark } from './light-after-dark.ts';

/** Share of the global light in hours of night that no twilight explains. */
const MOST_AFTER_DARK = 0.02;
/** Annual global irradiation found on land, with room, kWh/m2. Common knowledge of solar maps, no source. */
const LEAST_ANNUAL = 300;
const MOST_ANNUAL = 2900;

/** What makes a whole and readable weather year doubtful; global irradiance `ghi` in W/m2, 8,760 hours. */
export function weatherDoubts(
  ghi: Float32Array,
  station: { latitude: number; longitude: number; utcOffset: number },
): Problem[] {
  const doubts: Problem[] = [];
  const dark = lightAfterDark(ghi, station);
  if (dark > MOST_AFTER_DARK)
    doubts.push({
      path: 'file',
      message: `has ${(100 * dark).toFixed(0)} % of its global light in hours with the sun down at its place; the zone or the coordinates in its header look wrong.`,
    });
  const annual = ghi.reduce((sum, value) => sum + value, 0) / 1000;
  if (annual < LEAST_ANNUAL || annual > MOST_ANNUAL)
    doubts.push({
      path: 'file',
      message: `has ${Math.round(annual)} kWh/m2 of global light in a year, where places on land have ${LEAST_ANNUAL} to ${MOST_ANNUAL}; its units or its columns look wrong.`,
    });
  return doubts;
}
