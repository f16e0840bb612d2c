import type { Climate } from '../irradiance/climate.ts';
import { pointSurvey } from '../pointing/point-survey.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { Assessment } from '../shading/assessment.ts';
import type { SkyDensity } from '../shading/sky-density.ts';
import { skyDensity } from '../shading/sky-density.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import type { StationShade } from '../shading/station-shade.ts';
import { measuredShade } from '../shading/station-shade.ts';
import type { Survey } from '../survey/survey.ts';
import type { AssessOptions, AssessedStation } from './assess-survey.ts';
import { assessSurvey } from './assess-survey.ts';

/** A survey's result with all that stands behind it: what a report is made from. Plain data that a worker can send. */
export interface SurveyEvidence {
  assessment: Assessment;
  pointed: PointedSurvey;
  /** In the order of the assessment's planes. */
  planes: PlaneEvidence[];
}

export interface PlaneEvidence {
  id: string;
  /** In the order of the assessment's stations of this plane. */
  stations: StationEvidence[];
}

export interface StationEvidence {
  id: string;
  shade: StationShade;
}

/** Assesses a survey as `assessSurvey` does, keeping what a report shows besides the figures; errors as there. */
export async function surveyEvidence(
  survey: Survey,
  climate: Climate,
  options: Omit<AssessOptions, 'onStation'> = {},
): Promise<SurveyEvidence> {
  const densities = new Map<SkyMap, SkyDensity>();
  const made = new Map<string, StationEvidence[]>();
  const onStation = ({ plane, station, map, horizon, result }: AssessedStation) => {
    const density = densities.get(map) ?? skyDensity(map, 1);
    densities.set(map, density);
    const evidence = { id: station.id, shade: measuredShade(map, density, horizon, result) };
    made.set(plane.id, [...(made.get(plane.id) ?? []), evidence]);
  };
  const assessment = await assessSurvey(survey, climate, { ...options, onStation });
  const planes = assessment.planes.map(({ id }) => ({ id, stations: made.get(id) ?? [] }));
  return { assessment, pointed: pointSurvey(survey), planes };
}
