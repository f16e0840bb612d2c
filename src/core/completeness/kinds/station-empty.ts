import { ordered } from '../../survey/order.ts';
import type { Station } from '../../survey/survey.ts';
import { effectThrough } from '../interval-effect.ts';
import type { OpenPointKind } from '../open-point.ts';

/** Whether nothing at all was seen from a station. */
export const isEmpty = ({ traces, observedOpen = [], openLooks = [] }: Station): boolean =>
  traces.length === 0 && observedOpen.length === 0 && openLooks.length === 0;

export const stationEmpty: OpenPointKind = {
  id: 'station-empty',
  title: 'Nothing sighted from here',
  isGrave: false,
  find: ({ survey, assessment }) =>
    ordered(survey.stations)
      .filter(isEmpty)
      .map(({ id, name }) => ({
        subject: name,
        sentence:
          'No trace and no open range: its horizon counts as clear, although nobody looked. Trace what stands there, or say that it is open.',
        effect: effectThrough(assessment, new Set([id]), 'unseen'),
        cure: { at: 'station', station: id, act: 'sight', words: 'Sight from here' },
      })),
};
