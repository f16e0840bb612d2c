import { blockedSpans } from '../../../src/core/horizon/blocked-spans.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { pointedDirections, stationHorizon } from '../../../src/core/horizon/station-horizon.ts';
import { worldClimate } from '../../../src/core/irradiance/world-climate.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import type { SiteLight } from '../../../src/core/shading/site-light.ts';
import { siteLight } from '../../../src/core/shading/site-light.ts';
import { stationsOf } from '../../../src/core/survey/served-planes.ts';
import { blockedLight, shadedMonths } from '../../../src/core/shading/blocked-light.ts';
import type { SkyMap } from '../../../src/core/shading/sky-map.ts';
import { skyMap, unshadedMonths } from '../../../src/core/shading/sky-map.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import type {
  UncertainObstruction,
  UncertainStation,
} from '../../../src/core/uncertainty/uncertain-station.ts';
import { uncertainStation } from '../../../src/core/uncertainty/uncertain-station.ts';
import { worldGrid } from '../irradiance/world-bytes.ts';
import { sampleSurvey, sampleTexts } from '../survey/sample-surveys.ts';

export interface Scene {
  name: string;
  survey: Survey;
  map: SkyMap;
  station: UncertainStation;
}

/** The first station of every plane of a survey. */
export function scenesOf(survey: Survey, light: SiteLight = lightOf(survey)): Scene[] {
  const pointed = pointSurvey(survey);
  return survey.planes.flatMap((plane) => {
    const station = stationsOf(survey, plane)[0];
    if (!station) return [];
    const horizon = stationHorizon(survey, station, pointedDirections(pointed));
    return {
      name: `${survey.title}, ${plane.name}`,
      survey,
      map: skyMap(light.year, light.grid, plane.surfaceTilt, plane.surfaceAzimuth),
      station: uncertainStation(survey, station, pointed, horizon),
    };
  });
}

export const lightOf = (survey: Survey): SiteLight =>
  siteLight(survey.site, worldClimate(worldGrid, survey.site), { stepMinutes: 10 });

export const sampleScenes = (): Scene[] => sampleTexts.flatMap(({ file }) => scenesOf(sampleSurvey(file)));

const sum = (values: readonly number[]) => values.reduce((all, value) => all + value, 0);

/** Annual access by a whole rebuild: profile, spans, every month. */
export function rebuiltAccess(
  map: SkyMap,
  obstructions: readonly Pick<UncertainObstruction, 'id' | 'transmittance' | 'traces'>[],
): number {
  const traced = obstructions.map((one) => ({ ...one, traces: [...one.traces] }));
  const blocked = blockedLight(map, blockedSpans(horizonProfile(traced)));
  return sum(shadedMonths(map, blocked)) / sum(unshadedMonths(map));
}
