import { PLACE, keyOfStep, surveyLayout } from './field-layout.ts';
import type { FieldChange, ListLayout, ObjectLayout } from './field-layout.ts';
import { isRecord } from './json-value.ts';
import type { JsonRecord } from './json-value.ts';
import { inRecordOrder } from './record-order.ts';

/** Fields under one step of their paths. */
interface Branch {
  value: unknown;
  below: Map<string, Branch>;
}

/**
 * The survey that fields make, for `surveyFromJson` to check: the inverse of `fieldsOf`. The fields come in any order;
 * of two on one path the later counts, and an undefined value takes the field away. A row without its `id` field is
 * left out (it is deleted; what else was written in it stays in the fields), and so are paths that lead nowhere. The
 * document's fields are in the order of the record.
 */
export function surveyOf(fields: Iterable<FieldChange>): unknown {
  const root: Branch = { value: undefined, below: new Map() };
  for (const { path, value } of fields) {
    let branch = root;
    for (const step of path.split('/')) branch = branchAt(branch, step);
    branch.value = value;
  }
  return inRecordOrder(objectFrom(root, surveyLayout));
}

function branchAt(branch: Branch, step: string): Branch {
  let next = branch.below.get(step);
  if (!next) branch.below.set(step, (next = { value: undefined, below: new Map() }));
  return next;
}

function objectFrom(branch: Branch, layout: ObjectLayout): JsonRecord {
  const entries: [string, unknown][] = [];
  for (const [step, inner] of branch.below) {
    const key = keyOfStep(step);
    if (step === PLACE || (layout.lists && Object.hasOwn(layout.lists, key))) continue;
    if (layout.objects && Object.hasOwn(layout.objects, key) && inner.below.size > 0)
      entries.push([key, objectFrom(inner, layout.objects[key])]);
    else if (step.includes('+') && isRecord(inner.value)) entries.push(...Object.entries(inner.value));
    else if (inner.value !== undefined) entries.push([key, inner.value]);
  }
  for (const [key, list] of Object.entries(layout.lists ?? {})) {
    const value = listFrom(branch.below.get(key), list);
    if (value !== undefined) entries.push([key, value]);
  }
  return Object.fromEntries(entries);
}

function listFrom(branch: Branch | undefined, layout: ListLayout): unknown {
  const rows: PlacedRow[] = [];
  for (const [step, inner] of branch?.below ?? []) {
    const isThere = (layout.whole ? inner : inner.below.get('id'))?.value !== undefined;
    if (!isThere) continue;
    const row = layout.whole ? inner.value : objectFrom(inner, layout.row);
    const place = inner.below.get(PLACE)?.value ?? (row as JsonRecord)[layout.sortedBy];
    rows.push({ row, place, id: keyOfStep(step) });
  }
  if (rows.length === 0) return branch?.value ?? (layout.required ? [] : undefined);
  return rows.sort(byPlace).map(({ row }) => row);
}

interface PlacedRow {
  row: unknown;
  place: unknown;
  id: string;
}

/** Numbers before texts before nothing, each in its own order; equal ones by id. */
function byPlace(a: PlacedRow, b: PlacedRow): number {
  const byKind = rank(a.place) - rank(b.place);
  if (byKind !== 0) return byKind;
  if (a.place !== b.place) return (a.place as string | number) < (b.place as string | number) ? -1 : 1;
  return a.id < b.id ? -1 : a.id > b.id ? 1 : 0;
}

const rank = (place: unknown) => (typeof place === 'number' ? 0 : typeof place === 'string' ? 1 : 2);
