import type { FieldChange } from '../core/survey/field-changes.ts';
import { surveyOf } from '../core/survey/field-changes.ts';
import { isRecord, type JsonRecord } from '../core/survey/json-value.ts';
import type { SurveySummary } from '../app/survey-store.ts';
import type { FieldVersions } from '../core/sync-protocol/field-versions.ts';
import type { Stamp } from '../core/sync-protocol/stamp.ts';
import { standingFields } from '../core/sync-protocol/standing-fields.ts';
import type { FieldRow } from './schema.ts';
import type { Reading, Writing } from './transaction.ts';

/** All keys `[survey, …]` of one survey: a list sorts after every text. */
export function keysOf(survey: string): IDBKeyRange {
  return IDBKeyRange.bound([survey], [survey, []]);
}

const LINE_PATH = /^(?:title|surveyedOn|site(?:\/.*)?|(?:planes|stations|obstructions)(?:\/[^/]+\/id)?)$/;

/** Whether a change of a field may change the survey's line in the list. */
export const touchesLine = ({ path }: FieldChange): boolean => LINE_PATH.test(path);

/** What a field's row holds beside its key. */
export function versionsIn(row: FieldRow): FieldVersions {
  const field: FieldVersions & Partial<FieldRow> = { ...row };
  delete field.survey;
  delete field.path;
  return field;
}

/** The document that a survey's rows make; with `act`, what that act deleted is not brought back. */
export async function storedDocument(
  transaction: Reading | Writing,
  survey: string,
  act?: Stamp,
): Promise<unknown> {
  const keys = keysOf(survey);
  const [fields, readings] = await Promise.all([
    (transaction as Reading).objectStore('fields').getAll(keys),
    (transaction as Reading).objectStore('readings').getAll(keys),
  ]);
  return surveyOf(
    standingFields(
      fields.map((row) => [row.path, row] as const),
      readings.map((row) => [row.id, row] as const),
      act,
    ).fields,
  );
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
