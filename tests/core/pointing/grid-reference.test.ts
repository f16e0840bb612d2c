import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { parseCoordinates } from '../../../src/core/pointing/coordinates.ts';
import { utmBand, utmOf } from '../../../src/core/pointing/utm.ts';

const read = (text: string) => {
  const parsed = parseCoordinates(text);
  if (!parsed.ok) throw new Error(parsed.problems[0].message);
  return parsed;
};
const why = (text: string) => {
  const parsed = parseCoordinates(text);
  return parsed.ok ? '' : parsed.problems[0].message;
};

const LATITUDE = 52.52;
const LONGITUDE = 13.4;
const { easting, northing } = utmOf(LATITUDE, LONGITUDE);
const [E, N] = [easting.toFixed(1), northing.toFixed(1)];
const [e, n] = [Math.round(easting), Math.round(northing)];

describe('a place in metres of the UTM grid', () => {
  // Common ways of writing, no source.
  it.each([
    `33U ${E} ${N}`,
    `33 U ${E} ${N}`,
    `33u ${E}, ${N}`,
    `33N ${E} ${N}`,
    `33 north ${E} ${N}`,
    `UTM zone 33 N, E ${E}, N ${N}`,
    `UTM 33U ${E} m E ${N} m N`,
    `33U ${E}mE ${N}mN`,
    `33U E${E} N${N}`,
    `33U N ${N} E ${E}`,
    `${E} ${N} 33U`,
    `${E} E ${N} N zone 33 north`,
    `Zone 33, northern hemisphere`.replace(',', '') + ` ${E} ${N}`,
    `WGS84 UTM 33N ${E} ${N}`,
    `EPSG:32633 ${E} ${N}`,
    `Easting: ${E} Northing: ${N} Zone: 33U`,
    `33U ${E.replace('.', ',')} ${N.replace('.', ',')}`,
    `(33U, ${E}, ${N})`,
  ])('is read from %s', (text) => {
    const { value, warnings } = read(text);
    expect(value.latitude).toBeCloseTo(LATITUDE, 5);
    expect(value.longitude).toBeCloseTo(LONGITUDE, 5);
    expect(warnings).toEqual([]);
  });

  it('with thousands set off by commas', () => {
    const grouped = (value: number) => value.toLocaleString('en-US');
    expect(read(`33U ${grouped(e)} ${grouped(n)}`).value.latitude).toBeCloseTo(LATITUDE, 4);
  });

  it('in the south, by hemisphere or band', () => {
    const sydney = utmOf(-33.87, 151.21);
    const text = `${sydney.easting} ${sydney.northing}`;
    for (const zone of ['56H', '56 south', '56S', 'EPSG:32756'])
      expect(read(`${zone} ${text}`).value.latitude).toBeCloseTo(-33.87, 6);
  });

  it('of a zone carried on beyond its edge is taken, with a word about it', () => {
    const carried = utmOf(52.52, 13.4, 32);
    const { value, warnings } = read(`32U ${carried.easting} ${carried.northing}`);
    expect(value.longitude).toBeCloseTo(13.4, 6);
    expect(warnings[0].message).toMatch(/lies in zone 33, outside zone 32/);
  });

  it.each<[string, RegExp]>([
    [`${e} ${n}`, /without its zone/],
    [`33 ${e} ${n}`, /north or south of the equator/],
    [`61N ${e} ${n}`, /zones go from 1 to 60; this is 61/],
    [`33T ${e} ${n}`, /Band T goes from 40° to 48° of latitude; this northing is at 52\.52°, in band U/],
    [`33O ${e} ${n}`, /no letter of a band/],
    [`33S 400000 4000000`, /Write north or south behind the zone/],
    [`33N ${n} ${e}`, /The easting comes first/],
    [`33N ${e} 12345678`, /northing goes from 0 to 10000000/],
    [`33N ${e} 9700000`, /UPS.*latitude and the longitude/],
    [`33N ${e} 10000000`, /UPS/],
    [`33 south ${e} 0`, /UPS/],
    ['Z AH 12345 67890', /UPS/],
    ['UPS north 2000000 2100000', /UPS/],
  ])('is refused with why: %s', (text, reason) => expect(why(text)).toMatch(reason));

  it('at the edges of the grid and of a band is not turned away for its last figure', () => {
    for (const latitude of [-80, -72, 84]) {
      const place = utmOf(latitude, 20);
      const text = `${place.zone} ${place.hemisphere} ${place.easting.toFixed(3)} ${place.northing.toFixed(3)}`;
      expect(read(text).value.latitude).toBeCloseTo(latitude, 6);
    }
  });

  property.prop([
    fc.double({ min: -80, max: 83.99, noNaN: true }),
    fc.double({ min: -180, max: 179.99, noNaN: true }),
  ])('with its band is read back to a millimetre', (latitude, longitude) => {
    const place = utmOf(latitude, longitude);
    const ambiguous = utmBand(latitude) === 'S';
    const zone = ambiguous ? `${place.zone} north` : `${place.zone}${utmBand(latitude)}`;
    const { value } = read(`${zone} ${place.easting.toFixed(4)} ${place.northing.toFixed(4)}`);
    expect(value.latitude).toBeCloseTo(latitude, 6);
  });
});

