import { readFileSync } from 'node:fs';

/** Rows of a table of this folder by column name; lines that begin with # are comments. */
export function readTable(name: string): Record<string, string>[] {
  const lines = readFileSync(new URL(name, import.meta.url), 'utf8')
    .split(/\r?\n/)
    .filter((line) => line !== '' && !line.startsWith('#'));
  const [header, ...rows] = lines.map((line) => line.split(','));
  return rows.map((row) => Object.fromEntries(header.map((column, i) => [column, row[i]])));
}

/** A number that must be there: an empty or broken cell fails the test that reads it. */
export function cell(row: Record<string, string>, column: string): number {
  const text = row[column];
  const value = Number(text);
  if (text === undefined || text.trim() === '' || !Number.isFinite(value))
    throw new Error(`no number in column ${column}: ${text}`);
  return value;
}

export interface PublishedExample {
  id: string;
  source: string;
  input: Record<string, number>;
  expected: unknown;
}

/** One entry of published_examples.json. */
export function publishedExample(id: string): PublishedExample {
  const path = new URL('published_examples.json', import.meta.url);
  const entries = JSON.parse(readFileSync(path, 'utf8')) as PublishedExample[];
  const found = entries.find((entry) => entry.id === id);
  if (!found) throw new Error(`no published example ${id}`);
  return found;
}
