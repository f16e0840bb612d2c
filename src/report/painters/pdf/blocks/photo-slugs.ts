import type { ContentsPhoto } from '../../../contents/report-contents.ts';
import { rowSlugs } from '../cell-row.ts';
import type { Setting } from '../setting.ts';
import type { Sheet } from '../sheet.ts';
import type { Slug } from '../slug.ts';
import { baseOf } from '../text-slugs.ts';
import { STYLES } from '../text-style.ts';
import { wrapText } from '../wrap-text.ts';

const BETWEEN = 16;
/** Height over width of the frame in place of a picture that is not at hand. */
const EMPTY_SHAPE = 0.45;
const HIGHEST = 0.4;

/** Photos two to a row, each with its caption. */
export function photoSlugs(photos: readonly ContentsPhoto[], setting: Setting): Slug[] {
  const rows: ContentsPhoto[][] = [];
  for (let i = 0; i < photos.length; i += 2) rows.push(photos.slice(i, i + 2));
  return rows.flatMap((row) => photoRow(row, setting));
}

function photoRow(photos: readonly ContentsPhoto[], setting: Setting): Slug[] {
  const width = (setting.width - BETWEEN) / 2;
  const left = (place: number) => setting.left + place * (width + BETWEEN);
  const sizes = photos.map(({ image }) => shownSize(image, width, setting.height * HIGHEST));
  const captions = photos.map(({ caption }, place) => ({
    lines: wrapText(caption, width, STYLES.caption, setting.setter),
    style: STYLES.caption,
    x: left(place),
    width,
  }));
  const pictures: Slug = {
    height: Math.max(...sizes.map(({ height }) => height)),
    gap: 14,
    keep: true,
    paint: (sheet, y) =>
      photos.forEach((photo, place) => paintPhoto(sheet, photo, left(place), y, sizes[place])),
  };
  return [pictures, ...rowSlugs(captions, { above: 4, below: 0 }, setting.height)];
}

interface Size {
  width: number;
  height: number;
}

function shownSize(image: Size | null, width: number, highest: number): Size {
  if (!image || !(image.width > 0 && image.height > 0)) return { width, height: width * EMPTY_SHAPE };
  const scale = Math.min(width / image.width, highest / image.height);
  return { width: image.width * scale, height: image.height * scale };
}

function paintPhoto(
  sheet: Sheet,
  { image, alternative }: ContentsPhoto,
  x: number,
  y: number,
  size: Size,
): void {
  const { width, height } = size;
  if (image && sheet.image(image.bytes, image.type === 'image/png' ? 'PNG' : 'JPEG', x, y, width, height)) {
    sheet.frame(x, y, width, height, 0.5, 'rule');
    return;
  }
  sheet.frame(x, y, width, height, 0.5, 'faint', [3, 2]);
  const style = STYLES.small;
  const room = Math.max(1, Math.floor((height - 16) / style.leading));
  const lines = wrapText(alternative, width - 24, style, sheet.setter).slice(0, room);
  const top = y + (height - lines.length * style.leading) / 2;
  lines.forEach((line, place) =>
    sheet.text(line, x + 12, top + place * style.leading + baseOf(style), style),
  );
}
