import type { DotsMark, Hatch, Line, Mark, PathMark, Pen, Picture, TextMark } from '../../marks.ts';
import { boxOf, hatchShapes } from './hatch-strokes.ts';
import type { Sheet } from './sheet.ts';
import { colourOf } from './sheet.ts';

/** Thinner than this a stroke is lost in print, in points. */
const THINNEST = 0.25;

/** Paints a picture's marks with its upper left corner at (x, y), `scale` points of the page for one of its own. */
export function paintPicture(sheet: Sheet, picture: Picture, x: number, y: number, scale: number): void {
  const painter = new PicturePainter(sheet, x, y, scale, [0, 0, picture.width, picture.height]);
  sheet.clipped(x, y, picture.width * scale, picture.height * scale, () => painter.marks(picture.marks));
}

class PicturePainter {
  private readonly doc;

  constructor(
    private readonly sheet: Sheet,
    private readonly left: number,
    private readonly top: number,
    private readonly scale: number,
    private readonly box: readonly [number, number, number, number],
  ) {
    this.doc = sheet.doc;
  }

  marks(marks: readonly Mark[]): void {
    for (const mark of marks) this.mark(mark);
  }

  private mark(mark: Mark): void {
    switch (mark.kind) {
      case 'path':
        return this.path(mark);
      case 'dots':
        return this.dots(mark);
      case 'text':
        return this.text(mark);
      case 'clip':
        return this.sheet.clipped(
          this.x(mark.x),
          this.y(mark.y),
          mark.width * this.scale,
          mark.height * this.scale,
          () => this.marks(mark.marks),
        );
    }
  }

  private path({ lines, closed, fill, pen }: PathMark): void {
    const shown = lines.filter((line) => line.length >= 4);
    if (shown.length === 0) return;
    if (fill && 'hatch' in fill) this.hatched(shown, fill.hatch);
    else if (fill)
      this.faded(fill.opacity, () => {
        this.doc.setFillColor(colourOf(fill.tone));
        this.trace(shown, true);
        this.doc.fillEvenOdd();
      });
    if (pen)
      this.faded(pen.opacity, () => {
        this.pen(pen);
        this.trace(shown, closed ?? false);
        this.doc.stroke();
      });
  }

  private hatched(lines: readonly Line[], hatch: Hatch): void {
    const shapes = hatchShapes(hatch, within(boxOf(lines), this.box));
    this.doc.saveGraphicsState();
    this.trace(lines, true);
    this.doc.clip().discardPath();
    this.pen({ tone: hatch.tone, width: hatch.ringed ? 0.7 : hatch.width });
    if (shapes.strokes.length > 0) {
      this.trace(shapes.strokes, false);
      this.doc.stroke();
    }
    for (let i = 0; i < shapes.rings.length; i += 2)
      this.doc.circle(
        this.x(shapes.rings[i]),
        this.y(shapes.rings[i + 1]),
        (hatch.width / 2) * this.scale,
        'S',
      );
    this.doc.restoreGraphicsState();
  }

  private dots({ at, radius, tone }: DotsMark): void {
    if (at.length < 2) return;
    this.doc.saveGraphicsState();
    this.pen({ tone, width: radius * 2 });
    this.doc.setLineCap('round');
    // a stroke of no length is left out by some readers, even with round ends
    const least = 0.02 / this.scale;
    const strokes: Line[] = [];
    for (let i = 0; i + 1 < at.length; i += 2) strokes.push([at[i], at[i + 1], at[i] + least, at[i + 1]]);
    this.trace(strokes, false);
    this.doc.stroke();
    this.doc.restoreGraphicsState();
  }

  private text({ x, y, text, size, anchor, bold, italic, tone = 'ink', turn, rim }: TextMark): void {
    const face = bold ? 'bold' : italic ? 'italic' : 'regular';
    const style = { face, size: size * this.scale, tone } as const;
    const share = anchor === 'middle' ? 0.5 : anchor === 'end' ? 1 : 0;
    const [left, base] = [this.x(x), this.y(y)];
    const start = left - (share && share * this.sheet.setter.width(text, style));
    const edge = rim ? ({ tone: 'paper', width: style.size * 0.32 } as const) : undefined;
    const write = () => this.sheet.text(text, start, base, style, edge);
    if (turn) this.sheet.turned(turn, left, base, write);
    else write();
  }

  private trace(lines: readonly Line[], closed: boolean): void {
    for (const line of lines) {
      this.doc.moveTo(this.x(line[0]), this.y(line[1]));
      for (let i = 2; i + 1 < line.length; i += 2) this.doc.lineTo(this.x(line[i]), this.y(line[i + 1]));
      if (closed) this.doc.close();
    }
  }

  private pen({ tone, width, dash = [] }: Pick<Pen, 'tone' | 'width' | 'dash'>): void {
    this.doc
      .setDrawColor(colourOf(tone))
      .setLineWidth(Math.max(THINNEST, width * this.scale))
      .setLineDashPattern(
        dash.map((length) => length * this.scale),
        0,
      );
    this.doc.setLineJoin('round').setLineCap('butt');
  }

  private faded(opacity: number | undefined, paint: () => void): void {
    if (opacity === undefined || opacity >= 1) return paint();
    const { GState } = this.doc as unknown as { GState: new (state: object) => unknown };
    this.doc.saveGraphicsState();
    this.doc.setGState(new GState({ opacity, 'stroke-opacity': opacity }));
    paint();
    this.doc.restoreGraphicsState();
  }

  private x = (x: number) => this.left + x * this.scale;
  private y = (y: number) => this.top + y * this.scale;
}

function within(
  [left, top, right, bottom]: readonly number[],
  [boxLeft, boxTop, boxRight, boxBottom]: readonly number[],
): [number, number, number, number] {
  return [
    Math.max(left, boxLeft),
    Math.max(top, boxTop),
    Math.min(right, boxRight),
    Math.min(bottom, boxBottom),
  ];
}
