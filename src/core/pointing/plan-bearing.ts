import { bearingReference } from './bearing-reference.ts';
import type { HeadingMethod } from './heading-method.ts';
import { PLANNING } from './planning-values.ts';

/** A bearing measured on a plan, of an eave sighted along or of a mark; it may be given later. */
export const planBearing: HeadingMethod = {
  id: 'plan-bearing',
  name: 'Bearing from a plan',
  needsBearing: true,
  needsSun: false,
  howTo: 'Sight along an eave, or at a mark, whose bearing you can measure on a plan, now or at the office.',
  caution: null,
  reference: (question) => bearingReference(question, PLANNING.planBearing),
};
