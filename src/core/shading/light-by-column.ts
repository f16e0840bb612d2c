import { DEGREES, RADIANS } from '../angles/angles.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import { BAND_TOP, planeHorizon, viewUpTo } from '../horizon/sky-view.ts';
import type { SkyMap } from './sky-map.ts';
import { BIN } from './sun-paths.ts';

/** All sky light on a plane (direct light, dome and horizon band) by column of azimuth, kWh/m2 a year. */
export function lightByColumn(map: SkyMap): number[] {
  const dome = evenLight(map, map.dome, Math.PI / 2);
  const band = evenLight(map, map.band, BAND_TOP);
  return dome.map((even, column) => {
    let light = even + band[column];
    for (let month = 0; month < 12; month++) light += columnDirect(map, month, column);
    return light;
  });
}

/** A year of even light from the horizontal up to an elevation [radians], shared out to columns by the plane's view. */
function evenLight({ facing }: SkyMap, monthly: readonly number[], topRad: number): number[] {
  const light = monthly.reduce((sum, month) => sum + month, 0);
  const views = Array.from({ length: COLUMNS }, (_, column) =>
    light === 0 ? 0 : viewUpTo(facing, (column + 0.5) * COLUMN_WIDTH, topRad),
  );
  const whole = views.reduce((sum, view) => sum + view, 0);
  return views.map((view) => (whole > 0 ? (light * view) / whole : 0));
}

/** All direct light of a month and a column, kWh/m2. */
function columnDirect({ grid, below }: SkyMap, month: number, column: number): number {
  const strip = column * 12 + month;
  const end = grid.first[strip + 1];
  return end > grid.first[strip] ? below[end - 1] : 0;
}

/** Whether the sun ever stands in a column in front of the plane. */
export function isInSunBand({ grid, facing }: SkyMap, column: number): boolean {
  const azimuth = (column + 0.5) * COLUMN_WIDTH * RADIANS;
  const toward = facing.north * Math.cos(azimuth) + facing.east * Math.sin(azimuth);
  const behind = planeHorizon(toward, facing.upward) * DEGREES;
  for (let strip = column * 12; strip < (column + 1) * 12; strip++) {
    const bins = grid.first[strip + 1] - grid.first[strip] - 1;
    if (bins > 0 && (grid.bottom[strip] + bins) * BIN > behind) return true;
  }
  return false;
}
