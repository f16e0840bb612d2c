/** Where a text stops being JSON: line and column, both from 1. */
export interface JsonFault {
  line: number;
  column: number;
}

const TOKEN =
  /[ \t\n\r]*(?:([{}[\],:])|("(?:[^"\\\u0000-\u001f]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*")|(-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null)(?![\w.]))/y;

/** What may come next: a value, a key, the colon after a key, or a comma or bracket after a value. */
type Expected = 'value' | 'value-or-end' | 'key' | 'key-or-end' | 'colon' | 'after';

/**
 * Finds the first place where a text that `JSON.parse` refused breaks the rules; null where it finds none. Platforms
 * word this differently or not at all, so the place is found here. Reads any depth without recursion.
 * Ref: RFC 8259 (2017), sections 2 to 7.
 */
export function jsonFault(text: string): JsonFault | null {
  const open: string[] = [];
  let expected: Expected = 'value';
  let at = 0;
  for (;;) {
    const done = expected === 'after' && open.length === 0;
    TOKEN.lastIndex = at;
    const token = TOKEN.exec(text);
    if (!token) {
      const next = at + (/^[ \t\n\r]*/.exec(text.slice(at))?.[0].length ?? 0);
      return done && next >= text.length ? null : placeOf(text, next);
    }
    const [whole, mark, string] = token;
    const step: Expected | null = mark
      ? afterMark(mark, expected, open)
      : afterScalar(string !== undefined, expected);
    if (done || step === null) return placeOf(text, at + whole.length - whole.trimStart().length);
    expected = step;
    at += whole.length;
  }
}

function afterScalar(isString: boolean, expected: Expected): Expected | null {
  if (expected === 'value' || expected === 'value-or-end') return 'after';
  if ((expected === 'key' || expected === 'key-or-end') && isString) return 'colon';
  return null;
}

function afterMark(mark: string, expected: Expected, open: string[]): Expected | null {
  const within = open.at(-1);
  if (mark === ':') return expected === 'colon' ? 'value' : null;
  if (mark === ',') return expected === 'after' ? (within === '{' ? 'key' : 'value') : null;
  if (mark === '{' || mark === '[') {
    if (expected !== 'value' && expected !== 'value-or-end') return null;
    open.push(mark);
    return mark === '{' ? 'key-or-end' : 'value-or-end';
  }
  const mayEnd = expected === 'after' || expected === (mark === '}' ? 'key-or-end' : 'value-or-end');
  if (!mayEnd || within !== (mark === '}' ? '{' : '[')) return null;
  open.pop();
  return 'after';
}

function placeOf(text: string, offset: number): JsonFault {
  const before = text.slice(0, offset);
  const lastBreak = before.lastIndexOf('\n');
  return { line: before.split('\n').length, column: offset - lastBreak };
}
