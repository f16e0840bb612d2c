import type { PaperSize } from '../../contents/report-contents.ts';
import type { Ink } from './sheet.ts';
import type { Typesetter } from './typesetter.ts';

/** Where text stands on the paper, in points, and with what it is set. */
export interface Setting {
  setter: Typesetter;
  left: number;
  top: number;
  width: number;
  height: number;
  paper: { width: number; height: number };
  /** Of the thick rules: the firm's colour, or ink. */
  firmInk: Ink;
}

const MILLIMETRE = 72 / 25.4;
const MARGIN = 20 * MILLIMETRE;
/** Below the text: the running foot stands in it. */
const FOOT_MARGIN = 24 * MILLIMETRE;

/** ISO 216 and the North American letter, 8½ by 11 inches. */
const PAPERS: Readonly<Record<PaperSize, { width: number; height: number }>> = {
  a4: { width: 210 * MILLIMETRE, height: 297 * MILLIMETRE },
  letter: { width: 612, height: 792 },
};

export function settingFor(size: PaperSize, colour: string | null, setter: Typesetter): Setting {
  const paper = PAPERS[size];
  return {
    setter,
    left: MARGIN,
    top: MARGIN,
    width: paper.width - 2 * MARGIN,
    height: paper.height - MARGIN - FOOT_MARGIN,
    paper,
    firmInk: colour !== null && /^#[0-9a-f]{6}$/i.test(colour) ? (colour as Ink) : 'ink',
  };
}
