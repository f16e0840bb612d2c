import { baseOf } from './text-slugs.ts';
import type { Sheet } from './sheet.ts';
import type { Slug } from './slug.ts';
import type { TextStyle } from './text-style.ts';

/** Text of one cell, broken into lines. */
export interface Cell {
  lines: string[];
  style: TextStyle;
  /** Left edge on the paper. */
  x: number;
  width: number;
  right?: boolean;
  /** Stands on the row's last line rather than on its first. */
  low?: boolean;
}

export interface RowLook {
  above: number;
  below: number;
  /** Rules around it; `y` is the top of the piece painted. */
  rules?: (sheet: Sheet, y: number, height: number, first: boolean, last: boolean) => void;
}

/** A row higher than this share of the text's frame may be cut between its lines. */
const UNCUT = 0.5;

/** Cells side by side as one piece, or line by line where they are too high for that. */
export function rowSlugs(cells: readonly Cell[], look: RowLook, pageHeight: number): Slug[] {
  const count = Math.max(1, ...cells.map(({ lines }) => lines.length));
  const leading = Math.max(...cells.map(({ style }) => style.leading));
  const whole = look.above + count * leading + look.below;
  const piece = (from: number, to: number): Slug => {
    const [first, last] = [from === 0, to === count];
    const above = first ? look.above : 0;
    const height = above + (to - from) * leading + (last ? look.below : 0);
    return {
      height,
      paint: (sheet, y) => {
        look.rules?.(sheet, y, height, first, last);
        for (const cell of cells) paintLines(sheet, cell, from, to, count, y + above, leading);
      },
    };
  };
  if (whole <= pageHeight * UNCUT) return [piece(0, count)];
  return Array.from({ length: count }, (_, line) => piece(line, line + 1));
}

function paintLines(
  sheet: Sheet,
  cell: Cell,
  from: number,
  to: number,
  count: number,
  top: number,
  leading: number,
): void {
  const { lines, style, x, width, right, low } = cell;
  const shift = low ? count - lines.length : 0;
  for (let place = from; place < to; place++) {
    const line = lines[place - shift];
    if (line === undefined) continue;
    const start = right ? x + width - sheet.setter.width(line, style) : x;
    sheet.text(line, start, top + (place - from) * leading + baseOf(style), style);
  }
}
