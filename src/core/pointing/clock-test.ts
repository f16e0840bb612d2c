import { DEGREES, turnBetween } from '../angles/angles.ts';
import { solarPosition } from '../solar-position/solar-position.ts';
import type { HeadingCheck, Site } from '../survey/survey.ts';
import type { CheckResult } from './pointed-survey.ts';

/** No compass that works is further off than this, degrees (planning value: outliers to 20, and the check's own error). */
export const COMPASS_REACH = 25;
/** A height taken from a shadow's length is good to this, degrees. Common practice, no source. */
const LENGTH_DEVIATION = 1.5;
/** Clock errors looked for: hours and half hours, as summer time and zones make them [minutes]. */
const SUSPECTED = [-120, -90, -60, -30, 30, 60, 90, 120];
/** Two checks decide when they are this far apart, minutes. */
const APART = 45;

/** What evidence says of the clock: `right`, wrong by so many minutes (to be added to it), or nothing either way. */
export type ClockVerdict =
  { is: 'right' } | { is: 'wrong'; minutes: number | null; because: string } | { is: 'unknown' };

/** The verdict of a shadow's length: the sun's height by it against the height by the clock. */
export function clockByLength(
  { shadowHeight, shadowLength }: HeadingCheck,
  timeMs: number,
  site: Site,
): ClockVerdict {
  if (shadowHeight === undefined || shadowLength === undefined) return { is: 'unknown' };
  const measured = Math.atan2(shadowHeight, shadowLength) * DEGREES;
  const height = (minutes: number) =>
    solarPosition(timeMs + minutes * 60_000, site.latitude, site.longitude, site.altitude).apparentElevation;
  const misfit = (minutes: number) => Math.abs(height(minutes) - measured);
  const other = bestOf(misfit, 2 * LENGTH_DEVIATION);
  if (misfit(0) <= 2 * LENGTH_DEVIATION) return { is: other === null ? 'right' : 'unknown' };
  const because = `the shadow’s length puts the sun ${measured.toFixed(0)}° high, the clock ${height(0).toFixed(0)}°`;
  return { is: 'wrong', minutes: other, because };
}

/** The suspected clock error that fits best; null where none does within the limit. */
function bestOf(misfit: (minutes: number) => number, limit: number): number | null {
  const best = SUSPECTED.reduce((least, one) => (misfit(one) < misfit(least) ? one : least));
  return misfit(best) <= limit ? best : null;
}

/**
 * The verdict of two checks by shadow of one run, well apart in time: with the true time both give one offset.
 * `drift` is what the run's frame may have turned between them, degrees.
 */
export function clockByPair(
  first: CheckResult,
  second: CheckResult,
  site: Site,
  drift: number,
): ClockVerdict {
  if (first.offset === null || second.offset === null) return { is: 'unknown' };
  if (Math.abs(second.takenAtMs - first.takenAtMs) < APART * 60_000) return { is: 'unknown' };
  const allowed = 2.5 * Math.hypot(first.standardDeviation, second.standardDeviation, drift);
  const azimuth = (timeMs: number) => solarPosition(timeMs, site.latitude, site.longitude).solarAzimuth;
  const shifted = ({ takenAtMs, offset }: CheckResult, minutes: number) =>
    offset! + turnBetween(azimuth(takenAtMs), azimuth(takenAtMs + minutes * 60_000));
  const apart = (minutes: number) => Math.abs(turnBetween(shifted(first, minutes), shifted(second, minutes)));
  const other = bestOf(apart, allowed);
  if (apart(0) <= allowed) return { is: other === null ? 'right' : 'unknown' };
  if (other === null) return { is: 'unknown' };
  const between = Math.round(Math.abs(second.takenAtMs - first.takenAtMs) / 60_000);
  return {
    is: 'wrong',
    minutes: other,
    because: `two checks by shadow, ${between} minutes apart, differ by ${apart(0).toFixed(0)}°`,
  };
}
