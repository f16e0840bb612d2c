import * as v from 'valibot';
import type { JsonValue } from '../survey/json-value.ts';
import { isRecord } from '../survey/json-value.ts';
import { LIMITS } from '../survey/limits.ts';
import { MOST_VERSIONS } from './field-versions.ts';
import { isReadingPath } from './reading-state.ts';
import type { Row } from './rows.ts';
import { isStamp } from './stamp.ts';

/** What one message and one row may hold. */
export const SYNC_LIMITS = {
  surveys: 1_000,
  /** In all surveys of a message together. */
  rows: 50_000,
  /** Characters of a row's key. */
  keyLength: 2_000,
  /** Values inside each other. */
  depth: 64,
  /** Stamps that one version names as replaced. */
  over: 100,
  latestMs: 8.64e15,
} as const;

// Every message here is the phrase that follows "must be".
const stampPhrase = 'a stamp such as 2026-05-14T09:30:00.000Z-0000-phone7';
const stamp = v.pipe(v.string(stampPhrase), v.check(isStamp, stampPhrase));

const idPhrase = `a text of 1 to ${LIMITS.idLength} characters`;
export const surveyIdSchema = v.pipe(
  v.string(idPhrase),
  v.minLength(1, idPhrase),
  v.maxLength(LIMITS.idLength, idPhrase),
);

const valuePhrase = `a JSON value, at most ${SYNC_LIMITS.depth} deep`;
const jsonValue = v.custom<JsonValue>((value) => isJson(value, SYNC_LIMITS.depth), valuePhrase);

function isJson(value: unknown, depth: number): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (value === null || typeof value === 'boolean' || typeof value === 'string') return true;
  if (depth === 0) return false;
  if (Array.isArray(value)) return value.every((item) => isJson(item, depth - 1));
  return isRecord(value) && Object.values(value).every((item) => isJson(item, depth - 1));
}

const keyPhrase = `a text of 1 to ${SYNC_LIMITS.keyLength} characters`;
const key = v.pipe(
  v.string(keyPhrase),
  v.minLength(1, keyPhrase),
  v.maxLength(SYNC_LIMITS.keyLength, keyPhrase),
);
const readingPhrase = 'readings/ with an id';
const readingKey = v.pipe(key, v.check(isReadingPath, readingPhrase));
const fieldPhrase = 'the path of a field, not of a reading';
const fieldKey = v.pipe(
  key,
  v.check((path) => !isReadingPath(path), fieldPhrase),
);

const versionEntries = {
  stamp,
  value: v.optional(jsonValue),
  since: v.optional(stamp),
  made: v.optional(stamp),
  over: v.optional(
    v.pipe(
      v.array(stamp, 'a list of stamps'),
      v.maxLength(SYNC_LIMITS.over, `at most ${SYNC_LIMITS.over} stamps`),
    ),
  ),
};
const version = v.looseObject(versionEntries, 'a version with its stamp');
const mostVersions = `at most ${MOST_VERSIONS} versions`;

const fieldRow = v.looseObject({
  kind: v.literal('field'),
  key: fieldKey,
  ...versionEntries,
  replaced: v.optional(
    v.pipe(v.array(version, 'a list of versions'), v.maxLength(MOST_VERSIONS, mostVersions)),
  ),
});

const contents = v.custom<JsonValue>(
  (value) => isRecord(value) && isJson(value, SYNC_LIMITS.depth),
  'a raw reading',
);
const readingRow = v.looseObject({
  kind: v.literal('reading'),
  key: readingKey,
  reading: contents,
  others: v.optional(v.pipe(v.array(contents, 'a list of readings'), v.maxLength(10, 'at most 10 readings'))),
  removed: v.nullable(stamp),
  returned: v.optional(stamp),
});

const timePhrase = 'null or a time in milliseconds since 1970';
const whole = v.literal('', 'empty: there is one of it');
const deletionRow = v.looseObject({
  kind: v.literal('deletion'),
  key: whole,
  stamp,
  at: v.nullable(
    v.pipe(v.number(timePhrase), v.minValue(0, timePhrase), v.maxValue(SYNC_LIMITS.latestMs, timePhrase)),
  ),
});
const erasureRow = v.looseObject({ kind: v.literal('erasure'), key: whole, stamp });

const kindPhrase = 'field, reading, deletion, erasure, or a later kind, x-…';
const otherRow = v.pipe(
  v.looseObject({
    kind: v.pipe(v.string(kindPhrase), v.regex(/^x-[a-z-]{1,40}$/, kindPhrase)),
    key: v.pipe(v.string(keyPhrase), v.maxLength(SYNC_LIMITS.keyLength, keyPhrase)),
    stamp,
  }),
  v.check((row) => isJson(row, SYNC_LIMITS.depth), valuePhrase),
);

const KNOWN = { field: fieldRow, reading: readingRow, deletion: deletionRow, erasure: erasureRow };

/** The shape of a row. Parts it does not name are let through. */
export const rowSchema = v.lazy((row) =>
  isRecord(row) && typeof row.kind === 'string' && Object.hasOwn(KNOWN, row.kind)
    ? KNOWN[row.kind as keyof typeof KNOWN]
    : otherRow,
);

/** Whether a value from outside has the shape of a row. */
export const isRow = (value: unknown): value is Row => v.is(rowSchema, value);
