import * as v from 'valibot';
import { shown } from './json-value.ts';
import type { ProblemList } from './problem-list.ts';
import { lastName, pathBelow } from './record-path.ts';
import { schemaBelow, schemaFor } from './schema-walk.ts';
import type { SchemaNode } from './schema-walk.ts';
import { surveySchema } from './survey-schema.ts';

/** Adds a problem for each place where a document differs from the record's shape. */
export function addSchemaProblems(document: unknown, problems: ProblemList): void {
  const result = v.safeParse(surveySchema, document);
  for (const issue of result.issues ?? []) {
    const keys = (issue.path ?? []).map((step) => step.key as string | number);
    if (isExcess(issue)) keys.pop(); // what is wrong is the list that has one item too many
    const path = keys.reduce<string>(pathBelow, '') || 'file';
    const phrase = issue.input === undefined ? phraseAt(document, keys) : issue.message;
    problems.add(
      path,
      sentence(lastName(path), isExcess(issue) ? issue.path?.at(-1)?.input : issue.input, phrase),
    );
  }
}

const isExcess = (issue: v.BaseIssue<unknown>) => issue.type === 'strict_tuple' && issue.expected === 'never';

function sentence(name: string, input: unknown, phrase: string | null): string {
  if (input === undefined) return `${name} is missing. ${phrase ? `Give ${phrase}` : 'Add it'}.`;
  return `${name} must be ${phrase}; it is ${shown(input)}. Correct it.`;
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
