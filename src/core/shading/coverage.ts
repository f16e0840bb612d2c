import { fullCircle } from '../angles/angles.ts';
import type { AzimuthRange } from '../angles/azimuth-ranges.ts';
import { rangesBetween, unitedRanges } from '../angles/azimuth-ranges.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import type { UnseenRange } from './assessment.ts';
import { isInSunBand, lightByColumn } from './light-by-column.ts';
import type { SkyMap } from './sky-map.ts';

/** How much of a plane's light comes through azimuths that somebody observed, and where the rest comes from. */
export interface ObservedLight {
  /** 0 to 1. */
  coverage: number;
  /** Clockwise; their shares and `coverage` sum to 1. */
  unseen: UnseenRange[];
}

/**
 * Share of a plane's unshaded sky light (direct light, dome and horizon band) that comes through azimuths somebody
 * observed, and of each range that nobody observed. Sky behind the plane sends it nothing and so is not missed.
 */
export function observedLight(map: SkyMap, observed: readonly AzimuthRange[]): ObservedLight {
  const light = lightByColumn(map);
  const seen = observedShares(observed);
  let [whole, covered] = [0, 0];
  for (let column = 0; column < COLUMNS; column++) {
    whole += light[column];
    covered += light[column] * seen[column];
  }
  const share = ([from, to]: AzimuthRange) => (whole > 0 ? lightBetween(light, from, to) / whole : 0);
  const unseen = rangesBetween(observed).flatMap((range) => cutAtBand(map, range));
  return {
    coverage: whole > 0 ? covered / whole : 1,
    unseen: unseen.map(({ range: [from, to], inSunBand }) => ({
      from: fullCircle(from),
      to: to > 360 ? to - 360 : to,
      share: share([from, to]),
      inSunBand,
    })),
  };
}

/** Light from between two azimuths, `to` at most a circle past `from`; a column's light is spread evenly over it. */
function lightBetween(light: readonly number[], from: number, to: number): number {
  let sum = 0;
  for (let column = Math.floor(from / COLUMN_WIDTH); column * COLUMN_WIDTH < to; column++)
    sum += light[column % COLUMNS] * partOfColumn(column, from, to);
  return sum;
}

/** The range in pieces, each wholly inside or wholly outside the columns where the sun comes before the plane. */
function cutAtBand(map: SkyMap, [from, to]: AzimuthRange): { range: AzimuthRange; inSunBand: boolean }[] {
  const pieces: { range: [number, number]; inSunBand: boolean }[] = [];
  for (let column = Math.floor(from / COLUMN_WIDTH); column * COLUMN_WIDTH < to; column++) {
    const [start, end] = [Math.max(from, column * COLUMN_WIDTH), Math.min(to, (column + 1) * COLUMN_WIDTH)];
    const inSunBand = isInSunBand(map, column % COLUMNS);
    const last = pieces[pieces.length - 1];
    if (last && last.inSunBand === inSunBand) last.range[1] = end;
    else pieces.push({ range: [start, end], inSunBand });
  }
  const [first, last] = [pieces[0], pieces[pieces.length - 1]];
  if (pieces.length < 2 || to - from < 360 || first.inSunBand !== last.inSunBand) return pieces;
  const overNorth = { range: [last.range[0], first.range[1] + 360] as const, inSunBand: last.inSunBand };
  return [...pieces.slice(1, -1), overNorth];
}

/** Share of each column that the ranges cover together. */
export function observedShares(observed: readonly AzimuthRange[]): Float64Array {
  const shares = new Float64Array(COLUMNS);
  for (const [from, to] of unitedRanges(observed))
    for (let column = Math.floor(from / COLUMN_WIDTH); column * COLUMN_WIDTH < to; column++)
      shares[column] += partOfColumn(column, from, to);
  return shares;
}

/** Share of a column that lies between two azimuths. */
function partOfColumn(column: number, from: number, to: number): number {
  const start = Math.max(from, column * COLUMN_WIDTH);
  const end = Math.min(to, (column + 1) * COLUMN_WIDTH);
  return (end - start) / COLUMN_WIDTH;
}
