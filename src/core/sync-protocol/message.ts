import * as v from 'valibot';
import type { Parsed, Problem } from '../survey/problem.ts';
import { ProblemList } from '../survey/problem-list.ts';
import { isRecord, shown } from '../survey/json-value.ts';
import { pathBelow } from '../survey/record-path.ts';
import { joinRows, type Row } from './rows.ts';
import { SYNC_LIMITS, rowSchema, surveyIdSchema } from './row-schema.ts';

export const SYNC_FORMAT = 'noonmark-sync';
export const SYNC_VERSION = 1;

/** How far a store's changes were taken: of another store, or of one put back to an older state, nothing was. */
export interface Cursor {
  /** Name of the store, new whenever one is set up or put back from a backup. */
  store: string;
  number: number;
}

/** Rows on their way, either way. */
export interface SyncMessage {
  format: typeof SYNC_FORMAT;
  /** Version of the protocol the sender speaks. */
  version: number;
  /** The oldest version that can take the message. */
  readableFrom: number;
  /** How far the sender's changes reach with this message; null where they are not numbered. */
  cursor: Cursor | null;
  /** More waits after the cursor. */
  hasMore: boolean;
  surveys: { id: string; rows: Row[] }[];
}

/** A message of this version. */
export const syncMessage = (parts: Pick<SyncMessage, 'cursor' | 'hasMore' | 'surveys'>): SyncMessage => ({
  format: SYNC_FORMAT,
  version: SYNC_VERSION,
  readableFrom: 1,
  ...parts,
});

const count = v.pipe(
  v.number('a whole number, 0 or more'),
  v.safeInteger('a whole number'),
  v.minValue(0, '0 or more'),
);

const messageSchema = v.looseObject({
  format: v.literal(SYNC_FORMAT, `"${SYNC_FORMAT}"`),
  version: count,
  readableFrom: count,
  cursor: v.nullable(
    v.looseObject({ store: surveyIdSchema, number: count }, 'null or a store with a number'),
  ),
  hasMore: v.boolean('true or false'),
  surveys: v.pipe(
    v.array(
      v.looseObject({ id: surveyIdSchema, rows: v.array(rowSchema, 'a list of rows') }, 'a survey'),
      'a list',
    ),
    v.maxLength(SYNC_LIMITS.surveys, `at most ${SYNC_LIMITS.surveys} surveys`),
    v.check(
      (surveys) => surveys.reduce((sum, { rows }) => sum + rows.length, 0) <= SYNC_LIMITS.rows,
      `at most ${SYNC_LIMITS.rows} rows in all`,
    ),
  ),
});

/**
 * Reads a message from outside. Rows of a kind this version does not know (`x-…`) and parts it does not know are kept.
 * Problems carry paths such as `surveys[0].rows[3].stamp`.
 */
export function parseSyncMessage(value: unknown): Parsed<SyncMessage> {
  if (!isRecord(value))
    return {
      ok: false,
      problems: [{ path: 'message', message: `A message is needed; it is ${shown(value)}.` }],
    };
  if (typeof value.readableFrom === 'number' && value.readableFrom > SYNC_VERSION)
    return {
      ok: false,
      problems: [
        {
          path: 'readableFrom',
          message: `The message needs version ${shown(value.readableFrom)} of the protocol; this Noonmark has version ${SYNC_VERSION}. Update Noonmark.`,
        },
      ],
    };
  const read = v.safeParse(messageSchema, value);
  if (!read.success) return { ok: false, problems: problemsOf(read.issues) };
  const message = value as unknown as SyncMessage;
  // Joined with itself, a row has its versions in order, whoever sent it.
  const surveys = message.surveys.map(({ id, rows }) => ({
    id,
    rows: rows.map((row) => joinRows(row, row)),
  }));
  return { ok: true, value: { ...message, surveys }, warnings: [] };
}

/** The problems that a schema found, with paths. */
export function problemsOf(issues: readonly v.BaseIssue<unknown>[]): Problem[] {
  const problems = new ProblemList();
  for (const { path, message, input } of issues) {
    const where = (path ?? []).map(({ key }) => key as string | number).reduce<string>(pathBelow, '');
    problems.add(where || 'message', `It must be ${message}; it is ${shown(input)}.`);
  }
  return problems.list();
}
