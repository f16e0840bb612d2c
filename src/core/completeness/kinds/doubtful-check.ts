import { ordered } from '../../survey/order.ts';
import type { OpenPointKind } from '../open-point.ts';

/** Checks that do not count, or that the compass speaks against: clock, zone or steel. */
export const doubtfulCheck: OpenPointKind = {
  id: 'doubtful-check',
  title: 'A check in doubt',
  isGrave: false,
  find: ({ survey, pointed }) =>
    ordered(survey.stations).flatMap(({ id, name }) => {
      const place = survey.stations.findIndex((station) => station.id === id);
      const paths = [`stations[${place}].headingChecks[`, `stations[${place}].indexChecks[`];
      return pointed.warnings
        .filter(({ path }) => paths.some((start) => path.startsWith(start)))
        .map(({ message }) => ({
          subject: name,
          sentence: message,
          effect: null,
          cure: { at: 'station', station: id, act: 'sight', words: 'Take another check' } as const,
        }));
    }),
};
