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
  /** More bars than this have their names beside them. */
  mostUnderNames?: number;
}

const SIZE = 13.5;
const BAR = 16;
/** So that a page holds them. */
const MOST_UNDER_NAMES = 3;
const WIDEST_NAME = 0.34;

interface Layout {
  /** Room for the names, which stand over the bars where it is null. */
  names: number | null;
  left: number;
  right: number;
  row: number;
  xOf: (light: number) => number;
}

/**
 * A bar for each plane, as long as its light with nothing in the way: ink for what arrives, hatched for what shade takes, a
 * whisker for the range. A plane that nobody measured is an empty, broken outline.
 */
export function roofBars(
  { bars, axis, width, mostUnderNames = MOST_UNDER_NAMES }: RoofBarsInput,
  words: PictureWords = ENGLISH,
): Picture {
  const most = Math.max(0.01, ...bars.map(({ unshaded }) => unshaded));
  const layout = layoutOf(bars, most, width, bars.length > mostUnderNames);
  const foot = bars.length * layout.row;
  const under = foot + 2 * SIZE + 12;
  return {
    width,
    height: under + 4,
    marks: [
      ...bars.flatMap((bar, i) => barMarks(bar, i * layout.row, width, layout)),
      ...axisMarks(most, foot, layout, words),
      { kind: 'text', x: layout.left, y: under, text: axis, size: SIZE, tone: 'faint' },
    ],
  };
}

function layoutOf(bars: readonly RoofBar[], most: number, width: number, isBeside: boolean): Layout {
  const widest = (texts: string[]) => Math.max(0, ...texts.map((text) => textWidth(text, SIZE, true)));
  const values = widest(bars.map(({ value }) => value));
  const names = isBeside ? Math.min(WIDEST_NAME * width, widest(bars.map(({ name }) => name))) : null;
  const left = names === null ? 1 : names + 10;
  const right = Math.max(left + width / 4, width - values - 12);
  return {
    names,
    left,
    right,
    row: names === null ? BAR + SIZE * 2.5 : BAR + 9,
    xOf: (light) => left + (light / most) * (right - left),
  };
}

function barMarks(bar: RoofBar, above: number, width: number, { names, xOf }: Layout): Mark[] {
  const { name, unshaded, access, interval, value } = bar;
  const top = above + (names === null ? SIZE * 1.5 : 2);
  const bottom = top + BAR;
  const box = (from: number, to: number): Line => [from, top, to, top, to, bottom, from, bottom];
  const [start, end] = [xOf(0), xOf(unshaded)];
  const text = shortened(name, names ?? width);
  const marks: Mark[] = [
    names === null
      ? { kind: 'text', x: start, y: above + SIZE, text, size: SIZE, bold: true }
      : { kind: 'text', x: names, y: bottom - 4, text, size: SIZE, bold: true, anchor: 'end' },
    { kind: 'text', x: end + 6, y: bottom - 4, text: shortened(value, width / 3), size: SIZE, bold: true },
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

function axisMarks(most: number, foot: number, { xOf, right }: Layout, words: PictureWords): Mark[] {
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
      size: SIZE,
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
