import { pointedDirections, stationHorizon } from '../core/horizon/station-horizon.ts';
import type { Climate } from '../core/irradiance/climate.ts';
import { parseWeatherFile } from '../core/irradiance/weather-file.ts';
import type { SiteLight } from '../core/shading/site-light.ts';
import type { AssessOptions } from '../core/assessment/assess-survey.ts';
import { assessSurvey } from '../core/assessment/assess-survey.ts';
import type { SurveyEvidence } from '../core/assessment/survey-evidence.ts';
import { surveyEvidence } from '../core/assessment/survey-evidence.ts';
import type { StationSoFar } from '../core/assessment/station-so-far.ts';
import { stationSoFar } from '../core/assessment/station-so-far.ts';
import { obstructionsById } from '../core/survey/served-planes.ts';
import { siteLight } from '../core/shading/site-light.ts';
import type { Assessment } from '../core/shading/assessment.ts';
import type {
  AssessRequest,
  Outcome,
  PlaceQuestion,
  ShadeQuestion,
  WeatherFileFacts,
} from '../core/shading/calculation.ts';
import type { SkyDensity } from '../core/shading/sky-density.ts';
import { skyDensity } from '../core/shading/sky-density.ts';
import type { SkyMap } from '../core/shading/sky-map.ts';
import { skyMap } from '../core/shading/sky-map.ts';
import type { StationShade } from '../core/shading/station-shade.ts';
import { stationShade } from '../core/shading/station-shade.ts';
import type { Survey } from '../core/survey/survey.ts';
import type { ClimateSource } from './climate-source.ts';
import { textOf } from './climate-source.ts';
import { HeldRequest } from './held-request.ts';
import { Cancelled, outcomeOf } from './outcome-of.ts';

interface HeldLight {
  key: string;
  climate: Climate;
  light: SiteLight;
  planes: Map<string, { map: SkyMap; density: SkyDensity | null }>;
}

/** Lights kept: the one at work and the one before it, so that a look at another climate and back is quick. */
const MOST_LIGHTS = 2;

export type Progress = (share: number, stage: string) => void;

/**
 * The worker's memory: the survey at work, its site's light and the maps of its planes, so that another station or an
 * obstruction imagined gone is a subtraction and not a pass over the year.
 */
export class ShadeEngine {
  private held: HeldRequest | null = null;
  private lights: HeldLight[] = [];
  private readonly cancelled = new Set<number>();

  /** `breathe` resolves once waiting messages have been let in. */
  constructor(
    private readonly climates: ClimateSource,
    private readonly breathe: () => Promise<void>,
  ) {}

  /** Takes a survey up; later questions are about it. */
  hold(request: AssessRequest): void {
    this.held = new HeldRequest(request);
  }

  /** Ends the call that was given this ticket, where it next looks up. */
  cancel(ticket: number): void {
    this.cancelled.add(ticket);
  }

  assess(ticket: number, onProgress: Progress): Promise<Outcome<Assessment>> {
    return this.yearly(ticket, onProgress, assessSurvey);
  }

  evidence(ticket: number, onProgress: Progress): Promise<Outcome<SurveyEvidence>> {
    return this.yearly(ticket, onProgress, surveyEvidence);
  }

  /** A calculation over all planes and stations that tells how far it is. */
  private yearly<T>(
    ticket: number,
    onProgress: Progress,
    calculate: (survey: Survey, climate: Climate, options: AssessOptions) => Promise<T>,
  ): Promise<Outcome<T>> {
    return this.answer(ticket, async (held) => {
      const { request } = held;
      onProgress(0, 'The sun and the sky of a year');
      await this.lookUp(ticket);
      const { climate, light } = await this.lightOf(held);
      return calculate(request.survey, climate, {
        transposition: request.transposition,
        stepMinutes: request.stepMinutes,
        light,
        onProgress: async (share, stage) => {
          onProgress(share, stage);
          await this.lookUp(ticket);
        },
      });
    });
  }

