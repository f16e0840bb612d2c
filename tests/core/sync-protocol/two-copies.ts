import { changesBetween, fieldsOf, surveyOf } from '../../../src/core/survey/field-changes.ts';
import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { merge, stateOf, type SurveyState } from '../../../src/core/sync-protocol/merge.ts';
import { standingIn } from '../../../src/core/sync-protocol/needs-a-look.ts';
import { nameOfPath, writtenRow } from '../../../src/core/sync-protocol/rows.ts';
import type { FieldRow, ReadingRow, Row } from '../../../src/core/sync-protocol/rows.ts';
import type { FieldChange } from '../../../src/core/survey/field-changes.ts';
import { nextStamp } from '../../../src/core/sync-protocol/stamp.ts';

/** The state after one act of a device, at a time of one day such as `10:30`. */
export function acted(
  state: SurveyState,
  device: string,
  time: string,
  changes: readonly FieldChange[],
  settles = false,
): SurveyState {
  const stamp = nextStamp(null, Date.parse(`2026-05-14T${time}:00Z`), device);
  const rows = changes.flatMap((change): Row[] => {
    const known = state.get(nameOfPath(change.path)) as FieldRow | ReadingRow | undefined;
    const row = writtenRow(known, change, stamp, settles);
    return row ? [row] : [];
  });
  return merge(state, stateOf(rows));
}

export const created = (survey: Survey, device = 'phone', time = '09:00'): SurveyState =>
  acted(new Map(), device, time, fieldsOf(survey));

/** The survey that a state shows; fails where it cannot be read. */
export function shown(state: SurveyState): Survey {
  const parsed = surveyFromJson(surveyOf(standingIn(state).fields));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return parsed.value;
}

/** The state after a person changed the survey that it shows. */
export const edited = (
  state: SurveyState,
  device: string,
  time: string,
  change: (survey: Survey) => Survey,
): SurveyState => {
  const before = shown(state);
  return acted(state, device, time, changesBetween(before, change(before)));
};
