import { stationNames } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';
import { runsInUse } from '../stations-of-runs.ts';

export const runRefused: OpenPointKind = {
  id: 'run-refused',
  title: 'The horizon does not close',
  isGrave: true,
  find: ({ survey, pointed }) =>
    runsInUse(pointed).flatMap(({ run, stations, pointed: { refused } }) => {
      if (!refused) return [];
      return [
        {
          subject: stationNames(survey, stations),
          sentence: `The sightings of this sitting are left out. ${refused}`,
          effect: null,
          cure: { at: 'run', run, station: [...stations][0], words: 'Sight again from here' },
        },
      ];
    }),
};
