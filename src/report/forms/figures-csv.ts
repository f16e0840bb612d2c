import type { FigureRow } from './figure-row.ts';
import { FIGURE_COLUMNS } from './figure-row.ts';

/**
 * Figures as a CSV table (RFC 4180): a line of heads, lines ended by CR LF, decimal points whatever the language, nothing
 * where a figure is not known. UTF-8 without a mark before it.
 */
export const figuresCsv = (rows: readonly FigureRow[]): string =>
  [FIGURE_COLUMNS, ...rows.map((row) => FIGURE_COLUMNS.map((column) => row[column]))]
    .map((cells) => `${cells.map(cell).join(',')}\r\n`)
    .join('');

function cell(value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const text = asWords(value);
  return /[",\r\n]/.test(text) ? `"${text.replace(/"/g, '""')}"` : text;
}

/**
 * A name that a spreadsheet would take for a formula begins with an apostrophe, which marks words there: `=`, `+`, `-`, `@`
 * and their wide forms, a tab, an end of line, also after spaces.
 */
const asWords = (text: string) => (/^\s*[=+\-@\t\r\n＝＋－＠]/.test(text) ? `'${text}` : text);
