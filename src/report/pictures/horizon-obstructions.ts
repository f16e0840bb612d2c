import type { HorizonProfile } from '../../core/horizon/horizon-profile.ts';
import type { Line, Mark } from '../marks.ts';
import { textWidth } from '../marks.ts';
import { hatchFor } from './hatches.ts';
import type { Box, LabelPlaces } from './label-places.ts';
import { boxAround } from './label-places.ts';
import type { SilhouettePart } from './silhouettes.ts';
import { silhouette, turnsFrom } from './silhouettes.ts';
import type { SkyFrame } from './sky-frame.ts';
import { xOfTurn, yOf } from './sky-frame.ts';

export interface ObstructionShape {
  id: string;
  name: string;
  /** Place in the profile's list, which settles its hatch. */
  place: number;
  parts: SilhouettePart[];
  /** Share of light lost, mean of the year. */
  lost: number;
  /** Imagined gone. */
  gone: boolean;
}

/** The shapes of a profile's obstructions, larger ones first so that they do not cover smaller ones. */
export function obstructionShapes(
  profile: HorizonProfile,
  names: ReadonlyMap<string, string>,
  gone: ReadonlySet<string>,
): ObstructionShape[] {
  const shapes = profile.obstructionIds.map((id, place) => {
    const passes =
      profile.transmittance.subarray(place * 12, place * 12 + 12).reduce((sum, t) => sum + t, 0) / 12;
    const parts = silhouette(profile, place);
    return { id, name: names.get(id) ?? id, place, parts, lost: 1 - passes, gone: gone.has(id) };
  });
  return shapes.sort((a, b) => areaOf(b.parts) - areaOf(a.parts));
}

function areaOf(parts: readonly SilhouettePart[]): number {
  let area = 0;
  for (const { azimuth, low, high } of parts)
    for (let i = 1; i < azimuth.length; i++)
      area += ((azimuth[i] - azimuth[i - 1]) * (high[i] - low[i] + high[i - 1] - low[i - 1])) / 2;
  return area;
}

/** Outlines of a shape on the sheet; a part that runs over the far side of the circle is drawn at both ends. */
export function outlinesOf(frame: SkyFrame, parts: readonly SilhouettePart[]): Line[] {
  return parts.flatMap((part) => {
    const turns = turnsFrom(frame.centre, part);
    const outline = (shift: number): Line => {
      const upper: Line = [];
      const lower: Line = [];
      turns.forEach((turn, i) => {
        upper.push(xOfTurn(frame, turn + shift), yOf(frame, part.high[i]));
        lower.unshift(xOfTurn(frame, turn + shift), yOf(frame, part.low[i]));
      });
      return [...upper, ...lower];
    };
    const [first, last] = [turns[0], turns[turns.length - 1]];
    const shifts = [0, 360, -360].filter(
      (shift) => last + shift > -frame.span / 2 && first + shift < frame.span / 2,
    );
    return shifts.map(outline);
  });
}

/** Hatched shapes; what passes light lets the drawing under it through, what is imagined gone is a broken line. */
export function obstructionMarks(frame: SkyFrame, shapes: readonly ObstructionShape[]): Mark[] {
  return shapes.flatMap(({ parts, place, lost, gone }): Mark[] => {
    const lines = outlinesOf(frame, parts);
    if (gone) return [{ kind: 'path', lines, closed: true, pen: { tone: 'ink', width: 1.2, dash: [5, 4] } }];
    return [
      { kind: 'path', lines, closed: true, fill: { tone: 'paper', opacity: 0.25 + 0.75 * lost } },
      {
        kind: 'path',
        lines,
        closed: true,
        fill: { hatch: hatchFor(place) },
        pen: { tone: 'ink', width: 1.5 },
      },
    ];
  });
}

/** Names of the shapes where they fit: on the shape, else above its summit, else beside it. */
export function obstructionNames(
  frame: SkyFrame,
  shapes: readonly ObstructionShape[],
  places: LabelPlaces,
  size: number,
): Mark[] {
  return shapes.flatMap(({ name, parts, gone }): Mark[] => {
    const text = gone ? `${name} (imagined gone)` : name;
    const width = textWidth(text, size, true);
    const place = places.take(nameBoxes(frame, parts, width, size));
    if (!place) return [];
    return [
      {
        kind: 'text',
        x: place.x,
        y: place.y,
        text,
        size,
        anchor: 'middle',
        bold: true,
        italic: gone,
        rim: true,
      },
    ];
  });
}

function nameBoxes(
  frame: SkyFrame,
  parts: readonly SilhouettePart[],
  width: number,
  size: number,
): (Box & { x: number; y: number })[] {
  const outlines = outlinesOf(frame, parts).map((line) => ({ line, box: boundsOf(line) }));
  const seen = outlines.filter(({ box }) => box.right > frame.left && box.left < frame.right);
  seen.sort((a, b) => b.box.right - b.box.left - (a.box.right - a.box.left));
  const half = width / 2 + 2;
  return seen.flatMap(({ box }) => {
    const middle = (Math.max(box.left, frame.left) + Math.min(box.right, frame.right)) / 2;
    const x = Math.min(frame.right - half, Math.max(frame.left + half, middle));
    const roomy = box.bottom - box.top > size * 2 && box.right - box.left > width;
    const inside = [0.55, 0.75, 0.35].map((share) =>
      boxAround(x, box.top + (box.bottom - box.top) * share + size * 0.35, width, size),
    );
    const above = [4, 4 + size * 1.2, 4 + size * 2.4].map((gap) => boxAround(x, box.top - gap, width, size));
    const beside = [box.right + half, box.left - half].flatMap((at) =>
      [0.3, 0.6, 0.9].map((share) => boxAround(at, box.top + (box.bottom - box.top) * share, width, size)),
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
