import { DEGREES } from '../angles/angles.ts';
import type { Parsed } from '../survey/problem.ts';

export interface TapedObject {
  /** Height of the object's top over the surface the station stands on, metres; below it negative. */
  height: number;
  /** Level distance from the station, metres, over 0. */
  distance: number;
  /** Height of the instrument over that surface, metres; absent means 0. */
  instrumentHeight?: number;
}

/**
 * Elevation of an object's top from its height and distance by tape, degrees, -90 to 90.
 * Throws RangeError for a distance not over 0 and for what is not finite.
 */
export function elevationByTape({ height, distance, instrumentHeight = 0 }: TapedObject): number {
  if (!(distance > 0 && distance < Infinity))
    throw new RangeError(`distance must be over 0 m, got ${distance}`);
  if (!Number.isFinite(height)) throw new RangeError(`height must be finite, got ${height}`);
  if (!Number.isFinite(instrumentHeight))
    throw new RangeError(`instrumentHeight must be finite, got ${instrumentHeight}`);
  return Math.atan2(height - instrumentHeight, distance) * DEGREES;
}

const NUMBER = String.raw`(\d+(?:[.,]\d+)?)`;
const RATIO = new RegExp(`^${NUMBER}\\s*(?:/|:|in)\\s*${NUMBER}$`);
const PERCENT = new RegExp(`^${NUMBER}\\s*(?:%|percent)$`);
const DEGREE = new RegExp(`^${NUMBER}\\s*(?:°|deg|degrees)?$`);
const MINUTES = new RegExp(`^(\\d+)\\s*°\\s*${NUMBER}\\s*'$`);

/**
 * Reads a slope, as a tilt in degrees from 0 to 90: rise over run (`6/12`, `1:2`, `6 in 12`), percent of rise to run
 * (`50 %`), degrees (`26.5`, `26.5°`, `26° 30'`). A number alone is degrees.
 */
export function parseSlope(text: string): Parsed<number> {
  const plain = text
    .trim()
    .toLowerCase()
    .replace(/[′’‘`´]/g, "'")
    .replace(/[º˚]/g, '°');
  const tilt = tiltOf(plain);
  if (tilt === null)
    return refused(`“${text.trim()}” is not understood. Write a slope as 30°, 6/12, 1:2 or 50 %.`);
  if (!(tilt >= 0 && tilt <= 90)) return refused('A slope goes from 0 to 90 degrees. Correct the number.');
  return { ok: true, value: Math.round(tilt * 1e6) / 1e6, warnings: [] };
}

const refused = (message: string): Parsed<never> => ({ ok: false, problems: [{ path: '', message }] });

function tiltOf(plain: string): number | null {
  const read = (text: string) => Number(text.replace(',', '.'));
  const ratio = RATIO.exec(plain);
  if (ratio) {
    const [rise, run] = [read(ratio[1]), read(ratio[2])];
    return rise === 0 && run === 0 ? null : Math.atan2(rise, run) * DEGREES;
  }
  const percent = PERCENT.exec(plain);
  if (percent) return Math.atan(read(percent[1]) / 100) * DEGREES;
  const degrees = DEGREE.exec(plain);
  if (degrees) return read(degrees[1]);
  const minutes = MINUTES.exec(plain);
  return minutes && read(minutes[2]) < 60 ? read(minutes[1]) + read(minutes[2]) / 60 : null;
}
