import { pointSurvey } from '../pointing/point-survey.ts';
import type { Assessment } from '../shading/assessment.ts';
import type { Survey } from '../survey/survey.ts';
import type { OpenPoint } from './open-point.ts';
import { isGrave, OPEN_POINT_KINDS } from './point-kinds.ts';

/**
 * What is missing or weak in a survey that the parser has passed, worst first: what leaves a result out or makes it
 * false, then by effect in percentage points, then what has no effect that could be computed, in the order of the table
 * of kinds. `assessment` is that of the same survey; null where it could not be had, and then no point has an effect.
 */
export function openPoints(survey: Survey, assessment: Assessment | null): OpenPoint[] {
  const look = { survey, assessment, pointed: pointSurvey(survey) };
  const points = OPEN_POINT_KINDS.flatMap(({ id, find }) =>
    find(look).map((point): OpenPoint => ({ kind: id, ...point })),
  );
  return points.sort(worstFirst);
}

/** The sort keeps the table's order where this says equal. */
function worstFirst(a: OpenPoint, b: OpenPoint): number {
  const grave = Number(isGrave(b.kind)) - Number(isGrave(a.kind));
  if (grave !== 0) return grave;
  return (b.effect ?? -1) - (a.effect ?? -1);
}
