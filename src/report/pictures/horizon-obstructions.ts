import type { HorizonProfile } from '../../core/horizon/horizon-profile.ts';
import type { Line, Mark } from '../marks.ts';
import { textWidth } from '../marks.ts';
import { hatchFor } from './hatches.ts';
import type { Box, LabelPlaces } from './label-places.ts';
import { boxAround } from './label-places.ts';
import type { PictureWords } from './picture-words.ts';
import type { SilhouettePart } from './silhouettes.ts';
import { silhouette, turnsFrom } from './silhouettes.ts';
import type { SkyFrame } from './sky-frame.ts';
import { xOfTurn, yOf } from './sky-frame.ts';

export interface ObstructionShape {
  id: string;
  name: string;
  /** Place in the profile's list, which settles its hatch. */
  place: number;
  /** As it stands, or would stand with a change imagined; empty where it is imagined gone. */
  parts: SilhouettePart[];
  /** As measured, where a change to its shape is imagined. */
  before: SilhouettePart[] | null;
  /** Share of light lost, mean of the year. */
  lost: number;
}

/** The shapes of a profile's obstructions, larger ones first so that they do not cover smaller ones. */
export function obstructionShapes(
  profile: HorizonProfile,
  names: ReadonlyMap<string, string>,
  imagined: HorizonProfile | null,
): ObstructionShape[] {
  const standing = imagined ?? profile;
  const shapes = profile.obstructionIds.map((id, place): ObstructionShape => {
    const passes =
      standing.transmittance.subarray(place * 12, place * 12 + 12).reduce((sum, t) => sum + t, 0) / 12;
    const before = imagined && hasChanged(profile, imagined, place) ? silhouette(profile, place) : null;
    return {
      id,
      name: names.get(id) ?? id,
      place,
      parts: silhouette(standing, place),
      before,
      lost: 1 - passes,
    };
  });
  const area = ({ parts, before }: ObstructionShape) => areaOf(before ?? parts);
  return shapes.sort((a, b) => area(b) - area(a));
}

const hasChanged = (profile: HorizonProfile, imagined: HorizonProfile, place: number): boolean =>
  profile.intervalObstruction.some(
    (obstruction, k) =>
      obstruction === place && (profile.low[k] !== imagined.low[k] || profile.high[k] !== imagined.high[k]),
  );

function areaOf(parts: readonly SilhouettePart[]): number {
  let area = 0;
  for (const { azimuth, low, high } of parts)
    for (let i = 1; i < azimuth.length; i++)
      area += ((azimuth[i] - azimuth[i - 1]) * (high[i] - low[i] + high[i - 1] - low[i - 1])) / 2;
  return area;
}

/** Shapes on the sheet; a part that runs over the far side of the circle is drawn at both ends. */
export function outlinesOf(frame: SkyFrame, parts: readonly SilhouettePart[]): Line[] {
  return placed(frame, parts, ({ low, high }, xs) => {
    const line: Line = [];
    for (let i = 0; i < xs.length; i++) line.push(xs[i], yOf(frame, high[i]));
    for (let i = xs.length - 1; i >= 0; i--) line.push(xs[i], yOf(frame, low[i]));
    return [line];
  });
}

/** The edges of a shape to be inked: upper edge, lower edge off the ground, upright ends. */
function edgesOf(frame: SkyFrame, parts: readonly SilhouettePart[]): Line[] {
  return placed(frame, parts, ({ azimuth, low, high, walls }, xs) => {
    const lines: Line[] = [xs.flatMap((x, i) => [x, yOf(frame, high[i])])];
    let lower: Line = [];
    xs.forEach((x, i) => {
      if (low[i] > 0) lower.push(x, yOf(frame, low[i]));
      else {
        if (lower.length > 0) lines.push([...lower, x, yOf(frame, 0)]);
        lower = i + 1 < xs.length && low[i + 1] > 0 ? [x, yOf(frame, 0)] : [];
      }
    });
    const scale = (frame.right - frame.left) / frame.span;
    const upright = walls.map((wall) => {
      const x = xs[0] + (wall.azimuth - azimuth[0]) * scale;
      return [x, yOf(frame, wall.low), x, yOf(frame, wall.high)];
    });
    return [...lines, lower, ...upright];
  });
}

/** Nobody sees a corner smaller than this, points of the sheet; a dense sweep has thousands. */
const FINEST = 0.3;

function thinned(frame: SkyFrame, { azimuth, low, high, walls }: SilhouettePart): SilhouettePart {
  const across = (frame.right - frame.left) / frame.span;
  const up = (frame.below - frame.above) / frame.top;
  let last = 0;
  const kept: number[] = [];
  const moved = (values: number[], i: number, scale: number) =>
    Math.abs(values[i] - values[last]) * scale > FINEST;
  for (let i = 0; i < azimuth.length; i++) {
    const isEnd = i === 0 || i === azimuth.length - 1;
    if (!(isEnd || moved(azimuth, i, across) || moved(low, i, up) || moved(high, i, up))) continue;
    kept.push(i);
    last = i;
  }
  const pick = (values: number[]) => kept.map((i) => values[i]);
  return { azimuth: pick(azimuth), low: pick(low), high: pick(high), walls };
}

type Draw = (part: SilhouettePart, xs: readonly number[]) => Line[];

