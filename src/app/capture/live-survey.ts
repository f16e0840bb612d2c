import type { ApparentElevation, TrueAzimuth } from '../../core/angles/angles.ts';
import { fullCircle, RADIANS } from '../../core/angles/angles.ts';
import { PLANNING } from '../../core/pointing/planning-values.ts';
import type { PointedRun, PointedSighting, PointedSurvey } from '../../core/pointing/pointed-survey.ts';
import { offsetAt } from '../../core/pointing/run-ties.ts';
import { simplifiedSweep } from '../../core/pointing/simplified-sweep.ts';
import { sweepPoints } from '../../core/pointing/sweep-points.ts';
import type { SightingDirection } from '../../core/survey/sighting-direction.ts';
import type { Obstruction, SightingAxis, Survey, Trace } from '../../core/survey/survey.ts';
import { rawReading } from './raw-reading.ts';
import type { SensorSample } from './sensor-interfaces.ts';
import { withStation, withTrace } from './station-edits.ts';
import type { TraceChoice } from './trace-choice.ts';
import { traceFields } from './trace-choice.ts';

/** A sweep at work, of an obstruction that may not be named yet. */
export interface LiveSweep {
  /** Where it has gone so far. */
  swept: readonly SweptDirection[];
  axis: SightingAxis;
  run: PointedRun;
  choice: TraceChoice;
}

export type SweptDirection = SightingDirection & { timeMs: number };

/** A survey and where its sightings point. */
export interface LiveSurvey {
  survey: Survey;
  pointed: PointedSurvey;
}

/** A coarser line than what is stored: it is drawn anew several times a second. */
const LIVE_TOLERANCE = 0.5;
const UNNAMED: Obstruction = { id: 'sweep at work', name: 'Sweep', kind: 'other' };

/**
 * What the live figures are computed from: one station as pointed, with the sweep at work, and no readings, so that
 * little goes to the worker.
 */
export function liveSurvey(
  survey: Survey,
  stationId: string,
  pointed: PointedSurvey,
  sweep: LiveSweep | null,
): LiveSurvey {
  const stations = survey.stations
    .filter(({ id }) => id === stationId)
    .map((station) => ({ ...station, markSightings: [], headingChecks: [], indexChecks: [] }));
  const planes = survey.planes.map((plane) => ({ ...plane, tiltPlacings: [], azimuthSightings: [] }));
  const light = { ...survey, stations, planes, runs: [], readings: [], facts: [], photos: [] };
  const here = stations.flatMap(({ traces }) => traces.flatMap(({ sightings }) => sightings));
  const sightings = new Map(here.flatMap(({ id }) => entryOf(pointed.sightings.get(id))));
  const lightPointed = { ...pointed, sightings, planes: [], warnings: [] };
  const swept = sweep && sweptSightings(sweep, stationId);
  if (!sweep || !swept || swept.length < 2) return { survey: light, pointed: lightPointed };
  for (const sighting of swept) sightings.set(sighting.id, sighting);
  const trace = sweptTrace(sweep, swept);
  const known = light.obstructions.some(({ id }) => id === trace.obstruction);
  const obstructions = known ? light.obstructions : [...light.obstructions, UNNAMED];
  return {
    survey: withStation({ ...light, obstructions }, stationId, (station) => withTrace(station, trace)),
    pointed: lightPointed,
  };
}

const entryOf = (sighting: PointedSighting | undefined): [string, PointedSighting][] =>
  sighting ? [[sighting.id, sighting]] : [];

/** Where the sweep has gone so far, in true directions. */
export function sweptDirections(
  samples: readonly SensorSample[],
  axis: SightingAxis,
  run: PointedRun,
): SweptDirection[] {
  const { heading } = run;
  if (!heading || samples.length === 0) return [];
  const { points } = sweepPoints([rawReading('live', run.id, axis, samples)]);
  return simplifiedSweep(points, 'drawn', LIVE_TOLERANCE).map(({ azimuth, elevation, timeMs }) => ({
    azimuth: fullCircle(azimuth + offsetAt(heading, timeMs)) as TrueAzimuth,
    elevation: Math.max(-90, Math.min(90, elevation + run.index[axis].value)) as ApparentElevation,
    timeMs,
  }));
}

/** The sweep at work as it would be pointed once stored. */
function sweptSightings(sweep: LiveSweep, station: string): PointedSighting[] {
  return sweep.swept.map(({ timeMs, ...direction }, order) => ({
    id: `live ${order}`,
    path: '',
    station,
    trace: UNNAMED.id,
    mark: null,
    direction,
    undirected: null,
    source: 'reading',
    run: sweep.run.id,
    axis: sweep.axis,
    takenAtMs: timeMs,
    random: {
      azimuth: Math.min(90, PLANNING.sweepPointing / Math.max(1e-6, Math.cos(direction.elevation * RADIANS))),
      elevation: PLANNING.sweepPointing,
    },
  }));
}

function sweptTrace({ choice }: LiveSweep, swept: readonly PointedSighting[]): Trace {
  return {
    id: UNNAMED.id,
    obstruction: choice.obstruction ?? UNNAMED.id,
    ...traceFields({ ...choice, shape: choice.shape === 'outline' ? 'skyline' : choice.shape, way: 'sweep' }),
    sightings: swept.map(({ id }, order) => ({ id, order })),
  };
}
