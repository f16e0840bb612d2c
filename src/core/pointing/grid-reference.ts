import { toCentimetre, type Coordinates } from '../angles/place.ts';
import type { Parsed } from '../survey/problem.ts';
import { parseGridSquare } from './grid-square.ts';
import {
  bandLatitudes,
  placeOfUtm,
  utmBand,
  utmZoneNumber,
  UTM_BANDS,
  UTM_LATITUDES,
  type UtmPlace,
} from './utm.ts';

const NUMBER = String.raw`(-?\d+(?:\.\d+)?)`;
const EAST_NORTH = new RegExp(
  `^E?\\s*[:=]?\\s*${NUMBER}\\s*M?\\s*E?[\\s,;/]+[N+]?\\s*[:=]?\\s*${NUMBER}\\s*M?\\s*[N+]?$`,
);
const NORTH_EAST = new RegExp(`^[N+]\\s*[:=]?\\s*${NUMBER}\\s*M?[\\s,;/]+E\\s*[:=]?\\s*${NUMBER}\\s*M?$`);
const NORTH_EAST_AFTER = new RegExp(`^${NUMBER}\\s*M?\\s*[N+][\\s,;/]+${NUMBER}\\s*M?\\s*E$`);
const ZONE_FIRST = /^(\d{1,2})(?:\s*([A-Z+-])(?![A-Z]))?[\s,;:/]+(.*)$/;
const ZONE_LAST = /^(.*?)[\s,;:/]+(\d{1,2})(?:\s*([A-Z+-]))?$/;

const HOW =
  'Write a grid reference as 33U 391545 5819698, as 33 north 391545 5819698, or as 33U UU 91545 19698.';
const POLES =
  'This near to a pole another grid is used (UPS), which is not read here. Give the latitude and the longitude in degrees.';

const refused = (message: string): Parsed<never> => ({ ok: false, problems: [{ path: '', message }] });

/**
 * Reads a place on the UTM grid of WGS 84 (zone with band letter or hemisphere, easting, northing, metres) or its square
 * by letters (MGRS, USNG). Null where the text is of neither kind, so that it may be read as degrees. A zone may be
 * carried on beyond its edges, as many countries' maps do; that is told as a warning.
 */
