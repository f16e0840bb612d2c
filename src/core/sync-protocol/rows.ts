import { canonicalText } from '../survey/canonical-text.ts';
import type { JsonValue } from '../survey/json-value.ts';
import { sameJson } from '../survey/same-json.ts';
import type { FieldChange } from '../survey/field-layout.ts';
import { joinVersions, written, type FieldVersions } from './field-versions.ts';
import { isReadingPath, isStanding, joinReadings, type ReadingState } from './reading-state.ts';
import { compareStamps, type Stamp } from './stamp.ts';

/** A field of the survey; the key is its path. */
export interface FieldRow extends FieldVersions {
  kind: 'field';
  key: string;
}

/** A raw reading; the key is `readings/` and its id, as a step of a path. */
export interface ReadingRow extends ReadingState {
  kind: 'reading';
  key: string;
}

/** Whether the whole survey is deleted: it can be restored. `at`: milliseconds since 1970 by the device, or null. */
export interface DeletionRow {
  kind: 'deletion';
  key: '';
  stamp: Stamp;
  at: number | null;
}

/** The survey was erased for good: nothing else of it is kept anywhere. */
export interface ErasureRow {
  kind: 'erasure';
  key: '';
  stamp: Stamp;
}

/** A row of a kind that came after version 1 of the protocol: kept and passed on as it is, the later one. */
export interface OtherRow {
  kind: `x-${string}`;
  key: string;
  stamp: Stamp;
  [part: string]: JsonValue;
}

/** What a survey is made of for sync. A row is the smallest thing that is sent, and is told by its kind and key. */
export type Row = FieldRow | ReadingRow | DeletionRow | ErasureRow | OtherRow;

/** The name of a row within its survey. */
export const rowName = ({ kind, key }: Pick<Row, 'kind' | 'key'>): string => `${kind} ${key}`;

/**
 * The row that a change makes of the one known under its name; null where there is no reading to take out, or it is
 * written already. A reading's contents are joined, never put over. `settles`: see `written`.
 */
export function writtenRow(
  known: FieldRow | ReadingRow | undefined,
  { path, value }: FieldChange,
  stamp: Stamp,
  settles = false,
): FieldRow | ReadingRow | null {
  if (!isReadingPath(path)) {
    const field = known?.kind === 'field' ? withoutName(known) : undefined;
    return { kind: 'field', key: path, ...written(field, value, stamp, settles) };
  }
  const row = known?.kind === 'reading' ? known : undefined;
  if (value === undefined) return row ? { ...row, removed: stamp } : null;
  const fresh: ReadingRow = { kind: 'reading', key: path, reading: value, removed: null };
  const joined = row ? (joinRows(row, fresh) as ReadingRow) : fresh;
  if (!isStanding(joined)) return { ...joined, returned: stamp };
  return joined === row ? null : joined;
}

/** The name of the row that a path is kept in. */
export const nameOfPath = (path: string): string =>
  rowName({ kind: isReadingPath(path) ? 'reading' : 'field', key: path });

/**
 * Two copies of one row as one; `a` itself where nothing is new in `b`. Commutative, associative, idempotent. Throws
 * RangeError for rows of different names.
 */
export function joinRows(a: Row, b: Row): Row {
  if (rowName(a) !== rowName(b)) throw new RangeError(`b must be ${rowName(a)}, got ${rowName(b)}`);
  const joined = joinedRow(a, b);
  return sameJson(joined as unknown as JsonValue, a as unknown as JsonValue) ? a : joined;
}

function joinedRow(a: Row, b: Row): Row {
  if (a.kind === 'field' && b.kind === 'field') {
    const { kind, key, ...field } = a;
    return { kind, key, ...joinVersions(field, withoutName(b)) };
  }
  if (a.kind === 'reading' && b.kind === 'reading')
    return { kind: a.kind, key: a.key, ...joinReadings(a, b) };
  return laterRow(a as DeletionRow, b as DeletionRow);
}

function withoutName(row: FieldRow): FieldVersions {
  const field: FieldVersions & Partial<FieldRow> = { ...row };
  delete field.kind;
  delete field.key;
  return field;
}

function laterRow<R extends { stamp: Stamp }>(a: R, b: R): R {
  const byStamp = compareStamps(a.stamp, b.stamp) || (canonicalText(a) < canonicalText(b) ? -1 : 1);
  return byStamp < 0 ? b : a;
}
