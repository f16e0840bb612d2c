import { ordered } from '../../core/survey/order.ts';
import type { HeadingCheck, HeadingMethodId, Survey } from '../../core/survey/survey.ts';

type Stations = Pick<Survey, 'stations'>;

/** All heading checks of a survey, station after station. */
export const checksOf = ({ stations }: Stations): HeadingCheck[] =>
  ordered(stations).flatMap(({ headingChecks = [] }) => ordered(headingChecks));

/** How the heading was checked last in this survey. */
export const checkMethodLast = (survey: Stations): HeadingMethodId | null =>
  checksOf(survey).at(-1)?.method ?? null;

/** The obstruction traced last in this survey, from whichever station. */
export const tracedLast = ({ stations }: Stations): string | null =>
  ordered(stations)
    .flatMap(({ traces }) => ordered(traces))
    .at(-1)?.obstruction ?? null;
