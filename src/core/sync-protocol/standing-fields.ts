import { PLACE, type FieldChange } from '../survey/field-layout.ts';
import type { JsonValue } from '../survey/json-value.ts';
import { versionsOf, type FieldVersions } from './field-versions.ts';
import { isStanding, type ReadingState } from './reading-state.ts';
import { namedRows } from './row-references.ts';
import { compareStamps, type Stamp } from './stamp.ts';

/** What stands of a survey, for `surveyOf`, and the entries that are there although they were deleted. */
export interface StandingFields {
  fields: FieldChange[];
  /** Paths of entries (`planes/south`, `readings/r9`) brought back by the rule: someone should look. */
  broughtBack: string[];
}

type Fields = Iterable<readonly [path: string, row: Readonly<FieldVersions>]>;
type Readings = Iterable<readonly [path: string, row: Readonly<ReadingState>]>;

/** A row's place in its list is no content. */
const isPlace = (step: string): boolean => step === PLACE || step === 'order';

/**
 * The fields that stand in merged rows. An entry deleted on one device while another works in it is there again, with
 * all that the deletion took, if
 * - something in it was written later than the deletion, or was added without the deletion's knowledge: a deletion
 *   takes away what it saw, never what was measured elsewhere; or
 * - something that stands names it (a trace its obstruction, a sighting its reading), so that the survey can be read.
 *
 * An earlier edit of a field that the deletion took is among that field's lost versions. Deleting the entry once more
 * deletes it for good, since then all of it was seen. Depends on the rows alone, so that all devices show the same.
 *
 * With `act`, what that act deleted stays deleted: so a store finds out whether an act leaves a readable survey.
 */
export function standingFields(fields: Fields, readings: Readings, act?: Stamp): StandingFields {
  const rows = new Map(fields);
  const raw = new Map(readings);
  const values = new Map<string, JsonValue | undefined>();
  const deleted = new Map<string, Stamp>();
  for (const [path, { value, stamp }] of rows) {
    values.set(path, value);
    if (value === undefined && stamp !== act && path.endsWith('/id')) deleted.set(path.slice(0, -3), stamp);
  }
  for (const [path, row] of raw) {
    values.set(path, isStanding(row) ? row.reading : undefined);
    if (!isStanding(row) && row.removed && row.removed !== act) deleted.set(path, row.removed);
  }
  const broughtBack: string[] = [];

  function bringBack(entry: string): void {
    const stamp = deleted.get(entry);
    if (stamp === undefined) return;
    deleted.delete(entry);
    for (const [path, row] of rows)
      if (row.value === undefined && row.stamp === stamp && path.startsWith(`${entry}/`)) {
        values.set(path, versionsOf(row).find(({ value }) => value !== undefined)?.value);
        if (path.endsWith('/id')) deleted.delete(path.slice(0, -3));
      }
    if (raw.has(entry)) values.set(entry, raw.get(entry)?.reading);
    if ((raw.has(entry) ? values.get(entry) : values.get(`${entry}/id`)) !== undefined)
      broughtBack.push(entry);
  }

  if (deleted.size > 0) {
    for (const entry of enteredSince(rows, deleted)) bringBack(entry);
    let named: string[];
    do {
      named = [...values]
        .flatMap(([path, value]) => namedRows(path, value))
        .filter((row) => deleted.has(row));
      named.forEach(bringBack);
    } while (named.length > 0);
  }
  return { fields: [...values].map(([path, value]) => ({ path, value })), broughtBack };
}

/** Deleted entries in which something was written that the deletion did not see. */
function enteredSince(fields: Fields, deleted: ReadonlyMap<string, Stamp>): string[] {
  const entries = new Set<string>();
  for (const [path, { value, stamp }] of fields) {
    const steps = path.split('/');
    if (isPlace(steps[steps.length - 1])) continue;
    for (let depth = steps.length - 1; depth >= 2; depth--) {
      const entry = steps.slice(0, depth).join('/');
      const deletion = deleted.get(entry);
      if (deletion && (value !== undefined || compareStamps(stamp, deletion) > 0)) entries.add(entry);
    }
  }
  return [...entries].sort();
}
