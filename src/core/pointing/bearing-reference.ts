import { fullCircle } from '../angles/angles.ts';
import type { HeadingCheck, Site } from '../survey/survey.ts';
import { magneticDeclination } from './declination.ts';
import { gridConvergence } from './grid-convergence.ts';
import type { HeadingQuestion, HeadingReference } from './heading-method.ts';
import { centralMeridian } from './utm.ts';

/** Further from its central meridian a place is hardly in a UTM zone, degrees. */
const ZONE_REACH = 6;

/** The true azimuth of a check's typed bearing, from whichever north it was measured. */
export function bearingReference(
  { check, site, takenAtMs }: HeadingQuestion,
  planned: number,
): HeadingReference {
  if (check.bearing === undefined)
    return {
      ok: false,
      field: 'bearing',
      message: 'The check has no bearing yet, so it ties nothing. Give the bearing of what was sighted.',
    };
  const deviation = check.bearingDeviation ?? planned;
  const turn = northOf(check, site, takenAtMs);
  if (typeof turn === 'string') return { ok: false, field: 'gridZone', message: turn };
  return {
    ok: true,
    azimuth: fullCircle(check.bearing + turn.value),
    standardDeviation: Math.hypot(deviation, turn.deviation),
  };
}

/** What is to be added to a bearing of the check's frame to make it true, degrees; a sentence where it is unknown. */
function northOf(
  { frame = 'true', convergence, gridZone }: HeadingCheck,
  { latitude, longitude, altitude }: Site,
  timeMs: number,
): { value: number; deviation: number } | string {
  if (frame === 'true') return { value: 0, deviation: 0 };
  if (frame === 'magnetic') {
    const { declination, standardDeviation } = magneticDeclination({ latitude, longitude, altitude, timeMs });
    return { value: declination, deviation: standardDeviation };
  }
  if (convergence !== undefined) return { value: convergence, deviation: 0 };
  if (gridZone === undefined)
    return 'The bearing is from grid north, and neither the convergence nor the UTM zone is given. Give one of them.';
  const meridian = centralMeridian(Number.parseInt(gridZone, 10));
  const away = Math.abs(((longitude - meridian + 540) % 360) - 180);
  if (away > ZONE_REACH)
    return `UTM zone ${gridZone} has its meridian at ${meridian}°, ${away.toFixed(0)}° from this site. Correct the zone, or give the convergence.`;
  return { value: gridConvergence(latitude, longitude, meridian), deviation: 0 };
}
