import { fc, test } from '@fast-check/vitest';
import { expect, it } from 'vitest';
import {
  inUnit,
  lengthInput,
  lengthText,
  offsetInput,
  typedLength,
  typedOffset,
} from '../../src/ui/length-text.ts';

it.each([
  [9.144, 'metres', '9.144 m'],
  [9.144, 'feet', "30'"],
  [9.2964, 'feet', `30' 6"`],
  [0.0254 * 6.625, 'feet', '6 5/8"'],
  [0.0254 / 2, 'feet', '1/2"'],
] as const)('%d m in %s is %s', (metres, unit, text) => expect(lengthText(metres, unit)).toBe(text));

const metres = fc.integer({ min: 4, max: 4_000_000 }).map((millimetres) => millimetres / 1000);

test.prop([metres])('a length shown in feet is read back to a sixteenth of an inch', (length) => {
  const typed = typedLength(lengthInput(length, 'feet'), 'feet');
  expect('value' in typed && Math.abs(typed.value! - length)).toBeLessThanOrEqual(0.0254 / 16 + 1e-6);
});

test.prop([metres])('and one that was not touched is kept as it was', (length) => {
  expect(typedLength(lengthInput(length, 'feet'), 'feet', length)).toEqual({ value: length });
  expect(typedLength(lengthInput(length, 'metres'), 'metres', length)).toEqual({ value: length });
});

const places = fc.integer({ min: -900_000, max: 900_000 }).map((millimetres) => millimetres / 1000);

test.prop([places])('a place along an axis is read back with its sign, in either unit', (place) => {
  for (const unit of ['metres', 'feet'] as const) {
    const typed = typedOffset(offsetInput(place, unit), unit);
    expect('value' in typed && Math.abs(typed.value! - place)).toBeLessThanOrEqual(0.0254 / 16 + 1e-6);
    expect(typedOffset(offsetInput(place, unit), unit, place)).toEqual({ value: place });
  }
});

it.each([
  [`-3' 6"`, 'metres', -1.0668],
  ['− 2', 'feet', -0.6096],
  ['+1.5', 'metres', 1.5],
  ['0', 'feet', 0],
  ['-0', 'metres', 0],
] as const)('%s in %s is %d m', (text, unit, value) => expect(typedOffset(text, unit)).toEqual({ value }));

it.each(['--2', '2-', 'left', '1200'])('%s is no place', (text) => {
  expect(typedOffset(text, 'metres')).toHaveProperty('fault');
});

it('a text that is not understood stays as it is when the unit is changed', () => {
  expect(inUnit('about 3', 'metres', 'feet')).toBe('about 3');
  expect(inUnit('', 'metres', 'feet')).toBe('');
  expect(inUnit('9.144', 'metres', 'feet')).toBe(`30'`);
});
