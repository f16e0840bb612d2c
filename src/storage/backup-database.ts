import { AppError } from '../app/app-error.ts';
import type { BackupStore, MergeResult, SurveyRows } from '../app/backup/backup-store.ts';
import { isRecord } from '../core/survey/json-value.ts';
import type { Parsed } from '../core/survey/problem.ts';
import { sameJson } from '../core/survey/same-json.ts';
import type { Survey } from '../core/survey/survey.ts';
import { compareStamps, type Stamp } from '../core/sync-protocol/stamp.ts';
import type { Connection } from './connection.ts';
import type { SurveyRow } from './schema.ts';
import { keysOf, storedDocument, summaryOf } from './survey-rows.ts';
import { reading, writing, type Writing } from './transaction.ts';

export interface BackupDatabaseNeeds {
  connection: Connection;
  checker: () => Promise<(document: unknown) => Parsed<Survey>>;
  /** Milliseconds since 1970. */
  now: () => number;
}

const isLater = (stamp: Stamp, than: Stamp | null | undefined): boolean =>
  than === null || than === undefined || compareStamps(stamp, than) > 0;

/** Writes the fields that are later than the stored ones; the number of them. */
async function mergeFields(transaction: Writing, { id: survey, fields }: SurveyRows): Promise<number> {
  const store = transaction.objectStore('fields');
  const stored = new Map((await store.getAll(keysOf(survey))).map((row) => [row.path, row.stamp]));
  const later = fields.filter(({ path, stamp }) => isLater(stamp, stored.get(path)));
  await Promise.all(later.map((field) => store.put({ survey, ...field })));
  return later.length;
}

/**
 * Adds the readings that are not stored; the number of them. One that stands in either copy stands: it is evidence,
 * and something may refer to it.
 */
async function mergeReadings(transaction: Writing, { id: survey, readings }: SurveyRows): Promise<number> {
  const store = transaction.objectStore('readings');
  const stored = new Map((await store.getAll(keysOf(survey))).map((row) => [row.id, row]));
  let changed = 0;
  for (const row of readings) {
    const known = stored.get(row.id);
    if (known && !sameJson(known.reading, row.reading))
      throw new AppError('reading-conflict', `${survey}: ${row.id}`);
    const returns = known && known.removed !== null && row.removed === null;
    if (known && !returns) continue;
    changed++;
    await store.put({ survey, ...row });
  }
  return changed;
}

/** Stamps this device gives from now on come after all that came in. */
async function heedStamps(transaction: Writing, { fields, deletionStamp }: SurveyRows): Promise<void> {
  const store = transaction.objectStore('device');
  const last = await store.get('last-stamp');
  let newest = last?.name === 'last-stamp' ? last.stamp : null;
  for (const stamp of [...fields.map((field) => field.stamp), ...(deletionStamp ? [deletionStamp] : [])])
    if (isLater(stamp, newest)) newest = stamp;
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
          fields: fields.map(({ path, stamp, value }) => ({
            path,
            stamp,
            ...(value !== undefined && { value }),
          })),
          readings: readings.map(({ id: reading_, reading: value, removed }) => ({
            id: reading_,
            reading: value,
            removed,
          })),
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
