import type { ReportContents } from '../../contents/report-contents.ts';
import type { Setting } from './setting.ts';
import type { Slug } from './slug.ts';
import { STYLES } from './text-style.ts';
import { baseOf, textSlugs } from './text-slugs.ts';
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
  const names = wrapText(name, half, STYLES.firm, setter);
  const others = lines.flatMap((line) => wrapText(line, half, STYLES.firmLines, setter));
  const height = Math.max(names.length * STYLES.firm.leading, others.length * STYLES.firmLines.leading);
  return [
    {
      height: height + 9,
      paint: (sheet, y) => {
        names.forEach((line, i) =>
          sheet.text(line, left, y + i * STYLES.firm.leading + baseOf(STYLES.firm), STYLES.firm),
        );
        others.forEach((line, i) =>
          sheet.text(
            line,
            left + width - setter.width(line, STYLES.firmLines),
            y + i * STYLES.firmLines.leading + baseOf(STYLES.firmLines),
            STYLES.firmLines,
          ),
        );
        sheet.rule(left, y + height + 8, width, 0.7, 'ink');
      },
    },
  ];
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
