import type { HeadingMethodId } from '../survey/survey.ts';
import type { HeadingMethod } from './heading-method.ts';
import { knownMark } from './known-mark.ts';
import { planBearing } from './plan-bearing.ts';
import { sunShadow } from './sun-shadow.ts';

/** The ways of checking a heading, one row each. */
export const headingMethods: readonly HeadingMethod[] = [sunShadow, knownMark, planBearing];

const byId = new Map(headingMethods.map((method) => [method.id, method]));

/** The row of a method. Throws RangeError for one that has none. */
export function headingMethod(id: HeadingMethodId): HeadingMethod {
  const method = byId.get(id);
  if (!method) throw new RangeError(`id must be a heading method, got ${String(id)}`);
  return method;
}
