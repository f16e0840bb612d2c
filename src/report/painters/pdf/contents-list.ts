import type { Part, ReportContents, Section } from '../../contents/report-contents.ts';
import type { Setting } from './setting.ts';
import type { Sheet } from './sheet.ts';
import type { Slug } from './slug.ts';
import { STYLES } from './text-style.ts';
import { baseOf, textSlugs } from './text-slugs.ts';
import { wrapText } from './wrap-text.ts';

const BETWEEN = 24;
const NUMBER_WIDTH = 22;
const ROW_GAP = 3.5;
/** A heading longer than this is cut in the list; it stands whole over its section. */
const MOST_LINES = 3;

/** The list among the sections that pages are known of; no section has a space in its name. */
export const CONTENTS_LIST = 'contents list';

/** Page of a section, counted from 1. */
export type PageOf = (section: string) => number;

/** What is in the report, the letter beside the evidence, each heading with its page. */
export function contentsSlugs(contents: ReportContents, pageOf: PageOf, setting: Setting): Slug[] {
  const { frame, sections } = contents;
  const lists = (['letter', 'evidence'] as const)
    .map((part: Part) => ({ name: frame[part], sections: sections.filter((one) => one.part === part) }))
    .filter(({ sections: some }) => some.length > 0);
  const width = (setting.width - BETWEEN) / 2;
  const columns = lists.map(({ name, sections: some }, place) =>
    contentsColumn(name, some, setting.left + place * (width + BETWEEN), width, pageOf, setting),
  );
  const height = Math.max(...columns.map((column) => column.height));
  return [
    {
      height: 7,
      gap: 26,
      keep: true,
      section: CONTENTS_LIST,
      paint: (sheet, y) => sheet.rule(setting.left, y, setting.width, 1.4, 'ink'),
    },
    ...textSlugs(frame.contents, STYLES.contentsHead, setting, { keep: true }),
    {
      height,
      gap: 3,
      keep: true,
      paint: (sheet, y) => columns.forEach((column) => column.paint(sheet, y)),
    },
    {
      height: 6,
      paint: (sheet, y) => sheet.rule(setting.left, y + 5, setting.width, 0.7, 'ink'),
    },
  ];
}

function contentsColumn(
  name: string,
  sections: readonly Section[],
  x: number,
  width: number,
  pageOf: PageOf,
  { setter }: Setting,
) {
  const entry = STYLES.contentsEntry;
  const rows = sections.map(({ id, heading }) => ({
    id,
    lines: wrapText(heading, width - NUMBER_WIDTH, entry, setter).slice(0, MOST_LINES),
  }));
  const heights = rows.map(({ lines }) => lines.length * entry.leading + 2 * ROW_GAP);
  const paint = (sheet: Sheet, top: number) => {
    sheet.text(name, x, top + baseOf(STYLES.contentsPart), STYLES.contentsPart);
    let y = top + STYLES.contentsPart.leading;
    rows.forEach(({ id, lines }, place) => {
      if (place > 0) sheet.rule(x, y, width, 0.5, 'rule');
      lines.forEach((line, i) => sheet.text(line, x, y + ROW_GAP + i * entry.leading + baseOf(entry), entry));
      const page = String(pageOf(id));
      sheet.text(page, x + width - setter.width(page, entry), y + ROW_GAP + baseOf(entry), entry);
      sheet.link(x, y, width, heights[place], pageOf(id));
      y += heights[place];
    });
  };
  return { height: STYLES.contentsPart.leading + heights.reduce((sum, one) => sum + one, 0), paint };
}
