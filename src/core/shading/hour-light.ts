import { domeView, groundView } from '../transposition/plane-irradiance.ts';
import type { SkyMap } from './sky-map.ts';

/** A plane's light in one hour of local standard time, summed over a month, with nothing in the way, kWh/m2. */
export interface HourLight {
  /** From the dome, the dark band taken off. */
  dome: number;
  /** From a bright horizon band. */
  band: number;
  /** All of it: direct light and the ground's too. */
  whole: number;
}

/** Reads the light of a cell, [month · 24 + hour]. */
export function hourLight(map: SkyMap): (cell: number) => HourLight {
  const { dome, brightBand, darkBand, ghi, albedo } = map.year;
  const sine = Math.sqrt(1 - map.facing.upward ** 2);
  const view = domeView(map.surfaceTilt);
  const groundShare = albedo * groundView(map.surfaceTilt);
  return (cell) => {
    const even = Math.max(0, dome[cell] * view + darkBand[cell] * sine);
    const band = brightBand[cell] * sine;
    return { dome: even, band, whole: map.directHours[cell] + even + band + ghi[cell] * groundShare };
  };
}

/** A table [month][hour] from the cells' values. */
export const monthHourTable = <T>(value: (cell: number, month: number) => T): T[][] =>
  Array.from({ length: 12 }, (_, month) =>
    Array.from({ length: 24 }, (_, hour) => value(month * 24 + hour, month)),
  );
