import type { StationHorizon } from '../horizon/station-horizon.ts';
import { pointedDirections, stationHorizon } from '../horizon/station-horizon.ts';
import type { Climate } from '../irradiance/climate.ts';
import { pointSurvey } from '../pointing/point-survey.ts';
import { ordered } from '../survey/order.ts';
import type { Problem } from '../survey/problem.ts';
import { obstructionsById, stationsOf } from '../survey/served-planes.ts';
import type { RoofPlane, Station, Survey, TranspositionId } from '../survey/survey.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { DrawnAccess, DrawnSurvey } from '../uncertainty/access-interval.ts';
import { accessInterval, drawAccess, drawnSurvey } from '../uncertainty/access-interval.ts';
import { orientationInterval } from '../uncertainty/orientation-interval.ts';
import { uncertainStation } from '../uncertainty/uncertain-station.ts';
import type { Assessment, PlaneAccess, PlaneAssessment, StationAssessment } from '../shading/assessment.ts';
import { assessStation } from '../shading/assess-station.ts';
import type { Orientation } from '../shading/orientation-factor.ts';
import type { SiteLight } from '../shading/site-light.ts';
import { siteLight } from '../shading/site-light.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import { skyMap, unshadedMonths } from '../shading/sky-map.ts';

/** What an AbortSignal offers, without the platform's type. */
export interface Cancellation {
  /** Throws the reason where the work is no longer wanted. */
  throwIfAborted(): void;
}

export interface AssessOptions {
  /** Absent: the survey's own, else Hay and Davies. */
  transposition?: TranspositionId;
  /** A divisor of 60, 1 to 15. */
  stepMinutes?: number;
  /** What `siteLight` made for this very site, climate, transposition and step, where the caller has it already. */
  light?: SiteLight;
  /** Whether to draw how sure each access is; absent means true. The draws are the same for the same survey id. */
  intervals?: boolean;
  signal?: Cancellation;
  /** Called for each station of each plane with what its result was made from. */
  onStation?: (made: AssessedStation) => void;
  /** Called between parts of the work with the share done; the work waits for what it returns. */
  onProgress?: (share: number, stage: string) => void | Promise<void>;
}

/** A station laid over a plane. */
export interface AssessedStation {
  plane: RoofPlane;
  station: Station;
  map: SkyMap;
  horizon: StationHorizon;
  result: StationAssessment;
}

/**
 * Solar access and shading loss of every plane and station of a survey, by month, hour and obstruction.
 * The survey is one that the parser has passed. Throws the signal's reason when aborted.
 */
export async function assessSurvey(
  survey: Survey,
  climate: Climate,
  options: AssessOptions = {},
): Promise<Assessment> {
  const pointed = pointSurvey(survey);
  const transposition = options.transposition ?? survey.transposition ?? 'hay-davies';
  const planes = ordered(survey.planes);
  const parts = 1 + planes.reduce((count, plane) => count + 1 + stationsOf(survey, plane).length, 0);
  let done = 0;
  const advance = async (stage: string) => {
    await options.onProgress?.(done++ / parts, stage);
    options.signal?.throwIfAborted();
  };
  await advance('The sun and the sky of a year');
  const light = options.light ?? siteLight(survey.site, climate, { ...options, transposition });
  const drawn =
    options.intervals === false
      ? null
      : drawnSurvey(pointed, survey.site.latitude, climate.source, { seed: survey.id });
  const assessed: PlaneAssessment[] = [];
  for (const plane of planes)
    assessed.push(
      await assessPlane(plane, { survey, pointed, light, drawn, onStation: options.onStation }, advance),
    );
  await options.onProgress?.(1, 'Done');
  const { source, name, reference, warnings } = climate;
  return {
    climate: { source, name, reference, warnings },
    transposition,
    stepMinutes: light.year.paths.track.stepMinutes,
    warnings: [...surveyWarnings(survey), ...pointed.warnings],
    planes: assessed,
  };
}