function placed(frame: SkyFrame, parts: readonly SilhouettePart[], draw: Draw): Line[] {
  return parts.flatMap((whole) => {
    const part = thinned(frame, whole);
    const turns = turnsFrom(frame.centre, part);
    const [first, last] = [turns[0], turns[turns.length - 1]];
    return [0, 360, -360]
      .filter((shift) => last + shift > -frame.span / 2 && first + shift < frame.span / 2)
      .flatMap((shift) =>
        draw(
          part,
          turns.map((turn) => xOfTurn(frame, turn + shift)),
        ),
      );
  });
}

/** Whether nothing of a shape stands in the window. */
export const isOutside = (frame: SkyFrame, { parts, before }: ObstructionShape): boolean =>
  placed(frame, before ?? parts, () => [[]]).length === 0;

/** Hatched shapes; what passes light lets the drawing under it through, what is imagined away is a broken line. */
export function obstructionMarks(frame: SkyFrame, shapes: readonly ObstructionShape[]): Mark[] {
  return shapes.flatMap(({ parts, before, place, lost }): Mark[] => {
    const lines = outlinesOf(frame, parts);
    const broken = before ? edgesOf(frame, before) : [];
    return [
      { kind: 'path', lines, closed: true, fill: { tone: 'paper', opacity: 0.25 + 0.75 * lost } },
      { kind: 'path', lines, closed: true, fill: { hatch: hatchFor(place) } },
      { kind: 'path', lines: edgesOf(frame, parts), pen: { tone: 'ink', width: 1.5 } },
      { kind: 'path', lines: broken, pen: { tone: 'ink', width: 1.2, dash: [5, 4] } },
    ].filter((mark) => mark.lines.length > 0) as Mark[];
  });
}

/** Names of the shapes where they fit: on the shape, else above its summit, else beside it. */
export function obstructionNames(
  frame: SkyFrame,
  shapes: readonly ObstructionShape[],
  places: LabelPlaces,
  size: number,
  words: PictureWords,
): Mark[] {
  return shapes.flatMap(({ name, parts, before }): Mark[] => {
    const widest = (frame.right - frame.left) * WIDEST_NAME;
    const imagined = parts.length > 0 ? words.lower(name) : words.gone(name);
    const lines = twoLines(before ? imagined : name, size, widest);
    const width = Math.max(...lines.map((line) => textWidth(line, size, true)));
    const place = places.take(nameBoxes(frame, before ?? parts, width, size, lines.length));
    if (!place) return [];
    return lines.map((text, i): Mark => {
      const y = place.y - (lines.length - 1 - i) * size * LINE;
      return {
        kind: 'text',
        x: place.x,
        y,
        text,
        size,
        anchor: 'middle',
        bold: true,
        italic: before !== null,
        rim: true,
      };
    });
  });
}

/** A name wider than this share of the drawing is set in two lines. */
const WIDEST_NAME = 0.36;
/** Distance of baselines in sizes. */
const LINE = 1.12;

function twoLines(text: string, size: number, widest: number): string[] {
  if (textWidth(text, size, true) <= widest) return [text];
  const spaces = [...text.matchAll(/ /g)].map(({ index }) => index);
  const [cut] = spaces.sort((a, b) => Math.abs(a - text.length / 2) - Math.abs(b - text.length / 2));
  return cut === undefined ? [text] : [text.slice(0, cut), text.slice(cut + 1)];
}

function nameBoxes(
  frame: SkyFrame,
  parts: readonly SilhouettePart[],
  width: number,
  size: number,
  lines: number,
): (Box & { x: number; y: number })[] {
  const outlines = outlinesOf(frame, parts).map((line) => ({ line, box: boundsOf(line) }));
  const shown = ({ box }: { box: Box }) => Math.min(box.right, frame.right) - Math.max(box.left, frame.left);
  const seen = outlines.filter((outline) => shown(outline) > 0).sort((a, b) => shown(b) - shown(a));
  const half = width / 2 + 2;
  const spot = (x: number, y: number) => {
    const box = boxAround(x, y, width, size);
    return { ...box, top: box.top - (lines - 1) * size * LINE };
  };
  return seen.flatMap(({ box }) => {
    const middle = (Math.max(box.left, frame.left) + Math.min(box.right, frame.right)) / 2;
    const x = Math.min(frame.right - half, Math.max(frame.left + half, middle));
    const height = box.bottom - box.top;
    const roomy = height > size * (lines + 1) && box.right - box.left > width;
    const inside = [0.55, 0.75, 0.35].map((share) => spot(x, box.top + height * share + size * 0.35 * lines));
    const above = [0, 1.2, 2.4].map((gap) => spot(x, box.top - 4 - gap * size));
    const beside = [box.right + half, box.left - half].flatMap((at) =>
      [0.3, 0.6, 0.9].map((share) => spot(at, box.top + height * share)),
    );
    return roomy ? [...inside, ...above] : [...above, ...beside];
  });
}

function boundsOf(line: Line): Box {
  const box = { left: Infinity, top: Infinity, right: -Infinity, bottom: -Infinity };
  for (let i = 0; i < line.length; i += 2) {
    box.left = Math.min(box.left, line[i]);
    box.right = Math.max(box.right, line[i]);
    box.top = Math.min(box.top, line[i + 1]);
    box.bottom = Math.max(box.bottom, line[i + 1]);
  }
  return box;
}
