import { openPoints } from '../../../src/core/completeness/open-points.ts';
import type { OpenPoint, OpenPointKindId } from '../../../src/core/completeness/open-point.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { assessSurvey } from '../../../src/core/assessment/assess-survey.ts';
import type { Assessment } from '../../../src/core/shading/assessment.ts';
import type { RoofPlane, Survey } from '../../../src/core/survey/survey.ts';

export const SOUTH: RoofPlane = { id: 'south', name: 'South roof', surfaceTilt: 30, surfaceAzimuth: 180 };

export const assessed = (survey: Survey): Promise<Assessment> =>
  assessSurvey(survey, clearSkyClimate('ineichen'), { stepMinutes: 15 });

/** The points of a survey under a clear sky. */
export const pointsOf = async (survey: Survey): Promise<OpenPoint[]> =>
  openPoints(survey, await assessed(survey));

export const ofKind = (points: readonly OpenPoint[], kind: OpenPointKindId): OpenPoint[] =>
  points.filter((point) => point.kind === kind);
