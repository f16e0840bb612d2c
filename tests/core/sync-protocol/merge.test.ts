import { fc, test } from '@fast-check/vitest';
import { describe, expect } from 'vitest';
import { MOST_VERSIONS, versionsOf } from '../../../src/core/sync-protocol/field-versions.ts';
import { changedRows, merge, stateOf } from '../../../src/core/sync-protocol/merge.ts';
import { joinRows, rowName } from '../../../src/core/sync-protocol/rows.ts';
import type { Row } from '../../../src/core/sync-protocol/rows.ts';
import { compareStamps } from '../../../src/core/sync-protocol/stamp.ts';
import { state } from './arbitrary-rows.ts';

const runs = { numRuns: 400 };

describe('merging, of any rows whatever, even such as no device writes', () => {
  test.prop([state, state], runs)('is commutative', (a, b) => {
    expect(merge(a, b)).toEqual(merge(b, a));
  });

  test.prop([state, state, state], runs)('is associative', (a, b, c) => {
    expect(merge(merge(a, b), c)).toEqual(merge(a, merge(b, c)));
  });

  test.prop([state, state], runs)('is idempotent, and rows without news are the very same', (a, b) => {
    const joined = merge(a, b);
    expect(changedRows(a, merge(a, a))).toEqual([]);
    expect(changedRows(joined, merge(joined, a))).toEqual([]);
    expect(changedRows(joined, merge(joined, b))).toEqual([]);
  });

  test.prop([fc.array(state, { minLength: 2, maxLength: 5 }), fc.infiniteStream(fc.nat())], runs)(
    'comes to the same, row by row, in any order, some rows twice',
    (states, chance) => {
      const pick = (below: number) => (chance.next().value as number) % below;
      const rows = states.flatMap((part) => [...part.values()]);
      const shuffled = [...rows, ...rows.filter(() => pick(3) === 0)]
        .map((row) => ({ row, place: pick(1000) }))
        .sort((a, b) => a.place - b.place)
        .map(({ row }) => row);
      expect(stateOf(shuffled)).toEqual(states.reduce(merge));
    },
  );

  test.prop([state, state], runs)('gives of each field the latest value, in order and bounded', (a, b) => {
    const joined = merge(a, b);
    for (const row of joined.values()) {
      if (row.kind !== 'field') continue;
      const both = [a, b].flatMap((part) => {
        const known = part.get(rowName(row));
        return known?.kind === 'field' ? versionsOf(known) : [];
      });
      expect(both.every(({ stamp }) => compareStamps(stamp, row.stamp) <= 0)).toBe(true);
      const kept = versionsOf(row);
      expect(kept.length).toBeLessThanOrEqual(MOST_VERSIONS);
      for (let i = 1; i < kept.length; i++)
        expect(compareStamps(kept[i - 1].stamp, kept[i].stamp)).toBeGreaterThanOrEqual(0);
    }
  });

  test.prop([state, state], runs)('leaves of an erased survey the erasure alone', (a, b) => {
    const erasure = stateOf([
      { kind: 'erasure', key: '', stamp: '2026-05-14T09:30:11.000Z-0000-a' as never },
    ]);
    const rows = [...merge(merge(a, erasure), b).values()];
    expect(rows.map(({ kind }) => kind)).toEqual(['erasure']);
  });
});

test('rows of different names are not joined', () => {
  const row = (key: string): Row => ({
    kind: 'field',
    key,
    stamp: '2026-05-14T09:30:11.000Z-0000-a' as never,
  });
  expect(() => joinRows(row('title'), row('notes'))).toThrow(/b must be field title, got field notes/);
});
