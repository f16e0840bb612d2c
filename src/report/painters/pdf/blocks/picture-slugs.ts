import type { Mark, Picture, TextMark } from '../../../marks.ts';
import { paintPicture } from '../picture-painter.ts';
import type { Setting } from '../setting.ts';
import type { Slug } from '../slug.ts';
import { STYLES } from '../text-style.ts';
import { textSlugs } from '../text-slugs.ts';

/** A picture takes no more of a page's height than this, so that its caption and heading stand with it. */
const HIGHEST = 0.68;
/** A picture is not blown up further: its words would grow over those of the page. */
const LARGEST_SCALE = 0.85;

/** A picture as wide as the text where it is made for that, with its caption under it. */
export function pictureSlugs(picture: Picture, caption: string, setting: Setting): Slug[] {
  const { left, width, height } = setting;
  const scale = Math.min(width / picture.width, (height * HIGHEST) / picture.height, LARGEST_SCALE);
  for (const text of textsOf(picture.marks))
    setting.setter.runs(text.text, { face: 'regular', size: text.size });
  const words = textSlugs(caption, STYLES.caption, setting, { gap: 6 });
  const slug: Slug = {
    height: picture.height * scale,
    gap: 14,
    keep: words.length > 0,
    paint: (sheet, y) => paintPicture(sheet, picture, left, y, scale),
  };
  return [slug, ...words];
}

/** All words in a picture; they are set once before the pages are laid, so that it is known whether letters lack. */
function textsOf(marks: readonly Mark[]): TextMark[] {
  return marks.flatMap((mark) =>
    mark.kind === 'text' ? [mark] : mark.kind === 'clip' ? textsOf(mark.marks) : [],
  );
}
