import { stationNames } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';
import { runsInUse } from '../stations-of-runs.ts';

/** A sitting as short as this hardly drifts, minutes; common practice, no source. */
const SHORT = 2;

export const noClosure: OpenPointKind = {
  id: 'no-closure',
  title: 'The horizon is not closed',
  isGrave: false,
  find: ({ survey, pointed }) =>
    runsInUse(pointed)
      .filter(({ minutes, pointed: { closure } }) => minutes >= SHORT && closure === null)
      .map(({ run, stations, minutes }) => ({
        subject: stationNames(survey, stations),
        sentence: `A sitting of ${minutes.toFixed(0)} minutes, and no mark was sighted at its start and again at its end, so nobody knows whether the phone drifted.`,
        effect: null,
        cure: { at: 'run', run, station: [...stations].at(-1)!, words: 'Sight the first mark again' },
      })),
};
