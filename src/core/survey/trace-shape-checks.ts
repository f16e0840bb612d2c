import { turnBetween } from '../angles/angles.ts';
import { LIMITS } from './limits.ts';
import { traceEdge } from './obstruction-kinds.ts';
import { outlineCrossing } from './outline-crossing.ts';
import type { ProblemList } from './problem-list.ts';
import type { Row } from './record-rows.ts';
import { pathBelow } from './record-path.ts';
import type { Obstruction, Trace } from './survey.ts';

/** A turn this close to half a circle could go either way. */
const HALF_CIRCLE = 180 - 1e-9;
/** A step back of more than this is no overhang, degrees. */
const LONG_STEP = 90;
/** Above this elevation azimuths swing widely, degrees. */
const NEAR_ZENITH = 80;

/** One sighting of a trace, where it stands in the file and where it points, degrees. */
export interface Pointed {
  path: string;
  azimuth: number;
  elevation: number;
}

/** Adds a problem where the pointed sightings of a trace make no edge, or one that runs into itself. */
export function addShapeProblems(
  { value, path }: Row,
  pointed: Pointed[],
  kind: unknown,
  problems: ProblemList,
): void {
  const trace = value as unknown as Trace;
  const closed = trace.shape === 'outline' || (trace.shape === 'skyline' && trace.fullCircle === true);
  const apart = addNeighbourProblems(pointed, closed, problems);
  if (apart || pointed.length < 2) return;
  if (trace.shape === 'skyline' && closed) addCircleProblem(path, pointed, problems);
  if (trace.shape !== 'outline' && !closed) addBackStepProblems(pointed, problems);
  if (trace.shape !== 'outline' || pointed.length < 3 || pointed.length > LIMITS.outlineSightings) return;
  const edge = traceEdge(trace, { kind } as Obstruction);
  const crossing = outlineCrossing(pointed, edge);
  if (!crossing) return;
  const [from, other] = crossing.map((i) => pointed[i].path.slice(path.length + 1));
  problems.add(
    pathBelow(path, 'sightings'),
    `The outline crosses or touches itself: its edge after ${from} meets its edge after ${other}. Put the sightings in order around the edge, or split the outline in two.`,
  );
}

function addNeighbourProblems(pointed: Pointed[], closed: boolean, problems: ProblemList): boolean {
  let found = false;
  pointed.forEach((sighting, i) => {
    const before = pointed[i - 1] ?? (closed ? pointed.at(-1) : undefined);
    if (!before || Math.abs(turnBetween(before.azimuth, sighting.azimuth)) < HALF_CIRCLE) return;
    found = true;
    problems.add(
      sighting.path,
      `The sighting is 180 degrees from its neighbour ${before.path} (azimuths ${before.azimuth} and ${sighting.azimuth}), so the edge could run either way. Add a sighting between the two.`,
    );
  });
  return found;
}

/** A full circle must go once around; it does not where a gap of more than half the horizon is left. */
function addCircleProblem(path: string, pointed: Pointed[], problems: ProblemList): void {
  const turn = pointed.reduce(
    (sum, sighting, i) => sum + turnBetween(pointed.at(i - 1)!.azimuth, sighting.azimuth),
    0,
  );
  if (Math.abs(Math.abs(turn) - 360) < 1e-6) return;
  problems.add(
    pathBelow(path, 'fullCircle'),
    'The sightings do not go once around the horizon: somewhere neighbours are 180 degrees or more apart, or the order is mixed up. Add sightings in the gap, or take fullCircle out.',
  );
}

/**
 * Neighbours are joined the shorter way. A long step back against the way the rest of the trace goes is therefore a
 * gap of more than half the horizon: 60, 100, 290 would be joined over north.
 */
function addBackStepProblems(pointed: Pointed[], problems: ProblemList): void {
  const turns = pointed.slice(1).map((sighting, i) => turnBetween(pointed[i].azimuth, sighting.azimuth));
  const whole = turns.reduce((sum, turn) => sum + turn, 0);
  turns.forEach((turn, i) => {
    const [before, sighting] = [pointed[i], pointed[i + 1]];
    const isBack = Math.abs(turn) > LONG_STEP && turn * (whole - turn) < 0;
    if (!isBack || Math.max(before.elevation, sighting.elevation) > NEAR_ZENITH) return;
    problems.add(
      sighting.path,
      `Onward from its neighbour ${before.path} the sighting is ${Math.round(360 - Math.abs(turn))} degrees away (azimuths ${before.azimuth} and ${sighting.azimuth}), more than 180, and back it would run against the rest of the trace. Add sightings between the two, or put them in order.`,
    );
  });
}
