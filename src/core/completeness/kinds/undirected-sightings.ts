import type { PointedSighting } from '../../pointing/pointed-survey.ts';
import { groupedBy } from '../../pointing/grouped-by.ts';
import { counted, stationName } from '../names.ts';
import type { Cure, OpenPointKind } from '../open-point.ts';

/** A run refused for its closure is a point of its own. */
const isLost = ({ trace, undirected }: PointedSighting) =>
  trace !== null && undirected !== null && undirected.code !== 'run-refused';

export const undirectedSightings: OpenPointKind = {
  id: 'undirected-sightings',
  title: 'Sightings that point nowhere',
  isGrave: true,
  find: ({ survey, pointed }) => {
    const lost = [...pointed.sightings.values()].filter(isLost);
    const groups = groupedBy(lost, ({ station, run, undirected }) =>
      JSON.stringify([station, run, undirected!.code]),
    );
    return [...groups.values()].map((group) => {
      const { station, undirected } = group[0];
      const more = group.length > 1 ? ` So it is with ${counted(group.length, 'sighting')}.` : '';
      return {
        subject: stationName(survey, station),
        sentence: `${undirected!.message}${more}`,
        effect: null,
        cure: cureOf(group[0]),
      };
    });
  },
};

function cureOf({ station, run, undirected }: PointedSighting): Cure {
  if (undirected!.code === 'no-heading' && run !== null)
    return { at: 'run', run, station, words: 'Take a heading check' };
  return { at: 'station', station, act: 'book', words: 'Open the field book' };
}
