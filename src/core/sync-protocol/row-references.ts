import { pathStep } from '../survey/field-layout.ts';
import { isRecord } from '../survey/json-value.ts';

/** Fields that name a row, by the last step of their paths, with the list of that row. */
const LIST_NAMED: Readonly<Record<string, string>> = {
  run: 'runs',
  obstruction: 'obstructions',
  reading: 'readings',
  readings: 'readings',
  upright: 'readings',
  turned: 'readings',
  serves: 'planes',
  position: 'planes',
};

/**
 * Paths of the rows that the value of a field names, such as `planes/south` for `stations/A/serves`: the references
 * without which a survey cannot be read (see `reference-checks.ts`).
 */
export function namedRows(path: string, value: unknown): string[] {
  if (value === undefined) return [];
  if (path.startsWith('readings/')) return isRecord(value) ? rowsIn('runs', [value.run]) : [];
  const step = path.slice(path.lastIndexOf('/') + 1);
  if (!Object.hasOwn(LIST_NAMED, step)) return [];
  if (step === 'position') return isRecord(value) ? rowsIn('planes', [value.on]) : [];
  return rowsIn(LIST_NAMED[step], Array.isArray(value) ? value : [value]);
}

const rowsIn = (list: string, ids: unknown[]): string[] =>
  ids.flatMap((id) => (typeof id === 'string' ? [`${list}/${pathStep(id)}`] : []));
