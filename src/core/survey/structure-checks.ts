import { isRecord } from './json-value.ts';
import { LIMITS } from './limits.ts';
import type { ProblemList } from './problem-list.ts';
import { pathBelow } from './record-path.ts';
import { rowsOf } from './record-rows.ts';

/**
 * Checks that a document is neither too large nor too deep to be looked at closely, and that no field bears a name
 * that would change how objects work. Reads any depth without recursion; stops at the first excess.
 */
export function addStructureProblems(document: unknown, problems: ProblemList): void {
  addTooMany(document, problems);
  if (!problems.isEmpty) return;
  const waiting: { value: object; path: string; depth: number }[] = [];
  const enter = (value: unknown, path: string, depth: number) => {
    if (typeof value === 'object' && value !== null) waiting.push({ value, path, depth });
  };
  enter(document, '', 1);
  let values = 0;
  for (let at = waiting.pop(); at; at = waiting.pop()) {
    const { value, path, depth } = at;
    if (depth > LIMITS.depth)
      return problems.add(
        shortened(path),
        `Lists and objects stand more than ${LIMITS.depth} deep in each other. Remove them.`,
      );
    const keys = Object.keys(value);
    values += keys.length;
    if (values > LIMITS.values)
      return problems.add(
        'file',
        `The file holds more than ${LIMITS.values} values, the limit. Split the survey.`,
      );
    if (Object.hasOwn(value, '__proto__'))
      problems.add(
        pathBelow(path, '__proto__'),
        'A field may not be named __proto__. Remove it or give it another name.',
      );
    for (const key of keys) {
      const below = (value as Record<string, unknown>)[key];
      if (typeof below === 'object' && below !== null)
        enter(below, pathBelow(path, Array.isArray(value) ? Number(key) : key), depth + 1);
    }
  }
}

const shortened = (path: string) => (path.length > 120 ? `${path.slice(0, 117)}…` : path);

/** Adds a problem for each list that is longer than its limit. */
function addTooMany(document: unknown, problems: ProblemList): void {
  if (!isRecord(document)) return;
  const stations = rowsOf(document, 'stations');
  const traces = stations.flatMap(({ value, path }) => rowsOf(value, 'traces', path));
  const counts = {
    planes: length(document.planes),
    stations: length(document.stations),
    obstructions: length(document.obstructions),
    runs: length(document.runs),
    readings: length(document.readings),
    headingChecks: sum(stations.map(({ value }) => length(value.headingChecks))),
    traces: sum(stations.map(({ value }) => length(value.traces))),
    sightings: sum(traces.map(({ value }) => length(value.sightings))),
  };
  for (const [what, count] of Object.entries(counts) as [keyof typeof counts, number][])
    if (count > LIMITS[what])
      problems.add(
        PLACES[what] ?? what,
        `The survey has ${count} ${WORDS[what] ?? what}; the limit is ${LIMITS[what]}. Split the survey, or simplify its traces.`,
      );
}

const WORDS: Partial<Record<string, string>> = {
  headingChecks: 'heading checks',
  sightings: 'sightings in its traces',
};
const PLACES: Partial<Record<string, string>> = {
  headingChecks: 'stations',
  traces: 'stations',
  sightings: 'stations',
};

const length = (list: unknown) => (Array.isArray(list) ? list.length : 0);
const sum = (counts: number[]) => counts.reduce((total, count) => total + count, 0);
