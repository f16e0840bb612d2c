import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { parseCoordinates } from '../../../src/core/pointing/coordinates.ts';

// Notations after ISO 6709 (sign and order, Annex D for people) and common practice.
const HERE = { latitude: 44.91, longitude: -72.2 };

describe('a place', () => {
  it.each([
    '44.91, -72.20',
    '44.91,-72.2',
    '44.91 -72.2',
    '(44.91; −72.20)',
    '44,91; -72,20',
    '44,91 -72,20',
    '44,91,-72,20',
    '44.91 N 72.20 W',
    '44.91N, 72.20W',
    'N44.91 W72.20',
    '72.2 W, 44.91 N',
    '44.91° north, 72.2° west',
    'Lat: 44.91, Long: -72.2',
    'latitude = 44.91; longitude = -72.2',
    "44° 54.6' N, 72° 12.0' W",
    '44°54′36″N 72°12′00″W',
    '44º 54’ 36” N, 72º 12’ 0” W',
    'N 44 54 36, W 72 12 0',
    '44 54 36 N 72 12 00 W',
    '44 54 36, -72 12 0',
    "44° 54' 36'' N, 72° 12' W",
    '44:54:36N 72:12:00W',
    '44:54:36, -72:12:00',
    'geo:44.91,-72.20?z=18',
    'https://maps.invalid/@44.91,-72.20,17z',
    'https://maps.invalid/?q=44.91%2C-72.20',
  ])('is read from %s', (text) => {
    expect(parseCoordinates(text)).toEqual({ ok: true, value: HERE, warnings: [] });
  });

  it('on the equator, at the date line and in whole degrees', () => {
    expect(parseCoordinates('0 N 180 W')).toMatchObject({ value: { latitude: 0, longitude: -180 } });
    expect(parseCoordinates('0, 0')).toMatchObject({ value: { latitude: 0, longitude: 0 } });
    expect(parseCoordinates("0° 30' S, 0° 15' W")).toMatchObject({
      value: { latitude: -0.5, longitude: -0.25 },
    });
    expect(parseCoordinates('-0 30, 10 15')).toMatchObject({ value: { latitude: -0.5, longitude: 10.25 } });
  });

  it.each<[string, RegExp]>([
    ['', /Type or paste/],
    ['Mill lane 4', /not understood/],
    ['44.91', /Two angles/],
    ['44.91 N', /Two angles/],
    ['44.91 N 72.2', /no letter at all/],
    ['44.91 N 72.2 S', /One angle needs N or S/],
    ['-44.91 S, 72 W', /a sign or a letter/],
    ['121.5, 25', /change the two round/],
    ['95 N, 20 E', /from -90 to 90; this is 95/],
    ['45, 190', /from -180 to 180; this is 190/],
    ['44 61 N, 72 0 W', /up to 59/],
    ['44.5 30 N, 72 0 W', /Only the last number/],
    ["30' 44° N, 72 0 W", /Degrees come first/],
    ['1 2 3 4 5 6 7 8', /more numbers/],
  ])('is refused with why: %s', (text, why) => {
    const parsed = parseCoordinates(text);
    expect(parsed.ok ? '' : parsed.problems[0].message).toMatch(why);
  });

  const place = fc.record({
    latitude: fc.integer({ min: -900_000, max: 900_000 }).map((value) => value / 10_000),
    longitude: fc.integer({ min: -1_800_000, max: 1_800_000 }).map((value) => value / 10_000),
  });
  const sexagesimal = (value: number, [plus, minus]: string) => {
    const tenths = Math.round(Math.abs(value) * 36_000);
    const [degrees, minutes, seconds] = [tenths / 36_000, (tenths / 600) % 60, (tenths % 600) / 10];
    return `${Math.floor(degrees)}° ${Math.floor(minutes)}' ${seconds}" ${value < 0 ? minus : plus}`;
  };

  test.prop([place])('written in either way is read back', ({ latitude, longitude }) => {
    const expected = {
      latitude: expect.closeTo(latitude, 4) as number,
      longitude: expect.closeTo(longitude, 4) as number,
    };
    expect(parseCoordinates(`${latitude}, ${longitude}`)).toMatchObject({ value: expected });
    const written = `${sexagesimal(latitude, 'NS')} ${sexagesimal(longitude, 'EW')}`;
    expect(parseCoordinates(written)).toMatchObject({ value: expected });
  });

  test.prop([fc.string({ maxLength: 40 })])('or any text gets an answer', (text) => {
    const parsed = parseCoordinates(text);
    if (parsed.ok) expect(Math.abs(parsed.value.latitude)).toBeLessThanOrEqual(90);
    else expect(parsed.problems[0].message.length).toBeGreaterThan(10);
  });
});
