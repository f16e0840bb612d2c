import type { Block, ReportContents, Section } from '../../contents/report-contents.ts';
import { blockSlugs } from './blocks/block-slugs.ts';
import type { PageOf } from './contents-list.ts';
import { contentsSlugs } from './contents-list.ts';
import { headSlugs } from './page-head.ts';
import type { Setting } from './setting.ts';
import type { Slug } from './slug.ts';
import { STYLES } from './text-style.ts';
import { textSlugs } from './text-slugs.ts';

/** Fewer sections than this are found without a list of them. */
const FEWEST_LISTED = 3;

/**
 * The whole report as slugs: head, first section, list of contents, the other sections. Where the list has a page of its
 * own, `joined` sets the section after it on that page too.
 */
export function reportSlugs(
  contents: ReportContents,
  pageOf: PageOf,
  setting: Setting,
  joined = false,
): Slug[] {
  const { sections } = contents;
  const list = sections.length >= FEWEST_LISTED ? contentsSlugs(contents, pageOf, setting) : [];
  const firstEvidence = sections.findIndex(({ part }) => part === 'evidence');
  return [
    ...headSlugs(contents, setting),
    ...sections.flatMap((section, place) => [
      ...(place === firstEvidence ? partSlugs(contents.frame.evidence, place > 0, setting) : []),
      ...sectionSlugs(section, place > (joined ? 1 : 0) && place !== firstEvidence, setting),
      ...(place === 0 ? list : []),
    ]),
  ];
}

/** The evidence begins a page, under a thick rule. */
function partSlugs(name: string, startsPage: boolean, setting: Setting): Slug[] {
  const thick: Slug = {
    height: 10,
    gap: 30,
    startsPage,
    keep: true,
    paint: (sheet, y) => sheet.rectangle(setting.left, y, setting.width, 3, setting.firmInk),
  };
  return [thick, ...textSlugs(name, STYLES.part, setting, { keep: true })];
}

function sectionSlugs(section: Section, mayStartPage: boolean, setting: Setting): Slug[] {
  const { id, heading, startsPage, blocks } = section;
  const rule: Slug = {
    height: 8,
    gap: 24,
    keep: true,
    section: id,
    startsPage: mayStartPage && startsPage,
    paint: (sheet, y) => sheet.rule(setting.left, y + 0.35, setting.width, 0.7, 'ink'),
  };
  const body = blocks.flatMap((block, place) => ledIn(blockSlugs(block, setting), block, blocks[place + 1]));
  return [rule, ...textSlugs(heading, STYLES.heading, setting, { keep: body.length > 0 }), ...body];
}

/** More lines than this stand on their own. */
const MOST_LEADING = 4;

/** A few lines that lead to a picture or a table stay with it. */
function ledIn(slugs: Slug[], block: Block, next: Block | undefined): Slug[] {
  const leads = block.kind === 'paragraph' && (next?.kind === 'picture' || next?.kind === 'table');
  return leads && slugs.length <= MOST_LEADING ? slugs.map((slug) => ({ ...slug, keep: true })) : slugs;
}
