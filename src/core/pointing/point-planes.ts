import { fullCircle, turnBetween } from '../angles/angles.ts';
import type { Problem } from '../survey/problem.ts';
import type { RoofPlane, Survey } from '../survey/survey.ts';
import { groupedBy } from './grouped-by.ts';
import type { LaidPlane } from './laid-phone.ts';
import { facingFromEdge, laidPlane } from './laid-phone.ts';
import { PLANNING } from './planning-values.ts';
import type { PlaneAngle, PointedPlane } from './pointed-survey.ts';
import { pointingOfReading, rowsOfReading } from './reading-direction.ts';
import { deviationAt, offsetAt } from './run-ties.ts';
import type { SolvedRuns } from './solve-runs.ts';

/** What was settled may differ from what was read by this much, degrees, or by three deviations, before it is said. */
const TELLING = { tilt: 2, azimuth: 5 } as const;

/** What each plane's own readings say of its tilt and facing, and where the record's values differ from them. */
export function pointPlanes(
  survey: Survey,
  solved: SolvedRuns,
): { planes: PointedPlane[]; warnings: Problem[] } {
  const warnings: Problem[] = [];
  const planes = survey.planes.map((plane, p) => {
    const laid = laidGroups(plane, solved);
    const tilt = tiltOf(laid);
    const azimuth = azimuthOf(plane, laid, solved);
    const at = `planes[${p}]`;
    if (tilt && Math.abs(tilt.value - plane.surfaceTilt) > Math.max(TELLING.tilt, 3 * tilt.standardDeviation))
      warnings.push({
        path: `${at}.surfaceTilt`,
        message: `The phone laid on "${plane.name}" read a tilt of ${tilt.value.toFixed(1)}°; the record says ${plane.surfaceTilt}°. Take over the one that is right.`,
      });
    const turn = azimuth && Math.abs(turnBetween(azimuth.value, plane.surfaceAzimuth));
    if (azimuth && turn! > Math.max(TELLING.azimuth, 3 * azimuth.standardDeviation))
      warnings.push({
        path: `${at}.surfaceAzimuth`,
        message: `By the readings taken along "${plane.name}" it faces ${azimuth.value.toFixed(0)}°; the record says ${plane.surfaceAzimuth}°. Take over the one that is right.`,
      });
    return { id: plane.id, tilt, azimuth };
  });
  return { planes, warnings };
}

interface LaidGroup {
  run: string;
  atMs: number;
  laid: LaidPlane;
}

/** A plane's placings, by run and by how the phone was held. */
function laidGroups({ tiltPlacings = [] }: RoofPlane, { readings, runs }: SolvedRuns): LaidGroup[] {
  const placed = tiltPlacings.flatMap(({ reading: id, held = 'flat' }) => {
    const reading = readings.get(id);
    if (!reading || runs.get(reading.run)?.refused) return [];
    return [{ held, reading, rows: rowsOfReading(reading) }];
  });
  const groups = groupedBy(placed, ({ held, reading }) => JSON.stringify([held, reading.run]));
  return [...groups.values()].flatMap((group) => {
    const laid = laidPlane(group);
    const times = group.map(({ reading }) => Date.parse(reading.takenAt));
    const atMs = times.reduce((sum, timeMs) => sum + timeMs, 0) / times.length;
    return laid ? [{ run: group[0].reading.run, atMs, laid }] : [];
  });
}

function tiltOf(groups: readonly LaidGroup[]): PlaneAngle | null {
  return combined(
    groups.map(({ laid }) => ({ ...laid, value: laid.tilt, standardDeviation: laid.tiltDeviation })),
    0,
  );
}

/** From sightings along its edges, else from how the phone lay. */
function azimuthOf(plane: RoofPlane, groups: readonly LaidGroup[], solved: SolvedRuns): PlaneAngle | null {
  const sighted = (plane.azimuthSightings ?? []).flatMap(({ reading: id, along }) => {
    const reading = solved.readings.get(id);
    const pointing = reading && pointingOfReading(reading, solved.indexOf(reading.run));
    if (!pointing) return [];
    const facing = (value: number) => facingFromEdge(value, along, plane.surfaceAzimuth);
    return inTruth(pointing.run, pointing.takenAtMs, pointing.azimuth, PLANNING.pointing, solved).map(
      (one) => ({
        ...one,
        value: facing(one.value),
        scatter: 0,
        count: 1,
        bothWays: true,
      }),
    );
  });
  if (sighted.length > 0) return wrapped(combined(sighted, sighted[0].value));
  const laid = groups.flatMap(({ run, atMs, laid: one }) =>
    one.facing === null
      ? []
      : inTruth(run, atMs, one.facing, one.facingDeviation, solved).map((angle) => ({ ...one, ...angle })),
  );
  return laid.length > 0 ? wrapped(combined(laid, laid[0].value)) : null;
}

const wrapped = (angle: PlaneAngle | null) => angle && { ...angle, value: fullCircle(angle.value) };

/** An azimuth of a run's frame as a true one; none where the run has no heading. */
function inTruth(run: string, atMs: number, azimuth: number, deviation: number, { runs }: SolvedRuns) {
  const { heading = null, refused = null } = runs.get(run) ?? {};
  if (!heading || refused) return [];
  return [
    {
      value: fullCircle(azimuth + offsetAt(heading, atMs)),
      standardDeviation: Math.hypot(deviation, deviationAt(heading, atMs)),
    },
  ];
}

/** Weighted mean about a base [degrees]; no surer than the surest, since their errors are largely the same. */
function combined(angles: readonly PlaneAngle[], base: number): PlaneAngle | null {
  if (angles.length === 0) return null;
  const weights = angles.map(({ standardDeviation }) => 1 / standardDeviation ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const turn = angles.reduce((sum, { value }, i) => sum + weights[i] * turnBetween(base, value), 0) / total;
  const count = angles.reduce((sum, angle) => sum + angle.count, 0);
  const value = base + turn;
  const squares = angles.reduce(
    (sum, angle) => sum + angle.count * (angle.scatter ** 2 + turnBetween(value, angle.value) ** 2),
    0,
  );
  return {
    value,
    standardDeviation: Math.min(...angles.map(({ standardDeviation }) => standardDeviation)),
    scatter: Math.sqrt(squares / count),
    count,
    bothWays: angles.every(({ bothWays }) => bothWays),
  };
}
