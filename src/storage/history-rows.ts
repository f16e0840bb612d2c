import type { Step, StepRecord, Steps } from '../app/survey-store.ts';
import type { FieldChange } from '../core/survey/field-changes.ts';
import { isReadingPath } from '../core/sync-protocol/reading-state.ts';
import type { HistoryRow } from './schema.ts';
import { keysOf } from './survey-rows.ts';
import type { Reading, Writing } from './transaction.ts';

/** Steps kept for each survey; older ones can no longer be taken back. */
export const MOST_STEPS = 200;

const isField = ({ path }: FieldChange): boolean => !isReadingPath(path);

export const stepOf = ({ number, code, title }: HistoryRow): Step => ({ number, code, title });

const historyOf = (transaction: Reading | Writing, survey: string): Promise<HistoryRow[]> =>
  (transaction as Reading).objectStore('history').getAll(keysOf(survey));

/** The row that would be taken back next, and the one that would be done again. */
export async function rowsToMove(
  transaction: Reading | Writing,
  survey: string,
): Promise<{ undo?: HistoryRow; redo?: HistoryRow }> {
  const rows = await historyOf(transaction, survey);
  return { undo: rows.findLast(({ undone }) => !undone), redo: rows.find(({ undone }) => undone) };
}

export async function stepsOf(transaction: Reading, survey: string): Promise<Steps> {
  const { undo, redo } = await rowsToMove(transaction, survey);
  return { undo: undo ? stepOf(undo) : null, redo: redo ? stepOf(redo) : null };
}

/** Remembers an act. What had been taken back before it cannot be done again any more. */
export async function addStep(
  transaction: Writing,
  survey: string,
  changes: readonly FieldChange[],
  { back, code, title }: StepRecord,
): Promise<number> {
  const store = transaction.objectStore('history');
  const rows = await historyOf(transaction, survey);
  const standing = rows.filter(({ undone }) => !undone);
  const gone = [
    ...rows.filter(({ undone }) => undone),
    ...standing.slice(0, Math.max(0, standing.length + 1 - MOST_STEPS)),
  ];
  await Promise.all(gone.map(({ number }) => store.delete([survey, number])));
  const number = (rows.at(-1)?.number ?? 0) + 1;
  const readings = changes
    .filter(({ path }) => isReadingPath(path))
    .map(({ path, value }) => ({ id: path, standing: value !== undefined }));
  await store.put({
    survey,
    number,
    code,
    title,
    back: back.filter(isField),
    forth: changes.filter(isField),
    readings,
    undone: false,
  });
  return number;
}

/** The field changes that take a step back or do it again; readings are had from their rows. */
export async function changesOfMove(
  transaction: Writing,
  { survey, back, forth, readings }: HistoryRow,
  way: 'undo' | 'redo',
): Promise<FieldChange[]> {
  const moved = readings.map(async ({ id, standing }): Promise<FieldChange> => {
    const stands = way === 'redo' ? standing : !standing;
    const row = stands ? await transaction.objectStore('readings').get([survey, id]) : undefined;
    return { path: id, value: row?.reading };
  });
  return [...(way === 'undo' ? back : forth), ...(await Promise.all(moved))];
}
