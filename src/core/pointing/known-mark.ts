import { bearingReference } from './bearing-reference.ts';
import type { HeadingMethod } from './heading-method.ts';
import { PLANNING } from './planning-values.ts';

/** A mark whose bearing from the station is known. */
export const knownMark: HeadingMethod = {
  id: 'known-mark',
  name: 'Mark of known bearing',
  needsBearing: true,
  needsSun: false,
  howTo: 'Sight the mark and give its bearing from here.',
  caution: null,
  reference: (question) => bearingReference(question, PLANNING.markBearing),
};
