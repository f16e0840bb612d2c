import type { IDBPTransaction, StoreNames } from 'idb';
import type { Database } from './open-database.ts';
import type { NoonmarkSchema } from './schema.ts';

type Stores = StoreNames<NoonmarkSchema>[];
type WritingTo<S extends Stores> = IDBPTransaction<NoonmarkSchema, S, 'readwrite'>;

const SURVEY_STORES = ['surveys', 'fields', 'readings', 'history', 'erased', 'device', 'drafts'] as const;
type SurveyStores = (typeof SURVEY_STORES)[number][];

export type Reading = IDBPTransaction<NoonmarkSchema, SurveyStores, 'readonly'>;
export type Writing = WritingTo<SurveyStores>;

/** One look at the surveys: what is read belongs together. */
export function reading(database: Database): Reading {
  return database.transaction([...SURVEY_STORES], 'readonly');
}

/** Ends a transaction that failed; afterwards nothing of it is stored. Gives the reason that tells most. */
async function undone<S extends Stores>(transaction: WritingTo<S>, error: unknown): Promise<unknown> {
  try {
    transaction.abort();
  } catch {
    // The browser has ended it already.
  }
  await transaction.done.catch(() => undefined);
  const isVague = error instanceof DOMException && error.name === 'AbortError';
  return isVague ? (transaction.error ?? error) : error;
}

/** Runs an act on some stores as one transaction: durable when this resolves, nothing stored when it rejects. */
export async function writingTo<S extends Stores, T>(
  database: Database,
  stores: S,
  act: (transaction: WritingTo<S>) => Promise<T>,
): Promise<T> {
  const transaction = database.transaction(stores, 'readwrite', { durability: 'strict' });
  // Waited for below; without this a failure would be reported twice.
  transaction.done.catch(() => undefined);
  try {
    const result = await act(transaction);
    await transaction.done;
    return result;
  } catch (error) {
    throw await undone(transaction, error);
  }
}

/** Runs an act on the surveys as one transaction. */
export function writing<T>(database: Database, act: (transaction: Writing) => Promise<T>): Promise<T> {
  return writingTo(database, [...SURVEY_STORES], act);
}
