/**
 * A document as one text that does not depend on the order of its fields: JSON without spaces, names sorted by code unit
 * (after RFC 8785, 3.2.3), lists as they stand, absent fields left out. Its hash is the survey's fingerprint.
 */
export function canonicalText(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map((item) => canonicalText(item ?? null)).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const fields = Object.entries(value)
    .filter(([, field]) => field !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1));
  return `{${fields.map(([name, field]) => `${JSON.stringify(name)}:${canonicalText(field)}`).join(',')}}`;
}
