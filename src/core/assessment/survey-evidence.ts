import type { Climate } from '../irradiance/climate.ts';
import { pointSurvey } from '../pointing/point-survey.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { Assessment } from '../shading/assessment.ts';
import type { PlaneProspects } from '../shading/prospects.ts';
import { planeProspects } from '../shading/prospects.ts';
import type { ObstructionTimes } from '../shading/shade-times.ts';
import { shadeTimes } from '../shading/shade-times.ts';
import type { SkyDensity } from '../shading/sky-density.ts';
import { skyDensity } from '../shading/sky-density.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import type { StationShade } from '../shading/station-shade.ts';
import { measuredShade } from '../shading/station-shade.ts';
import { obstructionsById } from '../survey/served-planes.ts';
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
  /** The station with the lowest annual access, the first of several; null where no station serves the plane. */
  lowest: LowestStation | null;
  /** What removing, cutting or growing each obstruction would change. */
  prospects: PlaneProspects;
}

export interface StationEvidence {
  id: string;
  shade: StationShade;
}

export interface LowestStation {
  id: string;
  /** When each obstruction shades it, in the order of the station's profile. */
  times: ObstructionTimes[];
}

/** Assesses a survey as `assessSurvey` does, keeping what a report shows besides the figures; errors as there. */
export async function surveyEvidence(
  survey: Survey,
  climate: Climate,
  options: Omit<AssessOptions, 'onStation'> = {},
): Promise<SurveyEvidence> {
  const made: AssessedStation[] = [];
  const assessment = await assessSurvey(survey, climate, {
    ...options,
    onStation: (station) => made.push(station),
  });
  return {
    assessment,
    pointed: pointSurvey(survey),
    planes: assessment.planes.map(({ id }) =>
      planeEvidence(
        id,
        made.filter(({ plane }) => plane.id === id),
        survey,
      ),
    ),
  };
}

function planeEvidence(id: string, made: readonly AssessedStation[], survey: Survey): PlaneEvidence {
  const densities = new Map<SkyMap, SkyDensity>();
  const densityOf = (map: SkyMap) => {
    const density = densities.get(map) ?? skyDensity(map, 1);
    densities.set(map, density);
    return density;
  };
  const scenes = made.map(({ map, horizon: { profile }, result }) => ({ map, profile, result }));
  return {
    id,
    stations: made.map(({ station, map, horizon, result }) => ({
      id: station.id,
      shade: measuredShade(map, densityOf(map), horizon, result),
    })),
    lowest: lowestStation(made, survey.site.timeZone),
    prospects: planeProspects(scenes, obstructionsById(survey)),
  };
}

function lowestStation(made: readonly AssessedStation[], timeZone: string): LowestStation | null {
  if (made.length === 0) return null;
  const access = ({ result }: AssessedStation) => result.solarAccess.annual;
  const lowest = made.reduce((least, one) => (access(one) < access(least) ? one : least));
  const { map, horizon, station } = lowest;
  return { id: station.id, times: shadeTimes(map.year.paths.track, map.facing, horizon.profile, timeZone) };
}
