import { arrayPlacesOf } from '../../survey/array-places.ts';
import { stationsOf } from '../../survey/served-planes.ts';
import { ordered } from '../../survey/order.ts';
import { listed } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';

export const arrayPlaces: OpenPointKind = {
  id: 'array-places',
  title: 'Corners or centre not sighted',
  isGrave: false,
  find: ({ survey }) =>
    ordered(survey.planes).flatMap((plane) => {
      const missing = arrayPlacesOf(survey, plane).filter(({ isMissing }) => isMissing);
      if (stationsOf(survey, plane).length === 0 || missing.length === 0) return [];
      return [
        {
          subject: plane.name,
          sentence: `Not sighted: ${listed(missing.map(({ name }) => name))}. What stands near shades one end of an array and not the other.`,
          effect: null,
          cure: { at: 'new-station', plane: plane.id, words: 'Add a station' },
        },
      ];
    }),
};
