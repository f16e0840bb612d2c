import { stationName } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';
import { runsInUse } from '../stations-of-runs.ts';

/** A misclosure over these is worth a second look, degrees; common practice, no source. Runs far over are refused. */
const LARGE = { azimuth: 2, elevation: 1 } as const;

export const largeClosure: OpenPointKind = {
  id: 'large-closure',
  title: 'Large error of closure',
  isGrave: false,
  find: ({ survey, pointed }) =>
    runsInUse(pointed).flatMap(({ run, pointed: { closure, refused } }) => {
      if (!closure || refused) return [];
      const [azimuth, elevation] = [Math.abs(closure.azimuth), Math.abs(closure.elevation)];
      if (azimuth <= LARGE.azimuth && elevation <= LARGE.elevation) return [];
      return [
        {
          subject: stationName(survey, closure.station),
          sentence: `After ${closure.minutes.toFixed(0)} minutes "${closure.mark}" had moved ${azimuth.toFixed(1)}° in azimuth and ${elevation.toFixed(1)}° in elevation. The azimuths are spread by time, the elevations are not. A fresh, shorter sitting is surer.`,
          effect: null,
          cure: { at: 'run', run, station: closure.station, words: 'Sight again from here' },
        },
      ];
    }),
};
