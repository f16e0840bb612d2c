import type { Hatch } from '../marks.ts';

/** Told apart in black and white: first by direction, then by density, then crossed. */
const DIRECTIONS = [45, 135, 0, 90, 67.5, 112.5] as const;
const WAYS = [
  { spacing: 6, width: 1.1 },
  { spacing: 3.6, width: 0.9 },
  { spacing: 7, width: 0.9, crossed: true },
  { spacing: 9.5, width: 2 },
  { spacing: 4.6, width: 0.8, crossed: true },
] as const;

/** A hatch for each place in a list of obstructions; the first thirty differ, later ones repeat them more widely spaced. */
export function hatchFor(place: number): Hatch {
  const round = DIRECTIONS.length * WAYS.length;
  const way = WAYS[Math.floor(place / DIRECTIONS.length) % WAYS.length];
  const wider = 1 + Math.floor(place / round) * 0.3;
  // crossed strokes at 45° and 135° would look the same
  const turned = 'crossed' in way ? (place % DIRECTIONS.length) * 15 : DIRECTIONS[place % DIRECTIONS.length];
  return { ...way, angle: turned, spacing: way.spacing * wider, tone: 'ink' };
}
