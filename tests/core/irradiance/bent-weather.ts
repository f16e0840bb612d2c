import { weatherText } from '../../reference-values/weather-text.ts';

export const EPW = 'USA_AZ_Tucson.Intl.AP.722740_TMY3.epw';
export const TMY3 = 'USA_AZ_Phoenix.722780.tmy3.csv';

/** Lines before the first hour. */
export const headerLines = (name: string): number => (name.endsWith('.csv') ? 2 : 8);

/** Text of a weather file after its lines went through `bend`; `first` is the index of the first hour. */
export function bentLines(name: string, bend: (lines: string[], first: number) => void): string {
  const lines = weatherText(name).trimEnd().split(/\r?\n/);
  bend(lines, headerLines(name));
  return `${lines.join('\n')}\n`;
}

/** The same with one cell changed: of the hour `hour` (from 0), in the column `column` (from 0). */
export const withCell = (name: string, hour: number, column: number, value: string): string =>
  bentLines(name, (lines, first) => {
    const cells = lines[first + hour].split(',');
    cells[column] = value;
    lines[first + hour] = cells.join(',');
  });
