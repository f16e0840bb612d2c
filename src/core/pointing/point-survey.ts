import type { ApparentElevation, TrueAzimuth } from '../angles/angles.ts';
import { RADIANS, fullCircle } from '../angles/angles.ts';
import type { Problem } from '../survey/problem.ts';
import { sightingDirection } from '../survey/sighting-direction.ts';
import type { Sighting, Survey } from '../survey/survey.ts';
import { openLookWarnings } from './open-looks.ts';
import { pointedTraceWarnings } from './pointed-traces.ts';
import { pointPlanes } from './point-planes.ts';
import { offsetAt } from './run-ties.ts';
import { solveRuns } from './solve-runs.ts';
import type { SolvedRuns } from './solve-runs.ts';
import { PLANNING } from './planning-values.ts';
import type { PointedRun, PointedSighting, PointedSurvey, RunHeading, Undirected } from './pointed-survey.ts';
import type { FramePointing } from './reading-direction.ts';
import { pointingOfSighting } from './reading-direction.ts';

/** The direction of every sighting of a survey that the parser has passed, and what it may err by. */
export function pointSurvey(survey: Survey): PointedSurvey {
  const solved = solveRuns(survey);
  const { planes, warnings: ofPlanes } = pointPlanes(survey, solved);
  const sightings = new Map<string, PointedSighting>();
  const warnings: Problem[] = [...solved.warnings, ...ofPlanes];
  for (const placed of placedSightings(survey)) {
    const pointed = pointSighting(placed, solved);
    sightings.set(pointed.id, pointed);
    if (pointed.undirected) warnings.push({ path: pointed.path, message: pointed.undirected.message });
  }
  const runs = [...solved.runs.values()];
  warnings.push(
    ...uncheckedRuns(survey, solved, sightings),
    ...pointedTraceWarnings(survey, sightings),
    ...openLookWarnings(survey, runs),
  );
  return {
    runs,
    sightings,
    planes,
    typed: { heading: PLANNING.typedHeading, index: PLANNING.typedIndex },
    warnings,
  };
}

/** A warning for each run whose sightings rest on a compass alone. */
function uncheckedRuns(
  survey: Survey,
  { runs }: SolvedRuns,
  sightings: ReadonlyMap<string, PointedSighting>,
): Problem[] {
  const used = new Set([...sightings.values()].map(({ run }) => run));
  return survey.runs.flatMap(({ id }, i) => {
    const heading = runs.get(id)?.heading;
    if (!used.has(id) || !heading?.outliers) return [];
    const message = `The azimuths of this run rest on a compass alone, good to about ${heading.standardDeviation.toFixed(0)}° and now and then far off. One heading check, by shadow or by a mark of known bearing, makes them sure.`;
    return [{ path: `runs[${i}]`, message }];
  });
}

interface PlacedSighting {
  sighting: Sighting;
  path: string;
  station: string;
  trace: string | null;
}

function placedSightings(survey: Survey): PlacedSighting[] {
  return survey.stations.flatMap((station, s) => [
    ...station.traces.flatMap((trace, t) =>
      trace.sightings.map((sighting, i) => ({
        sighting,
        path: `stations[${s}].traces[${t}].sightings[${i}]`,
        station: station.id,
        trace: trace.id,
      })),
    ),
    ...(station.markSightings ?? []).map((sighting, i) => ({
      sighting,
      path: `stations[${s}].markSightings[${i}]`,
      station: station.id,
      trace: null,
    })),
  ]);
}

function pointSighting(
  { sighting, path, station, trace }: PlacedSighting,
  solved: SolvedRuns,
): PointedSighting {
  const known = { id: sighting.id, path, station, trace, mark: sighting.mark ?? null };
  const byHand = sightingDirection(sighting);
  if (byHand)
    return {
      ...known,
      direction: byHand,
      undirected: null,
      source: sighting.amendments?.length ? 'amendment' : 'typed',
      run: null,
      axis: 'camera',
      takenAtMs: null,
      random: randomOf(PLANNING.typedAzimuth, PLANNING.typedElevation, byHand.elevation),
    };
  const pointing = pointingOfSighting(sighting, solved.readings, solved.indexOf);
  const run = pointing && (solved.runs.get(pointing.run) ?? null);
  const undirected = whyUndirected(pointing, run);
  const spread = pointing ? spreadOf(pointing) : PLANNING.pointing;
  return {
    ...known,
    direction: pointing && run?.heading && !undirected ? trueDirection(pointing, run.heading) : null,
    undirected,
    source: 'reading',
    run: pointing?.run ?? null,
    axis: pointing?.axis ?? 'camera',
    takenAtMs: pointing?.takenAtMs ?? null,
    random: randomOf(spread, spread, pointing?.elevation ?? 0),
  };
}

function trueDirection({ azimuth, elevation, takenAtMs }: FramePointing, heading: RunHeading) {
  return {
    azimuth: fullCircle(azimuth + offsetAt(heading, takenAtMs)) as TrueAzimuth,
    elevation: elevation as ApparentElevation,
  };
}

function whyUndirected(pointing: FramePointing | null, run: PointedRun | null): Undirected | null {
  if (!pointing)
    return {
      code: 'no-angles',
      message:
        'The reading of this sighting has no angles that could be used, so the sighting is left out. Sight it again, type azimuth and elevation, or amend it.',
    };
  if (run?.refused)
    return {
      code: 'run-refused',
      message: `This sighting is left out, since its run is refused: ${run.refused}`,
    };
  if (!run?.heading)
    return {
      code: 'no-heading',
      message:
        'The phone had no compass here and nothing ties its azimuths to north, so this sighting is left out. Take one heading check in the same run (sun by shadow, or a mark of known bearing), sight a mark of a run that has one, or give a mark’s bearing from a plan.',
    };
  return null;
}

/** Spread of one pointing each way across its line, degrees. */
function spreadOf({ scatter, count, moving }: FramePointing): number {
  if (moving) return PLANNING.sweepPointing;
  return Math.max(PLANNING.pointing, count > 1 ? scatter / Math.SQRT2 / Math.sqrt(count) : 0);
}

function randomOf(across: number, along: number, elevation: number): { azimuth: number; elevation: number } {
  const level = Math.cos(elevation * RADIANS);
  return { azimuth: Math.min(90, across / Math.max(level, 1e-6)), elevation: along };
}
