import type { SkyDensity } from '../../core/shading/sky-density.ts';

/** Energy by direction as a smooth surface, kWh/m2 a year from a patch of 10° by 10° of the unrolled sky. */
export interface SmoothDensity {
  readonly columns: number;
  readonly rows: number;
  readonly cell: number;
  /** At cell centres, [row · columns + column]. */
  readonly values: Float32Array;
  readonly highest: number;
}

/** The days of a year leave stripes; this spread, degrees, makes one surface of them. */
const SPREAD = 2.2;

/** Spreads each cell over its neighbours; around the horizon it joins, at the ground it is turned back. */
export function smoothDensity({ cell, columns, rows, irradiation }: SkyDensity): SmoothDensity {
  const reach = Math.ceil((3 * SPREAD) / cell);
  const weights = Array.from({ length: 2 * reach + 1 }, (_, i) =>
    Math.exp(-(((i - reach) * cell) ** 2) / (2 * SPREAD ** 2)),
  );
  const whole = weights.reduce((sum, weight) => sum + weight, 0);
  const perPatch = (10 / cell) ** 2;
  const along = new Float32Array(columns * rows);
  const values = new Float32Array(columns * rows);
  let highest = 0;
  for (let row = 0; row < rows; row++)
    for (let column = 0; column < columns; column++) {
      let sum = 0;
      for (let k = -reach; k <= reach; k++)
        sum += weights[k + reach] * irradiation[row * columns + ((column + k + columns) % columns)];
      along[row * columns + column] = (sum / whole) * perPatch;
    }
  for (let row = 0; row < rows; row++)
    for (let column = 0; column < columns; column++) {
      let sum = 0;
      for (let k = -reach; k <= reach; k++) {
        const other = row + k < 0 ? -1 - row - k : row + k >= rows ? 2 * rows - 1 - row - k : row + k;
        sum += weights[k + reach] * along[other * columns + column];
      }
      const value = sum / whole;
      values[row * columns + column] = value;
      if (value > highest) highest = value;
    }
  return { columns, rows, cell, values, highest };
}

/** Value at a direction, linear between cell centres. */
export function densityAt(
  { columns, rows, cell, values }: SmoothDensity,
  azimuth: number,
  elevation: number,
): number {
  const x = azimuth / cell - 0.5;
  const y = Math.min(rows - 1, Math.max(0, elevation / cell - 0.5));
  const [column, row] = [Math.floor(x), Math.min(rows - 2, Math.floor(y))];
  const [u, v] = [x - column, y - row];
  const at = (r: number, c: number) => values[r * columns + ((c + columns) % columns)];
  const lower = at(row, column) * (1 - u) + at(row, column + 1) * u;
  const upper = at(row + 1, column) * (1 - u) + at(row + 1, column + 1) * u;
  return lower * (1 - v) + upper * v;
}

const ROUND = [1, 2, 5];

/** Two to four round levels for contours below the highest value; none where there is no light. */
export function contourLevels(highest: number): number[] {
  if (!(highest > 0)) return [];
  const power = 10 ** Math.floor(Math.log10(highest / 4));
  const steps = ROUND.map((digit) => digit * power).concat(10 * power);
  const step = steps.find((size) => highest / size < 4.5)!;
  const count = Math.floor((highest * 0.97) / step);
  return Array.from({ length: count }, (_, k) => Number(((k + 1) * step).toPrecision(6)));
}
