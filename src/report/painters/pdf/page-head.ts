import type { ReportContents } from '../../contents/report-contents.ts';
import type { Cell, RowLook } from './cell-row.ts';
import { rowSlugs } from './cell-row.ts';
import type { Setting } from './setting.ts';
import type { Slug } from './slug.ts';
import { STYLES } from './text-style.ts';
import { textSlugs } from './text-slugs.ts';
import { wrapText } from './wrap-text.ts';

/** The head of page one: whose report it is, its title, and what it is about. */
export function headSlugs({ firm, title, about }: ReportContents, setting: Setting): Slug[] {
  const { left, width, firmInk } = setting;
  const thick: Slug = {
    height: 11,
    paint: (sheet, y) => sheet.rectangle(left, y, width, 3, firmInk),
  };
  return [
    thick,
    ...firmSlugs(firm.name, firm.lines.filter(Boolean), setting),
    ...textSlugs(title, STYLES.title, setting, { gap: 10, keep: true }),
    ...aboutLines(about, setting).flatMap((line, place) =>
      textSlugs(line, STYLES.about, setting, { gap: place === 0 ? 5 : 0 }),
    ),
  ];
}

/** The firm's name to the left, its lines to the right, a thin rule under both. */
function firmSlugs(name: string, lines: readonly string[], setting: Setting): Slug[] {
  if (name === '' && lines.length === 0) return [];
  const { left, width, setter } = setting;
  const half = width * 0.48;
  const cells: Cell[] = [
    { lines: wrapText(name, half, STYLES.firm, setter), style: STYLES.firm, x: left, width: half },
    {
      lines: lines.flatMap((line) => wrapText(line, half, STYLES.firmLines, setter)),
      style: STYLES.firmLines,
      x: left + width - half,
      width: half,
      right: true,
    },
  ];
  const rules: RowLook['rules'] = (sheet, y, height, _first, last) => {
    if (last) sheet.rule(left, y + height - 1, width, 0.7, 'ink');
  };
  return rowSlugs(cells, { above: 0, below: 9, rules }, setting.height);
}

const BETWEEN = '   ·   ';

/** As many facts on one line as have room. */
function aboutLines(about: readonly string[], { setter, width }: Setting): string[] {
  const lines: string[] = [];
  for (const fact of about) {
    const joined = lines.length > 0 ? lines.at(-1)! + BETWEEN + fact : null;
    if (joined !== null && setter.width(joined, STYLES.about) <= width) lines[lines.length - 1] = joined;
    else lines.push(fact);
  }
  return lines;
}
