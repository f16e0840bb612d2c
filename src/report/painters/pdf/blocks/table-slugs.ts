import type { Table } from '../../../contents/report-contents.ts';
import type { Cell } from '../cell-row.ts';
import { rowSlugs } from '../cell-row.ts';
import type { Setting } from '../setting.ts';
import type { Slug } from '../slug.ts';
import { STYLES } from '../text-style.ts';
import type { TextStyle } from '../text-style.ts';
import { textSlugs } from '../text-slugs.ts';
import { textExtent, wrapText } from '../wrap-text.ts';
import { tableWidths } from './table-widths.ts';

/** From large to small: the first in which every word has room is taken, else the last. */
const SIZES = [9, 8, 7.2, 6.5];
const LEADING = 1.36;
/** Between columns, in points for each point of type. */
const BETWEEN = 1.25;

/** After a column of numbers, which end at its right edge, before one of words; beside what stands between columns. */
const AFTER_NUMBERS = 1;
/** Up to this many rows a table stands on one page: the months of a year with their sum. */
const FEW_ROWS = 14;
/** Heads that take more than this share of a page stand only once. */
const HIGHEST_REPEATED = 0.3;

interface TableSetting {
  setting: Setting;
  table: Table;
  size: number;
  lefts: number[];
  widths: number[];
}

/** A ruled table whose heads stand again on every page it runs over. */
export function tableSlugs(table: Table, setting: Setting): Slug[] {
  if (table.columns.length === 0) return textSlugs(table.caption, STYLES.caption, setting, { gap: 12 });
  const fitted = fitTable(table, setting);
  const heads = headSlugs(fitted);
  const headHeight = heads.reduce((sum, { height }) => sum + height, 0);
  const repeat = headHeight <= setting.height * HIGHEST_REPEATED ? heads : [];
  const [rows, sums] = [table.rows, table.sums ?? []].map((some, kind) =>
    some.flatMap((row, place) =>
      rowSlugsOf(row, fitted, kind === 1, place === 0 && (kind === 0 || table.rows.length === 0)).map(
        (slug) => ({ ...slug, repeat }),
      ),
    ),
  );
  const body = [...rows, ...sums];
  // no row stands alone at the foot or the head of a page
  for (const row of [rows[0], rows.at(-2)]) if (row) row.keep = true;
  if (body.length <= FEW_ROWS) for (const row of body.slice(0, -1)) row.keep = true;
  // sums stand with the last row they sum up
  if (rows.length > 0 && sums.length > 0) rows.at(-1)!.keep = true;
  return [
    ...textSlugs(table.caption, STYLES.caption, setting, { gap: 14, keep: true }),
    ...heads.map((head, place) => ({ ...head, gap: place === 0 ? 5 : 0, keep: body.length > 0 })),
    ...body,
    endRule(setting),
  ];
}

function fitTable(table: Table, setting: Setting): TableSetting {
  for (const size of SIZES) {
    const between = size * BETWEEN;
    const gaps = table.columns.map(({ number }, column) => {
      if (column === 0) return 0;
      return between + (table.columns[column - 1].number && !number ? size * AFTER_NUMBERS : 0);
    });
    const room = setting.width - gaps.reduce((sum, gap) => sum + gap, 0);
    const needs = table.columns.map((_, column) => columnNeed(table, column, size, setting));
    const fits = needs.reduce((total, { word }) => total + word, 0) <= room;
    if (!fits && size !== SIZES.at(-1)) continue;
    const widths = tableWidths(needs, Math.max(room, 0));
    let x = setting.left;
    const lefts = widths.map((width, column) => {
      const left = x + gaps[column];
      x = left + width;
      return left;
    });
    return { setting, table, size, lefts, widths };
  }
  throw new RangeError('sizes of a table');
}

function columnNeed({ columns, rows, sums = [] }: Table, column: number, size: number, { setter }: Setting) {
  const texts = [
    [columns[column].head, cellStyle(size, 'faint')] as const,
    ...rows.map((row) => [row[column] ?? '', cellStyle(size)] as const),
    ...sums.map((row) => [row[column] ?? '', cellStyle(size, 'bold')] as const),
  ];
  const need = { word: size * 1.2, whole: size * 1.2 };
  for (const [text, style] of texts) {
    const { word, whole } = textExtent(text, style, setter);
    need.word = Math.max(need.word, word + 0.01);
    need.whole = Math.max(need.whole, whole + 0.01);
  }
  return need;
}

function cellStyle(size: number, look?: 'bold' | 'faint'): TextStyle {
  return {
    face: look === 'bold' ? 'bold' : 'regular',
    size,
    leading: size * LEADING,
    tone: look === 'faint' ? 'faint' : 'ink',
  };
}

function cellsOf(texts: readonly string[], style: TextStyle, fitted: TableSetting, low: boolean): Cell[] {
  const { table, lefts, widths, setting } = fitted;
  return table.columns.map(({ number }, column) => ({
    lines: wrapText(texts[column] ?? '', widths[column], style, setting.setter),
    style,
    x: lefts[column],
    width: widths[column],
    right: number ?? false,
    low,
  }));
}

function headSlugs(fitted: TableSetting): Slug[] {
  const { setting, table, size } = fitted;
  const heads = table.columns.map(({ head }) => head);
  return rowSlugs(
    cellsOf(heads, cellStyle(size, 'faint'), fitted, true),
    {
      above: 3.5,
      below: 3,
      rules: (sheet, y, height, first, last) => {
        if (first) sheet.rule(setting.left, y, setting.width, 1.4, 'ink');
        if (last) sheet.rule(setting.left, y + height, setting.width, 0.7, 'ink');
      },
    },
    setting.height,
  );
}

function rowSlugsOf(row: readonly string[], fitted: TableSetting, isSum: boolean, first: boolean): Slug[] {
  const { setting, size } = fitted;
  return rowSlugs(
    cellsOf(row, cellStyle(size, isSum ? 'bold' : undefined), fitted, false),
    {
      above: 2.5,
      below: 2.5,
      rules: (sheet, y, _height, top) => {
        if (top && !first)
          sheet.rule(setting.left, y, setting.width, isSum ? 0.7 : 0.5, isSum ? 'ink' : 'rule');
      },
    },
    setting.height,
  );
}

const endRule = ({ left, width }: Setting): Slug => ({
  height: 0,
  paint: (sheet, y) => sheet.rule(left, y, width, 1.4, 'ink'),
});
