import { fc, test } from '@fast-check/vitest';
import { expect, it } from 'vitest';
import { lengthInput, lengthText, typedLength } from '../../src/ui/length-text.ts';

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
