import { fc } from '@fast-check/vitest';

/** One change of a document at a place found by walking `turns` down its tree. */
interface Bend {
  turns: number[];
  /** Absent: the field or item is deleted. */
  value?: unknown;
}

const strange = fc.constantFrom<unknown>(
  null,
  '',
  0,
  -1,
  1e308,
  -0,
  true,
  [],
  {},
  [[]],
  { id: 'x' },
  NaN,
  Infinity,
);

/** A few changes of a document: fields and items deleted, or replaced by something strange. */
export const bends: fc.Arbitrary<Bend[]> = fc.array(
  fc.record(
    {
      turns: fc.array(fc.nat(40), { minLength: 1, maxLength: 9 }),
      value: fc.oneof(strange, fc.jsonValue({ maxDepth: 2 }), fc.double()),
    },
    { requiredKeys: ['turns'] },
  ),
  { minLength: 1, maxLength: 4 },
);

/** A document, which is changed in place, after the changes. */
export function bent(document: unknown, changes: readonly Bend[]): unknown {
  for (const change of changes) bend(document, change);
  return document;
}

function bend(document: unknown, change: Bend): void {
  let at = document as Record<string, unknown>;
  for (const [i, turn] of change.turns.entries()) {
    const keys = Object.keys(at);
    if (keys.length === 0) return;
    const key = keys[turn % keys.length];
    const below = at[key];
    if (i < change.turns.length - 1 && typeof below === 'object' && below !== null) {
      at = below as Record<string, unknown>;
      continue;
    }
    if ('value' in change) at[key] = change.value;
    else if (Array.isArray(at)) at.splice(Number(key), 1);
    else delete at[key];
    return;
  }
}
