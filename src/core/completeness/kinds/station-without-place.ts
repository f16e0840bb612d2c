import { ordered } from '../../survey/order.ts';
import type { OpenPointKind } from '../open-point.ts';

export const stationWithoutPlace: OpenPointKind = {
  id: 'station-without-place',
  title: 'Place unknown',
  isGrave: false,
  find: ({ survey }) =>
    ordered(survey.stations)
      .filter(({ position }) => position === undefined)
      .map(({ id, name }) => ({
        subject: name,
        sentence:
          'Nobody can find it again, and distances cannot be taken from it. Measure it from the eave and the edge.',
        effect: null,
        cure: { at: 'station', station: id, act: 'edit', words: 'Say where it is' },
      })),
};
