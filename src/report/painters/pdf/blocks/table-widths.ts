/** What a column asks for: its longest word, and its longest text on one line; in points. */
export interface ColumnNeed {
  word: number;
  whole: number;
}

/**
 * Shares a width among columns: each gets its longest word, the rest goes where lines would break. Where not even the
 * words have room all are cut down alike, and their words are broken.
 */
export function tableWidths(needs: readonly ColumnNeed[], width: number): number[] {
  const words = sum(needs.map(({ word }) => word));
  if (words >= width) return cutDown(needs, width);
  const wholes = sum(needs.map(({ whole }) => whole));
  if (wholes <= width) {
    const spare = (width - wholes) / needs.length;
    return needs.map(({ whole }) => whole + spare);
  }
  const wanted = wholes - words;
  return needs.map(({ word, whole }) => word + ((whole - word) / wanted) * (width - words));
}

/** Narrow columns keep their words; what is left is shared by the wide ones. */
function cutDown(needs: readonly ColumnNeed[], width: number): number[] {
  const order = needs.map((_, i) => i).sort((a, b) => needs[a].word - needs[b].word);
  const widths = needs.map(() => 0);
  let left = width;
  order.forEach((column, place) => {
    widths[column] = Math.min(needs[column].word, left / (order.length - place));
    left -= widths[column];
  });
  return widths;
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
