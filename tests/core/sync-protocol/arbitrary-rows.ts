import { fc } from '@fast-check/vitest';
import { stateOf } from '../../../src/core/sync-protocol/merge.ts';
import { joinRows } from '../../../src/core/sync-protocol/rows.ts';
import type { Row } from '../../../src/core/sync-protocol/rows.ts';
import type { Stamp } from '../../../src/core/sync-protocol/stamp.ts';

/** Few stamps, so that equal ones meet: of three devices in 30 seconds. */
export const stamp = fc
  .tuple(fc.integer({ min: 10, max: 39 }), fc.constantFrom('phone', 'tablet', 'office'))
  .map(([second, device]) => `2026-05-14T09:30:${second}.000Z-0000-${device}` as Stamp);

const value = fc.oneof(
  fc.integer({ min: 0, max: 3 }),
  fc.constantFrom('a', 'b'),
  fc.constant({ x: 1, y: [2] }),
);
const version = fc.record(
  { stamp, value, since: stamp, over: fc.array(stamp, { minLength: 1, maxLength: 3 }), made: stamp },
  { requiredKeys: ['stamp'] },
);
const reading = fc.integer({ min: 0, max: 6 }).map((alpha) => ({ alpha }));

/** Rows that no device may have written: versions in any order, runs and causes that make no sense. */
const row: fc.Arbitrary<Row> = fc.oneof(
  {
    weight: 8,
    arbitrary: fc
      .record(
        {
          key: fc.constantFrom('title', 'planes/p1/surfaceTilt', 'planes/p1/id', 'x/unknown'),
          first: version,
          replaced: fc.array(version, { maxLength: 20 }),
        },
        { requiredKeys: ['key', 'first'] },
      )
      .map(
        ({ key, first, replaced }) =>
          ({ kind: 'field', key, ...first, ...(replaced && { replaced }) }) as Row,
      ),
  },
  {
    weight: 3,
    arbitrary: fc
      .record(
        {
          key: fc.constantFrom('readings/r1', 'readings/r2'),
          reading,
          removed: fc.option(stamp),
          returned: stamp,
          others: fc.array(reading, { minLength: 1, maxLength: 6 }),
        },
        { requiredKeys: ['key', 'reading', 'removed'] },
      )
      .map((made): Row => ({ kind: 'reading', ...made })),
  },
  {
    weight: 2,
    arbitrary: fc
      .record({ stamp, at: fc.option(fc.integer({ min: 0, max: 3 })) })
      .map((made): Row => ({ kind: 'deletion', key: '', ...made })),
  },
  {
    weight: 2,
    arbitrary: fc
      .record({ stamp, mood: value })
      .map((made) => ({ kind: 'x-mood', key: 'm1', ...made }) as Row),
  },
);

/** Parts of one survey as they come from outside, now and then erased. */
export const state = fc
  .record({ rows: fc.array(row, { maxLength: 12 }), erased: fc.option(stamp, { freq: 12 }) })
  .map(({ rows, erased }) =>
    stateOf([
      ...rows.map((made) => joinRows(made, made)),
      ...(erased ? [{ kind: 'erasure', key: '', stamp: erased } as const] : []),
    ]),
  );
