import { COLUMNS, COLUMN_WIDTH } from '../horizon/horizon-profile.ts';
import { directFrom } from './blocked-light.ts';
import type { SkyMap } from './sky-map.ts';
import { BIN } from './sun-paths.ts';

/** Where in the sky a plane's direct light comes from, for drawing. */
export interface SkyDensity {
  /** Size of a cell, degrees. */
  readonly cell: number;
  readonly columns: number;
  readonly rows: number;
  /** Irradiation of each cell over the year, kWh/m2, [row · columns + column]; row 0 lies on the horizon. */
  readonly irradiation: Float32Array;
}

/** `cell` in degrees, a multiple of half a degree that divides 90. Throws RangeError for another. */
export function skyDensity(map: SkyMap, cell = 1): SkyDensity {
  const perCell = cell / COLUMN_WIDTH;
  if (!(Number.isInteger(perCell) && Number.isInteger(90 / cell)))
    throw new RangeError(`cell must be a multiple of ${COLUMN_WIDTH} that divides 90, got ${cell}`);
  const [columns, rows] = [COLUMNS / perCell, 90 / cell];
  const irradiation = new Float32Array(columns * rows);
  for (let column = 0; column < COLUMNS; column++)
    for (let month = 0; month < 12; month++) {
      const [lowest, highest] = rowsOf(map, column * 12 + month, cell, rows);
      for (let row = lowest; row <= highest; row++)
        irradiation[row * columns + Math.floor(column / perCell)] += directFrom(
          map,
          month,
          column,
          row * cell,
          row === rows - 1 ? 91 : (row + 1) * cell,
        );
    }
  return { cell, columns, rows, irradiation };
}

/** First and last row of cells that a strip of the map reaches into. */
function rowsOf({ grid }: SkyMap, strip: number, cell: number, rows: number): [number, number] {
  const nodes = grid.first[strip + 1] - grid.first[strip];
  if (nodes === 0) return [0, -1];
  const lowest = Math.floor((grid.bottom[strip] * BIN) / cell);
  const highest = Math.floor(((grid.bottom[strip] + nodes - 1) * BIN) / cell);
  return [Math.min(lowest, rows - 1), Math.min(highest, rows - 1)];
}
