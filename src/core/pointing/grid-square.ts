import { toCentimetre, type Coordinates } from '../angles/place.ts';
import type { Parsed } from '../survey/problem.ts';
import { bandLatitudes, centralMeridian, placeOfUtm, utmZoneNumber, UTM_BANDS } from './utm.ts';

const SQUARE = 100_000;
/** Letters of the squares' rows, counted from the equator and begun anew every 2000 km. */
const ROWS = 'ABCDEFGHJKLMNPQRSTUV';
const ROWS_AGAIN = ROWS.length * SQUARE;
/** Letters of the columns from 100 km east on, by zone modulo three. */
const COLUMNS = ['STUVWXYZ', 'ABCDEFGH', 'JKLMNPQR'];
/** In zones of even number the rows begin with F. */
const EVEN_SHIFT = 5;
/** A grid square may be named beyond its zone's edge this far, degrees. */
const OVERLAP = 0.75;
/** Zones that their neighbours over Svalbard take up. */
const NO_ZONES = ['32X', '34X', '36X'];

const REFERENCE = /^(\d{1,2})\s*([A-Z])\s*([A-Z])\s*([A-Z])\s*((?:\d\s*)*)$/;

const refused = (message: string): Parsed<never> => ({ ok: false, problems: [{ path: '', message }] });

/**
 * Reads a military or United States national grid reference, such as `33U UU 9154 1969`, in capitals: zone, band, 100 km
 * square, and two to ten figures. The place is the middle of the square that the figures name; a square of a kilometre or
 * more is told as a warning. Null where the text is none. Ref: DMA TM 8358.1 (1990), chapter 3, and FGDC-STD-011-2001;
 * from memory.
 */
export function parseGridSquare(plain: string): Parsed<Coordinates> | null {
  const match = REFERENCE.exec(plain);
  if (!match) return null;
  const [, zoneText, band, column, row] = match;
  const zone = Number(zoneText);
  const figures = match[5].replace(/\s/g, '');
  if (!(zone >= 1 && zone <= 60)) return refused(`Zones go from 1 to 60; this is ${zone}. Correct the zone.`);
  if (!UTM_BANDS.includes(band) || NO_ZONES.includes(`${zone}${band}`))
    return refused(
      `There is no zone ${zone}${band}. Bands go from C to X, without I and O. Check the letter.`,
    );
  const easting = COLUMNS[zone % 3].indexOf(column) + 1;
  const place = ROWS.indexOf(row);
  if (easting === 0 || place < 0)
    return refused(
      `Zone ${zone} has no square ${column}${row}: its first letters are ${COLUMNS[zone % 3]}. Check the letters.`,
    );
  const groups = match[5].trim().split(/\s+/);
  const isUneven = groups.length === 2 && groups[0].length !== groups[1].length;
  if (isUneven || figures.length % 2 !== 0 || figures.length > 10 || figures.length === 0)
    return refused(
      'After the letters come two to ten figures, half of them east and half north. Check their number.',
    );
  const size = SQUARE / 10 ** (figures.length / 2);
  const [east, north] = halves(figures).map((half) => Number(half) * size + size / 2);
  const shifted = zone % 2 === 0 ? (place - EVEN_SHIFT + ROWS.length) % ROWS.length : place;
  return inBand(
    { zone, band, easting: easting * SQUARE + east, row: shifted * SQUARE + north, size },
    column + row,
  );
}

const halves = (figures: string) => [figures.slice(0, figures.length / 2), figures.slice(figures.length / 2)];

interface Named {
  zone: number;
  band: string;
  easting: number;
  /** Metres north, but for whole rounds of the rows' letters. */
  row: number;
  /** Side of the square, metres. */
  size: number;
}

/** The one round of letters that brings the square into its band. */
function inBand({ zone, band, easting, row, size }: Named, letters: string): Parsed<Coordinates> {
  const { least, most } = bandLatitudes(band);
  const hemisphere = band >= 'N' ? 'north' : 'south';
  // A square cut by the band's edge may have its middle past it.
  const slack = (size / 2 + 1) / 111_000;
  for (let northing = row; northing < 10_000_000; northing += ROWS_AGAIN) {
    const { latitude, longitude } = placeOfUtm({ zone, hemisphere, easting, northing });
    if (latitude < least - slack || latitude > most + slack) continue;
    if (!isNearZone(zone, latitude, longitude)) break;
    const value = toCentimetre({ latitude, longitude });
    return { ok: true, value, warnings: size < 1000 ? [] : [{ path: '', message: coarse(size) }] };
  }
  return refused(`Square ${letters} does not lie in ${zone}${band}. Check the letters.`);
}

const coarse = (size: number) =>
  `The figures name a square of ${size / 1000} km; its middle is taken. Give more figures for the place itself.`;

/** Whether a place lies in a zone, or so little beside it that its squares may still be named there. */
function isNearZone(zone: number, latitude: number, longitude: number): boolean {
  const meridian = centralMeridian(zone);
  const towards = ((longitude - meridian + 540) % 360) - 180 < 0 ? OVERLAP : -OVERLAP;
  return [0, towards].some((step) => utmZoneNumber(latitude, longitude + step) === zone);
}
