import type { jsPDF } from 'jspdf';
import type { Tone } from '../../marks.ts';
import { PRINT_PALETTE } from '../svg.ts';
import { isReadable } from './image-bytes.ts';
import type { Face } from './pdf-fonts.ts';
import type { Run, Typesetter } from './typesetter.ts';
import type { TextStyle } from './text-style.ts';

/** What a stroke or a filling is painted with: a tone of the paper's palette, or a colour `#rrggbb`. */
export type Ink = Tone | `#${string}`;

export interface Rim {
  tone: Tone;
  width: number;
}

/** The page under the pen: points, x to the right and y down from the paper's upper left corner. */
export class Sheet {
  private images = 0;
  private readonly aliases = new Map<Uint8Array, string>();

  constructor(
    readonly doc: jsPDF,
    readonly setter: Typesetter,
    readonly paperHeight: number,
  ) {}

  rule(x: number, y: number, width: number, thickness: number, ink: Ink): void {
    this.rectangle(x, y - thickness / 2, width, thickness, ink);
  }

  upright(x: number, y: number, height: number, thickness: number, ink: Ink): void {
    this.rectangle(x - thickness / 2, y, thickness, height, ink);
  }

  rectangle(x: number, y: number, width: number, height: number, ink: Ink): void {
    this.doc.setFillColor(colourOf(ink));
    this.doc.rect(x, y, width, height, 'F');
  }

  frame(
    x: number,
    y: number,
    width: number,
    height: number,
    thickness: number,
    ink: Ink,
    dash: number[] = [],
  ) {
    this.doc.setDrawColor(colourOf(ink)).setLineWidth(thickness).setLineDashPattern(dash, 0);
    this.doc.rect(x, y, width, height, 'S');
  }

  /** One line of text; `y` is the line the letters stand on. */
  text(
    text: string,
    x: number,
    y: number,
    style: Pick<TextStyle, 'face' | 'size' | 'tone'>,
    rim?: Rim,
  ): void {
    let at = x;
    for (const run of this.setter.runs(text, style)) {
      this.run(run, at, y, style, rim);
      at += run.width;
    }
  }

  /** The same bytes are stored once. False, and nothing painted, where they are no such picture. */
  image(
    bytes: Uint8Array,
    type: 'PNG' | 'JPEG',
    x: number,
    y: number,
    width: number,
    height: number,
  ): boolean {
    if (!isReadable(bytes, type)) return false;
    const alias = this.aliases.get(bytes) ?? `image-${this.images++}`;
    this.aliases.set(bytes, alias);
    try {
      this.doc.addImage(bytes, type, x, y, width, height, alias, 'FAST');
      return true;
    } catch {
      // a picture cut off in its middle; the rest of the report stands
      return false;
    }
  }

  link(x: number, y: number, width: number, height: number, pageNumber: number): void {
    this.doc.link(x, y, width, height, { pageNumber, magFactor: 'XYZ' });
  }

  /** Paints turned by some degrees clockwise about a point. */
  turned(degrees: number, x: number, y: number, paint: () => void): void {
    const [cos, sin] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
    const up = this.paperHeight - y;
    const [shiftX, shiftY] = [x - cos * x - sin * up, up + sin * x - cos * up];
    this.doc.saveGraphicsState();
    this.doc.setCurrentTransformationMatrix(this.doc.Matrix(cos, -sin, sin, cos, shiftX, shiftY));
    paint();
    this.doc.restoreGraphicsState();
  }

  clipped(x: number, y: number, width: number, height: number, paint: () => void): void {
    this.doc.saveGraphicsState();
    this.doc.rect(x, y, width, height, null).clip().discardPath();
    paint();
    this.doc.restoreGraphicsState();
  }

  private run(
    run: Run,
    x: number,
    y: number,
    { face, size, tone }: Pick<TextStyle, 'face' | 'size' | 'tone'>,
    rim?: Rim,
  ) {
    switch (run.kind) {
      case 'letters':
        return this.letters(run.text.replaceAll('\u00a0', ' '), x, y, face, size, tone, rim);
      case 'drawn': {
        const { png, width, height, baseline } = run.drawn;
        this.spoken(run, x, y, size, () => this.image(png, 'PNG', x, y - baseline, width, height));
        return;
      }
      case 'boxes':
        this.spoken(run, x, y, size, () => {
          const step = run.width / run.count;
          for (let i = 0; i < run.count; i++)
            this.frame(
              x + i * step + size * 0.06,
              y - size * 0.68,
              size * 0.5,
              size * 0.7,
              size * 0.05,
              tone,
            );
        });
    }
  }

  private letters(text: string, x: number, y: number, face: Face, size: number, tone: Tone, rim?: Rim): void {
    this.doc.setFont(face, 'normal').setFontSize(size);
    if (rim) {
      this.doc.setDrawColor(colourOf(rim.tone)).setLineWidth(rim.width);
      this.doc.setLineDashPattern([], 0).setLineJoin('round');
      this.doc.text(text, x, y, { renderingMode: 'stroke' });
    }
    this.doc.setTextColor(colourOf(tone)).text(text, x, y, { renderingMode: 'fill' });
  }

  /** Marks what is painted as a text, so that it is found, copied and read aloud: a space lies under it, as wide. */
  private spoken({ text, width }: Run, x: number, y: number, size: number, paint: () => void): void {
    const { write } = this.doc.internal as unknown as { write: (line: string) => void };
    const horizontalScale = width / this.setter.width(' ', { face: 'regular', size });
    write(`/Span <</ActualText ${hexText(text)}>> BDC`);
    this.doc.saveGraphicsState();
    this.doc.setFont('regular', 'normal').setFontSize(size);
    this.doc.text(' ', x, y, { renderingMode: 'invisible', horizontalScale });
    // the stretching would go on to the next text
    this.doc.restoreGraphicsState();
    paint();
    write('EMC');
  }
}

export const colourOf = (ink: Ink): string => (ink.startsWith('#') ? ink : PRINT_PALETTE[ink as Tone]);

/** A text string of a PDF in hexadecimal: UTF-16, big end first. Ref: ISO 32000-1, 7.9.2. */
export function hexText(text: string): string {
  let hex = 'FEFF';
  for (let i = 0; i < text.length; i++) hex += text.charCodeAt(i).toString(16).toUpperCase().padStart(4, '0');
  return `<${hex}>`;
}
