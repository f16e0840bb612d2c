import { fullCircle } from '../../core/angles/angles.ts';
import type { PointedRun, PointedSurvey } from '../../core/pointing/pointed-survey.ts';
import { offsetAt } from '../../core/pointing/run-ties.ts';
import { simplifiedSweep } from '../../core/pointing/simplified-sweep.ts';
import { sweepPoints } from '../../core/pointing/sweep-points.ts';
import type { Obstruction, Sighting, SightingAxis, Survey, Trace } from '../../core/survey/survey.ts';
import { rawReading } from './raw-reading.ts';
import type { SensorSample } from './sensor-interfaces.ts';
import { withStation, withTrace } from './station-edits.ts';
import type { TraceChoice } from './trace-choice.ts';
import { traceFields } from './trace-choice.ts';

/** A sweep at work, of an obstruction that may not be named yet. */
export interface LiveSweep {
  samples: readonly SensorSample[];
  axis: SightingAxis;
  run: PointedRun;
  choice: TraceChoice;
}

/** A coarser line than what is stored: it is drawn anew several times a second. */
const LIVE_TOLERANCE = 0.5;
const UNNAMED: Obstruction = { id: 'sweep at work', name: 'Sweep', kind: 'other' };

/**
 * What the live figures are computed from: one station with every direction written in, and no readings, so that little
 * goes to the worker.
 */
export function liveSurvey(
  survey: Survey,
  stationId: string,
  pointed: PointedSurvey,
  sweep: LiveSweep | null,
): Survey {
  const stations = survey.stations
    .filter(({ id }) => id === stationId)
    .map((station) => ({
      ...station,
      markSightings: [],
      headingChecks: [],
      indexChecks: [],
      traces: station.traces.map((trace) => ({ ...trace, sightings: directed(trace.sightings, pointed) })),
    }));
  const planes = survey.planes.map((plane) => ({ ...plane, tiltPlacings: [], azimuthSightings: [] }));
  const light = { ...survey, stations, planes, runs: [], readings: [] };
  const trace = sweep && sweptTrace(sweep);
  if (!trace) return light;
  const known = light.obstructions.some(({ id }) => id === trace.obstruction);
  return withStation(
    { ...light, obstructions: known ? light.obstructions : [...light.obstructions, UNNAMED] },
    stationId,
    (station) => withTrace(station, trace),
  );
}

/** Sightings by their directions alone; those without one are left out. */
const directed = (sightings: readonly Sighting[], pointed: PointedSurvey): Sighting[] =>
  sightings.flatMap(({ id, order }) => {
    const direction = pointed.sightings.get(id)?.direction;
    return direction ? [{ id, order, ...direction }] : [];
  });

/** Where the sweep has gone so far, in true directions. */
export function sweptDirections({ samples, axis, run }: Omit<LiveSweep, 'choice'>): Sighting[] {
  const { heading } = run;
  if (!heading || samples.length === 0) return [];
  const { points } = sweepPoints([rawReading('live', run.id, axis, samples)]);
  return simplifiedSweep(points, 'drawn', LIVE_TOLERANCE).map(({ azimuth, elevation, timeMs }, order) => ({
    id: `live ${order}`,
    order,
    azimuth: fullCircle(azimuth + offsetAt(heading, timeMs)),
    elevation: Math.max(-90, Math.min(90, elevation + run.index[axis].value)),
  }));
}

function sweptTrace(sweep: LiveSweep): Trace | null {
  const sightings = sweptDirections(sweep);
  if (sightings.length < 2) return null;
  const { choice } = sweep;
  return {
    id: 'sweep at work',
    obstruction: choice.obstruction ?? UNNAMED.id,
    ...traceFields({ ...choice, shape: choice.shape === 'outline' ? 'skyline' : choice.shape, way: 'sweep' }),
    sightings,
  };
}
