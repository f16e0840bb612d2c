import type { JsonValue } from '../survey/json-value.ts';
import { lostVersions } from './field-versions.ts';
import type { SurveyState } from './merge.ts';
import type { DeletionRow, FieldRow, ReadingRow } from './rows.ts';
import { standingFields } from './standing-fields.ts';
import { compareStamps, type Stamp } from './stamp.ts';

/** A value that lost unseen against a later one. */
export interface ReplacedValue {
  path: string;
  value: JsonValue;
  stamp: Stamp;
  /** The stamp of the value that counts. */
  replacedBy: Stamp;
}

/** What a person should look at after states met. */
export interface NeedsALook {
  /** In the order of their paths, of one path the latest first. */
  replaced: ReplacedValue[];
  /** Deleted entries that are there again: see `standingFields`. */
  broughtBack: string[];
  /** Raw readings of one id with different contents; all are kept. */
  readingConflicts: string[];
  /** The survey is deleted, and some of it was written later than that: restore it, or delete it knowingly. */
  isEditedSinceDeletion: boolean;
}

const fieldRows = (state: SurveyState): FieldRow[] =>
  [...state.values()].filter((row) => row.kind === 'field');
const readingRows = (state: SurveyState): ReadingRow[] =>
  [...state.values()].filter((row) => row.kind === 'reading');

/** The fields that stand in a state, for `surveyOf`. */
export const standingIn = (state: SurveyState) =>
  standingFields(
    fieldRows(state).map((row) => [row.key, row] as const),
    readingRows(state).map((row) => [row.key, row] as const),
  );

/** What in a state someone should look at. A state without disagreements gives empty lists. */
export function needsALook(state: SurveyState): NeedsALook {
  const fields = fieldRows(state);
  const replaced = fields.flatMap((row) =>
    lostVersions(row).map(({ stamp, value }) => ({
      path: row.key,
      value: value ?? null,
      stamp,
      replacedBy: row.stamp,
    })),
  );
  const conflicts = readingRows(state).filter(({ others }) => others !== undefined);
  const deletion = state.get('deletion ') as DeletionRow | undefined;
  return {
    replaced: replaced.sort((a, b) => (a.path < b.path ? -1 : a.path > b.path ? 1 : 0)),
    broughtBack: standingIn(state).broughtBack.sort(),
    readingConflicts: conflicts.map(({ key }) => key).sort(),
    isEditedSinceDeletion:
      typeof deletion?.at === 'number' &&
      fields.some(({ stamp }) => compareStamps(stamp, deletion.stamp) > 0),
  };
}
