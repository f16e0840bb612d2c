import { unwrap } from 'idb';
import { AppError } from '../app/app-error.ts';
import type { FieldChange } from '../core/survey/field-changes.ts';
import type { JsonValue } from '../core/survey/json-value.ts';
import { sameJson } from '../core/survey/same-json.ts';
import { written } from '../core/sync-protocol/field-versions.ts';
import { isReadingPath, isStanding } from '../core/sync-protocol/reading-state.ts';
import type { Stamp } from '../core/sync-protocol/stamp.ts';
import type { FieldRow } from './schema.ts';
import { keysOf, versionsIn } from './survey-rows.ts';
import type { Writing } from './transaction.ts';

/** Rows that are had faster one by one than all of the survey. */
const FEW = 50;

async function addReading(
  transaction: Writing,
  survey: string,
  id: string,
  reading: JsonValue,
  stamp: Stamp,
): Promise<void> {
  const store = transaction.objectStore('readings');
  const stored = await store.get([survey, id]);
  if (!stored) await store.add({ survey, id, reading, removed: null });
  else if (!sameJson(stored.reading, reading)) throw new AppError('reading-conflict', `${survey}: ${id}`);
  else if (!isStanding(stored)) await store.put({ ...stored, returned: stamp });
}

async function takeOutReading(transaction: Writing, survey: string, id: string, stamp: Stamp): Promise<void> {
  const store = transaction.objectStore('readings');
  const stored = await store.get([survey, id]);
  if (stored) await store.put({ ...stored, removed: stamp });
}

async function writeFields(
  transaction: Writing,
  survey: string,
  changes: readonly FieldChange[],
  stamp: Stamp,
): Promise<void> {
  const store = transaction.objectStore('fields');
  const stored =
    changes.length > FEW
      ? await store.getAll(keysOf(survey))
      : await Promise.all(changes.map(({ path }) => store.get([survey, path])));
  const known = new Map(stored.flatMap((row) => (row ? [[row.path, row]] : [])));
  // Past the wrapper: a promise for each of ten thousands of fields costs more than storing them, and a failing
  // request ends the transaction anyhow, which is waited for.
  const fields = unwrap(store);
  for (const { path, value } of changes) {
    const row = known.get(path);
    const next: FieldRow = { survey, path, ...written(row && versionsIn(row), value, stamp) };
    fields.put(next);
    known.set(path, next);
  }
}

/** Writes field changes of one survey, all with the stamp of the act. */
export async function writeChanges(
  transaction: Writing,
  survey: string,
  changes: readonly FieldChange[],
  stamp: Stamp,
): Promise<void> {
  await writeFields(
    transaction,
    survey,
    changes.filter(({ path }) => !isReadingPath(path)),
    stamp,
  );
  const write = ({ path, value }: FieldChange): Promise<void> =>
    value === undefined
      ? takeOutReading(transaction, survey, path, stamp)
      : addReading(transaction, survey, path, value, stamp);
  await Promise.all(changes.filter(({ path }) => isReadingPath(path)).map(write));
}
