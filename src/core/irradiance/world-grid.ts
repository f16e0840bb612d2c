import type { Parsed } from '../survey/problem.ts';
import type { Months } from '../survey/survey.ts';

/** Monthly climate of the world on a grid; a plane of twelve months is decoded when it is first asked for. */
export interface WorldGrid {
  readonly kt: GridPlane;
  readonly kd: GridPlane;
  readonly t2m: GridPlane;
}

export interface GridPlane {
  readonly rows: number;
  readonly cols: number;
  /** Degrees between centres of neighbouring cells. */
  readonly step: number;
  /** Centre of the first row (the northernmost) and of the first column (the westernmost). */
  readonly firstLat: number;
  readonly firstLon: number;
  /** Value of a cell; month 0 to 11. */
  at(month: number, row: number, col: number): number;
}

const MAGIC = 'CLG1';
const MONTHS = 12;
const NAMES = ['kt', 'kd', 't2m'] as const;

/** Reads the header of a grid file (layout in the file's own notes); the planes stay packed until used. */
export function decodeWorldGrid(bytes: ArrayBuffer): Parsed<WorldGrid> {
  const header = headerOf(bytes);
  if (header === null)
    return {
      ok: false,
      problems: [{ path: 'header', message: 'is not that of a climate grid. Install the app again.' }],
    };
  const planes: Partial<Record<(typeof NAMES)[number], GridPlane>> = {};
  for (const name of NAMES) {
    const found = header.planes.find((plane) => isRecord(plane) && plane.name === name);
    const plane = isRecord(found) ? gridPlane(bytes, header.dataStart, found) : null;
    if (plane === null)
      return {
        ok: false,
        problems: [
          { path: name, message: 'is missing or damaged in the climate grid. Install the app again.' },
        ],
      };
    planes[name] = plane;
  }
  return { ok: true, value: planes as WorldGrid, warnings: [] };
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;

/** Bytes of text that are plain ASCII, which the header is. */
const asciiText = (bytes: Uint8Array) => Array.from(bytes, (code) => String.fromCharCode(code)).join('');

function headerOf(bytes: ArrayBuffer): { planes: unknown[]; dataStart: number } | null {
  if (bytes.byteLength < 8 || asciiText(new Uint8Array(bytes, 0, 4)) !== MAGIC) return null;
  const length = new DataView(bytes).getUint32(4, true);
  if (length > 100_000 || 8 + length > bytes.byteLength) return null;
  try {
    const header: unknown = JSON.parse(asciiText(new Uint8Array(bytes, 8, length)));
    if (!isRecord(header) || !Array.isArray(header.planes)) return null;
    return { planes: header.planes, dataStart: 8 + length };
  } catch {
    return null;
  }
}

function gridPlane(bytes: ArrayBuffer, dataStart: number, header: Record<string, unknown>): GridPlane | null {
  const number = (key: string) => (Number.isFinite(header[key]) ? (header[key] as number) : NaN);
  const shape = { rows: number('rows'), cols: number('cols'), step: number('step') };
  const corner = { firstLat: number('firstLat'), firstLon: number('firstLon') };
  const scale = number('scale');
  const offset = number('offset');
  const from = dataStart + number('offsetBytes');
  const size = shape.rows * shape.cols;
  const whole =
    shape.rows > 0 && shape.cols > 0 && Number.isInteger(shape.rows) && Number.isInteger(shape.cols);
  if (!whole || !(shape.step > 0) || Number.isNaN(corner.firstLat + corner.firstLon + scale + offset))
    return null;
  if (!(from >= dataStart && from + MONTHS * size <= bytes.byteLength)) return null;
  const months: Uint8Array[] = [];
  const month = (m: number) =>
    (months[m] ??= summed(new Uint8Array(bytes, from + m * size, size), shape.cols));
  const at = (m: number, row: number, col: number) => month(m)[row * shape.cols + col] * scale + offset;
  return { ...shape, ...corner, at };
}

/** Undoes the differences along each row. */
function summed(differences: Uint8Array, cols: number): Uint8Array {
  const values = new Uint8Array(differences);
  for (let i = 0; i < values.length; i++) if (i % cols !== 0) values[i] += values[i - 1];
  return values;
}

/**
 * Monthly clearness index, diffuse share (both 0 to 1) and air temperature [°C] at a place, linear between the centres
 * of cells. Longitude wraps; beyond the first and last row their values hold.
 */
export function gridAt(
  grid: WorldGrid,
  latitude: number,
  longitude: number,
): { kt: Months; kd: Months; t2m: Months } {
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  if (!(Math.abs(longitude) <= 360)) throw new RangeError(`longitude must be -360 to 360, got ${longitude}`);
  return {
    kt: planeAt(grid.kt, latitude, longitude),
    kd: planeAt(grid.kd, latitude, longitude),
    t2m: planeAt(grid.t2m, latitude, longitude),
  };
}

function planeAt(plane: GridPlane, latitude: number, longitude: number): Months {
  const south = Math.min(Math.max((plane.firstLat - latitude) / plane.step, 0), plane.rows - 1);
  const east = ((longitude - plane.firstLon) / plane.step + 2 * plane.cols) % plane.cols;
  const row = Math.min(Math.floor(south), Math.max(plane.rows - 2, 0));
  const col = Math.floor(east) % plane.cols;
  const nextRow = Math.min(row + 1, plane.rows - 1);
  const nextCol = (col + 1) % plane.cols;
  const [v, u] = [south - row, east - Math.floor(east)];
  return Array.from({ length: MONTHS }, (_, m) => {
    const upper = plane.at(m, row, col) * (1 - u) + plane.at(m, row, nextCol) * u;
    const lower = plane.at(m, nextRow, col) * (1 - u) + plane.at(m, nextRow, nextCol) * u;
    return upper * (1 - v) + lower * v;
  }) as Months;
}