/** What every plane of a survey is assessed with. */
interface Context {
  survey: Survey;
  pointed: PointedSurvey;
  light: SiteLight;
  /** Null where no intervals are asked for. */
  drawn: DrawnSurvey | null;
  onStation: AssessOptions['onStation'];
}

async function assessPlane(
  plane: RoofPlane,
  { survey, pointed, light, drawn, onStation }: Context,
  advance: (stage: string) => Promise<void>,
): Promise<PlaneAssessment> {
  await advance(plane.name);
  const map = skyMap(light.year, light.grid, plane.surfaceTilt, plane.surfaceAzimuth);
  const obstructions = obstructionsById(survey);
  const directionOf = pointedDirections(pointed);
  const stations: StationAssessment[] = [];
  const draws: DrawnAccess[] = [];
  for (const station of stationsOf(survey, plane)) {
    await advance(`${plane.name}, ${station.name}`);
    const horizon = stationHorizon(survey, station, directionOf);
    const result = assessStation(map, horizon, station, obstructions);
    if (drawn) {
      const uncertain = uncertainStation(survey, station, pointed, horizon);
      const draw = drawAccess(map, uncertain, result.solarAccess.annual, drawn);
      result.solarAccess.interval = accessInterval([draw], drawn);
      draws.push(draw);
    }
    onStation?.({ plane, station, map, horizon, result });
    stations.push(result);
  }
  const result = planeAssessment(plane, map, light.orientation, stations);
  if (!drawn) return result;
  if (result.solarAccess) result.solarAccess.interval = accessInterval(draws, drawn);
  const read = pointed.planes.find(({ id }) => id === plane.id);
  const lies = orientationInterval(light.orientation, plane, read, survey.id);
  return lies ? { ...result, orientationInterval: lies } : result;
}

function planeAssessment(
  plane: RoofPlane,
  map: SkyMap,
  { annual, best }: Orientation,
  stations: StationAssessment[],
): PlaneAssessment {
  const { id, name, surfaceTilt, surfaceAzimuth } = plane;
  const monthly = unshadedMonths(map);
  return {
    id,
    name,
    surfaceTilt,
    surfaceAzimuth,
    orientationFactor: best.annual > 0 ? Math.min(1, annual(surfaceTilt, surfaceAzimuth) / best.annual) : 1,
    bestPlane: { surfaceTilt: best.surfaceTilt, surfaceAzimuth: best.surfaceAzimuth },
    unshaded: { annual: monthly.reduce((sum, light) => sum + light, 0), monthly },
    solarAccess: planeAccess(stations),
    stations,
  };
}

function planeAccess(stations: readonly StationAssessment[]): PlaneAccess | null {
  if (stations.length === 0) return null;
  const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  const monthly = Array.from({ length: 12 }, (_, month) => {
    const shares = stations.map(({ solarAccess }) => solarAccess.monthly[month] ?? null);
    return shares.some((share) => share === null) ? null : mean(shares as number[]);
  });
  const annual = stations.map(({ solarAccess }) => solarAccess.annual);
  return {
    annual: mean(annual),
    monthly,
    method: 'stations-mean',
    lowest: Math.min(...annual),
    count: stations.length,
  };
}

/** What does not stop the computation but changes what its result means. */
function surveyWarnings(survey: Survey): Problem[] {
  const warnings: Problem[] = [];
  survey.stations.forEach((station, s) => {
    if (station.serves.length === 0)
      warnings.push({
        path: `stations[${s}].serves`,
        message: `Station "${station.name}" serves no plane, so it is in no result. Name the planes it speaks for.`,
      });
  });
  survey.planes.forEach((plane, p) => {
    if (stationsOf(survey, plane).length === 0)
      warnings.push({
        path: `planes[${p}]`,
        message: `No station serves "${plane.name}", so it has no solar access.`,
      });
  });
  return warnings;
}
