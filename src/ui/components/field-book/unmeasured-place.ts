import type { Station, Survey } from '../../../core/survey/survey.ts';

/** Where a station is whose place was not measured: the plane it is for is known where there is only one. */
export function unmeasuredPlace({ serves }: Station, { planes }: Survey): string {
  const [plane, ...others] = planes.filter(({ id }) => serves.includes(id));
  return plane && others.length === 0 ? `Not measured on ${plane.name}` : 'Place unknown';
}
