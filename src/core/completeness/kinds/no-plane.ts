import type { OpenPointKind } from '../open-point.ts';

export const noPlane: OpenPointKind = {
  id: 'no-plane',
  title: 'No roof plane',
  isGrave: true,
  find: ({ survey }) =>
    survey.planes.length > 0
      ? []
      : [
          {
            subject: 'The roof',
            sentence: 'Shade falls on a plane, so without one there is no figure at all.',
            effect: null,
            cure: { at: 'roof', words: 'Add a roof plane' },
          },
        ],
};
