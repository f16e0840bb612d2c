import { ordered } from '../../survey/order.ts';
import type { OpenPointKind } from '../open-point.ts';

export const brokenTrace: OpenPointKind = {
  id: 'broken-trace',
  title: 'A trace that does not hold together',
  isGrave: false,
  find: ({ survey, pointed }) => {
    const undirected = new Set(
      [...pointed.sightings.values()].flatMap((one) => (one.undirected ? [one.path] : [])),
    );
    return ordered(survey.stations).flatMap((station) => {
      const start = `stations[${survey.stations.indexOf(station)}].traces[`;
      return pointed.warnings
        .filter(({ path }) => path.startsWith(start) && !undirected.has(path))
        .map(({ message }) => ({
          subject: station.name,
          sentence: message,
          effect: null,
          cure: { at: 'station', station: station.id, act: 'book', words: 'Open the field book' } as const,
        }));
    });
  },
};
