const PLAIN_KEY = /^[A-Za-z_$][\w$-]*$/;

/** The path of a field or list item, such as `stations[0].traces`, one step below `base` (empty for the top). */
export function pathBelow(base: string, key: string | number): string {
  if (typeof key === 'number') return `${base}[${key}]`;
  if (!PLAIN_KEY.test(key))
    return `${base}[${JSON.stringify(key.length > 60 ? `${key.slice(0, 57)}…` : key)}]`;
  return base === '' ? key : `${base}.${key}`;
}

/** The path's last name with its list places, as the subject of a sentence. */
export const lastName = (path: string): string => path.slice(path.lastIndexOf('.') + 1);
