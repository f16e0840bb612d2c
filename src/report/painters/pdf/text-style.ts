import type { Tone } from '../../marks.ts';
import type { Face } from './pdf-fonts.ts';

/** How a text is set; size and distance between lines in points. */
export interface TextStyle {
  face: Face;
  size: number;
  leading: number;
  tone: Tone;
}

const style = (face: Face, size: number, leading: number, tone: Tone = 'ink'): TextStyle => ({
  face,
  size,
  leading,
  tone,
});

/** The report's kinds of text on paper. */
export const STYLES = {
  firm: style('bold', 11, 14),
  firmLines: style('regular', 9.5, 12.5, 'faint'),
  title: style('bold', 21, 25),
  about: style('italic', 10, 14, 'faint'),
  part: style('italic', 11, 14, 'faint'),
  heading: style('bold', 15, 18.5),
  subheading: style('bold', 11.5, 15),
  answer: style('regular', 13.5, 18.5),
  body: style('regular', 10.5, 15),
  small: style('regular', 9, 12.5, 'faint'),
  caption: style('regular', 9, 12.5, 'faint'),
  figureLabel: style('regular', 9.5, 12, 'faint'),
  figureValue: style('regular', 27, 31),
  longFigureValue: style('regular', 19, 31),
  figureRange: style('regular', 10.5, 14),
  figureNote: style('italic', 9, 12, 'faint'),
  contentsHead: style('bold', 11.5, 15),
  contentsPart: style('italic', 9.5, 14, 'faint'),
  contentsEntry: style('regular', 9.5, 12.5),
  foot: style('regular', 8, 10, 'faint'),
} as const satisfies Record<string, TextStyle>;
