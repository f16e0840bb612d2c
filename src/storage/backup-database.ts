import { AppError } from '../app/app-error.ts';
import type { BackupStore, MergeResult, SurveyRows } from '../app/backup/backup-store.ts';
import { isRecord, type JsonValue } from '../core/survey/json-value.ts';
import type { Parsed } from '../core/survey/problem.ts';
import { sameJson } from '../core/survey/same-json.ts';
import type { Survey } from '../core/survey/survey.ts';
import { joinVersions } from '../core/sync-protocol/field-versions.ts';
import { joinReadings, type ReadingState } from '../core/sync-protocol/reading-state.ts';
import { compareStamps, type Stamp } from '../core/sync-protocol/stamp.ts';
import type { Connection } from './connection.ts';
import type { FieldRow, ReadingRow, SurveyRow } from './schema.ts';
import { keysOf, storedDocument, summaryOf, versionsIn } from './survey-rows.ts';
import { reading, writing, type Writing } from './transaction.ts';

export interface BackupDatabaseNeeds {
  connection: Connection;
  checker: () => Promise<(document: unknown) => Parsed<Survey>>;
  /** Milliseconds since 1970. */
  now: () => number;
}

const isLater = (stamp: Stamp, than: Stamp | null | undefined): boolean =>
  than === null || than === undefined || compareStamps(stamp, than) > 0;

/** Writes the fields in which something is new; the number of them. */
async function mergeFields(transaction: Writing, { id: survey, fields }: SurveyRows): Promise<number> {
  const store = transaction.objectStore('fields');
  const stored = new Map((await store.getAll(keysOf(survey))).map((row) => [row.path, row]));
  const merged = fields.flatMap(({ path, ...field }): FieldRow[] => {
    const known = stored.get(path);
    const row = { survey, path, ...joinVersions(known ? versionsIn(known) : field, field) };
    return known && isSameRow(row, known) ? [] : [row];
  });
  await Promise.all(merged.map((row) => store.put(row)));
  return merged.length;
}

/** Joins the readings with those stored; the number of rows in which something is new. */
async function mergeReadings(transaction: Writing, { id: survey, readings }: SurveyRows): Promise<number> {
  const store = transaction.objectStore('readings');
  const stored = new Map((await store.getAll(keysOf(survey))).map((row) => [row.id, row]));
  let changed = 0;
  for (const { id, ...reading } of readings) {
    const known = stored.get(id);
    const row = { survey, id, ...joinReadings(known ?? reading, reading) };
    if (row.others) throw new AppError('reading-conflict', `${survey}: ${id}`);
    if (known && isSameRow(row, known)) continue;
    changed++;
    await store.put(row);
  }
  return changed;
}

function readingIn(row: ReadingRow): ReadingState {
  const { reading, others, removed, returned } = row;
  return { reading, ...(others && { others }), removed, ...(returned && { returned }) };
}

const isSameRow = (a: FieldRow | ReadingRow, b: FieldRow | ReadingRow): boolean =>
  sameJson(a as unknown as JsonValue, b as unknown as JsonValue);

/** Stamps this device gives from now on come after all that came in. */
async function heedStamps(transaction: Writing, rows: SurveyRows): Promise<void> {
  const marks = rows.readings.flatMap(({ removed, returned }) => [removed, returned]);
  const store = transaction.objectStore('device');
  const last = await store.get('last-stamp');
  let newest = last?.name === 'last-stamp' ? last.stamp : null;
  for (const stamp of [...rows.fields.map((field) => field.stamp), ...marks, rows.deletionStamp])
    if (stamp && isLater(stamp, newest)) newest = stamp;
  if (newest) await store.put({ name: 'last-stamp', stamp: newest });
}

export function backupDatabase({ connection, checker, now }: BackupDatabaseNeeds): BackupStore {
  async function mergeInto(
    transaction: Writing,
    rows: SurveyRows,
  ): Promise<MergeResult & { document: unknown }> {
    const row = await transaction.objectStore('surveys').get(rows.id);
    await transaction.objectStore('erased').delete(rows.id);
    const changed = (await mergeFields(transaction, rows)) + (await mergeReadings(transaction, rows));
    await heedStamps(transaction, rows);
    const document = await storedDocument(transaction, rows.id);
    const theirs = rows.deletionStamp !== null && isLater(rows.deletionStamp, row?.deletionStamp);
    const { deletedAt, deletionStamp }: Pick<SurveyRow, 'deletedAt' | 'deletionStamp'> =
      row && !theirs ? row : rows;
    const isSame = row !== undefined && changed === 0 && deletedAt === row.deletedAt;
    if (!isSame) {
      const summary = summaryOf(rows.id, document, { changedAt: now(), deletedAt });
      await transaction.objectStore('surveys').put({ ...summary, deletionStamp });
    }
    const outcome = row === undefined ? 'added' : isSame ? 'same' : 'merged';
    return { outcome, isDeleted: deletedAt !== null, document };
  }

  return {
    rows: (id) =>
      connection.run(async (database): Promise<SurveyRows | null> => {
        const transaction = reading(database);
        const row = await transaction.objectStore('surveys').get(id);
        if (!row) return null;
        const [fields, readings] = await Promise.all([
          transaction.objectStore('fields').getAll(keysOf(id)),
          transaction.objectStore('readings').getAll(keysOf(id)),
        ]);
        return {
          id,
          deletedAt: row.deletedAt,
          deletionStamp: row.deletionStamp,
          fields: fields.map((row) => ({ path: row.path, ...versionsIn(row) })),
          readings: readings.map((row) => ({ id: row.id, ...readingIn(row) })),
        };
      }),

    merge: async (rows) => {
      const check = await checker();
      return connection.run((database) =>
        writing(database, async (transaction): Promise<MergeResult> => {
          const { document, outcome, isDeleted } = await mergeInto(transaction, rows);
          const parsed = check(document);
          if (!parsed.ok) {
            const [{ path, message }] = parsed.problems;
            throw new AppError('change-refused', `${path}: ${message}`);
          }
          const isOwn = isRecord(document) && document.id === rows.id;
          if (!isOwn)
            throw new AppError('change-refused', `id: the copy is of another survey than ${rows.id}`);
          return { outcome, isDeleted };
        }),
      );
    },
  };
}
