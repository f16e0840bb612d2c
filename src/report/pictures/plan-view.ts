import { RADIANS } from '../../core/angles/angles.ts';
import type { Line, Mark, Picture } from '../marks.ts';
import { hatchFor } from './hatches.ts';
import type { ObstructionShape } from './horizon-obstructions.ts';
import type { PictureWords } from './picture-words.ts';
import { ENGLISH } from './picture-words.ts';
import type { SkyPlace } from './sky-frame.ts';
import type { DayLine } from './sun-lines.ts';

export interface PlanInput {
  shapes: readonly ObstructionShape[];
  /** The solstices. */
  days: readonly DayLine[];
  /** Where the plane faces; null for a flat one. */
  surfaceAzimuth: number | null;
  size: number;
}

/** The sky from below as on a plan: north up, east to the right, the horizon as the rim, the zenith in the middle. */
export function planView(
  { shapes, days, surfaceAzimuth, size }: PlanInput,
  words: PictureWords = ENGLISH,
): Picture {
  const middle = size / 2;
  const radius = middle - 16;
  const at = ({ azimuth, elevation }: SkyPlace): [number, number] => {
    const r = radius * (1 - elevation / 90);
    return [middle + r * Math.sin(azimuth * RADIANS), middle - r * Math.cos(azimuth * RADIANS)];
  };
  const ring = (elevation: number): Line =>
    Array.from({ length: 73 }, (_, i) => at({ azimuth: i * 5, elevation })).flat();
  const marks: Mark[] = [
    { kind: 'path', lines: [ring(30), ring(60)], pen: { tone: 'rule', width: 0.6 } },
    {
      kind: 'path',
      lines: days.flatMap(({ path }) => path.map((part) => part.flatMap(at))),
      pen: { tone: 'ink', width: 0.9 },
    },
  ];
  const outlines = (parts: ObstructionShape['parts']): Line[] =>
    parts.map(({ azimuth, low, high }) => [
      ...azimuth.flatMap((a, i) => at({ azimuth: a, elevation: high[i] })),
      ...azimuth
        .map((a, i) => at({ azimuth: a, elevation: low[i] }))
        .reverse()
        .flat(),
    ]);
  for (const { parts, place, before } of shapes) {
    const hatch = { ...hatchFor(place), width: 0.8 };
    const pen = { tone: 'ink', width: 0.9 } as const;
    marks.push({ kind: 'path', lines: outlines(parts), closed: true, fill: { hatch }, pen });
    if (before)
      marks.push({ kind: 'path', lines: outlines(before), closed: true, pen: { ...pen, dash: [3, 2] } });
  }
  marks.push({ kind: 'path', lines: [ring(0)], closed: true, pen: { tone: 'ink', width: 1.6 } });
  for (const azimuth of [0, 90, 180, 270]) {
    const name = words.compass[azimuth / 45];
    const r = radius + 9;
    const [x, y] = [middle + r * Math.sin(azimuth * RADIANS), middle - r * Math.cos(azimuth * RADIANS) + 4];
    marks.push({ kind: 'text', x, y, text: name, size: 11, anchor: 'middle', bold: true });
  }
  if (surfaceAzimuth !== null) marks.push(...facing(middle, radius, surfaceAzimuth));
  return { width: size, height: size, marks };
}

/** An arrow down the slope. */
function facing(middle: number, radius: number, azimuth: number): Mark[] {
  const along = (r: number, turn = 0): [number, number] => [
    middle + r * Math.sin((azimuth + turn) * RADIANS),
    middle - r * Math.cos((azimuth + turn) * RADIANS),
  ];
  const tip = radius * 0.42;
  return [
    { kind: 'path', lines: [[middle, middle, ...along(tip)]], pen: { tone: 'ink', width: 2 } },
    {
      kind: 'path',
      lines: [[...along(tip + 5), ...along(tip - 3, 12), ...along(tip - 3, -12)]],
      closed: true,
      fill: { tone: 'ink' },
    },
  ];
}
