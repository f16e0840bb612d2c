import type { JsonValue } from './json-value.ts';

/** Whether two JSON values are equal, whatever the order of their keys. A field that is undefined counts as absent. */
export function sameJson(a: JsonValue | undefined, b: JsonValue | undefined): boolean {
  if (Object.is(a, b) || a === b) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) || Array.isArray(b))
    return (
      Array.isArray(a) &&
      Array.isArray(b) &&
      a.length === b.length &&
      a.every((item, i) => sameJson(item, b[i]))
    );
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].every((key) => sameJson(ownValue(a, key), ownValue(b, key)));
}

const ownValue = (object: { [key: string]: JsonValue }, key: string) =>
  Object.hasOwn(object, key) ? object[key] : undefined;
