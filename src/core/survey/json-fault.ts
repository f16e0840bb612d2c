/** Where a text stops being JSON: line and column, both from 1. */
export interface JsonFault {
  line: number;
  column: number;
}

const SPACE = /[ \t\n\r]*/y;
const PLAIN = /[^"\\\u0000-\u001f]*/y;
const ESCAPE = /\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4})/y;
const SCALAR = /(?:-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null)(?![\w.])/y;
const MARKS = '{}[],:';

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
    const start = endOf(SPACE, text, at);
    const done = expected === 'after' && open.length === 0;
    if (start >= text.length) return done ? null : placeOf(text, start);
    const sign = text[start];
    const isMark = MARKS.includes(sign);
    const next: Expected | null = isMark
      ? afterMark(sign, expected, open)
      : afterScalar(sign === '"', expected);
    if (done || next === null) return placeOf(text, start);
    const end = isMark ? start + 1 : sign === '"' ? endOfString(text, start) : endOf(SCALAR, text, start);
    if (end <= 0) return placeOf(text, end === NO_MATCH ? start : -end);
    expected = next;
    at = end;
  }
}

const NO_MATCH = -1;

/** Where a pattern that must match at `at` ends; -1 where it does not match. */
function endOf(pattern: RegExp, text: string, at: number): number {
  pattern.lastIndex = at;
  return pattern.test(text) ? pattern.lastIndex : NO_MATCH;
}

/** Where a string that starts at `start` ends; less than -1 where it breaks off: the negative of that place. */
function endOfString(text: string, start: number): number {
  let at = endOf(PLAIN, text, start + 1);
  while (text[at] !== '"') {
    const next = endOf(ESCAPE, text, at);
    if (next === NO_MATCH) return -at;
    at = endOf(PLAIN, text, next);
  }
  return at + 1;
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
