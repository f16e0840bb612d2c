import { isRecord } from './json-value.ts';
import type { JsonRecord } from './json-value.ts';
import { pathBelow } from './record-path.ts';

/** One object of a list, and where it stands. */
export interface Row {
  value: JsonRecord;
  path: string;
}

/**
 * The objects in a list of a document whose shape is not yet known to be right; what is no object is left out. So the
 * checks between fields can run beside the checks of each field, and a person gets all problems at once.
 */
export function rowsOf(owner: JsonRecord, key: string, ownerPath = ''): Row[] {
  const list = owner[key];
  if (!Array.isArray(list)) return [];
  const path = pathBelow(ownerPath, key);
  return list.flatMap((value: unknown, i) => (isRecord(value) ? [{ value, path: pathBelow(path, i) }] : []));
}

/** The texts in a list, with their paths. */
export function textsOf(owner: JsonRecord, key: string, ownerPath: string): { text: string; path: string }[] {
  const list = owner[key];
  if (!Array.isArray(list)) return [];
  const path = pathBelow(ownerPath, key);
  return list.flatMap((text: unknown, i) =>
    typeof text === 'string' ? [{ text, path: pathBelow(path, i) }] : [],
  );
}

/** Every trace of every station. */
export const tracesOf = (document: JsonRecord): Row[] =>
  rowsOf(document, 'stations').flatMap((station) => rowsOf(station.value, 'traces', station.path));

/** Every sighting of every station: those of its traces, then those of marks alone. */
export const sightingsOf = (document: JsonRecord): Row[] => [
  ...tracesOf(document).flatMap(({ value, path }) => rowsOf(value, 'sightings', path)),
  ...rowsOf(document, 'stations').flatMap(({ value, path }) => rowsOf(value, 'markSightings', path)),
];
