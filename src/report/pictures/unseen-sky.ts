import { turnBetween } from '../../core/angles/angles.ts';
import type { AzimuthRange } from '../../core/angles/azimuth-ranges.ts';
import { rangesBetween } from '../../core/angles/azimuth-ranges.ts';
import type { Mark } from '../marks.ts';
import { textWidth } from '../marks.ts';
import type { LabelPlaces } from './label-places.ts';
import { boxAround } from './label-places.ts';
import type { PictureWords } from './picture-words.ts';
import type { SkyFrame } from './sky-frame.ts';
import { xOfTurn } from './sky-frame.ts';

/** A light dotted pattern over the azimuths nobody looked at, and words where there is room. */
export function unseenMarks(
  frame: SkyFrame,
  observed: readonly AzimuthRange[],
  places: LabelPlaces,
  size: number,
  { unseen }: PictureWords,
): { under: Mark[]; words: Mark[] } {
  const under: Mark[] = [];
  const words: Mark[] = [];
  for (const [from, to] of rangesBetween(observed)) {
    const first = to - from >= 360 ? -180 : turnBetween(frame.centre, from);
    for (const shift of [0, -360, 360]) {
      const left = Math.max(frame.left, xOfTurn(frame, first + shift));
      const right = Math.min(frame.right, xOfTurn(frame, first + (to - from) + shift));
      if (right - left < 0.5) continue;
      const { above, below } = frame;
      const edge: Mark = {
        kind: 'path',
        lines: [
          [left, above, left, below],
          [right, above, right, below],
        ],
        pen: { tone: 'faint', width: 0.7, dash: [2, 3] },
      };
      const hatch = { angle: 45, spacing: 11, width: 3.4, ringed: true, tone: 'rule' } as const;
      under.push(
        {
          kind: 'path',
          lines: [[left, above, right, above, right, below, left, below]],
          closed: true,
          fill: { hatch },
        },
        edge,
      );
      words.push(...wordsIn(unseen, left, right, frame, places, size));
    }
  }
  return { under, words };
}

function wordsIn(
  text: string,
  left: number,
  right: number,
  frame: SkyFrame,
  places: LabelPlaces,
  size: number,
): Mark[] {
  const width = textWidth(text, size);
  const words = (x: number, y: number, turn?: number): Mark => ({
    kind: 'text',
    x,
    y,
    text,
    size,
    anchor: 'middle',
    italic: true,
    rim: true,
    tone: 'faint',
    turn,
  });
  if (right - left >= width + 4) {
    const middle = (left + right) / 2;
    const spots = [0.3, 0.5, 0.7, 0.1].map((share) =>
      boxAround(middle, frame.above + size + share * (frame.below - frame.above - 2 * size), width, size),
    );
    const place = places.take(spots);
    return place ? [words(place.x, place.y)] : [];
  }
  if (right - left < size * 1.3 || frame.below - frame.above < width) return [];
  const x = (left + right) / 2 + size * 0.35;
  const y = (frame.above + frame.below) / 2;
  const place = places.take([
    { left: x - size, right: x + size * 0.3, top: y - width / 2, bottom: y + width / 2 },
  ]);
  return place ? [words(x, y, -90)] : [];
}
