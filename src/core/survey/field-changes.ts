import { PLACE, pathStep, surveyLayout, togetherStep } from './field-layout.ts';
import type { FieldChange, ListLayout, ObjectLayout } from './field-layout.ts';
import { isRecord } from './json-value.ts';
import type { JsonRecord, JsonValue } from './json-value.ts';
import { sameJson } from './same-json.ts';
import type { Survey } from './survey.ts';

export type { FieldChange } from './field-layout.ts';
export { surveyOf } from './field-projection.ts';

/** A survey's fields by path, and the row ids of each list whose places are written. */
interface LaidOut {
  fields: Map<string, JsonValue>;
  placed: Map<string, string[]>;
}

/**
 * A survey as fields on flat paths, such as `title`, `site/latitude+longitude`, `planes/south/surfaceTilt`,
 * `stations/A/traces/t1/sightings/s3/azimuth`; a raw reading is one field, `readings/r9`.
 *
 * A row of a list is there while its `id` field is. The list's order is that of its sort key (`order`; time for runs
 * and readings), then of the ids; where the survey has its rows otherwise, each row has a field `#` with its place.
 * Values are not copied.
 */
export function fieldsOf(survey: Survey): FieldChange[] {
  return [...laidOut(survey).fields].map(([path, value]) => ({ path, value }));
}

/**
 * The changes that turn one survey's fields into another's. Where a list with places gains, loses or moves a row, the
 * places of all its rows are written, so that they hold whatever places were stored before.
 */
export function changesBetween(before: Survey, after: Survey): FieldChange[] {
  const old = laidOut(before);
  const now = laidOut(after);
  const changes = new Map<string, JsonValue | undefined>();
  for (const path of old.fields.keys()) if (!now.fields.has(path)) changes.set(path, undefined);
  for (const [path, value] of now.fields)
    if (!old.fields.has(path) || !sameJson(old.fields.get(path), value)) changes.set(path, value);
  for (const [list, steps] of now.placed) {
    if (sameJson(old.placed.get(list) ?? null, steps)) continue;
    for (const step of steps) {
      const path = `${list}/${step}/${PLACE}`;
      changes.set(path, now.fields.get(path));
    }
  }
  return [...changes].map(([path, value]) => ({ path, value }));
}

function laidOut(survey: Survey): LaidOut {
  const out: LaidOut = { fields: new Map(), placed: new Map() };
  layObject(survey as unknown as JsonRecord, surveyLayout, '', out);
  return out;
}

function layObject(object: JsonRecord, layout: ObjectLayout, prefix: string, out: LaidOut): void {
  const together = layout.together ?? [];
  const isTogether = together.length > 0 && together.every((key) => object[key] !== undefined);
  if (isTogether)
    out.fields.set(
      prefix + togetherStep(together),
      Object.fromEntries(together.map((key) => [key, object[key] as JsonValue])),
    );
  for (const key of Object.keys(object)) {
    const value = object[key];
    if (value === undefined || (isTogether && together.includes(key))) continue;
    const path = prefix + pathStep(key);
    const list = own(layout.lists, key);
    const inner = own(layout.objects, key);
    if (list && isRowList(value)) layList(value, list, path, out);
    else if (inner && isRecord(value)) layObject(value, inner, `${path}/`, out);
    else out.fields.set(path, value as JsonValue);
  }
}

function layList(rows: IdentifiedRow[], layout: ListLayout, path: string, out: LaidOut): void {
  if (rows.length === 0 && !layout.required) out.fields.set(path, []);
  const steps = rows.map(({ id }) => pathStep(id));
  const needsPlaces = !rows.every((row, i) => i === 0 || isBefore(rows[i - 1], row, layout.sortedBy));
  if (needsPlaces) out.placed.set(path, steps);
  rows.forEach((row, i) => {
    const rowPath = `${path}/${steps[i]}`;
    if (needsPlaces) out.fields.set(`${rowPath}/${PLACE}`, i);
    if (layout.whole) out.fields.set(rowPath, row as JsonValue);
    else layObject(row, layout.row, `${rowPath}/`, out);
  });
}

type IdentifiedRow = JsonRecord & { id: string };

/** A list whose rows can be told apart by their ids. */
function isRowList(value: unknown): value is IdentifiedRow[] {
  if (!Array.isArray(value)) return false;
  const ids = value.map((row: unknown) => (isRecord(row) ? row.id : undefined));
  return ids.every((id) => typeof id === 'string') && new Set(ids).size === ids.length;
}

/** Whether the sort key and then the id put a row before the next, so that no place need be written. */
function isBefore(row: IdentifiedRow, next: IdentifiedRow, key: string): boolean {
  const a = row[key] as string | number | undefined;
  const b = next[key] as string | number | undefined;
  if (a === undefined || b === undefined || typeof a !== typeof b) return false;
  return a < b || (a === b && row.id < next.id);
}

/** A layout's own entry; a key such as `constructor` has none. */
const own = <T>(table: Readonly<Record<string, T>> | undefined, key: string): T | undefined =>
  table && Object.hasOwn(table, key) ? table[key] : undefined;
