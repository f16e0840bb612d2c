import { ordered } from '../survey/order.ts';
import { ProblemList } from '../survey/problem-list.ts';
import type { Problem } from '../survey/problem.ts';
import type { JsonRecord } from '../survey/json-value.ts';
import type { Survey, Trace } from '../survey/survey.ts';
import { addShapeProblems } from '../survey/trace-shape-checks.ts';
import { overZenith } from './over-zenith.ts';
import type { PointedSighting } from './pointed-survey.ts';

/**
 * What is wrong with the shape of traces that the phone read: the parser could not look at them, since it has no
 * directions. One that does not join up is left out of the horizon.
 */
export function pointedTraceWarnings(
  survey: Survey,
  sightings: ReadonlyMap<string, PointedSighting>,
): Problem[] {
  const kinds = new Map(survey.obstructions.map(({ id, kind }) => [id, kind]));
  const found = new ProblemList();
  survey.stations.forEach((station, s) => {
    station.traces.forEach((trace, t) => {
      const pointed = readDirections(trace, sightings);
      const row = { value: trace as unknown as JsonRecord, path: `stations[${s}].traces[${t}]` };
      if (pointed) addShapeProblems(row, pointed, kinds.get(trace.obstruction), found);
    });
  });
  return found.list();
}

/** A trace's directions in order, rounded for the reader; null where none of them was read by the phone. */
function readDirections(trace: Trace, sightings: ReadonlyMap<string, PointedSighting>) {
  const all = ordered(trace.sightings).flatMap(({ id }) => sightings.get(id) ?? []);
  if (!all.some(({ source, direction }) => source === 'reading' && direction)) return null;
  const shown = (degrees: number) => Math.round(degrees * 1000) / 1000;
  return overZenith(
    all.flatMap(({ path, direction }) =>
      direction ? [{ path, azimuth: shown(direction.azimuth), elevation: shown(direction.elevation) }] : [],
    ),
  );
}