export function parseGridReference(text: string): Parsed<Coordinates> | null {
  const plain = bare(text);
  if (/^[ABYZ]\s*[A-Z]{2}[\s\d]*$/.test(plain) || /\bUPS\b/i.test(text)) return refused(POLES);
  const square = parseGridSquare(plain);
  if (square) return square;
  // No angle has six figures before its point.
  if (!/(?<![\d.])\d{6,}/.test(plain)) return null;
  const first = ZONE_FIRST.exec(plain);
  const last = ZONE_LAST.exec(plain);
  const [zone, letter, rest] = first ? first.slice(1) : last ? [last[2], last[3], last[1]] : [];
  const metres = rest === undefined ? null : metresOf(rest.trim());
  if (!metres)
    return /[°'"]/.test(text) || /^[a-z]+:/i.test(text.trim())
      ? null
      : refused(`These look like metres of a map’s grid, without its zone. ${HOW}`);
  return placed(Number(zone), letter, metres);
}

/** Without labels, in capitals; the words for the hemispheres as signs, so that they differ from the letters of bands. */
function bare(text: string): string {
  return (
    text
      .normalize('NFKC')
      .trim()
      .toUpperCase()
      .replace(/[−–—]/g, '-')
      .replace(/\b(?:UTM|MGRS|USNG|WGS\s*-?84|ZONE|HEMISPHERE|COORDINATES?)\b[:=]?/g, ' ')
      .replace(
        /\bEPSG:\s*32([67])(\d\d)\b/g,
        (_, side: string, zone: string) => ` ${zone}${side === '6' ? '+' : '-'} `,
      )
      .replace(/\bEASTING\b/g, 'E')
      .replace(/\bNORTHING\b/g, 'N')
      .replace(/\bEAST\b/g, 'E')
      .replace(/\bNORTH(?:ERN)?\b/g, '+')
      .replace(/\bSOUTH(?:ERN)?\b/g, '-')
      // Thousands set off by commas, or decimals by one.
      .replace(/(?<=\d),(?=\d{3}(?:\D|$))/g, '')
      .replace(/(?<=\d),(?=\d{1,2}(?:\D|$))/g, '.')
      .replace(/[()]/g, ' ')
      .trim()
      .replace(/^[,;:\s]+|[,;:\s]+$/g, '')
      .replace(/\s+/g, ' ')
  );
}

function metresOf(text: string): { easting: number; northing: number } | null {
  const byLabel = NORTH_EAST.exec(text) ?? NORTH_EAST_AFTER.exec(text);
  if (byLabel) return { easting: Number(byLabel[2]), northing: Number(byLabel[1]) };
  const inOrder = EAST_NORTH.exec(text);
  return inOrder && { easting: Number(inOrder[1]), northing: Number(inOrder[2]) };
}

/** Beyond these not even a country that carries one zone on has a map, metres. */
const EASTINGS = { least: -300_000, most: 1_300_000 };

function placed(
  zone: number,
  letter: string | undefined,
  { easting, northing }: { easting: number; northing: number },
): Parsed<Coordinates> {
  if (!(zone >= 1 && zone <= 60))
    return refused(`UTM zones go from 1 to 60; this is ${zone}. Correct the zone.`);
  if (letter && 'ABYZ'.includes(letter)) return refused(POLES);
  if (!letter)
    return refused(
      `Say whether zone ${zone} is north or south of the equator: ${zone} north, or ${zone} south.`,
    );
  if (!(easting >= EASTINGS.least && easting <= EASTINGS.most))
    return refused(
      `An easting has six figures before its point; this is ${easting}. The easting comes first: check the two.`,
    );
  if (!(northing >= 0 && northing <= 10_000_000))
    return refused(`A northing goes from 0 to 10000000 m; this is ${northing}. Correct it.`);
  const hemisphere = hemisphereOf(letter, northing);
  if (typeof hemisphere !== 'string') return hemisphere;
  return located({ zone, hemisphere, easting, northing }, letter);
}

/** Which side of the equator; a single S means two places where both are possible. */
function hemisphereOf(letter: string, northing: number): UtmPlace['hemisphere'] | Parsed<never> {
  if (letter === '+' || letter === 'N') return 'north';
  if (letter === '-') return 'south';
  if (letter !== 'S') return letter >= 'N' ? 'north' : 'south';
  const asBand = utmBand(placeOfUtm({ zone: 31, hemisphere: 'north', easting: 500_000, northing }).latitude);
  return asBand === 'S'
    ? refused(
        'S may be the band north of the equator or the south of it. Write north or south behind the zone instead.',
      )
    : 'south';
}

/** Rounding at the edge of a band or of the grid, degrees. */
const EDGE = 1e-6;

function located(place: UtmPlace, letter: string): Parsed<Coordinates> {
  const { latitude, longitude } = placeOfUtm(place);
  const { least: southmost, most: northmost } = UTM_LATITUDES;
  const isAtEdge = latitude >= southmost - EDGE && latitude <= northmost + EDGE;
  const band = isAtEdge ? utmBand(Math.min(Math.max(latitude, southmost), northmost)) : null;
  if (band === null) return refused(POLES);
  const isBand = !'+-NS'.includes(letter) && UTM_BANDS.includes(letter);
  const { least, most } = bandLatitudes(isBand ? letter : band);
  if (latitude < least - EDGE || latitude > most + EDGE)
    return refused(
      `Band ${letter} goes from ${least}° to ${most}° of latitude; this northing is at ${latitude.toFixed(2)}°, in band ${band}. Check the letter and the northing.`,
    );
  if (!isBand && !'+-NS'.includes(letter))
    return refused(`${letter} is no letter of a band; they go from C to X, without I and O. ${HOW}`);
  const own = utmZoneNumber(latitude, longitude);
  const message = `The place lies in zone ${own}, outside zone ${place.zone}. That is right where a map carries one zone on; else check the zone and the easting.`;
  return {
    ok: true,
    value: toCentimetre({ latitude, longitude }),
    warnings: own === place.zone ? [] : [{ path: '', message }],
  };
}
