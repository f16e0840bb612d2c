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
  const weights = spreadWeights(cell);
  const reach = (weights.length - 1) / 2;
  const along = spreadAlong(irradiation, columns, rows, weights);
  const whole = weights.reduce((sum, weight) => sum + weight, 0);
  const perPatch = (10 / cell) ** 2 / whole ** 2;
  const values = new Float32Array(columns * rows);
  const sums = new Float64Array(columns);
  let highest = 0;
  for (let row = 0; row < rows; row++) {
    sums.fill(0);
    for (let k = 0; k < weights.length; k++) {
      const other = row + k - reach;
      const turned = other < 0 ? -1 - other : other >= rows ? 2 * rows - 1 - other : other;
      const weight = weights[k];
      for (let column = 0, i = turned * columns; column < columns; column++, i++)
        sums[column] += weight * along[i];
    }
    for (let column = 0; column < columns; column++) {
      const value = sums[column] * perPatch;
      values[row * columns + column] = value;
      if (value > highest) highest = value;
    }
  }
  return { columns, rows, cell, values, highest };
}

/** The same light in cells twice as large, for a drawing that shows no more. */
export function halved({ cell, columns, rows, irradiation }: SkyDensity): SkyDensity {
  const [fewer, lower] = [columns / 2, Math.ceil(rows / 2)];
  const joined = new Float32Array(fewer * lower);
  for (let row = 0; row < rows; row++)
    for (let column = 0; column < columns; column++)
      joined[(row >> 1) * fewer + (column >> 1)] += irradiation[row * columns + column];
  return { cell: 2 * cell, columns: fewer, rows: lower, irradiation: joined };
}

/** By distance in cells, the middle one in the middle. */
function spreadWeights(cell: number): Float64Array {
  const reach = Math.ceil((3 * SPREAD) / cell);
  return Float64Array.from({ length: 2 * reach + 1 }, (_, i) =>
    Math.exp(-(((i - reach) * cell) ** 2) / (2 * SPREAD ** 2)),
  );
}

/** Sums over the neighbours along each row, around the horizon. */
function spreadAlong(
  irradiation: ArrayLike<number>,
  columns: number,
  rows: number,
  weights: Float64Array,
): Float64Array {
  const reach = (weights.length - 1) / 2;
  const along = new Float64Array(columns * rows);
  const round = new Float64Array(columns + 2 * reach);
  for (let row = 0; row < rows; row++) {
    let lit = false;
    for (let i = 0; i < round.length; i++) {
      round[i] = irradiation[row * columns + ((i - reach + columns) % columns)];
      lit ||= round[i] > 0;
    }
    if (!lit) continue;
    for (let column = 0; column < columns; column++) {
      let sum = 0;
      for (let k = 0; k < weights.length; k++) sum += weights[k] * round[column + k];
      along[row * columns + column] = sum;
    }
  }
  return along;
}

/** Value at a direction, linear between cell centres. */
export function densityAt(
  { columns, rows, cell, values }: SmoothDensity,
  azimuth: number,
  elevation: number,
): number {
  const x = azimuth / cell - 0.5;
  const y = Math.min(rows - 1, Math.max(0, elevation / cell - 0.5));
  const column = Math.floor(x);
  const row = Math.min(rows - 2, Math.floor(y));
  const u = x - column;
  const v = y - row;
  const left = row * columns + ((column + columns) % columns);
  const right = row * columns + ((column + 1 + columns) % columns);
  const lower = values[left] * (1 - u) + values[right] * u;
  const upper = values[left + columns] * (1 - u) + values[right + columns] * u;
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
