import { AppError } from '../app/app-error.ts';
import type { Step, StoredSurvey, SurveyStore, SurveySummary } from '../app/survey-store.ts';
import { fieldsOf, type FieldChange } from '../core/survey/field-changes.ts';
import { problemInWords } from '../core/survey/path-words.ts';
import type { Parsed } from '../core/survey/problem.ts';
import type { Survey } from '../core/survey/survey.ts';
import type { Stamp } from '../core/sync-protocol/stamp.ts';
import type { Connection } from './connection.ts';
import { stampOfAct } from './device-stamps.ts';
import { addStep, changesOfMove, rowsToMove, stepOf, stepsOf } from './history-rows.ts';
import type { SurveyRow } from './schema.ts';
import { keysOf, storedDocument, summaryOf, touchesLine } from './survey-rows.ts';
import { reading, writing, type Writing } from './transaction.ts';
import { writeChanges } from './write-changes.ts';

export interface SurveyDatabaseNeeds {
  connection: Connection;
  /** Loads what reads a stored document as a survey of this version. */
  checker: () => Promise<(document: unknown) => Parsed<Survey>>;
  /** Milliseconds since 1970. */
  now: () => number;
  newId: () => string;
}

async function rowOf(transaction: Writing, id: string): Promise<SurveyRow> {
  const row = await transaction.objectStore('surveys').get(id);
  if (!row) throw new AppError('survey-missing', id);
  return row;
}

/** The line of the list in a row: all but what is kept for merging. */
function lineOf(row: SurveyRow): SurveySummary {
  const summary: SurveySummary & Partial<SurveyRow> = { ...row };
  delete summary.deletionStamp;
  return summary;
}

/** Surveys in the database: stamped fields and reading rows, of which the document is the projection. */
export function surveyDatabase({ connection, checker, now, newId }: SurveyDatabaseNeeds): SurveyStore {
  const inOne = <T>(work: (transaction: Writing) => Promise<T>) =>
    connection.run((database) => writing(database, work));

  async function change(transaction: Writing, id: string, changes: FieldChange[]): Promise<Stamp> {
    const stamp = await stampOfAct(transaction, now(), newId);
    await writeChanges(transaction, id, changes, stamp);
    return stamp;
  }

  /** Writes the line of the list that a document gives. */
  async function putLine(
    transaction: Writing,
    id: string,
    document: unknown,
    { deletedAt, deletionStamp }: Pick<SurveyRow, 'deletedAt' | 'deletionStamp'>,
  ) {
    const summary = summaryOf(id, document, { changedAt: now(), deletedAt });
    await transaction.objectStore('surveys').put({ ...summary, deletionStamp });
  }

  const markDeleted = (id: string, deletedAt: number | null) =>
    inOne(async (transaction) => {
      const row = await rowOf(transaction, id);
      const deletionStamp = await stampOfAct(transaction, now(), newId);
      await transaction.objectStore('surveys').put({ ...row, deletedAt, deletionStamp });
    });

  /** After an act's changes: refuses it where the survey cannot be read any more, and writes the line of the list. */
  async function changed(
    transaction: Writing,
    id: string,
    row: SurveyRow,
    act: Stamp,
    check?: (document: unknown) => Parsed<Survey>,
  ) {
    const document = await storedDocument(transaction, id, check && act);
    const parsed = check?.(document);
    if (parsed && !parsed.ok)
      throw new AppError('change-refused', problemInWords(parsed.problems[0], document));
    await putLine(transaction, id, document, row);
  }

  async function move(id: string, way: 'undo' | 'redo', number?: number): Promise<Step | null> {
    const check = await checker();
    return inOne(async (transaction) => {
      const row = await rowOf(transaction, id);
      const found = (await rowsToMove(transaction, id))[way];
      if (!found || (number !== undefined && found.number !== number)) return null;
      const act = await change(transaction, id, await changesOfMove(transaction, found, way));
      await changed(transaction, id, row, act, check);
      await transaction.objectStore('history').put({ ...found, undone: way === 'undo' });
      return stepOf(found);
    });
  }

  return {
    list: async () => {
      const rows = await connection.run((database) => database.getAll('surveys'));
      return rows.map(lineOf).sort((a, b) => b.changedAt - a.changedAt || (a.id < b.id ? -1 : 1));
    },

    load: async (id): Promise<StoredSurvey | null> => {
      const found = await connection.run(async (database) => {
        const transaction = reading(database);
        const row = await transaction.objectStore('surveys').get(id);
        return row ? { row, document: await storedDocument(transaction, id) } : null;
      });
      if (!found) return null;
      const { document } = found;
      const { deletedAt } = found.row;
      const parsed = (await checker())(document);
      return parsed.ok
        ? { id, deletedAt, state: 'readable', survey: parsed.value, warnings: parsed.warnings }
        : { id, deletedAt, state: 'unreadable', document, problems: parsed.problems };
    },

    create: (survey) =>
      inOne(async (transaction) => {
        const { id } = survey;
        if (await transaction.objectStore('surveys').get(id)) throw new AppError('survey-exists', id);
        await transaction.objectStore('erased').delete(id);
        await change(transaction, id, fieldsOf(survey));
        await putLine(transaction, id, survey, { deletedAt: null, deletionStamp: null });
      }),

    applyChanges: async (id, changes, step) => {
      const check = step && (await checker());
      return inOne(async (transaction) => {
        const row = await rowOf(transaction, id);
        const act = await change(transaction, id, changes);
        // readings come several times a second: the survey is not read for each, only its time is moved on
        if (check || changes.some(touchesLine)) await changed(transaction, id, row, act, check);
        else await transaction.objectStore('surveys').put({ ...row, changedAt: now() });
        return step ? addStep(transaction, id, changes, step) : null;
      });
    },

    steps: (id) => connection.run((database) => stepsOf(reading(database), id)),

    undo: (id, number) => move(id, 'undo', number),

    redo: (id) => move(id, 'redo'),

    remove: (id) => markDeleted(id, now()),

    restore: (id) => markDeleted(id, null),

    erase: (id) =>
      inOne(async (transaction) => {
        await rowOf(transaction, id);
        const stamp = await stampOfAct(transaction, now(), newId);
        await Promise.all([
          transaction.objectStore('fields').delete(keysOf(id)),
          transaction.objectStore('readings').delete(keysOf(id)),
          transaction.objectStore('history').delete(keysOf(id)),
          transaction.objectStore('drafts').delete(keysOf(id)),
          transaction.objectStore('surveys').delete(id),
          transaction.objectStore('erased').put({ id, stamp }),
        ]);
      }),
  };
}
