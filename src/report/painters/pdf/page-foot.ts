import type { ReportContents } from '../../contents/report-contents.ts';
import type { Setting } from './setting.ts';
import type { Sheet } from './sheet.ts';
import { STYLES } from './text-style.ts';
import { wrapText } from './wrap-text.ts';

/** From the paper's lower edge to the line the foot stands on, in points. */
const FROM_EDGE = 36;

/** The foot of a page: what the report is of, and which page this is. */
export function paintFoot(
  sheet: Sheet,
  { foot, frame }: ReportContents,
  page: number,
  pages: number,
  { left, width, paper, setter }: Setting,
): void {
  const base = paper.height - FROM_EDGE;
  const style = STYLES.foot;
  sheet.rule(left, base - 13, width, 0.5, 'rule');
  const number = frame.page(page, pages);
  const numberWidth = setter.width(number, style);
  const [line = ''] = wrapText(foot, width - numberWidth - 16, style, setter);
  sheet.text(line, left, base, style);
  sheet.text(number, left + width - numberWidth, base, style);
}
