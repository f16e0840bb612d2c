import { isRecord, shown } from './json-value.ts';
import type { JsonRecord } from './json-value.ts';
import type { ProblemList } from './problem-list.ts';
import { pathBelow } from './record-path.ts';
import { rowsOf, sightingsOf, textsOf, tracesOf } from './record-rows.ts';
import type { Row } from './record-rows.ts';

/** Adds a problem for each id given twice in its list (sightings: in the whole survey) and each reference to nothing. */
export function addReferenceProblems(document: JsonRecord, problems: ProblemList): void {
  const stations = rowsOf(document, 'stations');
  const traces = tracesOf(document);
  const sightings = sightingsOf(document);
  const ids = (rows: Row[], what: string) => uniqueIds(rows, what, problems);
  const named = (key: string, what: string) => {
    const known = ids(rowsOf(document, key), what);
    return Array.isArray(document[key]) ? known : null; // a list that is missing is a problem of its own
  };
  const planes = named('planes', 'plane');
  const obstructions = named('obstructions', 'obstruction');
  const runs = named('runs', 'run');
  const readings = named('readings', 'reading');
  ids(stations, 'station');
  ids(sightings, 'sighting');
  ids(rowsOf(document, 'facts'), 'fact');
  const photos = rowsOf(document, 'photos');
  ids(photos, 'photo');
  const refer = (rows: Row[], key: string, known: Set<unknown> | null, what: string) => {
    for (const { value, path } of rows) addDangling(value[key], pathBelow(path, key), known, what, problems);
  };
  refer(rowsOf(document, 'readings'), 'run', runs, 'run');
  refer(traces, 'obstruction', obstructions, 'obstruction');
  refer([...sightings, ...photos], 'reading', readings, 'reading');
  const looks = stations.flatMap(({ value, path }) => rowsOf(value, 'openLooks', path));
  refer(looks, 'run', runs, 'run');
  for (const { value, path } of [...sightings, ...looks])
    for (const named of textsOf(value, 'readings', path))
      addDangling(named.text, named.path, readings, 'reading', problems);
  for (const { value, path } of rowsOf(document, 'planes')) {
    const placings = rowsOf(value, 'tiltPlacings', path);
    const edges = rowsOf(value, 'azimuthSightings', path);
    ids(placings, 'placing on this plane');
    ids(edges, 'sighting along an edge of this plane');
    refer([...placings, ...edges], 'reading', readings, 'reading');
  }
  for (const { value, path } of stations) {
    ids(rowsOf(value, 'traces', path), 'trace of this station');
    ids(rowsOf(value, 'openLooks', path), 'open look of this station');
    const checks = rowsOf(value, 'headingChecks', path);
    ids(checks, 'heading check of this station');
    refer(checks, 'reading', readings, 'reading');
    const indexChecks = rowsOf(value, 'indexChecks', path);
    ids(indexChecks, 'two-face check of this station');
    refer(indexChecks, 'upright', readings, 'reading');
    refer(indexChecks, 'turned', readings, 'reading');
    for (const plane of textsOf(value, 'serves', path))
      addDangling(plane.text, plane.path, planes, 'plane', problems);
    const position = value.position;
    if (isRecord(position)) addDangling(position.on, `${path}.position.on`, planes, 'plane', problems);
  }
}

function uniqueIds(rows: Row[], what: string, problems: ProblemList): Set<unknown> {
  const seen = new Map<string, string>();
  for (const { value, path } of rows) {
    if (typeof value.id !== 'string') continue;
    const first = seen.get(value.id);
    if (first === undefined) seen.set(value.id, path);
    else
      problems.add(
        pathBelow(path, 'id'),
        `The id ${shown(value.id)} already names the ${what} at ${first}. Give this one an id of its own.`,
      );
  }
  return new Set(seen.keys());
}

function addDangling(
  id: unknown,
  path: string,
  known: Set<unknown> | null,
  what: string,
  problems: ProblemList,
): void {
  if (typeof id !== 'string' || !known || known.has(id)) return;
  problems.add(path, `No ${what} has the id ${shown(id)}. Add that ${what}, or name one that is there.`);
}
