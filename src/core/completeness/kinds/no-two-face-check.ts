import { groupedBy } from '../../pointing/grouped-by.ts';
import type { PointedSurvey } from '../../pointing/pointed-survey.ts';
import { effectThrough, narrowing } from '../interval-effect.ts';
import { stationNames } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';
import type { RunInUse } from '../stations-of-runs.ts';
import { runsInUse } from '../stations-of-runs.ts';

/** A phone whose own inclination was not found by turning it over on a mark: once for all its sittings. */
export const noTwoFaceCheck: OpenPointKind = {
  id: 'no-two-face-check',
  title: 'Phone not turned over',
  isGrave: false,
  find: ({ survey, pointed, assessment }) => {
    const deviceOf = new Map(survey.runs.map(({ id, device = '' }) => [id, device]));
    const untested = runsInUse(pointed).filter((run) => untestedBy(run, pointed) > 0);
    return [...groupedBy(untested, ({ run }) => deviceOf.get(run)!).values()].map((sittings) => {
      const stations = new Set(sittings.flatMap((one) => [...one.stations]));
      const last = sittings.at(-1)!;
      const narrower = sittings.length === untested.length ? narrowing(assessment, 'elevation-index') : null;
      const off = 2 * Math.max(...sittings.map((run) => untestedBy(run, pointed)));
      return {
        subject: stationNames(survey, stations),
        sentence: `All elevations may be off together by the phone’s own inclination, up to ${off.toFixed(1)}° either way, which no heading check shows. One sharp mark sighted upright, then again with the phone upside down, corrects them, those taken before it too.${narrower ? ` ${narrower}` : ''}`,
        effect: effectThrough(assessment, stations, 'elevation-index'),
        cure: { at: 'run', run: last.run, station: [...last.stations].at(-1)!, words: 'Turn the phone over' },
      };
    });
  },
};

/** Deviation of the inclination of a run, by the axes its traces were sighted along, as far as it is only planned; else 0. */
function untestedBy({ run, pointed: { index, refused } }: RunInUse, { sightings }: PointedSurvey): number {
  if (refused) return 0;
  const axes = new Set(
    [...sightings.values()].flatMap((one) => (one.run === run && one.trace !== null ? one.axis : [])),
  );
  const planned = [...axes].filter((axis) => index[axis].source === 'planned');
  return Math.max(0, ...planned.map((axis) => index[axis].standardDeviation));
}
