import type { DotsMark, Fill, Hatch, Mark, PathMark, Pen, Picture, TextMark, Tone } from '../marks.ts';
import { plainMarkup } from './markup-text.ts';

export type Palette = Record<Tone, string>;

/** Ink on white paper, for files and print. */
export const PRINT_PALETTE: Palette = {
  ink: '#14120d',
  faint: '#4d483c',
  rule: '#b0a68e',
  paper: '#ffffff',
  sheet: '#f1ecdf',
  accent: '#14120d',
};

export interface SvgOptions {
  palette?: Palette;
  /** Put before the ids of patterns and clips; two pictures on one page need two. */
  idPrefix: string;
  font?: string;
  /** Attributes for the outermost element, already escaped. */
  attributes?: string;
}

/** Paints a picture as SVG with plain attributes: no style sheet, no script. */
export function svgText(picture: Picture, options: SvgOptions): string {
  const painter = new SvgPainter(options);
  const body = picture.marks.map((mark) => painter.mark(mark)).join('');
  const { width, height } = picture;
  const font = plainMarkup(options.font ?? 'sans-serif');
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${number(width)} ${number(height)}" width="${number(width)}" ` +
    `height="${number(height)}" font-family="${font}" ${options.attributes ?? ''}>` +
    `<defs>${painter.definitions.join('')}</defs>${body}</svg>`
  );
}

class SvgPainter {
  readonly definitions: string[] = [];
  private readonly hatches = new Map<string, string>();
  private readonly palette: Palette;
  private clips = 0;

  constructor(private readonly options: SvgOptions) {
    this.palette = options.palette ?? PRINT_PALETTE;
  }

  mark(mark: Mark): string {
    switch (mark.kind) {
      case 'path':
        return this.path(mark);
      case 'dots':
        return this.dots(mark);
      case 'text':
        return this.text(mark);
      case 'clip': {
        const id = `${this.options.idPrefix}-clip-${this.clips++}`;
        const box = `x="${number(mark.x)}" y="${number(mark.y)}" width="${number(mark.width)}" height="${number(mark.height)}"`;
        this.definitions.push(`<clipPath id="${id}"><rect ${box}/></clipPath>`);
        return `<g clip-path="url(#${id})">${mark.marks.map((inner) => this.mark(inner)).join('')}</g>`;
      }
    }
  }

  private path({ lines, closed, fill, pen }: PathMark): string {
    const d = lines.map((line) => lineText(line, closed ?? false)).join('');
    return d && `<path d="${d}" ${this.fill(fill)}${this.pen(pen)}/>`;
  }

  private dots({ at, radius, tone }: DotsMark): string {
    let d = '';
    for (let i = 0; i < at.length; i += 2) d += `M${number(at[i])} ${number(at[i + 1])}h0`;
    const pen = `stroke="${this.palette[tone]}" stroke-width="${number(radius * 2)}" stroke-linecap="round"`;
    return d && `<path d="${d}" fill="none" ${pen}/>`;
  }

  private text(mark: TextMark): string {
    const { x, y, text, size, anchor = 'start', bold, italic, tone = 'ink', turn, rim } = mark;
    const weight = bold ? ' font-weight="600"' : '';
    const slant = italic ? ' font-style="italic"' : '';
    const about = turn ? ` transform="rotate(${number(turn)} ${number(x)} ${number(y)})"` : '';
    const place = `x="${number(x)}" y="${number(y)}" font-size="${number(size)}" text-anchor="${anchor}"${weight}${slant}${about}`;
    const word = plainMarkup(text);
    const under = rim
      ? `<text ${place} fill="none" stroke="${this.palette.paper}" stroke-width="${number(size * 0.32)}" stroke-linejoin="round" aria-hidden="true">${word}</text>`
      : '';
    return `${under}<text ${place} fill="${this.palette[tone]}">${word}</text>`;
  }

  private fill(fill: Fill | undefined): string {
    if (!fill) return 'fill="none"';
    if ('hatch' in fill) return `fill="url(#${this.hatch(fill.hatch)})"`;
    const opacity = fill.opacity === undefined ? '' : ` fill-opacity="${number(fill.opacity)}"`;
    return `fill="${this.palette[fill.tone]}"${opacity} fill-rule="evenodd"`;
  }

  private pen(pen: Pen | undefined): string {
    if (!pen) return '';
    const dash = pen.dash ? ` stroke-dasharray="${pen.dash.map(number).join(' ')}"` : '';
    const opacity = pen.opacity === undefined ? '' : ` stroke-opacity="${number(pen.opacity)}"`;
    return ` stroke="${this.palette[pen.tone]}" stroke-width="${number(pen.width)}" stroke-linejoin="round"${dash}${opacity}`;
  }

  private hatch(hatch: Hatch): string {
    const key = JSON.stringify(hatch);
    const known = this.hatches.get(key);
    if (known) return known;
    const id = `${this.options.idPrefix}-hatch-${this.hatches.size}`;
    this.hatches.set(key, id);
    const s = number(hatch.spacing);
    const half = number(hatch.spacing / 2);
    const ink = this.palette[hatch.tone];
    const stroke = `stroke="${ink}" stroke-width="${number(hatch.width)}"`;
    const drawn = hatch.ringed
      ? `<circle cx="${half}" cy="${half}" r="${number(hatch.width / 2)}" fill="none" stroke="${ink}" stroke-width="0.7"/>`
      : `<path d="M${half} 0V${s}${hatch.crossed ? `M0 ${half}H${s}` : ''}" fill="none" ${stroke}/>`;
    this.definitions.push(
      `<pattern id="${id}" patternUnits="userSpaceOnUse" width="${s}" height="${s}" patternTransform="rotate(${number(hatch.angle)})">${drawn}</pattern>`,
    );
    return id;
  }
}

function lineText(line: readonly number[], closed: boolean): string {
  if (line.length < 4) return '';
  let d = `M${number(line[0])} ${number(line[1])}L`;
  for (let i = 2; i < line.length; i += 2)
    d += `${i > 2 ? ' ' : ''}${number(line[i])} ${number(line[i + 1])}`;
  return closed ? `${d}Z` : d;
}

/** To a hundredth, without trailing zeros. */
const number = (value: number): string => String(Math.round(value * 100) / 100);
