import type { SkyPlace } from './sky-frame.ts';
import type { SmoothDensity } from './smooth-density.ts';

type Ends = [from: string, to: string];

/**
 * Lines of one level over a smooth density (marching squares, saddles by their mean). A column beyond the last is the
 * first again, so lines go around the horizon.
 */
export function contourLines(density: SmoothDensity, level: number): SkyPlace[][] {
  const { columns, rows } = density;
  const places = new Map<string, SkyPlace>();
  const pieces: Ends[] = [];
  for (let row = 0; row < rows - 1; row++)
    for (let column = 0; column < columns; column++)
      pieces.push(...squarePieces(density, row, column, level, places));
  return joined(pieces).map((keys) => keys.map((key) => places.get(key)!));
}

function squarePieces(
  { columns, cell, values }: SmoothDensity,
  row: number,
  column: number,
  level: number,
  places: Map<string, SkyPlace>,
): Ends[] {
  const right = (column + 1) % columns;
  const corners = [
    values[row * columns + column],
    values[row * columns + right],
    values[(row + 1) * columns + right],
    values[(row + 1) * columns + column],
  ];
  const above = corners.map((value) => value >= level);
  if (above.every((is) => is === above[0])) return [];
  const share = (a: number, b: number) => (level - corners[a]) / (corners[b] - corners[a]);
  const place = (key: string, x: number, y: number): string => {
    if (!places.has(key)) places.set(key, { azimuth: ((x + 0.5) * cell) % 360, elevation: (y + 0.5) * cell });
    return key;
  };
  const sides: (() => string)[] = [
    () => place(`h${row},${column}`, column + share(0, 1), row),
    () => place(`v${row},${right}`, column + 1, row + share(1, 2)),
    () => place(`h${row + 1},${column}`, column + share(3, 2), row + 1),
    () => place(`v${row},${column}`, column, row + share(0, 3)),
  ];
  const crossed = [0, 1, 2, 3].filter((side) => above[side] !== above[(side + 1) % 4]);
  if (crossed.length === 2) return [[sides[crossed[0]](), sides[crossed[1]]()]];
  const middle = corners.reduce((sum, value) => sum + value, 0) / 4 >= level;
  const [a, b, c, d] = sides.map((side) => side());
  return middle === above[0]
    ? [
        [a, b],
        [c, d],
      ]
    : [
        [d, a],
        [b, c],
      ];
}

/** Pieces with common ends, end to end. */
function joined(pieces: readonly Ends[]): string[][] {
  const at = new Map<string, number[]>();
  pieces.forEach((ends, i) => ends.forEach((key) => at.set(key, [...(at.get(key) ?? []), i])));
  const used = new Set<number>();
  const follow = (key: string, line: string[]): void => {
    let here = key;
    for (;;) {
      const next = at.get(here)?.find((i) => !used.has(i));
      if (next === undefined) return;
      used.add(next);
      const [from, to] = pieces[next];
      here = from === here ? to : from;
      line.push(here);
    }
  };
  return pieces.flatMap(([from, to], i) => {
    if (used.has(i)) return [];
    used.add(i);
    const [forth, back] = [[to], [from]];
    follow(to, forth);
    follow(from, back);
    return [[...back.reverse(), ...forth]];
  });
}
