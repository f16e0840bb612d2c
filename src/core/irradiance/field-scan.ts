/** Columns that can be read; more are only counted. */
export const MOST_COLUMNS = 80;
const LONGEST_HEADER_LINE = 5000;

/**
 * Reads comma-separated lines in place: one pass over the characters, no copies but of odd numbers. Weather files have
 * 8,760 lines of up to 71 columns, of which seven are wanted.
 */
export class FieldScan {
  readonly text: string;
  /** Where each of the first columns begins, and one past the comma of the last of them. */
  readonly starts = new Int32Array(MOST_COLUMNS);
  /** Columns of the line read last. */
  columns = 0;
  /** Number of the line read last, counted from 1. */
  line = 0;
  private next: number;

  constructor(text: string) {
    this.text = text;
    this.next = text.charCodeAt(0) === 0xfeff ? 1 : 0;
  }

  /** Goes to the next line that is not empty and splits it; false at the end of the text. */
  nextLine(): boolean {
    const { text, starts } = this;
    const end = text.length;
    let at = this.next;
    while (at < end) {
      const from = at;
      let columns = 1;
      starts[0] = from;
      let code = 0;
      for (; at < end; at++) {
        code = text.charCodeAt(at);
        if (code === 44) {
          if (columns < MOST_COLUMNS) starts[columns] = at + 1;
          columns++;
        } else if (code === 10 || code === 13) break;
      }
      this.line++;
      const lineEnd = at;
      if (code === 13 && text.charCodeAt(at + 1) === 10) at++;
      at++;
      if (lineEnd === from) continue;
      if (columns < MOST_COLUMNS) starts[columns] = lineEnd + 1;
      this.columns = columns;
      this.next = at;
      return true;
    }
    this.next = end;
    return false;
  }

  /** Text of a column, without blanks around it. */
  textAt(column: number): string {
    return column < this.columns
      ? this.text.slice(this.starts[column], this.starts[column + 1] - 1).trim()
      : '';
  }

  /** The line, or its first 5,000 characters. */
  wholeLine(): string {
    const [from] = this.starts;
    const start = this.text.slice(from, from + LONGEST_HEADER_LINE);
    return start.slice(0, start.search(/[\r\n]|$/));
  }

  /** Number in a column; NaN where there is none. */
  numberAt(column: number): number {
    if (column >= this.columns || column >= MOST_COLUMNS - 1) return NaN;
    const to = this.starts[column + 1] - 1;
    let at = this.starts[column];
    const negative = this.text.charCodeAt(at) === 45;
    if (negative) at++;
    let value = 0;
    let scale = 0; // 0 before the point, then 10, 100, ...
    if (at >= to) return NaN;
    for (; at < to; at++) {
      const code = this.text.charCodeAt(at);
      if (code >= 48 && code <= 57) {
        value = value * 10 + (code - 48);
        scale *= 10;
      } else if (code === 46 && scale === 0) scale = 1;
      else return this.oddNumber(column);
    }
    if (scale > 1) value /= scale;
    return negative ? -value : value;
  }

  private oddNumber(column: number): number {
    const text = this.textAt(column);
    return text === '' ? NaN : Number(text);
  }
}

/** Splits one line with quoted fields (a header), blanks around fields removed. */
export function splitQuoted(line: string): string[] {
  return [...line.matchAll(/(?:^|,)\s*(?:"([^"]*)"|([^,]*))/g)].map((found) =>
    (found[1] ?? found[2] ?? '').trim(),
  );
}