describe('a place by its square', () => {
  // The Washington Monument, 38°53'22" N 77°02'07" W: 18S UJ 23487 06483 (an example often given for the United
  // States National Grid; from memory).
  it.each(['18S UJ 23487 06483', '18SUJ2348706483', '18s uj 2348706483', 'USNG 18S UJ 23487 06483'])(
    'is read from %s',
    (text) => {
      const { value, warnings } = read(text);
      expect(Math.abs(value.latitude - (38 + 53 / 60 + 22 / 3600))).toBeLessThan(3e-4);
      expect(Math.abs(value.longitude + (77 + 2 / 60 + 7 / 3600))).toBeLessThan(3e-4);
      expect(warnings).toEqual([]);
    },
  );

  it('of few figures is its middle, with a word where that is coarse', () => {
    expect(read('18S UJ 2348 0648').warnings).toEqual([]);
    expect(read('18S UJ 23 06').warnings[0].message).toMatch(/square of 1 km; its middle/);
    const [fine, coarse] = [read('18S UJ 23500 06500').value, read('18S UJ 23 06').value];
    expect(coarse.latitude).toBeCloseTo(fine.latitude, 4);
  });

  it.each<[string, RegExp]>([
    ['18S UJ 234 06483', /two to ten figures/],
    ['18S UJ 2348 064', /two to ten figures/],
    ['18S UJ', /two to ten figures/],
    ['18S JJ 23487 06483', /no square JJ: its first letters are STUVWXYZ/],
    ['18S UI 23487 06483', /no square UI/],
    ['18T UJ 23487 06483', /does not lie in 18T/],
    ['18I UJ 23487 06483', /no zone 18I/],
    ['32X MH 12345 12345', /no zone 32X/],
    ['61S UJ 23487 06483', /go from 1 to 60/],
  ])('is refused with why: %s', (text, reason) => expect(why(text)).toMatch(reason));

  const ROWS = 'ABCDEFGHJKLMNPQRSTUV';
  const COLUMNS = ['STUVWXYZ', 'ABCDEFGH', 'JKLMNPQR'];
  /** The reference of a place to the metre, by the tables of DMA TM 8358.1 (from memory). */
  function squareOf(latitude: number, longitude: number): string {
    const place = utmOf(latitude, longitude);
    const [column, row] = [Math.floor(place.easting / 1e5), Math.floor(place.northing / 1e5)];
    const letter = ROWS[(row + (place.zone % 2 === 0 ? 5 : 0)) % 20];
    const figures = [place.easting, place.northing].map((value) =>
      String(Math.floor(value % 1e5)).padStart(5, '0'),
    );
    return `${place.zone}${utmBand(latitude)}${COLUMNS[place.zone % 3][column - 1]}${letter}${figures.join('')}`;
  }

  property.prop([
    fc.integer({ min: -80_000_000, max: 83_990_000 }).map((value) => value / 1e6),
    fc.integer({ min: -180_000_000, max: 179_990_000 }).map((value) => value / 1e6),
  ])('of a metre is read back to its middle', (latitude, longitude) => {
    const { value } = read(squareOf(latitude, longitude));
    expect(Math.abs(value.latitude - latitude) * 111_000).toBeLessThan(1.2);
    const turn = (((value.longitude - longitude) % 360) + 540) % 360;
    expect(Math.abs(turn - 180) * 111_000 * Math.cos((latitude * Math.PI) / 180)).toBeLessThan(1.2);
  });
});
