import { isRecord } from './json-value.ts';
import { ProblemList } from './problem-list.ts';
import type { Problem } from './problem.ts';
import { pathBelow } from './record-path.ts';
import { schemaBelow, schemaFor } from './schema-walk.ts';
import type { SchemaNode } from './schema-walk.ts';

/**
 * Fields of a document that its schema does not name, one warning for each sort of place (the same field in every
 * reading is one warning). They are kept, so that a newer app's work survives an older one.
 */
export function unknownFields(schema: SchemaNode, document: unknown): Problem[] {
  const seen = new Map<string, { path: string; count: number }>();
  const walk = (node: SchemaNode, value: unknown, path: string, sort: string): void => {
    const own = schemaFor(node, value);
    if (Array.isArray(value)) {
      value.forEach((item, i) => {
        const below = schemaBelow(own, i);
        if (below) walk(below, item, pathBelow(path, i), `${sort}[]`);
      });
    } else if (isRecord(value) && own.entries) {
      for (const key of Object.keys(value)) {
        const below = schemaBelow(own, key);
        const belowSort = pathBelow(sort, key);
        if (below) walk(below, value[key], pathBelow(path, key), belowSort);
        else note(seen, belowSort, pathBelow(path, key));
      }
    }
  };
  walk(schema, document, '', '');
  const warnings = new ProblemList();
  for (const { path, count } of seen.values()) warnings.add(path, sentence(count));
  return warnings.list();
}

function note(seen: Map<string, { path: string; count: number }>, sort: string, path: string): void {
  const known = seen.get(sort);
  if (known) known.count++;
  else seen.set(sort, { path, count: 1 });
}

function sentence(count: number): string {
  const more = count > 1 ? ` (and in ${count - 1} more such places)` : '';
  return `This field is not known to this version of Noonmark${more}. It is kept as it is and changes no result.`;
}
