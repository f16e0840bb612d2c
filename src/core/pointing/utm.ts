import type { Coordinates } from '../angles/place.ts';
import { turnBetween } from '../angles/angles.ts';
import { projected, unprojected } from './transverse-mercator.ts';

/** A place on the Universal Transverse Mercator grid. */
export interface UtmPlace {
  /** 1 to 60. */
  zone: number;
  hemisphere: 'north' | 'south';
  /** Metres; 500 km on the central meridian. */
  easting: number;
  /** Metres from the equator; in the south 10000 km are added. */
  northing: number;
}

/** Scale on the central meridian, and what is added so that no coordinate is negative, metres. */
const SCALE = 0.9996;
const FALSE_EASTING = 500_000;
const FALSE_NORTHING = 10_000_000;

/** Latitudes the grid covers, degrees; nearer to the poles stands another one. */
export const UTM_LATITUDES = { least: -80, most: 84 } as const;

/** Bands of 8° from 80° south on; the last one has 12°. */
export const UTM_BANDS = 'CDEFGHJKLMNPQRSTUVWX';

/** Central meridian of a UTM zone 1 to 60, degrees east. Throws RangeError for another. */
export function centralMeridian(zone: number): number {
  if (!(Number.isInteger(zone) && zone >= 1 && zone <= 60))
    throw new RangeError(`zone must be a whole number from 1 to 60, got ${zone}`);
  return zone * 6 - 183;
}

/**
 * Number of the UTM zone a place lies in, 1 to 60: six degrees each from 180° west, but wider ones at the west coast of
 * Norway and over Svalbard. Outside the latitudes of the grid the zones go on as in the rest of the world.
 * Ref: DMA TM 8358.1, Datums, Ellipsoids, Grids, and Grid Reference Systems (1990), chapter 3; from memory.
 */
export function utmZoneNumber(latitude: number, longitude: number): number {
  const east = turnBetween(0, longitude) === 180 ? -180 : turnBetween(0, longitude);
  if (latitude >= 56 && latitude < 64 && east >= 3 && east < 12) return 32;
  if (latitude >= 72 && latitude <= UTM_LATITUDES.most && east >= 0 && east < 42)
    return east < 9 ? 31 : east < 21 ? 33 : east < 33 ? 35 : 37;
  // A hair before the date line the sum rounds up.
  return Math.min(Math.floor((east + 180) / 6) + 1, 60);
}

/** The zone with its hemisphere, such as `33N`, as a record's grid has it. */
export const utmZone = ({ latitude, longitude }: Coordinates): string =>
  `${utmZoneNumber(latitude, longitude)}${latitude < 0 ? 'S' : 'N'}`;

/** Letter of the band a latitude lies in; null outside the grid. */
export function utmBand(latitude: number): string | null {
  const { least, most } = UTM_LATITUDES;
  if (!(latitude >= least && latitude <= most)) return null;
  // A hair south of the equator the sum would round to the north.
  const highest = latitude < 0 ? UTM_BANDS.indexOf('M') : UTM_BANDS.length - 1;
  return UTM_BANDS[Math.min(Math.floor((latitude - least) / 8), highest)];
}

/** Latitudes of a band, degrees. Throws RangeError for a letter that is none. */
export function bandLatitudes(band: string): { least: number; most: number } {
  const place = UTM_BANDS.indexOf(band);
  if (band.length !== 1 || place < 0) throw new RangeError(`band must be one of ${UTM_BANDS}, got ${band}`);
  const least = UTM_LATITUDES.least + place * 8;
  return { least, most: band === 'X' ? UTM_LATITUDES.most : least + 8 };
}

/** The place on the grid of a zone, its own unless another is given (within 60° of it). Degrees, WGS 84. */
export function utmOf(
  latitude: number,
  longitude: number,
  zone = utmZoneNumber(latitude, longitude),
): UtmPlace {
  const { east, north } = projected(latitude, longitude, centralMeridian(zone));
  const hemisphere = latitude < 0 ? 'south' : 'north';
  return {
    zone,
    hemisphere,
    easting: FALSE_EASTING + SCALE * east,
    northing: SCALE * north + (hemisphere === 'south' ? FALSE_NORTHING : 0),
  };
}

/** Latitude and longitude of a place on the grid, degrees, WGS 84. Throws RangeError far outside the grid. */
export function placeOfUtm({ zone, hemisphere, easting, northing }: UtmPlace): Coordinates {
  const north = northing - (hemisphere === 'south' ? FALSE_NORTHING : 0);
  return unprojected(
    { east: (easting - FALSE_EASTING) / SCALE, north: north / SCALE },
    centralMeridian(zone),
  );
}
