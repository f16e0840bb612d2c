import type { ReportContents } from '../../contents/report-contents.ts';
import { documentFacts, outlineEntries, withFacts } from './document-facts.ts';
import { paginate } from './paginate.ts';
import type { PdfFonts } from './pdf-fonts.ts';
import type { PageOf } from './contents-list.ts';
import { CONTENTS_LIST } from './contents-list.ts';
import { paintFoot } from './page-foot.ts';
import { reportSlugs } from './section-slugs.ts';
import type { Setting } from './setting.ts';
import { settingFor } from './setting.ts';
import { openSheet } from './open-sheet.ts';
import { STYLES } from './text-style.ts';
import { textSlugs } from './text-slugs.ts';
import type { DrawText } from './typesetter.ts';
import { Typesetter } from './typesetter.ts';

export interface PdfOptions {
  /** Day the report is made, YYYY-MM-DD: the file's date, so that the same report is the same file. */
  madeOn: string;
  /** Draws what the typeface has no letters for; without it each such letter is a box, and the report says so. */
  drawText?: DrawText;
}

/**
 * A report as a PDF file on the paper chosen, with its typeface inside: pages with a running foot, bookmarks, a list of
 * contents with links. The same contents make the same bytes.
 * @throws RangeError where a font is no TrueType file.
 */
export async function pdfDocument(
  contents: ReportContents,
  fonts: PdfFonts,
  options: PdfOptions,
): Promise<Uint8Array> {
  const setter = new Typesetter(fonts, options.drawText);
  const setting = settingFor(contents.paper, contents.firm.colour, setter);
  const { width, height } = setting.paper;
  const sheet = await openSheet(fonts, setter, setting.paper);
  const { doc } = sheet;
  documentFacts(doc, contents, options.madeOn);
  const pages = layPages(contents, setting);
  pages.placed.forEach((page, place) => {
    if (place > 0) doc.addPage([width, height]);
    for (const { slug, y } of page) slug.paint(sheet, setting.top + y);
    paintFoot(sheet, contents, place + 1, pages.placed.length, setting);
  });
  outlineEntries(doc, contents, pages.pageOf);
  const file = withFacts(doc.output(), contents);
  return Uint8Array.from({ length: file.length }, (_, i) => file.charCodeAt(i));
}

function layPages(contents: ReportContents, setting: Setting) {
  const numbers = new Map<string, number>();
  const pageOf: PageOf = (section) => numbers.get(section) ?? 1;
  const lay = (joined: boolean) => {
    const slugs = reportSlugs(contents, pageOf, setting, joined);
    if (setting.setter.boxed)
      slugs.push(...textSlugs(contents.frame.boxes, STYLES.small, setting, { gap: 24 }));
    const placed = paginate(slugs, setting.height);
    placed.forEach((page, place) => {
      for (const { slug } of page) if (slug.section !== undefined) numbers.set(slug.section, place + 1);
    });
    return placed;
  };
  const placed = lay(false);
  return { placed: pageOf(CONTENTS_LIST) > 1 ? lay(true) : placed, pageOf };
}
