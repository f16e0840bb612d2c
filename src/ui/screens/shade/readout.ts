import { fullCircle } from '../../../core/angles/angles.ts';
import { isBetween, rangesBetween } from '../../../core/angles/azimuth-ranges.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { SunVisit } from '../../../core/solar-position/when-sun-at.ts';
import { datesWhenSunAt } from '../../../core/solar-position/when-sun-at.ts';
import type { Site } from '../../../core/survey/survey.ts';
import { compassWord } from '../../../report/pictures/compass-names.ts';
import { MONTH_NAMES } from '../../../report/pictures/picture-words.ts';
import { obstructionsAt } from '../../../report/pictures/silhouettes.ts';
import { clock, energy, listed, percent } from './figures.ts';

export interface Direction {
  azimuth: number;
  elevation: number;
}

export interface Readout {
  direction: string;
  when: string;
  light: string;
  inTheWay: string;
}

interface Context {
  site: Site;
  shade: StationShade;
  names: ReadonlyMap<string, string>;
  year: number;
}

/** All that can be said of one direction, as sentences. */
export function readoutAt(at: Direction, context: Context): Readout {
  const visits = datesWhenSunAt(
    { azimuth: at.azimuth, apparentElevation: at.elevation },
    context.site,
    context.year,
  );
  return {
    direction: `${capital(compassWord(at.azimuth))}, ${at.azimuth.toFixed(0)}°, ${at.elevation.toFixed(0)}° above the horizontal`,
    when: whenText(visits),
    light: lightText(at, context.shade),
    inTheWay: wayText(at, visits, context),
  };
}

function whenText(visits: readonly SunVisit[]): string {
  if (visits.length === 0) return 'The sun never stands there.';
  const times = visits.map(
    ({ clock: c }) => `${c.day} ${MONTH_NAMES[c.month - 1]} at ${clock(c.hour, c.minute)}`,
  );
  return `The sun stands there on ${listed(times)}, clock time.`;
}

/** Half the side of the patch that is summed, degrees. */
const REACH = 5;

function lightText(at: Direction, { density, unshaded }: StationShade): string {
  const { cell, columns, rows, irradiation } = density;
  let sum = 0;
  const [bottom, top] = [Math.max(0, at.elevation - REACH), Math.min(90, at.elevation + REACH)];
  for (let row = Math.round(bottom / cell); row < Math.min(rows, Math.round(top / cell)); row++)
    for (
      let column = Math.round((at.azimuth - REACH) / cell);
      column < Math.round((at.azimuth + REACH) / cell);
      column++
    )
      sum += irradiation[row * columns + ((column + columns) % columns)];
  if (sum < 0.05) return 'No direct light comes from around there.';
  return `From 10° around it come ${energy(sum)} kWh/m² a year, ${percent(sum / unshaded.annual)} of the whole.`;
}

function wayText(at: Direction, visits: readonly SunVisit[], { shade, names }: Context): string {
  const { profile } = shade;
  const places = obstructionsAt(profile, fullCircle(at.azimuth), at.elevation);
  if (places.length === 0)
    return isUnseen(at.azimuth, shade) ? 'Nobody looked there; it counts as open.' : 'Nothing is in the way.';
  const left = obstructionsAt(shade.imaginedProfile ?? profile, fullCircle(at.azimuth), at.elevation);
  const months = [...new Set(visits.map(({ clock: c }) => c.month - 1))];
  const texts = places.map((place) => {
    const id = profile.obstructionIds[place];
    const name = `${names.get(id) ?? id}${left.includes(place) ? '' : ' (imagined away)'}`;
    return `${name}${passesText(profile.transmittance.subarray(place * 12, place * 12 + 12), months)}`;
  });
  return `In the way: ${texts.join('; ')}.`;
}

function passesText(transmittance: Float64Array, months: readonly number[]): string {
  if (transmittance.every((passes) => passes === 0)) return '';
  const shown = months.length > 0 ? months : [5, 11];
  const shares = shown.map((month) => transmittance[month]);
  if (shares.every((share) => share === shares[0]))
    return `, lets ${percent(shares[0], 0)} of the light through`;
  return `, lets through ${shown.map((month, i) => `${percent(shares[i], 0)} in ${MONTH_NAMES[month]}`).join(', ')}`;
}

const isUnseen = (azimuth: number, { observed }: StationShade) =>
  rangesBetween(observed).some((gap) => isBetween(azimuth, gap));

const capital = (text: string) => text[0].toUpperCase() + text.slice(1);
