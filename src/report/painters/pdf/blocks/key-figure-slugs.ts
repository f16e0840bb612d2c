import type { KeyFigure } from '../../../contents/report-contents.ts';
import type { Cell } from '../cell-row.ts';
import { rowSlugs } from '../cell-row.ts';
import type { Setting } from '../setting.ts';
import type { Sheet } from '../sheet.ts';
import type { Slug } from '../slug.ts';
import { STYLES } from '../text-style.ts';
import type { TextStyle } from '../text-style.ts';
import { textExtent, wrapText } from '../wrap-text.ts';

const MOST_IN_A_ROW = 3;
const INSET = 12;

/** Figures side by side between two rules: name, figure, range, what it means. */
export function keyFigureSlugs(figures: readonly KeyFigure[], setting: Setting): Slug[] {
  const rows: KeyFigure[][] = [];
  for (let i = 0; i < figures.length; i += MOST_IN_A_ROW) rows.push(figures.slice(i, i + MOST_IN_A_ROW));
  const count = Math.min(MOST_IN_A_ROW, figures.length);
  return rows.flatMap((row) => figureRow(row, count, setting));
}

function figureRow(figures: readonly KeyFigure[], count: number, setting: Setting): Slug[] {
  const width = setting.width / count;
  const inner = width - INSET - 2;
  const uprights = (sheet: Sheet, y: number, height: number) => {
    for (let i = 1; i < count; i++) sheet.upright(setting.left + i * width, y, height, 0.5, 'rule');
  };
  const rank = (texts: readonly string[], style: TextStyle, above: number, below: number, low = false) => {
    const cells = texts.map((text, place): Cell => ({
      lines: wrapText(text, inner, style, setting.setter),
      style,
      x: setting.left + place * width + (place === 0 ? 0 : INSET),
      width: inner,
      low,
    }));
    if (cells.every(({ lines }) => lines.length === 0)) return [];
    return rowSlugs(cells, { above, below, rules: uprights }, setting.height);
  };
  const fits = figures.every(
    ({ value }) => textExtent(value, STYLES.figureValue, setting.setter).whole <= inner,
  );
  const slugs = [
    ...rank(
      figures.map(({ label }) => label),
      STYLES.figureLabel,
      8,
      0,
      true,
    ),
    ...rank(
      figures.map(({ value }) => value),
      fits ? STYLES.figureValue : STYLES.longFigureValue,
      0,
      0,
    ),
    ...rank(
      figures.map(({ range }) => (range === null ? '' : `(${range})`)),
      STYLES.figureRange,
      0,
      0,
    ),
    ...rank(
      figures.map(({ note }) => note),
      STYLES.figureNote,
      2,
      9,
    ),
  ];
  return [
    { ...ruleSlug(setting, 1.4), gap: 14, keep: true },
    ...slugs.map((slug) => ({ ...slug, keep: true })),
    ruleSlug(setting, 0.7),
  ];
}

const ruleSlug = ({ left, width }: Setting, thickness: number): Slug => ({
  height: 0,
  paint: (sheet, y) => sheet.rule(left, y, width, thickness, 'ink'),
});
