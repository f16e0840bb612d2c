import type { Problem } from '../survey/problem.ts';
import type { IndexCheck, Reading, SightingAxis, Survey } from '../survey/survey.ts';
import { angleBetween, dot } from '../angles/vectors.ts';
import { attitude } from './attitude.ts';
import { groupedBy } from './grouped-by.ts';
import { PLANNING } from './planning-values.ts';
import type { PointedRun } from './pointed-survey.ts';
import { axisOf, pointingOfReading, rowsOfReading } from './reading-direction.ts';

type RunIndex = PointedRun['index'];

/** Two pointings of one mark cannot lie further apart, degrees. No source. */
const FURTHEST = 12;
const AXES: readonly SightingAxis[] = ['camera', 'top-edge'];

/** What one two-face check found. */
interface IndexFound {
  device: string;
  axis: SightingAxis;
  value: number;
}

/**
 * Correction of the inclination of every run, by axis: the mean of the two-face checks of its device and axis (of all
 * devices without a name alike), else 0 with the planning deviation. With the phone turned 180° about the viewing axis
 * the error changes sign: correction = (turned - upright) / 2. The part that does not turn with the phone stays, as a
 * deviation.
 */
export function elevationIndexes(
  survey: Survey,
  readings: ReadonlyMap<string, Reading>,
): { byRun: Map<string, RunIndex>; warnings: Problem[] } {
  const deviceOf = new Map(survey.runs.map(({ id, device }) => [id, device ?? '']));
  const warnings: Problem[] = [];
  const found: IndexFound[] = [];
  survey.stations.forEach((station, s) => {
    (station.indexChecks ?? []).forEach((check, c) => {
      const result = indexOfCheck(check, readings, deviceOf);
      if (typeof result === 'string')
        warnings.push({ path: `stations[${s}].indexChecks[${c}]`, message: result });
      else found.push(result);
    });
  });
  const byDevice = groupedBy(found, ({ device, axis }) => JSON.stringify([device, axis]));
  const byRun = new Map(
    survey.runs.map(({ id, device = '' }) => {
      const index = AXES.map(
        (axis) => [axis, meanIndex(byDevice.get(JSON.stringify([device, axis])) ?? [])] as const,
      );
      return [id, Object.fromEntries(index) as RunIndex];
    }),
  );
  return { byRun, warnings };
}

function meanIndex(found: readonly IndexFound[]): RunIndex[SightingAxis] {
  if (found.length === 0) return { value: 0, standardDeviation: PLANNING.elevationIndex, source: 'planned' };
  const value = found.reduce((sum, one) => sum + one.value, 0) / found.length;
  const read = PLANNING.pointing / Math.SQRT2 / Math.sqrt(found.length);
  return { value, standardDeviation: Math.hypot(read, PLANNING.elevationIndexTurned), source: 'two-face' };
}

/** What a check found, or why it counts for nothing, as a sentence. */
function indexOfCheck(
  check: IndexCheck,
  readings: ReadonlyMap<string, Reading>,
  deviceOf: ReadonlyMap<string, string>,
): IndexFound | string {
  const [upright, turned] = [readings.get(check.upright), readings.get(check.turned)];
  const [first, second] = [upright && pointingOfReading(upright), turned && pointingOfReading(turned)];
  if (!upright || !turned || !first || !second)
    return 'A reading of this two-face check has no angles, so the check counts for nothing. Take it again.';
  const device = deviceOf.get(upright.run) ?? '';
  if (axisOf(upright) !== axisOf(turned) || device !== deviceOf.get(turned.run))
    return 'The two readings of this check are of different phones or axes, so it counts for nothing. Take it again with one.';
  const sameRun = upright.run === turned.run;
  const apart = sameRun
    ? angleBetween(first.vector, second.vector)
    : Math.abs(first.elevation - second.elevation);
  if (apart > FURTHEST)
    return `The two readings of this check lie ${apart.toFixed(0)}° apart, so they are not of one mark. Take it again.`;
  if (!isTurned(upright, turned))
    return 'Between the two readings of this check the phone was not turned upside down about the viewing axis, so it counts for nothing. Take it again, the second time with the phone upside down.';
  const lift = (first.elevation - second.elevation) / 2;
  return { device, axis: axisOf(upright), value: -lift };
}

/** Whether the phone's other axis, level with the horizon or up, has changed sides. */
function isTurned(upright: Reading, turned: Reading): boolean {
  const [a, b] = [upright, turned].map((reading) => {
    const [, alpha, beta, gamma] = rowsOfReading(reading)[0];
    const { y, z } = attitude({ alpha, beta, gamma });
    return axisOf(reading) === 'camera' ? y : z;
  });
  return dot([0, 0, 1], a) > 0.5 && dot([0, 0, 1], b) < -0.5;
}
