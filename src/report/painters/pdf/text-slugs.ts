import type { Setting } from './setting.ts';
import type { Sheet } from './sheet.ts';
import type { Slug } from './slug.ts';
import type { TextStyle } from './text-style.ts';
import { wrapText } from './wrap-text.ts';

interface Placing {
  /** From the left of the text's frame, in points. */
  indent?: number;
  width?: number;
  gap?: number;
  /** The last line stays with what follows. */
  keep?: boolean;
  /** Painted beside the first line, at its base line. */
  lead?: (sheet: Sheet, base: number) => void;
}

/** Where the letters stand in a line of this style, from its top. */
export const baseOf = ({ size, leading }: TextStyle): number => (leading - size) / 2 + size * 0.8;

/** A text as lines: none of it stands alone at the foot or the head of a page. */
export function textSlugs(text: string, style: TextStyle, setting: Setting, placing: Placing = {}): Slug[] {
  const { indent = 0, width = setting.width - indent, gap = 0, keep = false, lead } = placing;
  const lines = wrapText(text, width, style, setting.setter);
  const x = setting.left + indent;
  return lines.map((line, place) => ({
    height: style.leading,
    gap: place === 0 ? gap : 0,
    keep: place === lines.length - 1 ? keep : place === 0 || place === lines.length - 2,
    paint: (sheet, y) => {
      if (place === 0) lead?.(sheet, y + baseOf(style));
      sheet.text(line, x, y + baseOf(style), style);
    },
  }));
}
