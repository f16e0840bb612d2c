import type { Reading, ReadingSample, Sighting, SightingAxis } from '../survey/survey.ts';
import { sightVector } from './attitude.ts';
import type { AveragedDirection } from './average-direction.ts';
import { averageDirection } from './average-direction.ts';

/** A pointing in the frame of a run. */
export interface FramePointing extends AveragedDirection {
  run: string;
  axis: SightingAxis;
  takenAtMs: number;
  /** Taken from one row of a moving sweep. */
  moving: boolean;
}

/** Corrections of the inclination by axis, degrees. */
export type AxisIndex = Readonly<Record<SightingAxis, number>>;

const NO_INDEX: AxisIndex = { camera: 0, 'top-edge': 0 };

export const axisOf = (reading: Reading): SightingAxis => reading.axis ?? 'camera';

/** A reading's rows: its samples, else its own angles as one row; none where it has no angles. */
export function rowsOfReading({ samples, alpha, beta, gamma }: Reading): ReadingSample[] {
  if (samples && samples.length > 0) return samples;
  return alpha === undefined || beta === undefined || gamma === undefined ? [] : [[0, alpha, beta, gamma]];
}

/** Where one reading pointed, in its run's frame; null where it has no angles. */
export const pointingOfReading = (reading: Reading, index: AxisIndex = NO_INDEX): FramePointing | null =>
  pointingOf([reading], index);

/**
 * Where a sighting pointed: the mean of all rows of its readings, or for a point of a sweep the row at `sampleAt`. All
 * readings are of one run and axis; those of another than the first are left out. Null without angles.
 */
export function pointingOfSighting(
  sighting: Pick<Sighting, 'reading' | 'readings' | 'sampleAt'>,
  readings: ReadonlyMap<string, Reading>,
  indexOf: (run: string) => AxisIndex = () => NO_INDEX,
): FramePointing | null {
  const ids = new Set([
    ...(sighting.reading === undefined ? [] : [sighting.reading]),
    ...(sighting.readings ?? []),
  ]);
  const taken = [...ids].flatMap((id) => readings.get(id) ?? []);
  if (taken.length === 0) return null;
  const index = indexOf(taken[0].run);
  return sighting.sampleAt === undefined
    ? pointingOf(taken, index)
    : pointingAt(taken[0], sighting.sampleAt, index);
}

function pointingOf(readings: readonly Reading[], index: AxisIndex): FramePointing | null {
  const [first] = readings;
  const axis = axisOf(first);
  const alike = readings.filter((reading) => reading.run === first.run && axisOf(reading) === axis);
  const timed = alike.flatMap((reading) => {
    const startMs = Date.parse(reading.takenAt);
    return rowsOfReading(reading).map((row) => ({ row, timeMs: startMs + row[0] }));
  });
  const mean = averageDirection(
    timed.map(({ row }) => row),
    axis,
    index[axis],
  );
  if (!mean) return null;
  const takenAtMs = timed.reduce((sum, { timeMs }) => sum + timeMs, 0) / timed.length;
  return { ...mean, run: first.run, axis, takenAtMs, moving: false };
}

/** The row of a reading nearest in time. */
function pointingAt(reading: Reading, ms: number, index: AxisIndex): FramePointing | null {
  const axis = axisOf(reading);
  const rows = rowsOfReading(reading);
  if (rows.length === 0) return null;
  const row = rows.reduce((best, one) => (Math.abs(one[0] - ms) < Math.abs(best[0] - ms) ? one : best));
  const [, alpha, beta, gamma] = row;
  const mean = averageDirection([row], axis, index[axis]);
  if (!mean) return null;
  return {
    ...mean,
    vector: sightVector({ alpha, beta, gamma }, axis, index[axis]),
    run: reading.run,
    axis,
    takenAtMs: Date.parse(reading.takenAt) + row[0],
    moving: true,
  };
}
