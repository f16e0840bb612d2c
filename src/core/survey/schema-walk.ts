import { isRecord } from './json-value.ts';

/** What this file needs to know of a valibot schema. */
export interface SchemaNode {
  type: string;
  entries?: Record<string, SchemaNode>;
  wrapped?: SchemaNode;
  item?: SchemaNode;
  items?: readonly SchemaNode[];
  options?: readonly (SchemaNode | string)[];
  message?: unknown;
  literal?: unknown;
}

/** The schema that speaks for a value: optional unwrapped, of several the one whose fields fit best. */
export function schemaFor(schema: SchemaNode, value: unknown): SchemaNode {
  if (schema.wrapped) return schemaFor(schema.wrapped, value);
  if (schema.type !== 'union' && schema.type !== 'variant') return schema;
  const options = (schema.options ?? []).filter((option) => typeof option !== 'string');
  let best = options[0];
  for (const option of options) if (fit(option, value) > fit(best, value)) best = option;
  return best;
}

function fit(schema: SchemaNode, value: unknown): number {
  if (!isRecord(value) || !schema.entries)
    return Array.isArray(value) === (schema.items !== undefined) ? 0.5 : 0;
  let known = 0;
  for (const [key, entry] of Object.entries(schema.entries)) {
    if (!Object.hasOwn(value, key)) continue;
    if (entry.type === 'literal' && entry.literal !== value[key]) return 0;
    known++;
  }
  return known;
}

/** The schema of a field or list item; null where the schema does not name it. */
export function schemaBelow(schema: SchemaNode, key: string | number): SchemaNode | null {
  if (typeof key === 'number') return schema.item ?? schema.items?.[key] ?? null;
  return schema.entries && Object.hasOwn(schema.entries, key) ? schema.entries[key] : null;
}
