import { pointedDirections, stationHorizon } from '../horizon/station-horizon.ts';
import type { Climate } from '../irradiance/climate.ts';
import { pointSurvey } from '../pointing/point-survey.ts';
import { sunTrack } from '../solar-position/sun-track.ts';
import { standardOffsetMinutes } from '../solar-position/time-zone.ts';
import { ordered } from '../survey/order.ts';
import type { Problem } from '../survey/problem.ts';
import type { Obstruction, RoofPlane, Site, Station, Survey, TranspositionId } from '../survey/survey.ts';
import { transpositionOf } from '../transposition/transposition-models.ts';
import type { DrawnAccess } from '../uncertainty/access-interval.ts';
import { accessInterval, drawAccess, drawnSurvey } from '../uncertainty/access-interval.ts';
import { uncertainStation } from '../uncertainty/uncertain-station.ts';
import type { Assessment, PlaneAccess, PlaneAssessment, StationAssessment } from './assessment.ts';
import { assessStation } from './assess-station.ts';
import type { Orientation } from './orientation-factor.ts';
import { orientation } from './orientation-factor.ts';
import type { SkyGrid } from './sky-grid.ts';
import { skyGrid } from './sky-grid.ts';
import type { SkyMap } from './sky-map.ts';
import { skyMap, unshadedMonths } from './sky-map.ts';
import type { SkyYear } from './sky-year.ts';
import { skyYear } from './sky-year.ts';
import { sunPaths } from './sun-paths.ts';

/** Minutes of a step where nothing else is asked for; the exactness of the results is measured at it. */
export const DEFAULT_STEP_MINUTES = 5;
export const DEFAULT_ALBEDO = 0.2;

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
  /** Called between parts of the work with the share done; the work waits for what it returns. */
  onProgress?: (share: number, stage: string) => void | Promise<void>;
}

/** One site's light, ready to be laid on any plane. */
export interface SiteLight {
  year: SkyYear;
  grid: SkyGrid;
  orientation: Orientation;
}

/** A year of light over a site. Throws RangeError for a step or a site out of range. */
export function siteLight(site: Site, climate: Climate, options: AssessOptions = {}): SiteLight {
  const track = sunTrack(
    { ...site, utcOffset: standardOffsetMinutes(site.timeZone) },
    options.stepMinutes ?? DEFAULT_STEP_MINUTES,
  );
  const paths = sunPaths(track);
  const year = skyYear(
    paths,
    climate,
    transpositionOf(options.transposition ?? 'hay-davies'),
    site.albedo ?? DEFAULT_ALBEDO,
  );
  return { year, grid: skyGrid(paths), orientation: orientation(year) };
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
  const directionOf = pointedDirections(pointed);
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
  for (const plane of planes) {
    await advance(plane.name);
    const map = skyMap(light.year, light.grid, plane.surfaceTilt, plane.surfaceAzimuth);
    const stations: StationAssessment[] = [];
    const draws: DrawnAccess[] = [];
    for (const station of stationsOf(survey, plane)) {
      await advance(`${plane.name}, ${station.name}`);
      const horizon = stationHorizon(survey, station, directionOf);
      const result = assessStation(map, horizon, station, obstructionsById(survey));
      if (drawn) {
        const uncertain = uncertainStation(survey, station, pointed, horizon);
        draws.push(drawAccess(map, uncertain, result.solarAccess.annual, drawn));
        result.solarAccess.interval = accessInterval([draws[draws.length - 1]], drawn);
      }
      stations.push(result);
    }
    const result = planeAssessment(plane, map, light.orientation, stations);
    if (drawn && result.solarAccess) result.solarAccess.interval = accessInterval(draws, drawn);
    assessed.push(result);
  }
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

export const stationsOf = (survey: Survey, plane: RoofPlane): Station[] =>
  ordered(survey.stations).filter(({ serves }) => serves.includes(plane.id));

export const obstructionsById = (survey: Survey): Map<string, Obstruction> =>
  new Map(survey.obstructions.map((obstruction) => [obstruction.id, obstruction]));

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
