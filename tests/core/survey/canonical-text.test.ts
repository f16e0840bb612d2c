import { expect, test } from 'vitest';
import { canonicalText } from '../../../src/core/survey/canonical-text.ts';

test('sorts as the example of RFC 8785, 3.2.3 does (from memory): by code unit, not by letter', () => {
  const document = {
    '\u20ac': 'Euro Sign',
    '\r': 'Carriage Return',
    '\ufb33': 'Hebrew Letter Dalet With Dagesh',
    '1': 'One',
    '\ud83d\ude00': 'Emoji: Grinning Face',
    '\u0080': 'Control',
    '\u00f6': 'Latin Small Letter O With Diaeresis',
  };
  const order = ['\r', '1', '\u0080', '\u00f6', '\u20ac', '\ud83d\ude00', '\ufb33'];
  expect(Object.keys(JSON.parse(canonicalText(document)) as object).sort((a, b) => (a < b ? -1 : 1))).toEqual(
    order,
  );
  expect(canonicalText(document)).toBe(
    `{${order.map((name) => `${JSON.stringify(name)}:${JSON.stringify(document[name as keyof typeof document])}`).join(',')}}`,
  );
});

test('is the same for the same fields in another order, and not for another value', () => {
  expect(canonicalText({ b: [1, { d: 2, c: null }], a: 'x', gone: undefined })).toBe(
    canonicalText({ a: 'x', b: [1, { c: null, d: 2 }] }),
  );
  expect(canonicalText({ a: [1, 2] })).not.toBe(canonicalText({ a: [2, 1] }));
});
