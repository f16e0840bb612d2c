import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import { BAND_TOP, viewUpTo } from '../horizon/sky-view.ts';
import type { SkyMap } from './sky-map.ts';

/** A range of azimuth, degrees, clockwise from `from` to `to`, over north where `to` is below `from`. */
export type AzimuthRange = readonly [from: number, to: number];

/**
 * Share of a plane's unshaded sky light (direct light, dome and horizon band) that comes through azimuths somebody
 * observed, 0 to 1. Sky behind the plane sends it nothing and so is not missed.
 */
export function coverage(map: SkyMap, observed: readonly AzimuthRange[]): number {
  const seen = observedShares(observed);
  const dome = evenLight(map, map.dome, Math.PI / 2);
  const band = evenLight(map, map.band, BAND_TOP);
  let [whole, covered] = [0, 0];
  for (let column = 0; column < COLUMNS; column++) {
    let light = dome[column] + band[column];
    for (let month = 0; month < 12; month++) light += columnDirect(map, month, column);
    whole += light;
    covered += light * seen[column];
  }
  return whole > 0 ? covered / whole : 1;
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

/** Share of each column that the ranges cover together. */
export function observedShares(observed: readonly AzimuthRange[]): Float64Array {
  const shares = new Float64Array(COLUMNS);
  for (const [from, to] of united(observed))
    for (let column = Math.floor(from / COLUMN_WIDTH); column * COLUMN_WIDTH < to; column++) {
      const start = Math.max(from, column * COLUMN_WIDTH);
      const end = Math.min(to, (column + 1) * COLUMN_WIDTH);
      shares[column] += (end - start) / COLUMN_WIDTH;
    }
  return shares;
}

/** Ranges cut at north and joined where they touch, in order. */
function united(observed: readonly AzimuthRange[]): [number, number][] {
  const cut = observed.flatMap(([from, to]): [number, number][] =>
    from <= to
      ? [[from, to]]
      : [
          [from, 360],
          [0, to],
        ],
  );
  const joined: [number, number][] = [];
  for (const [from, to] of cut.sort((a, b) => a[0] - b[0])) {
    const last = joined[joined.length - 1];
    if (last && from <= last[1]) last[1] = Math.max(last[1], to);
    else joined.push([from, to]);
  }
  return joined;
}
