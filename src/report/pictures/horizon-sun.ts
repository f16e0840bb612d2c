import type { Line, Mark } from '../marks.ts';
import { textWidth } from '../marks.ts';
import { contourLines } from './contours.ts';
import type { LabelPlaces } from './label-places.ts';
import { boxAround } from './label-places.ts';
import type { PictureWords } from './picture-words.ts';
import type { SkyFrame } from './sky-frame.ts';
import { linesOf } from './sky-frame.ts';
import type { SmoothDensity } from './smooth-density.ts';
import { contourLevels } from './smooth-density.ts';
import type { DayLine, HourLine } from './sun-lines.ts';

export interface Spot {
  x: number;
  y: number;
}

type Hidden = (spot: Spot) => boolean;

const onSheet = (frame: SkyFrame, path: DayLine['path']): Line[] =>
  path.flatMap((part) => linesOf(frame, part));

/** Month lines in full ink, hour lines broken. */
export function sunLineMarks(frame: SkyFrame, days: readonly DayLine[], hours: readonly HourLine[]): Mark[] {
  const dayInk = days.flatMap(({ path }) => onSheet(frame, path));
  const hourInk = hours.flatMap(({ path }) => onSheet(frame, path));
  return [
    { kind: 'path', lines: hourInk, pen: { tone: 'ink', width: 0.7, dash: [4, 2.5] } },
    { kind: 'path', lines: dayInk, pen: { tone: 'ink', width: 0.8 } },
  ];
}

/** Names of months on their lines, near noon first. */
export function dayLabels(
  frame: SkyFrame,
  days: readonly DayLine[],
  places: LabelPlaces,
  size: number,
  hidden: Hidden,
): Mark[] {
  return days.flatMap(({ label, path }): Mark[] => {
    const width = textWidth(label, size);
    const spots = onSheet(frame, path).flatMap(spotsOf);
    const middle = (frame.left + frame.right) / 2;
    const offset = (frame.right - frame.left) * 0.06;
    spots.sort((a, b) => Math.abs(a.x - middle + offset) - Math.abs(b.x - middle + offset));
    const boxes = function* () {
      for (const spot of spots) if (!hidden(spot)) yield boxAround(spot.x, spot.y + size * 0.35, width, size);
    };
    const place = places.take(boxes());
    return place
      ? [{ kind: 'text', x: place.x, y: place.y, text: label, size, anchor: 'middle', rim: true }]
      : [];
  });
}

/** Hours at the summits of their lines, else at their feet. */
export function hourLabels(
  frame: SkyFrame,
  hours: readonly HourLine[],
  places: LabelPlaces,
  size: number,
  hidden: Hidden,
  words: PictureWords,
): Mark[] {
  return hours.flatMap(({ hour, path }): Mark[] => {
    const text = words.hour(hour);
    const width = textWidth(text, size) + 2;
    const spots = onSheet(frame, path)
      .flatMap(spotsOf)
      .filter((spot) => !hidden(spot));
    const high = [...spots].sort((a, b) => a.y - b.y);
    const candidates = [
      ...high.slice(0, 2).map(({ x, y }) => boxAround(x, y - 3, width, size)),
      ...high.filter((_, i) => i % 6 === 0).map(({ x, y }) => boxAround(x, y + size * 0.35, width, size)),
    ];
    const place = places.take(candidates);
    return place
      ? [{ kind: 'text', x: place.x, y: place.y, text, size, anchor: 'middle', italic: true, rim: true }]
      : [];
  });
}

function spotsOf(line: Line): Spot[] {
  const spots: Spot[] = [];
  for (let i = 0; i < line.length; i += 2) spots.push({ x: line[i], y: line[i + 1] });
  return spots;
}

/** A few numbered contours of energy. */
export function contourMarks(
  frame: SkyFrame,
  density: SmoothDensity,
  places: LabelPlaces,
  size: number,
  hidden: Hidden,
  words: PictureWords,
): { lines: Mark[]; numbers: Mark[] } {
  const lines: Mark[] = [];
  const numbers: Mark[] = [];
  for (const level of contourLevels(density.highest)) {
    const drawn = contourLines(density, level).flatMap((line) => linesOf(frame, line));
    lines.push(
      { kind: 'path', lines: drawn, pen: { tone: 'paper', width: 3.2, opacity: 0.75 } },
      { kind: 'path', lines: drawn, pen: { tone: 'ink', width: 1.3 } },
    );
    const longest = [...drawn].sort((a, b) => b.length - a.length)[0] ?? [];
    const spots = spotsOf(longest).filter((spot) => !hidden(spot));
    const tried = [0.25, 0.75, 0.15, 0.85, 0.4, 0.6, 0.05, 0.5].flatMap(
      (share) => spots[Math.floor(share * (spots.length - 1))] ?? [],
    );
    const text = words.number(level);
    const width = textWidth(text, size, true);
    const place = places.take(tried.map(({ x, y }) => boxAround(x, y + size * 0.35, width, size)));
    if (place)
      numbers.push({
        kind: 'text',
        x: place.x,
        y: place.y,
        text,
        size,
        anchor: 'middle',
        bold: true,
        rim: true,
      });
  }
  return { lines, numbers };
}
