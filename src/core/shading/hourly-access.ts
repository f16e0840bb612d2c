import type { BlockedSpans } from '../horizon/blocked-spans.ts';
import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import { dayOf } from '../solar-position/sun-track.ts';
import type { BlockedLight } from './blocked-light.ts';
import { hourLight, monthHourTable } from './hour-light.ts';
import type { SkyMap } from './sky-map.ts';
import type { MonthHours } from './sky-year.ts';
import { monthHourOf } from './sky-year.ts';
import { cosIncidenceOf } from './sky-map.ts';

/** An hour of a month with less light than this has no access to speak of, kWh/m2. */
const DARK = 1e-6;

/**
 * Solar access by month and hour of local standard time, [month][hour]; null where there is no light in that hour. A map by
 * month has no hours, so the direct light is taken from the pieces of the sun's path again.
 */
export function hourlyAccess(map: SkyMap, spans: BlockedSpans, blocked: BlockedLight): (number | null)[][] {
  const directLost = directLostByHour(map, spans);
  const light = hourLight(map);
  return monthHourTable((cell, month) => {
    const { dome, band, whole } = light(cell);
    if (whole < DARK) return null;
    const lost = directLost[cell] + dome * blocked.domeShare[month] + band * blocked.bandShare[month];
    return Math.min(1, Math.max(0, 1 - lost / whole));
  });
}

/** Direct light that the spans take, [month · 24 + hour], kWh/m2. */
function directLostByHour(map: SkyMap, spans: BlockedSpans): MonthHours {
  const { year } = map;
  const { track, step, pieceFirst, pieceStrip, pieceLow, pieceHigh, pieceShare } = year.paths;
  const lost = new Float64Array(12 * 24);
  const tops = columnTops(spans);
  for (let k = 0; k < step.length; k++) {
    const i = step[k];
    if (year.direct[i] <= 0) continue;
    const light = year.direct[i] * cosIncidenceOf(year, map.facing, i);
    if (light <= 0) continue;
    const month = track.monthOfDay[dayOf(track, i)];
    for (let piece = pieceFirst[k]; piece < pieceFirst[k + 1]; piece++) {
      const column = (pieceStrip[piece] / 12) | 0;
      if (pieceLow[piece] >= tops[column]) continue;
      const share = lostShare(spans, column, pieceLow[piece], pieceHigh[piece], month);
      lost[monthHourOf(track, i)] += light * pieceShare[piece] * share;
    }
  }
  return lost;
}

/** Highest blocked elevation of each column, degrees; 0 where nothing is. */
function columnTops({ profile, first, high }: BlockedSpans): Float64Array {
  const tops = new Float64Array(COLUMNS);
  profile.sliceColumn.forEach((column, slice) => {
    for (let k = first[slice]; k < first[slice + 1]; k++) tops[column] = Math.max(tops[column], high[k]);
  });
  return tops;
}

/** Share lost of light spread evenly over a column and between two elevations. */
function lostShare(spans: BlockedSpans, column: number, bottom: number, top: number, month: number): number {
  const { columnFirst, sliceFrom, sliceTo } = spans.profile;
  const height = top - bottom;
  let sum = 0;
  for (let slice = columnFirst[column]; slice < columnFirst[column + 1]; slice++) {
    const width = sliceTo[slice] - sliceFrom[slice];
    for (let k = spans.first[slice]; k < spans.first[slice + 1]; k++) {
      const low = Math.max(bottom, spans.low[k]);
      const high = Math.min(top, spans.high[k]);
      if (high < low || spans.high[k] === bottom) continue;
      const share = height > 0 ? (high - low) / height : 1;
      sum += width * share * spans.lost[spans.row[k] * 12 + month];
    }
  }
  return sum / COLUMN_WIDTH;
}
