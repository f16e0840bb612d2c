import type { Setting } from '../setting.ts';
import type { Slug } from '../slug.ts';
import { STYLES } from '../text-style.ts';
import { textSlugs } from '../text-slugs.ts';

const INDENT = 13;

/** Items with a bullet each, the last never alone on a page; `first` is the space above the first one. */
export function listSlugs(items: readonly string[], setting: Setting, first = 8): Slug[] {
  return items.flatMap((item, place) =>
    textSlugs(item, STYLES.body, setting, {
      indent: INDENT,
      gap: place === 0 ? first : 3.5,
      keep: place === items.length - 2,
      lead: (sheet, base) => sheet.text('•', setting.left + 1, base, STYLES.body),
    }),
  );
}
