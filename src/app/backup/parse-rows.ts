import { isRecord } from '../../core/survey/json-value.ts';
import type { Parsed } from '../../core/survey/problem.ts';
import { isRow } from '../../core/sync-protocol/row-schema.ts';
import { isStamp } from '../../core/sync-protocol/stamp.ts';
import type { SurveyRows } from './backup-store.ts';

const isStampText = (value: unknown): boolean => typeof value === 'string' && isStamp(value);

/** Reads the stored rows of a survey from an archive; `path` is the file they came from. */
export function parseRows(text: string, path: string, id: string): Parsed<SurveyRows> {
  const refused = (at: string, message: string): Parsed<never> => ({
    ok: false,
    problems: [{ path: `${path}: ${at}`, message }],
  });
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return refused('file', 'It is not JSON.');
  }
  if (!isRecord(value) || value.id !== id) return refused('id', 'It belongs to another survey than is said.');
  const { fields, readings, deletedAt, deletionStamp } = value;
  if (!Array.isArray(fields) || !Array.isArray(readings))
    return refused('fields', 'Fields and readings must be lists.');
  if (deletedAt !== null && typeof deletedAt !== 'number')
    return refused('deletedAt', 'A time or null is needed.');
  if (deletionStamp !== null && !isStampText(deletionStamp))
    return refused('deletionStamp', 'A stamp or null is needed.');
  const field = fields.findIndex(
    (row: unknown) => !isRecord(row) || !isRow({ ...row, kind: 'field', key: row.path }),
  );
  if (field >= 0) return refused(`fields[${field}]`, 'A path and a stamp are needed.');
  const reading = readings.findIndex(
    (row: unknown) => !isRecord(row) || !isRow({ ...row, kind: 'reading', key: row.id }),
  );
  if (reading >= 0) return refused(`readings[${reading}]`, 'An id and a raw reading are needed.');
  return { ok: true, value: value as unknown as SurveyRows, warnings: [] };
}
