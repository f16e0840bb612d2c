import type { Block } from '../../../contents/report-contents.ts';
import type { Setting } from '../setting.ts';
import type { Slug } from '../slug.ts';
import { STYLES } from '../text-style.ts';
import { textSlugs } from '../text-slugs.ts';
import { cautionSlugs } from './caution-slugs.ts';
import { keyFigureSlugs } from './key-figure-slugs.ts';
import { listSlugs } from './list-slugs.ts';
import { pairSlugs } from './pair-slugs.ts';
import { photoSlugs } from './photo-slugs.ts';
import { pictureSlugs } from './picture-slugs.ts';
import { tableSlugs } from './table-slugs.ts';

/** One block of a section as slugs. */
export function blockSlugs(block: Block, setting: Setting): Slug[] {
  switch (block.kind) {
    case 'answer':
      return textSlugs(block.text, STYLES.answer, setting, { gap: 14, keep: true });
    case 'paragraph':
      return textSlugs(block.text, block.small ? STYLES.small : STYLES.body, setting, { gap: 8 });
    case 'subheading':
      return textSlugs(block.text, STYLES.subheading, setting, { gap: 17, keep: true });
    case 'key-figures':
      return keyFigureSlugs(block.figures, setting);
    case 'picture':
      return pictureSlugs(block.picture, block.caption, setting);
    case 'table':
      return tableSlugs(block.table, setting);
    case 'list':
      return listSlugs(block.items, setting);
    case 'pairs':
      return pairSlugs(block.pairs, setting);
    case 'caution':
      return cautionSlugs(block.heading, block.items, setting);
    case 'photos':
      return photoSlugs(block.photos, setting);
  }
}
