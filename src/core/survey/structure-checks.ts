import { isRecord } from './json-value.ts';
import { LIMITS } from './limits.ts';
import type { ProblemList } from './problem-list.ts';
import { pathBelow } from './record-path.ts';
import { rowsOf } from './record-rows.ts';

/**
 * Checks that a document is neither too large nor too deep to be looked at closely, and that no field bears a name
 * that would change how objects work. Stops at the first excess.
 */
export function addStructureProblems(document: unknown, problems: ProblemList): void {
  addTooMany(document, problems);
  if (!problems.isEmpty) return;
  const excess = firstExcess(document, 1, { values: 0 });
  if (excess) problems.add(excess.keys.reduceRight<string>(pathBelow, '') || 'file', excess.message);
}

/** What is too much, and where: the keys from the place up to the top. */
interface Excess {
  keys: (string | number)[];
  message: string;
}

/** Goes down at most as deep as the limit, so that no document can exhaust the stack. */
function firstExcess(value: unknown, depth: number, counted: { values: number }): Excess | null {
  if (typeof value !== 'object' || value === null) return null;
  if (depth > LIMITS.depth)
    return {
      keys: [],
      message: `Lists and objects stand more than ${LIMITS.depth} deep in each other here. Remove them.`,
    };
  const keys = Array.isArray(value) ? null : Object.keys(value);
  const size = keys ? keys.length : (value as unknown[]).length;
  counted.values += size;
  if (counted.values > LIMITS.values)
    return { keys: [], message: `The survey holds more than ${LIMITS.values} values, the limit. Split it.` };
  if (Object.hasOwn(value, '__proto__'))
    return {
      keys: ['__proto__'],
      message: 'A field may not be named __proto__. Remove it or give it another name.',
    };
  for (let i = 0; i < size; i++) {
    const key = keys ? keys[i] : i;
    const below = firstExcess((value as Record<string | number, unknown>)[key], depth + 1, counted);
    if (below) {
      below.keys.push(key);
      return below;
    }
  }
  return null;
}

/** Adds a problem for each list that is longer than its limit. */
function addTooMany(document: unknown, problems: ProblemList): void {
  if (!isRecord(document)) return;
  const stations = rowsOf(document, 'stations');
  const traces = stations.flatMap(({ value, path }) => rowsOf(value, 'traces', path));
  const counts = {
    planes: length(document.planes),
    corners: sum(rowsOf(document, 'planes').map(({ value }) => length(value.outline))),
    stations: length(document.stations),
    obstructions: length(document.obstructions),
    runs: length(document.runs),
    readings: length(document.readings),
    facts: length(document.facts),
    photos: length(document.photos),
    headingChecks: sum(stations.map(({ value }) => length(value.headingChecks))),
    traces: sum(stations.map(({ value }) => length(value.traces))),
    indexChecks: sum(stations.map(({ value }) => length(value.indexChecks))),
    openLooks: sum(stations.map(({ value }) => length(value.openLooks))),
    placings: sum(
      rowsOf(document, 'planes').map(
        ({ value }) => length(value.tiltPlacings) + length(value.azimuthSightings),
      ),
    ),
    sightings:
      sum(traces.map(({ value }) => length(value.sightings))) +
      sum(stations.map(({ value }) => length(value.markSightings))),
  };
  for (const [what, count] of Object.entries(counts) as [keyof typeof counts, number][])
    if (count > LIMITS[what])
      problems.add(
        PLACES[what] ?? what,
        `The survey has ${count} ${WORDS[what] ?? what}; the limit is ${LIMITS[what]}. Split the survey, or simplify its traces.`,
      );
}

const WORDS: Partial<Record<string, string>> = {
  corners: 'corners in its plane outlines',
  headingChecks: 'heading checks',
  indexChecks: 'two-face checks',
  openLooks: 'open looks',
  placings: 'placings and sightings along edges of its planes',
  sightings: 'sightings in its traces',
};
const PLACES: Partial<Record<string, string>> = {
  corners: 'planes',
  placings: 'planes',
  indexChecks: 'stations',
  openLooks: 'stations',
  headingChecks: 'stations',
  traces: 'stations',
  sightings: 'stations',
};

const length = (list: unknown) => (Array.isArray(list) ? list.length : 0);
const sum = (counts: number[]) => counts.reduce((total, count) => total + count, 0);
