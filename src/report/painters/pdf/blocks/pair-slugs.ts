import type { Setting } from '../setting.ts';
import { rowSlugs } from '../cell-row.ts';
import type { Slug } from '../slug.ts';
import type { TextStyle } from '../text-style.ts';
import { wrapText } from '../wrap-text.ts';

const STYLE: TextStyle = { face: 'regular', size: 9.5, leading: 13, tone: 'ink' };
const TERM: TextStyle = { ...STYLE, tone: 'faint' };
const TERM_SHARE = 0.3;
const BETWEEN = 14;

/** Terms and what they are, in ruled rows. */
export function pairSlugs(pairs: readonly { term: string; text: string }[], setting: Setting): Slug[] {
  const { left, width, setter, height } = setting;
  const termWidth = width * TERM_SHARE;
  const textWidth = width - termWidth - BETWEEN;
  const rows = pairs.map(({ term, text }, place) =>
    rowSlugs(
      [
        { lines: wrapText(term, termWidth, TERM, setter), style: TERM, x: left, width: termWidth },
        {
          lines: wrapText(text, textWidth, STYLE, setter),
          style: STYLE,
          x: left + termWidth + BETWEEN,
          width: textWidth,
        },
      ],
      {
        above: 3,
        below: 3,
        rules: (sheet, y, _height, first) => {
          if (!first) return;
          const [thickness, ink] = place === 0 ? ([1.4, 'ink'] as const) : ([0.5, 'rule'] as const);
          sheet.rule(left, y, width, thickness, ink);
        },
      },
      height,
    ),
  );
  if (rows.length === 0) return [];
  rows[0][0].gap = 14;
  return [...rows.flat(), { height: 0, paint: (sheet, y) => sheet.rule(left, y, width, 0.7, 'ink') }];
}
