import type { JsonRecord } from './json-value.ts';
import { ordered } from './order.ts';
import { LIMITS } from './limits.ts';
import type { ProblemList } from './problem-list.ts';
import { rowsOf, tracesOf } from './record-rows.ts';
import type { Row } from './record-rows.ts';
import { pathBelow } from './record-path.ts';
import { sightingDirection } from './sighting-direction.ts';
import type { Sighting, Trace } from './survey.ts';
import { addShapeProblems } from './trace-shape-checks.ts';
import type { Pointed } from './trace-shape-checks.ts';

/** Fewest sightings that make each shape. */
const FEWEST = { skyline: 2, outline: 3, line: 2 } as const;

/** Adds a problem for each trace that cannot be drawn, and each sighting that points nowhere. */
export function addTraceProblems(document: JsonRecord, problems: ProblemList): void {
  const kinds = new Map(rowsOf(document, 'obstructions').map(({ value }) => [value.id, value.kind]));
  for (const trace of tracesOf(document)) {
    addPartProblems(trace, problems);
    const pointed = pointedSightings(trace, problems);
    if (pointed) addShapeProblems(trace, pointed, kinds.get(trace.value.obstruction), problems);
  }
  for (const { value, path } of rowsOf(document, 'stations'))
    for (const sighting of rowsOf(value, 'markSightings', path)) addDirectionProblem(sighting, problems);
}

/** What the trace says of itself: enough sightings, the width of a line, a circle only of a skyline. */
function addPartProblems({ value, path }: Row, problems: ProblemList): void {
  const shape = value.shape as Trace['shape'];
  if (!Object.hasOwn(FEWEST, shape)) return;
  const count = Array.isArray(value.sightings) ? value.sightings.length : FEWEST[shape];
  if (count < FEWEST[shape])
    problems.add(
      pathBelow(path, 'sightings'),
      `The trace has ${count === 1 ? 'one sighting' : `${count} sightings`}; its shape, ${shape}, needs at least ${FEWEST[shape]}. Add sightings, or remove the trace.`,
    );
  if (shape === 'outline' && count > LIMITS.outlineSightings)
    problems.add(
      pathBelow(path, 'sightings'),
      `The outline has ${count} sightings; the limit is ${LIMITS.outlineSightings}. Simplify it.`,
    );
  if (shape === 'line' && value.angularWidth === undefined)
    problems.add(
      pathBelow(path, 'angularWidth'),
      'A line needs its angular width. Give how wide it looks, in degrees over 0, at most 20.',
    );
  if (shape !== 'skyline' && value.fullCircle === true)
    problems.add(
      pathBelow(path, 'fullCircle'),
      `Only a skyline goes around the whole horizon. Take fullCircle out, or make the shape skyline.`,
    );
}

/** The trace's sightings in order with their directions; null where some have none yet or are no sightings. */
function pointedSightings({ value, path }: Row, problems: ProblemList): Pointed[] | null {
  const rows = rowsOf(value, 'sightings', path);
  const pointed = ordered(rows.map((row) => ({ row, order: numberOr(row.value.order, undefined) }))).flatMap(
    ({ row }) => pointedAt(row, problems) ?? [],
  );
  const whole = Array.isArray(value.sightings) && pointed.length === value.sightings.length;
  return whole ? pointed : null;
}

/** Adds a problem where a sighting has half a direction, or none and nothing to have it from. */
function addDirectionProblem({ value, path }: Row, problems: ProblemList): void {
  const hasAzimuth = value.azimuth !== undefined;
  const hasElevation = value.elevation !== undefined;
  if (hasAzimuth !== hasElevation)
    problems.add(
      pathBelow(path, hasAzimuth ? 'elevation' : 'azimuth'),
      `The sighting has ${hasAzimuth ? 'an azimuth but no elevation' : 'an elevation but no azimuth'}. Give both.`,
    );
  else if (!hasAzimuth && !hasReading(value) && !hasAmendment(value))
    problems.add(
      path,
      'The sighting points nowhere. Give azimuth and elevation, or the reading it was taken with.',
    );
  if (value.sampleAt !== undefined && value.reading === undefined)
    problems.add(
      pathBelow(path, 'sampleAt'),
      'The sighting names a time within a reading, but no reading. Name the reading, or take sampleAt out.',
    );
}

function pointedAt(row: Row, problems: ProblemList): Pointed | null {
  addDirectionProblem(row, problems);
  const { value, path } = row;
  const amendments: unknown = value.amendments;
  if (amendments !== undefined && !(Array.isArray(amendments) && amendments.every(isObject))) return null;
  const direction = sightingDirection(value as unknown as Sighting);
  if (!direction || !Number.isFinite(direction.azimuth) || !Number.isFinite(direction.elevation)) return null;
  return { path, ...direction };
}

const hasReading = ({ reading, readings }: JsonRecord) =>
  reading !== undefined || (Array.isArray(readings) && readings.length > 0);
const hasAmendment = ({ amendments }: JsonRecord) => Array.isArray(amendments) && amendments.length > 0;
const isObject = (value: unknown) => typeof value === 'object' && value !== null;
const numberOr = <T>(value: unknown, otherwise: T) => (typeof value === 'number' ? value : otherwise);
