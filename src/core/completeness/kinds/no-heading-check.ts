import type { RunHeading } from '../../pointing/pointed-survey.ts';
import { effectThrough } from '../interval-effect.ts';
import { stationNames } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';
import { runsInUse } from '../stations-of-runs.ts';

/** What the azimuths rest on where the run has no check of its own; a run tied to another stands and falls with that. */
const RESTS_ON: Partial<Record<RunHeading['source'], string>> = {
  compass: 'the compass and the declination alone',
  device: 'what the device calls true north',
  shared: 'the check of another sitting of the same compass',
};

export const noHeadingCheck: OpenPointKind = {
  id: 'no-heading-check',
  title: 'No heading check',
  isGrave: false,
  find: ({ survey, pointed, assessment }) =>
    runsInUse(pointed).flatMap(({ run, stations, pointed: { heading, refused } }) => {
      const restsOn = heading && RESTS_ON[heading.source];
      if (!heading || !restsOn || refused) return [];
      const { standardDeviation, outliers } = heading;
      const far = outliers ? `, now and then to ${outliers.reach}°` : '';
      return [
        {
          subject: stationNames(survey, stations),
          sentence: `The azimuths rest on ${restsOn}, good to ${(2 * standardDeviation).toFixed(0)}° either way${far}. One check, by shadow or by a mark of known bearing, makes them sure, those taken before it too.`,
          effect: effectThrough(assessment, stations, 'heading'),
          cure: { at: 'run', run, station: [...stations].at(-1)!, words: 'Take a heading check' },
        },
      ];
    }),
};
