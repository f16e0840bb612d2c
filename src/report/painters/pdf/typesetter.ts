import type { Face, PdfFonts } from './pdf-fonts.ts';
import type { TextStyle } from './text-style.ts';
import { TrueTypeFace } from './true-type-face.ts';
import { plainLetters, rightToLeft } from './plain-letters.ts';

/** A text as a picture, for letters that the report's typeface lacks; sizes in points at the size asked for. */
export interface DrawnText {
  png: Uint8Array;
  width: number;
  height: number;
  /** From the top of the picture to the line the letters stand on. */
  baseline: number;
}

/** Draws a text with whatever letters the device has; null where it cannot. `size` in points. */
export type DrawText = (text: string, size: number, bold: boolean) => DrawnText | null;

/** Neighbouring letters that are shown the same way: from the typeface, as a picture, or as a box for each. */
export type Run = { text: string; width: number } & (
  { kind: 'letters' } | { kind: 'drawn'; drawn: DrawnText } | { kind: 'boxes'; count: number }
);

/** Width of a box that stands for a letter, with the space around it, as a share of the size. */
export const BOX_WIDTH = 0.62;

/** Latin, Greek and Cyrillic: no letter of these joins another. */
const EACH_A_LETTER = /^[\u0020-\u024f\u0370-\u0482\u048a-\u052f]*$/;

type Style = Pick<TextStyle, 'face' | 'size'>;

/** Cuts text into runs that can be painted, none of them losing a letter. */
export class Typesetter {
  /** Whether a box had to stand for a letter. */
  boxed = false;
  private readonly faces: Record<Face, TrueTypeFace>;
  private readonly drawnTexts = new Map<string, DrawnText | null>();
  private readonly clusters = new Intl.Segmenter('en', { granularity: 'grapheme' });

  constructor(
    fonts: PdfFonts,
    private readonly drawText: DrawText | undefined,
  ) {
    this.faces = {
      regular: new TrueTypeFace(fonts.regular),
      bold: new TrueTypeFace(fonts.bold),
      italic: new TrueTypeFace(fonts.italic),
    };
  }

  width(text: string, style: Style): number {
    return this.runs(text, style).reduce((sum, { width }) => sum + width, 0);
  }

  runs(typed: string, style: Style): Run[] {
    const text = plainLetters(typed);
    if (text === '') return [];
    if (this.inFace(text, style.face)) return [this.letters(text, style)];
    return this.pieces(text, style.face).flatMap(({ lacking, text: piece }) =>
      lacking ? this.lackingRuns(piece, style) : [this.letters(piece, style)],
    );
  }

  /** What a reader takes for one letter each. */
  letterClusters(text: string): string[] {
    if (EACH_A_LETTER.test(text)) return text.split('');
    return Array.from(this.clusters.segment(text), ({ segment }) => segment);
  }

  private letters(text: string, { face, size }: Style): Run {
    return { kind: 'letters', text, width: this.faces[face].width(text, size) };
  }

  private inFace(text: string, face: Face): boolean {
    for (const letter of text) if (!this.faces[face].has(letter.codePointAt(0)!)) return false;
    return true;
  }

  /** Alternating pieces in and outside the typeface; spaces between two outside pieces belong to them. */
  private pieces(text: string, face: Face): { lacking: boolean; text: string }[] {
    const [from, to] = rightToLeft(text);
    const pieces: { lacking: boolean; text: string }[] = [];
    let at = 0;
    for (const cluster of this.letterClusters(text)) {
      const lacking = (at >= from && at < to) || !this.inFace(cluster, face);
      at += cluster.length;
      const last = pieces.at(-1);
      if (last?.lacking === lacking) last.text += cluster;
      else if (lacking && last && /^\s+$/.test(last.text) && pieces.length > 1) {
        pieces.pop();
        pieces.at(-1)!.text += last.text + cluster;
      } else pieces.push({ lacking, text: cluster });
    }
    return pieces;
  }

  private lackingRuns(text: string, style: Style): Run[] {
    const drawn = this.drawn(text, style);
    if (drawn) return [{ kind: 'drawn', text, width: drawn.width, drawn }];
    const runs: Run[] = [];
    for (const cluster of this.letterClusters(text)) {
      const [known, last] = [this.inFace(cluster, style.face), runs.at(-1)];
      if (known) runs.push(this.letters(cluster, style));
      else if (last?.kind === 'boxes') {
        last.text += cluster;
        last.count++;
        last.width += style.size * BOX_WIDTH;
      } else runs.push({ kind: 'boxes', text: cluster, count: 1, width: style.size * BOX_WIDTH });
      this.boxed ||= !known;
    }
    return runs;
  }

  private drawn(text: string, { face, size }: Style): DrawnText | null {
    if (!this.drawText) return null;
    const key = `${face === 'bold'} ${size} ${text}`;
    const known = this.drawnTexts.get(key);
    if (known !== undefined) return known;
    const drawn = this.drawText(text, size, face === 'bold');
    this.drawnTexts.set(key, drawn);
    return drawn;
  }
}
