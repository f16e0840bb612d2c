import type { Hatch, Line } from '../../marks.ts';

export interface HatchShapes {
  strokes: Line[];
  /** Centres of rings, x, y, x, y, … */
  rings: number[];
}

/**
 * The strokes or rings of a hatch over a box, in the sheet's points: the pattern is turned about the sheet's upper left
 * corner and begins there, so that it falls where a tiled pattern does.
 */
export function hatchShapes(hatch: Hatch, [left, top, right, bottom]: readonly number[]): HatchShapes {
  const { spacing, crossed, ringed } = hatch;
  const turn = (hatch.angle * Math.PI) / 180;
  const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
  const corners = [left, top, right, top, right, bottom, left, bottom];
  const us = [0, 2, 4, 6].map((i) => corners[i] * cos + corners[i + 1] * sin);
  const vs = [0, 2, 4, 6].map((i) => corners[i + 1] * cos - corners[i] * sin);
  const back = (u: number, v: number) => [u * cos - v * sin, u * sin + v * cos];
  const [uLow, uHigh, vLow, vHigh] = [Math.min(...us), Math.max(...us), Math.min(...vs), Math.max(...vs)];
  const [uSteps, vSteps] = [stepsWithin(uLow, uHigh, spacing), stepsWithin(vLow, vHigh, spacing)];
  if (ringed) return { strokes: [], rings: uSteps.flatMap((u) => vSteps.flatMap((v) => back(u, v))) };
  const strokes = uSteps.map((u) => [...back(u, vLow), ...back(u, vHigh)]);
  if (crossed) strokes.push(...vSteps.map((v) => [...back(uLow, v), ...back(uHigh, v)]));
  return { strokes, rings: [] };
}

/** Places half a spacing off whole ones, as a pattern draws in the middle of its tile. */
function stepsWithin(low: number, high: number, spacing: number): number[] {
  const first = Math.floor(low / spacing);
  const count = Math.max(0, Math.ceil(high / spacing) - first + 1);
  return Array.from({ length: count }, (_, i) => (first + i + 0.5) * spacing);
}

/** Left, top, right, bottom of some lines. */
export function boxOf(lines: readonly Line[]): [number, number, number, number] {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const line of lines)
    for (let i = 0; i + 1 < line.length; i += 2) {
      [left, right] = [Math.min(left, line[i]), Math.max(right, line[i])];
      [top, bottom] = [Math.min(top, line[i + 1]), Math.max(bottom, line[i + 1])];
    }
  return [left, top, right, bottom];
}
