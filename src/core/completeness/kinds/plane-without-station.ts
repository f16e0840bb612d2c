import { stationsOf } from '../../survey/served-planes.ts';
import { ordered } from '../../survey/order.ts';
import type { OpenPointKind } from '../open-point.ts';

export const planeWithoutStation: OpenPointKind = {
  id: 'plane-without-station',
  title: 'Plane without a station',
  isGrave: true,
  find: ({ survey }) =>
    ordered(survey.planes)
      .filter((plane) => stationsOf(survey, plane).length === 0)
      .map(({ id, name }) => ({
        subject: name,
        sentence: 'Nothing is known of what stands around it, so it has no solar access.',
        effect: null,
        cure: { at: 'new-station', plane: id, words: 'Add a station that speaks for it' },
      })),
};
