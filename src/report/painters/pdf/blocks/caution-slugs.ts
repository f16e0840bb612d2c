import type { Setting } from '../setting.ts';
import type { Slug } from '../slug.ts';
import { STYLES } from '../text-style.ts';
import { textSlugs } from '../text-slugs.ts';
import { listSlugs } from './list-slugs.ts';

const INSET = 13;
const PADDING = 9;
const THICKNESS = 1.4;

/** A higher frame than this share of a page may be cut. */
const HIGHEST_WHOLE = 0.4;

/** A warning in a frame of ink; a frame that runs over a page stays open there. */
export function cautionSlugs(heading: string, items: readonly string[], setting: Setting): Slug[] {
  const inner = { ...setting, left: setting.left + INSET, width: setting.width - 2 * INSET };
  const text = [
    ...textSlugs(heading, STYLES.subheading, inner, { keep: items.length > 0 }),
    ...listSlugs(items, inner, 3),
  ];
  const edge = (height: number, at: number, keep: boolean): Slug => ({
    height,
    keep,
    paint: (sheet, y) => sheet.rule(setting.left, y + at, setting.width, THICKNESS, 'ink'),
  });
  const pieces: Slug[] = [
    edge(PADDING, THICKNESS / 2, true),
    ...text,
    edge(PADDING, PADDING - THICKNESS / 2, false),
  ];
  const height = pieces.reduce((sum, piece) => sum + piece.height + (piece.gap ?? 0), 0);
  const whole = height <= setting.height * HIGHEST_WHOLE;
  for (const piece of whole ? pieces.slice(0, -1) : text.slice(-1)) piece.keep = true;
  return pieces.map((piece, place) => sided(piece, place === 0 ? 14 : 0, setting));
}

/** With the frame's sides; gaps inside are part of the height, so that the sides have none. */
function sided(piece: Slug, gap: number, { left, width }: Setting): Slug {
  const inside = piece.gap ?? 0;
  const height = piece.height + inside;
  return {
    ...piece,
    height,
    gap,
    paint: (sheet, y) => {
      for (const x of [left + THICKNESS / 2, left + width - THICKNESS / 2])
        sheet.upright(x, y - 0.1, height + 0.2, THICKNESS, 'ink');
      piece.paint(sheet, y + inside);
    },
  };
}
