import { fc, test } from '@fast-check/vitest';
import { expect } from 'vitest';
import { jsonFault } from '../../../src/core/survey/json-fault.ts';

test.each([
  ['{"a": 1,}', 1, 9],
  ['{"a" 1}', 1, 6],
  ['[1\n, 02]', 2, 3],
  ['[1 2]', 1, 4],
  ['{1: 2}', 1, 2],
  ['["a\nb"]', 1, 4],
  ['["\\x"]', 1, 3],
  ['[1]]', 1, 4],
  ['[1}', 1, 3],
  ['[truely]', 1, 2],
  ['', 1, 1],
  ['\n\n[', 3, 2],
  ['["abc', 1, 6],
])('%j breaks off at line %i, column %i', (text, line, column) => {
  expect(jsonFault(text)).toEqual({ line, column });
});

test.prop(
  [fc.json(), fc.nat(), fc.constantFrom('', ',', '"', '{', ']', ':', '0', '\\', 'e', '.', '-', '\n')],
  { numRuns: 1000 },
)('a fault is found where, and only where, the platform refuses the text', (json, at, sign) => {
  const cut = at % (json.length + 1);
  const text = json.slice(0, cut) + sign + json.slice(cut + 1);
  expect(jsonFault(text) === null).toBe(isJson(text));
});

function isJson(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}

test('long strings with many escapes are read without a deep stack', () => {
  expect(jsonFault(`["${'\\n'.repeat(1_000_000)}",]`)).toEqual({ line: 1, column: 2_000_005 });
});
