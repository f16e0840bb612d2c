import { ordered } from '../../survey/order.ts';
import type { OpenPointKind } from '../open-point.ts';

export const stationServesNothing: OpenPointKind = {
  id: 'station-serves-nothing',
  title: 'Speaks for no plane',
  isGrave: false,
  find: ({ survey }) =>
    ordered(survey.stations)
      .filter(({ serves }) => !survey.planes.some(({ id }) => serves.includes(id)))
      .map(({ id, name }) => ({
        subject: name,
        sentence: 'What was sighted from here is in no result. Name the planes that it speaks for.',
        effect: null,
        cure: { at: 'station', station: id, act: 'edit', words: 'Change the station' },
      })),
};
