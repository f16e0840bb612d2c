import type { Problem } from '../core/survey/problem.ts';
import type { Parsed } from '../core/survey/problem.ts';
import { plainNumber } from './command.ts';

/** One row of a CSV table; what is wrong with its cells is gathered with the line. */
export interface CsvRow {
  text(column: string): string;
  /** NaN, with a problem noted, where the cell holds no number within the bounds. */
  number(column: string, low: number, high: number): number;
  problem(column: string, message: string): void;
}

/**
 * Reads a CSV table with a header row. `read` turns a row into a value, or into null where it has noted a problem. Columns may
 * stand in any order, more than are needed may be there, and empty lines are passed over.
 */
export function readCsv<T>(
  csv: string,
  columns: readonly string[],
  read: (row: CsvRow) => T | null,
): Parsed<T[]> {
  const lines = csv.replace(/^\ufeff/, '').split(/\r\n|\n|\r/);
  const headerIndex = lines.findIndex((line) => line.trim() !== '');
  if (headerIndex < 0)
    return {
      ok: false,
      problems: [
        {
          path: 'line 1',
          message: `The table is empty. Its first line must name the columns: ${columns.join(',')}.`,
        },
      ],
    };
  const header = cellsOf(lines[headerIndex]).map((name) => name.toLowerCase());
  const missing = columns.filter((name) => !header.includes(name));
  if (missing.length > 0)
    return {
      ok: false,
      problems: [
        {
          path: `line ${headerIndex + 1}`,
          message: `The header has no column ${missing.join(', ')}. It must name: ${columns.join(',')}.`,
        },
      ],
    };
  const problems: Problem[] = [];
  const values: T[] = [];
  for (let i = headerIndex + 1; i < lines.length; i++) {
    if (lines[i].trim() === '') continue;
    const value = read(csvRow(cellsOf(lines[i]), header, `line ${i + 1}`, problems));
    if (value !== null) values.push(value);
  }
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value: values, warnings: [] };
}

const cellsOf = (line: string) => line.split(',').map((cell) => cell.trim().replace(/^"(.*)"$/, '$1'));

function csvRow(cells: string[], header: string[], line: string, problems: Problem[]): CsvRow {
  const text = (column: string) => cells[header.indexOf(column)] ?? '';
  const problem = (column: string, message: string) =>
    void problems.push({
      path: `${line}, ${column}`,
      message: `${message} (found "${text(column).slice(0, 40)}")`,
    });
  return {
    text,
    problem,
    number(column, low, high) {
      const value = plainNumber(text(column)) ?? NaN;
      if (value >= low && value <= high) return value;
      problem(column, `must be a number from ${low} to ${high}`);
      return NaN;
    },
  };
}
