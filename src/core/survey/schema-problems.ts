import * as v from 'valibot';
import { shown } from './json-value.ts';
import type { ProblemList } from './problem-list.ts';
import { lastName, pathBelow } from './record-path.ts';
import { schemaBelow, schemaFor } from './schema-walk.ts';
import type { SchemaNode } from './schema-walk.ts';
import { surveySchema } from './survey-schema.ts';

/** Adds a problem for each place where a document differs from the record's shape. */
export function addSchemaProblems(document: unknown, problems: ProblemList): void {
  const listsForObjects = new Set<string>();
  for (const issue of v.safeParse(surveySchema, document).issues ?? []) {
    const steps = issue.path ?? [];
    const keys = steps.map(({ key }) => key as string | number);
    const wrongList = steps.findIndex(({ key, input }) => Array.isArray(input) && typeof key === 'string');
    if (wrongList < 0 && !isExcess(issue)) {
      addProblem(document, keys, issue.input, issue.message, problems);
      continue;
    }
    // What is wrong is the list itself: it stands for an object, or has one item too many.
    const depth = wrongList < 0 ? keys.length - 1 : wrongList;
    const above = keys.slice(0, depth);
    const path = pathOf(above);
    if (listsForObjects.has(path)) continue;
    listsForObjects.add(path);
    addProblem(document, above, steps[depth].input, phraseAt(document, above), problems);
  }
}

const isExcess = (issue: v.BaseIssue<unknown>) => issue.type === 'strict_tuple' && issue.expected === 'never';

const pathOf = (keys: (string | number)[]) => keys.reduce<string>(pathBelow, '') || 'file';

function addProblem(
  document: unknown,
  keys: (string | number)[],
  input: unknown,
  phrase: string | null,
  problems: ProblemList,
): void {
  const path = pathOf(keys);
  if (input === undefined) {
    const wanted = phraseAt(document, keys);
    problems.add(path, `${lastName(path)} is missing. ${wanted ? `Give ${wanted}` : 'Add it'}.`);
  } else problems.add(path, `${lastName(path)} must be ${phrase}; it is ${shown(input)}. Correct it.`);
}

/** The phrase of the schema at the end of a path, for fields that are not there at all. */
function phraseAt(document: unknown, keys: (string | number)[]): string | null {
  let schema: SchemaNode | null = surveySchema;
  let value = document;
  for (const key of keys) {
    schema = schemaBelow(schemaFor(schema, value), key);
    if (!schema) return null;
    value = (value as Record<string | number, unknown> | undefined)?.[key];
  }
  while (schema.wrapped) schema = schema.wrapped;
  return typeof schema.message === 'string' ? schema.message : null;
}
