import type { Line, Mark, Picture } from '../marks.ts';
import { textWidth } from '../marks.ts';
import { hatchFor } from './hatches.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';
import { roundStep } from './round-step.ts';

/** One roof plane: light of a year with nothing in the way, and what share of it arrives. */
export interface RoofBar {
  name: string;
  /** In the unit of the axis. */
  unshaded: number;
  /** 0 to 1; null where nobody measured. */
  access: number | null;
  interval: { low: number; high: number } | null;
  /** Beside the bar, such as "78 %". */
  value: string;
}

export interface RoofBarsInput {
  bars: readonly RoofBar[];
  /** Under the axis. */
  axis: string;
  width: number;
}

const SIZE = 12;
const BAR = 17;
const ROW = BAR + SIZE * 1.5 + 12;

/**
 * A bar for each plane, as long as its light with nothing in the way: ink for what arrives, hatched for what shade takes, a
 * whisker for the range. A plane that nobody measured is an empty, broken outline.
 */
export function roofBars({ bars, axis, width }: RoofBarsInput, words: PictureWords = ENGLISH): Picture {
  const values = Math.max(0, ...bars.map(({ value }) => textWidth(value, SIZE, true)));
  const [left, right] = [1, Math.max(width / 2, width - values - 12)];
  const most = Math.max(0.01, ...bars.map(({ unshaded }) => unshaded));
  const xOf = (light: number) => left + (light / most) * (right - left);
  const foot = bars.length * ROW;
  return {
    width,
    height: foot + 2 * SIZE + 16,
    marks: [
      ...bars.flatMap((bar, i) => barMarks(bar, i * ROW, width, xOf)),
      ...axisMarks(most, xOf, foot, right, words),
      { kind: 'text', x: left, y: foot + 2 * SIZE + 12, text: axis, size: SIZE - 1, tone: 'faint' },
    ],
  };
}

function barMarks(bar: RoofBar, above: number, width: number, xOf: (light: number) => number): Mark[] {
  const { name, unshaded, access, interval, value } = bar;
  const [top, bottom] = [above + SIZE * 1.5, above + SIZE * 1.5 + BAR];
  const box = (from: number, to: number): Line => [from, top, to, top, to, bottom, from, bottom];
  const [start, end] = [xOf(0), xOf(unshaded)];
  const marks: Mark[] = [
    { kind: 'text', x: start, y: above + SIZE, text: shortened(name, width), size: SIZE, bold: true },
    { kind: 'text', x: end + 6, y: bottom - 4, text: value, size: SIZE, bold: true },
  ];
  const outline = { kind: 'path' as const, lines: [box(start, end)], closed: true };
  if (access === null) return [...marks, { ...outline, pen: { tone: 'ink', width: 1, dash: [4, 3] } }];
  const arrives = xOf(unshaded * Math.min(1, access));
  marks.push(
    { kind: 'path', lines: [box(arrives, end)], closed: true, fill: { hatch: hatchFor(0) } },
    { kind: 'path', lines: [box(start, arrives)], closed: true, fill: { tone: 'ink' } },
    { ...outline, pen: { tone: 'ink', width: 1.2 } },
  );
  if (interval) marks.push(...whisker(xOf(unshaded * interval.low), xOf(unshaded * interval.high), top));
  return marks;
}

/** From one end of the range to the other, rimmed so that it stands off ink and hatch alike. */
function whisker(low: number, high: number, top: number): Mark[] {
  const [middle, half] = [top + BAR / 2, BAR / 4];
  const lines = [
    [low, middle, high, middle],
    [low, middle - half, low, middle + half],
    [high, middle - half, high, middle + half],
  ];
  return [
    { kind: 'path', lines, pen: { tone: 'paper', width: 5 } },
    { kind: 'path', lines, pen: { tone: 'ink', width: 1.6 } },
  ];
}

function axisMarks(
  most: number,
  xOf: (light: number) => number,
  foot: number,
  right: number,
  words: PictureWords,
): Mark[] {
  const step = roundStep(most / 4);
  const ticks: number[] = [];
  for (let light = 0; light <= most * (1 + 1e-9); light += step) ticks.push(light);
  return [
    {
      kind: 'path',
      lines: [[xOf(0), foot, right, foot], ...ticks.map((light) => [xOf(light), foot, xOf(light), foot + 4])],
      pen: { tone: 'ink', width: 1.2 },
    },
    ...ticks.map((light, i): Mark => ({
      kind: 'text',
      x: xOf(light),
      y: foot + SIZE + 4,
      text: words.number(light),
      size: SIZE - 1,
      anchor: i === 0 ? 'start' : 'middle',
    })),
  ];
}

/** A name cut to the room it has. */
function shortened(name: string, room: number): string {
  if (textWidth(name, SIZE, true) <= room) return name;
  const letters = Array.from(name);
  while (letters.length > 1 && textWidth(`${letters.join('')}…`, SIZE, true) > room) letters.pop();
  return `${letters.join('').trimEnd()}…`;
}
