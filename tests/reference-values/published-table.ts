import { readFileSync } from 'node:fs';

/** Rows of a reference table by column name; lines that begin with `#` are notes. Blank cells are NaN. */
export function readTable(name: string): Record<string, number>[] {
  const text = readFileSync(new URL(name, import.meta.url), 'utf8');
  const [header, ...lines] = text.split(/\r?\n/).filter((line) => line && !line.startsWith('#'));
  const names = header.split(',');
  return lines.map((line) => {
    const cells = line.split(',');
    if (cells.length !== names.length) throw new Error(`${name}: ${cells.length} cells in "${line}"`);
    return Object.fromEntries(names.map((column, i) => [column, cells[i] === '' ? NaN : Number(cells[i])]));
  });
}
