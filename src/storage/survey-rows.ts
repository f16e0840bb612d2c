import type { FieldChange } from '../core/survey/field-changes.ts';
import { surveyOf } from '../core/survey/field-changes.ts';
import { isRecord, type JsonRecord } from '../core/survey/json-value.ts';
import type { SurveySummary } from '../app/survey-store.ts';
import type { FieldRow, ReadingRow } from './schema.ts';
import type { Reading, Writing } from './transaction.ts';

/** All keys `[survey, …]` of one survey: a list sorts after every text. */
export function keysOf(survey: string): IDBKeyRange {
  return IDBKeyRange.bound([survey], [survey, []]);
}

const READING_PATH = /^readings\/[^/]+$/;

/** Whether a path is that of a raw reading, which has a row of its own and is never put over. */
export const isReadingPath = (path: string): boolean => READING_PATH.test(path);

const LINE_PATH = /^(?:title|surveyedOn|site(?:\/.*)?|(?:planes|stations|obstructions)(?:\/[^/]+\/id)?)$/;

/** Whether a change of a field may change the survey's line in the list. */
export const touchesLine = ({ path }: FieldChange): boolean => LINE_PATH.test(path);

function fieldOf({ path, value }: FieldRow): FieldChange {
  return { path, value };
}

function readingField({ id, reading, removed }: ReadingRow): FieldChange {
  return { path: id, value: removed === null ? reading : undefined };
}

/** The document that a survey's rows make. */
export async function storedDocument(transaction: Reading | Writing, survey: string): Promise<unknown> {
  const keys = keysOf(survey);
  const [fields, readings] = await Promise.all([
    (transaction as Reading).objectStore('fields').getAll(keys),
    (transaction as Reading).objectStore('readings').getAll(keys),
  ]);
  return surveyOf([...fields.map(fieldOf), ...readings.map(readingField)]);
}

const textOf = (value: unknown): string | undefined => (typeof value === 'string' ? value : undefined);
const lengthOf = (value: unknown): number => (Array.isArray(value) ? value.length : 0);

/** The line of the list that a document gives; a damaged one still gets a line, so that it can be found. */
export function summaryOf(
  id: string,
  document: unknown,
  times: Pick<SurveySummary, 'changedAt' | 'deletedAt'>,
): SurveySummary {
  const record: JsonRecord = isRecord(document) ? document : {};
  const site: JsonRecord = isRecord(record.site) ? record.site : {};
  const surveyedOn = textOf(record.surveyedOn);
  const address = textOf(site.address);
  return {
    id,
    title: textOf(record.title) ?? id,
    ...(surveyedOn !== undefined && { surveyedOn }),
    ...(address !== undefined && { address }),
    planes: lengthOf(record.planes),
    stations: lengthOf(record.stations),
    obstructions: lengthOf(record.obstructions),
    ...times,
  };
}
