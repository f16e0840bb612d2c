import { unwrap } from 'idb';
import { AppError } from '../app/app-error.ts';
import type { FieldChange } from '../core/survey/field-changes.ts';
import type { JsonValue } from '../core/survey/json-value.ts';
import { sameJson } from '../core/survey/same-json.ts';
import type { Stamp } from '../core/sync-protocol/stamp.ts';
import type { FieldRow } from './schema.ts';
import { isReadingPath } from './survey-rows.ts';
import type { Writing } from './transaction.ts';

async function addReading(
  transaction: Writing,
  survey: string,
  id: string,
  reading: JsonValue,
): Promise<void> {
  const store = transaction.objectStore('readings');
  const stored = await store.get([survey, id]);
  if (!stored) await store.add({ survey, id, reading, removed: null });
  else if (!sameJson(stored.reading, reading)) throw new AppError('reading-conflict', `${survey}: ${id}`);
  else if (stored.removed !== null) await store.put({ ...stored, removed: null });
}

async function takeOutReading(transaction: Writing, survey: string, id: string, stamp: Stamp): Promise<void> {
  const store = transaction.objectStore('readings');
  const stored = await store.get([survey, id]);
  if (stored) await store.put({ ...stored, removed: stamp });
}

/** Writes field changes of one survey, all with the stamp of the act. */
export async function writeChanges(
  transaction: Writing,
  survey: string,
  changes: readonly FieldChange[],
  stamp: Stamp,
): Promise<void> {
  // Past the wrapper: a promise for each of ten thousands of fields costs more than storing them, and a failing
  // request ends the transaction anyhow, which is waited for.
  const fields = unwrap(transaction.objectStore('fields'));
  for (const { path, value } of changes) {
    if (isReadingPath(path)) continue;
    const row: FieldRow = { survey, path, stamp, ...(value !== undefined && { value }) };
    fields.put(row);
  }
  const write = ({ path, value }: FieldChange): Promise<void> =>
    value === undefined
      ? takeOutReading(transaction, survey, path, stamp)
      : addReading(transaction, survey, path, value);
  await Promise.all(changes.filter(({ path }) => isReadingPath(path)).map(write));
}
