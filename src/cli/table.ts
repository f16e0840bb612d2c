export interface Column {
  head: string;
  /** Text stands left, numbers stand right. */
  number?: boolean;
}

/** Rows as ruled text, a column as wide as its widest cell. */
export function table(columns: readonly Column[], rows: readonly (readonly string[])[]): string {
  const widths = columns.map(({ head }, i) =>
    rows.reduce((widest, row) => (row[i].length > widest ? row[i].length : widest), head.length),
  );
  const line = (cells: readonly string[]) =>
    cells
      .map((cell, i) => (columns[i].number ? cell.padStart(widths[i]) : cell.padEnd(widths[i])))
      .join('  ')
      .trimEnd();
  const rule = widths.map((width) => '-'.repeat(width)).join('  ');
  return [line(columns.map(({ head }) => head)), rule, ...rows.map(line), ''].join('\n');
}

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

export interface MonthsRow {
  label: string;
  /** Twelve cells and, where it has a meaning, one for the year. */
  cells: readonly string[];
}

/** A table with a column for each month and one for the year. */
export function monthsTable(rows: readonly MonthsRow[]): string {
  const columns = [{ head: '' }, ...[...MONTHS, 'Year'].map((head) => ({ head, number: true }))];
  return table(
    columns,
    rows.map(({ label, cells }) => [label, ...cells, ...Array<string>(13 - cells.length).fill('')]),
  );
}

/** A share as percent with one decimal; a dash where there is none. */
export const percent = (share: number | null): string => (share === null ? '-' : (share * 100).toFixed(1));

/** A number with a fixed count of decimals, thousands grouped. */
export const grouped = (value: number, decimals = 0): string =>
  value.toLocaleString('en-US', { minimumFractionDigits: decimals, maximumFractionDigits: decimals });