  shade(ticket: number, question: ShadeQuestion): Promise<Outcome<StationShade>> {
    return this.answer(ticket, async (held) => {
      const { survey } = held.request;
      const { roof, place } = placeOf(survey, question);
      const light = await this.lightOf(held);
      await this.lookUp(ticket);
      const map = this.mapOf(light, roof.surfaceTilt, roof.surfaceAzimuth);
      const density = this.densityOf(light, roof.surfaceTilt, roof.surfaceAzimuth);
      await this.lookUp(ticket);
      const horizon = stationHorizon(survey, place, pointedDirections(held.pointed()));
      // what was imagined at another station may not be in the sky of this one
      const here = question.changes.filter(({ obstruction }) =>
        horizon.profile.obstructionIds.includes(obstruction),
      );
      return stationShade(map, density, horizon, place, obstructionsById(survey), here);
    });
  }

  /** What a station has so far: the year's figures alone, with how sure they are. */
  soFar(ticket: number, question: PlaceQuestion): Promise<Outcome<StationSoFar>> {
    return this.answer(ticket, async (held) => {
      const { survey } = held.request;
      const { roof, place } = placeOf(survey, question);
      const light = await this.lightOf(held);
      await this.lookUp(ticket);
      const map = this.mapOf(light, roof.surfaceTilt, roof.surfaceAzimuth);
      await this.lookUp(ticket);
      return stationSoFar(map, light.climate.source, survey, place, held.pointed());
    });
  }

  readWeatherFile(name: string, contents: ArrayBuffer): Promise<Outcome<WeatherFileFacts>> {
    return outcomeOf(() => {
      const parsed = parseWeatherFile(textOf(contents), name);
      if (parsed.ok)
        return Promise.resolve({
          ok: true,
          value: { place: parsed.value.place, warnings: parsed.warnings },
        } as const);
      return Promise.resolve({
        ok: false,
        fault: { code: 'weather-file-refused', problems: parsed.problems },
      } as const);
    });
  }

  private async answer<T>(ticket: number, work: (held: HeldRequest) => Promise<T>): Promise<Outcome<T>> {
    const { held } = this;
    if (!held) throw new RangeError('hold a survey before asking about it');
    const outcome = await outcomeOf(async () => ({ ok: true, value: await work(held) }) as const);
    this.cancelled.delete(ticket);
    return outcome;
  }

  private async lookUp(ticket: number): Promise<void> {
    await this.breathe();
    if (this.cancelled.has(ticket)) throw new Cancelled();
  }

  private async lightOf(asked: HeldRequest): Promise<HeldLight> {
    const { request } = asked;
    const { survey, stepMinutes } = request;
    const transposition = request.transposition ?? survey.transposition ?? 'hay-davies';
    const key = JSON.stringify([survey.site, survey.climate, asked.weatherKey(), transposition, stepMinutes]);
    const known = this.lights.find((held) => held.key === key);
    if (known) return known;
    const climate = await this.climates.of(request);
    const light = siteLight(survey.site, climate, { transposition, stepMinutes });
    const made = { key, climate, light, planes: new Map() };
    this.lights = [made, ...this.lights].slice(0, MOST_LIGHTS);
    return made;
  }

  private mapOf(light: HeldLight, surfaceTilt: number, surfaceAzimuth: number): SkyMap {
    return this.planeOf(light, surfaceTilt, surfaceAzimuth).map;
  }

  private densityOf(light: HeldLight, surfaceTilt: number, surfaceAzimuth: number): SkyDensity {
    const plane = this.planeOf(light, surfaceTilt, surfaceAzimuth);
    plane.density ??= skyDensity(plane.map, 1);
    return plane.density;
  }

  private planeOf({ light, planes }: HeldLight, surfaceTilt: number, surfaceAzimuth: number) {
    const key = `${surfaceTilt} ${surfaceAzimuth}`;
    let plane = planes.get(key);
    if (!plane) {
      plane = { map: skyMap(light.year, light.grid, surfaceTilt, surfaceAzimuth), density: null };
      planes.set(key, plane);
    }
    return plane;
  }
}

/** The plane and the station that a question names. Throws RangeError where the survey has none. */
function placeOf(survey: Survey, { plane, station }: PlaceQuestion) {
  const roof = survey.planes.find(({ id }) => id === plane);
  const place = survey.stations.find(({ id }) => id === station);
  if (!roof || !place) throw new RangeError(`no plane ${plane} or station ${station} in the survey`);
  return { roof, place };
}
