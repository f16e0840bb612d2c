import type { JsonRecord } from './json-value.ts';
import { SURVEY_VERSION } from './survey.ts';

/** Brings a document of one released version to the next. */
export interface Migration {
  /** The version it reads; it writes `from + 1`, and sets it in the document. */
  from: number;
  name: string;
  migrate(document: JsonRecord): JsonRecord;
}

/** All migrations, oldest first, one for each released version but the newest. Version 1 is the first released. */
export const migrations: readonly Migration[] = [];

export interface Migrated {
  document: JsonRecord;
  /** Names of the migrations that ran, in order. */
  used: string[];
}

/**
 * Brings a document of `version` (a whole number, 1 to `newest`) to the newest version. Throws RangeError where a step
 * is missing from the list.
 */
export function migrated(
  document: JsonRecord,
  version: number,
  steps: readonly Migration[] = migrations,
  newest: number = SURVEY_VERSION,
): Migrated {
  const used: string[] = [];
  let current = document;
  for (let from = version; from < newest; from++) {
    const step = steps.find((each) => each.from === from);
    if (!step) throw new RangeError(`version has no migration, got ${from}`);
    current = step.migrate(current);
    used.push(step.name);
  }
  return { document: current, used };
}

/** Names of the listed migrations that no document has needed: a sample is missing for each. */
export const unusedMigrations = (steps: readonly Migration[], used: ReadonlySet<string>): string[] =>
  steps.filter((step) => !used.has(step.name)).map((step) => step.name);
