import { headingMethod } from '../../../core/pointing/heading-methods.ts';
import type { CheckResult, Closure, PointedRun } from '../../../core/pointing/pointed-survey.ts';

/** Degrees with a real minus. */
export const signed = (value: number, digits = 1): string =>
  `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(digits)}°`;

/** Twice the standard deviation: true in 95 of 100. */
export const within = (deviation: number): string =>
  `±\u00a0${(2 * deviation).toFixed(deviation < 5 ? 1 : 0)}°`;

const SOURCES: Record<NonNullable<PointedRun['heading']>['source'], string> = {
  check: 'Heading by its own check',
  tied: 'Heading by a mark that another sitting saw too',
  shared: 'Heading shared with another sitting of the same compass',
  compass: 'Heading by the compass and the magnetic declination alone',
  device: 'Heading as the device gives it',
};

/** How far a run's azimuths can be trusted, and why. */
export function headingWords({ heading, refused }: PointedRun): string {
  if (refused) return refused;
  if (!heading) return 'No north yet: nothing ties these azimuths to the earth.';
  return `${SOURCES[heading.source]}: azimuths ${within(heading.standardDeviation)} (95 in 100).`;
}

/** What closing the horizon showed. */
export const closureWords = ({ mark, minutes, azimuth, elevation }: Closure): string =>
  `Error of closure on ${mark} after ${minutes.toFixed(0)} min: azimuth ${signed(azimuth)}, elevation ${signed(elevation)}.`;

/** Which way the compass is off, where a check found more of the circle than it by `against` degrees. */
function compassWords(against: number): string {
  const degrees = Math.abs(against).toFixed(1);
  if (degrees === '0.0') return 'the compass agrees';
  return `compass ${degrees}° too far ${against < 0 ? 'clockwise' : 'anticlockwise'}`;
}

/** What a heading check found. */
export function checkWords({
  method,
  offset,
  standardDeviation,
  againstCompass,
  refused,
}: CheckResult): string {
  const { name } = headingMethod(method);
  if (refused) return `${name}: ${refused}`;
  if (offset === null) return `${name}: stored; its bearing is still to be given.`;
  const compass = againstCompass === null ? '' : `, ${compassWords(againstCompass)}`;
  return `${name}: north found ${within(standardDeviation)}${compass}.`;
}
