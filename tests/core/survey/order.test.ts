import { fc, test } from '@fast-check/vitest';
import { expect } from 'vitest';
import { ordered } from '../../../src/core/survey/order.ts';

test('a list is sorted by its order keys; equal ones keep their places', () => {
  const list = [
    { id: 'a', order: 2 },
    { id: 'b', order: 1 },
    { id: 'c', order: 2 },
    { id: 'd', order: 1 },
  ];
  expect(
    ordered(list)
      .map(({ id }) => id)
      .join(''),
  ).toBe('bdac');
});

test('an item without a key follows the one before it', () => {
  const list: { id: string; order?: number }[] = [
    { id: 'z' },
    { id: 'a', order: 5 },
    { id: 'b' },
    { id: 'c', order: 1 },
  ];
  expect(
    ordered(list)
      .map(({ id }) => id)
      .join(''),
  ).toBe('zcab');
});

test.prop([fc.array(fc.record({ order: fc.integer() }, { requiredKeys: [] }))])(
  'nothing is lost and the list is not changed',
  (list) => {
    const before = [...list];
    const sorted = ordered(list);
    expect(list).toEqual(before);
    expect(new Set(sorted)).toEqual(new Set(list));
    const keys = sorted.flatMap(({ order }) => order ?? []);
    expect(keys).toEqual([...keys].sort((a, b) => a - b));
  },
);
