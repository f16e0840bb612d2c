import type { Mark } from '../marks.ts';
import type { PictureWords } from './picture-words.ts';
import type { SkyFrame } from './sky-frame.ts';
import { xOf, yOf } from './sky-frame.ts';

/** Whether the degrees stand below the compass names, for which a narrow drawing has no room. */
export const hasDegrees = ({ left, right, span }: Pick<SkyFrame, 'left' | 'right' | 'span'>): boolean =>
  (right - left) / span > 2.6;

/** Ruled elevations under the drawing. */
export function elevationRules(frame: SkyFrame): Mark[] {
  const lines = elevations(frame).map((elevation) => [
    frame.left,
    yOf(frame, elevation),
    frame.right,
    yOf(frame, elevation),
  ]);
  return [{ kind: 'path', lines: lines.slice(1), pen: { tone: 'rule', width: 0.6 } }];
}

const elevations = ({ top }: SkyFrame) => Array.from({ length: Math.floor(top / 10) + 1 }, (_, i) => i * 10);

/** The horizon, ticks, degrees and compass names around the drawing. */
export function horizonAxes(frame: SkyFrame, textSize: number, words: PictureWords): Mark[] {
  const { left, right, above, below } = frame;
  const marks: Mark[] = [
    { kind: 'path', lines: [[left, above, left, below, right, below]], pen: { tone: 'ink', width: 1.6 } },
  ];
  const every = (below - above) / (frame.top / 10) < textSize * 1.3 ? 2 : 1;
  for (const elevation of elevations(frame).filter((_, i) => i % every === 0))
    marks.push({
      kind: 'text',
      x: left - 4,
      y: yOf(frame, elevation) + textSize * 0.35,
      text: `${elevation}°`,
      size: textSize,
      anchor: 'end',
    });
  const ticks: number[][] = [];
  for (let azimuth = 0; azimuth < 360; azimuth += 15) {
    const x = xOf(frame, azimuth);
    if (x < left - 0.01 || x > right + 0.01) continue;
    ticks.push([x, below, x, below + (azimuth % 45 === 0 ? 6 : 3)]);
  }
  marks.push({ kind: 'path', lines: ticks, pen: { tone: 'ink', width: 1 } });
  const wide = hasDegrees(frame);
  for (const [point, name] of words.compass.entries()) {
    const azimuth = point * 45;
    const x = xOf(frame, azimuth);
    if (x < left || x > right) continue;
    const [y, half] = [below + textSize + 7, textSize];
    const anchor = x - half < left ? 'start' : x + half > right ? 'end' : 'middle';
    marks.push({ kind: 'text', x, y, text: name, size: textSize * 1.05, anchor, bold: true });
    const degrees = {
      x,
      y: y + textSize * 1.1,
      text: `${azimuth}°`,
      size: textSize * 0.9,
      anchor,
      tone: 'faint',
    } as const;
    if (wide) marks.push({ kind: 'text', ...degrees });
  }
  return marks;
}
