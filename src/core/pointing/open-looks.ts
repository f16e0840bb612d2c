import { fullCircle } from '../angles/angles.ts';
import type { Problem } from '../survey/problem.ts';
import type { OpenLook, Survey } from '../survey/survey.ts';
import type { PointedRun } from './pointed-survey.ts';
import { offsetAt } from './run-ties.ts';

/**
 * True azimuths [from, to], clockwise, that a look found open: those read in its run, turned by the run's heading of that
 * instant; 0 to 360 for all around. Null where nothing ties the run to north, or it is refused.
 */
export function openRange(look: OpenLook, runs: readonly PointedRun[]): [number, number] | null {
  const run = runs.find(({ id }) => id === look.run);
  if (!run?.heading || run.refused) return null;
  const [from, to] = look.azimuths;
  if (to - from >= 360) return [0, 360];
  const offset = offsetAt(run.heading, Date.parse(look.lookedAt));
  return [fullCircle(from + offset), fullCircle(to + offset)];
}

/** A warning for each open look that counts for nothing. */
export function openLookWarnings(survey: Survey, runs: readonly PointedRun[]): Problem[] {
  return survey.stations.flatMap((station, s) =>
    (station.openLooks ?? []).flatMap((look, i) =>
      openRange(look, runs)
        ? []
        : [
            {
              path: `stations[${s}].openLooks[${i}]`,
              message:
                'What was looked at here and found open counts for nothing, since nothing ties its run to north. Take one heading check in the same run, or sight a mark of a run that has one.',
            },
          ],
    ),
  );
}
