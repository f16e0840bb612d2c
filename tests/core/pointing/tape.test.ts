import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import { elevationByTape, parseSlope } from '../../../src/core/pointing/tape.ts';
import { feetDoubt, parseLength } from '../../../src/core/pointing/tape-length.ts';
import type { LengthUnit } from '../../../src/core/pointing/tape-length.ts';

const value = (parsed: { ok: true; value: number } | { ok: false; problems: { message: string }[] }) =>
  parsed.ok ? parsed.value : parsed.problems[0].message;

describe('lengths', () => {
  // 1 ft = 0.3048 m and 1 in = 25.4 mm exactly: international yard and pound agreement, 1959.
  test.each<[string, LengthUnit, number]>([
    ['12.5', 'metres', 12.5],
    ['12.5', 'feet', 3.81],
    ['12,5 m', 'feet', 12.5],
    [' 350 cm ', 'feet', 3.5],
    ['3500mm', 'metres', 3.5],
    ["41'", 'metres', 12.4968],
    ['41 ft', 'metres', 12.4968],
    ['41 ft. 6 in.', 'metres', 12.6492],
    ['41\' 6"', 'metres', 12.6492],
    ['41′6″', 'metres', 12.6492],
    ['41’-6”', 'metres', 12.6492],
    ['41 feet and 6 inches', 'metres', 12.6492],
    ['5\' 6 1/2"', 'metres', 1.6891],
    ['5\' 6½"', 'metres', 1.6891],
    ['6-1/2 in', 'metres', 0.1651],
    ['3/4 in', 'metres', 0.01905],
    ['41 6', 'feet', 12.6492],
    ["5' 6''", 'metres', 1.6764],
  ])('%s, a number alone in %s, is %d m', (text, unit, metres) => {
    expect(value(parseLength(text, unit))).toBeCloseTo(metres, 6);
  });

  test.each([
    '',
    'x',
    '12 yards',
    '-3',
    '5\' 13"',
    '5 m 6 cm',
    '1\' 2" 3"',
    '0',
    '1e5',
    '20000 m',
    '3/0 in',
    '12.5.1',
  ])('“%s” is refused with what to do', (text) => {
    expect(value(parseLength(text, 'metres'))).toMatch(/Write|Give|Correct/);
  });

  property.prop([fc.integer({ min: 1, max: 400 }), fc.integer({ min: 0, max: 11 })])(
    'feet and inches come back',
    (feet, inches) => {
      expect(value(parseLength(`${feet}' ${inches}"`, 'metres'))).toBeCloseTo(
        (feet * 12 + inches) * 0.0254,
        6,
      );
    },
  );

  property.prop([fc.string()])('any text is answered', (text) => {
    const parsed = parseLength(text, 'feet');
    if (parsed.ok) expect(parsed.value).toBeGreaterThan(0);
    else expect(parsed.problems).toHaveLength(1);
  });

  test('a width that would be usual in feet is asked about', () => {
    expect(feetDoubt(36, 30)).toMatch(/36.0 feet, it is 11.0 m/);
    expect(feetDoubt(12, 30)).toBe(null);
    expect(feetDoubt(500, 30)).toBe(null);
  });
});

describe('slopes', () => {
  // Roof pitch tables in common use: 4/12 is 18.4°, 6/12 26.6°, 8/12 33.7°, 12/12 45°.
  test.each<[string, number]>([
    ['4/12', 18.4349],
    ['6/12', 26.5651],
    ['6 in 12', 26.5651],
    ['8:12', 33.6901],
    ['12/12', 45],
    ['1:2', 26.5651],
    ['50 %', 26.5651],
    ['100%', 45],
    ['30', 30],
    ['26,5°', 26.5],
    ["26° 30'", 26.5],
    ['0', 0],
    ['90', 90],
  ])('%s is %d°', (text, tilt) => {
    expect(value(parseSlope(text))).toBeCloseTo(tilt, 3);
  });

  test.each(['', '95', 'steep', '-5', '0/0', '6/12/3', "26° 70'"])(
    '“%s” is refused with what to do',
    (text) => {
      expect(value(parseSlope(text))).toMatch(/Write|Correct/);
    },
  );
});

describe('elevation by tape', () => {
  test('of an object as high over the instrument as it is away is 45°', () => {
    expect(elevationByTape({ height: 11.4, distance: 10, instrumentHeight: 1.4 })).toBeCloseTo(45, 9);
    expect(elevationByTape({ height: 0, distance: 10, instrumentHeight: 1 })).toBeCloseTo(-5.7106, 4);
  });

  property.prop([
    fc.double({ min: 0.1, max: 80, noNaN: true }),
    fc.double({ min: 0.5, max: 500, noNaN: true }),
  ])('gives the height back', (height, distance) => {
    const elevation = elevationByTape({ height, distance });
    expect(distance * Math.tan((elevation * Math.PI) / 180)).toBeCloseTo(height, 6);
  });

  test('without a distance is refused by name', () => {
    expect(() => elevationByTape({ height: 3, distance: 0 })).toThrow(/distance must be over 0 m, got 0/);
  });
});
