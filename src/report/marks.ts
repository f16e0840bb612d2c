/**
 * A picture is a short list of marks on a sheet, x to the right and y down, in points of the sheet. Screen, printed page
 * and command line paint the same marks.
 */
export interface Picture {
  width: number;
  height: number;
  marks: Mark[];
}

export type Mark = PathMark | DotsMark | TextMark | ClipMark;

/** Colours are named for their use; a painter knows what they are on its paper. */
export type Tone = 'ink' | 'faint' | 'rule' | 'paper' | 'sheet' | 'accent';

/** A line in x, y, x, y, … */
export type Line = number[];

export interface PathMark {
  kind: 'path';
  lines: Line[];
  /** Each line returns to its start. */
  closed?: boolean;
  fill?: Fill;
  pen?: Pen;
}

export type Fill = { tone: Tone; opacity?: number } | { hatch: Hatch };

/** Parallel strokes; `crossed` adds a second set at right angles. */
export interface Hatch {
  /** Degrees the strokes are turned clockwise from upright, 0 to 180. */
  angle: number;
  /** Distance between strokes. */
  spacing: number;
  width: number;
  crossed?: boolean;
  /** Small rings, `width` across, in place of strokes. */
  ringed?: boolean;
  tone: Tone;
}

export interface Pen {
  tone: Tone;
  width: number;
  dash?: number[];
  opacity?: number;
}

/** Round dots of one size. */
export interface DotsMark {
  kind: 'dots';
  /** x, y, x, y, … */
  at: number[];
  radius: number;
  tone: Tone;
}

export interface TextMark {
  kind: 'text';
  x: number;
  /** Of the baseline. */
  y: number;
  text: string;
  size: number;
  anchor?: 'start' | 'middle' | 'end';
  bold?: boolean;
  italic?: boolean;
  tone?: Tone;
  /** Degrees clockwise about (x, y). */
  turn?: number;
  /** A rim of paper, so that the word stands off what is under it. */
  rim?: boolean;
}

/** Marks seen only inside a rectangle. */
export interface ClipMark {
  kind: 'clip';
  x: number;
  y: number;
  width: number;
  height: number;
  marks: Mark[];
}

/** Width of a text set in the sheet's sans-serif, estimated from its letters; a little wide rather than narrow. */
export function textWidth(text: string, size: number, bold = false): number {
  let ems = 0;
  for (const letter of text)
    ems += /[iljtf.,:;'|! ]/.test(letter) ? 0.36 : /[mwMW@%]/.test(letter) ? 0.98 : 0.63;
  return ems * size * (bold ? 1.12 : 1);
}
