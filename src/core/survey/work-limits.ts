import { LIMITS } from './limits.ts';
import type { ProblemList } from './problem-list.ts';
import type { Survey } from './survey.ts';

/** Adds a problem where working the survey out would take longer than a phone should be asked for. */
export function addWorkProblems({ planes, stations }: Survey, problems: ProblemList): void {
  stations.forEach(({ name, traces }, s) => {
    const traced = new Set(traces.map(({ obstruction }) => obstruction)).size;
    if (traced > LIMITS.obstructionsPerStation)
      problems.add(
        `stations[${s}].traces`,
        `From "${name}" ${traced} obstructions are traced; the limit is ${LIMITS.obstructionsPerStation}. Trace what stands together as one.`,
      );
  });
  const known = new Set(planes.map(({ id }) => id));
  const served = stations.reduce((sum, { serves }) => sum + serves.filter((id) => known.has(id)).length, 0);
  if (served > LIMITS.served)
    problems.add(
      'stations',
      `The stations serve planes ${served} times in all; the limit is ${LIMITS.served}. Split the survey, or let each station serve only the planes it stands for.`,
    );
}
