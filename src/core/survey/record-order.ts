import { isRecord } from './json-value.ts';
import { schemaBelow, schemaFor } from './schema-walk.ts';
import type { SchemaNode } from './schema-walk.ts';
import { surveySchema } from './survey-schema.ts';

/**
 * A document with its fields in the order of the record (format, version, id, title, …) and unknown ones after, by
 * name: so that a file reads the same way round, and two exports of one survey are the same text.
 */
export const inRecordOrder = (document: unknown): unknown => ordered(document, surveySchema);

function ordered(value: unknown, schema: SchemaNode | null): unknown {
  const own = schema && schemaFor(schema, value);
  if (Array.isArray(value)) return value.map((item: unknown, i) => ordered(item, own && schemaBelow(own, i)));
  if (!isRecord(value)) return value;
  const known = Object.keys(own?.entries ?? {}).filter((key) => Object.hasOwn(value, key));
  const others = Object.keys(value)
    .filter((key) => !own?.entries || !Object.hasOwn(own.entries, key))
    .sort();
  return Object.fromEntries(
    [...known, ...others].map((key) => [key, ordered(value[key], own && schemaBelow(own, key))]),
  );
}
