import type { Climate } from '../irradiance/climate.ts';
import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { AccessInterval, IntervalSource } from '../shading/assessment.ts';
import type { SkyMap } from '../shading/sky-map.ts';
import { AccessAccount } from './access-account.ts';
import type { IntervalSourceId } from './interval-source.ts';
import { INTERVAL_SOURCES } from './interval-source.ts';
import { DRAWS, LEFT_AFTER, SOURCE_DRAWS } from './planning-values.ts';
import { quantile } from './quantile.ts';
import { cureOf, diffuseLeft, diffuseSpread, varianceLeft } from './source-cures.ts';
import type { DrawnLosses } from './station-draws.ts';
import { StationDraws } from './station-draws.ts';
import type { SurveyDraws } from './survey-draws.ts';
import { surveyDraws } from './survey-draws.ts';
import type { UncertainStation } from './uncertain-station.ts';

export interface IntervalOptions {
  /** Names the random numbers: the same seed gives the same interval. */
  seed: string;
  /** Absent: 1,000. */
  draws?: number;
  /** False leaves out the list of sources. */
  sources?: boolean;
}

/** A survey's errors, drawn once for all its planes. */
export interface DrawnSurvey {
  pointed: PointedSurvey;
  latitude: number;
  climate: Climate['source'];
  draws: SurveyDraws;
  /** With one source cured, made when first asked for. */
  cured(source: 'heading' | 'elevation-index'): SurveyDraws;
  sources: boolean;
}

export function drawnSurvey(
  pointed: PointedSurvey,
  latitude: number,
  climate: Climate['source'],
  { seed, draws = DRAWS, sources = true }: IntervalOptions,
): DrawnSurvey {
  const cured = new Map<IntervalSourceId, SurveyDraws>();
  return {
    pointed,
    latitude,
    climate,
    draws: surveyDraws(pointed, seed, draws),
    cured(source) {
      if (!cured.has(source))
        cured.set(source, surveyDraws(pointed, seed, Math.min(draws, SOURCE_DRAWS), source));
      return cured.get(source)!;
    },
    sources,
  };
}

/** One station before one plane, drawn. */
export interface DrawnAccess {
  station: UncertainStation;
  /** Annual solar access in each draw, 0 to 1. */
  access: Float64Array;
  /** The first draws again with one source cured, and the share of that source's variance that is left. */
  cured: Map<IntervalSourceId, { access: Float64Array; left: number }>;
}

/**
 * Draws the annual solar access of a plane at a station. `annual` is the access that the assessment gives: draws differ
 * from it by what they change.
 */
export function drawAccess(
  map: SkyMap,
  station: UncertainStation,
  annual: number,
  survey: DrawnSurvey,
): DrawnAccess {
  const drawn = new StationDraws(map, station, survey.latitude);
  const account = new AccessAccount(
    map,
    drawn,
    annual,
    survey.draws,
    diffuseSpread(survey.climate),
    station.obstructions.length > 0,
  );
  const losses = drawn.draw(survey.draws, survey.draws.count);
  const cured: DrawnAccess['cured'] = new Map();
  if (survey.sources)
    for (const source of INTERVAL_SOURCES) {
      const again = cureSource(source, drawn, losses, account, survey, station);
      if (again) cured.set(source, again);
    }
  return { station, access: account.access(losses, losses.direct.length), cured };
}

/** Redoes the first draws with one source changed; null for a source that moves nothing here. */
function cureSource(
  source: IntervalSourceId,
  drawn: StationDraws,
  losses: DrawnLosses,
  account: AccessAccount,
  survey: DrawnSurvey,
  station: UncertainStation,
): { access: Float64Array; left: number } | null {
  const { draws } = survey;
  const count = Math.min(SOURCE_DRAWS, draws.count);
  const again = (set: SurveyDraws, left: number) => {
    const redrawn = drawn.draw(set, count, source);
    // What was not looked at is drawn from numbers of its own, so it stays.
    return { access: account.access({ ...losses, direct: redrawn.direct, even: redrawn.even }, count), left };
  };
  switch (source) {
    case 'heading':
    case 'elevation-index': {
      if (station.obstructions.length === 0) return null;
      const set = survey.cured(source);
      return again(set, varianceLeft(source, [station], draws, set));
    }
    case 'pointing':
      return station.obstructions.length === 0 ? null : again(draws, LEFT_AFTER.sightedAgain ** 2);
    case 'gaps':
      return station.obstructions.length === 0 ? null : again(draws, LEFT_AFTER.moreSightings ** 2);
    case 'transmittance':
      return drawn.spreads ? again(draws, LEFT_AFTER.measuredPassing ** 2) : null;
    case 'unseen':
      return drawn.patches.length === 0
        ? null
        : { access: account.access(losses, count, { unseen: 0 }), left: 0 };
    case 'diffuse-share': {
      const left = diffuseLeft(survey.climate);
      return { access: account.access(losses, count, { diffuse: left }), left: left ** 2 };
    }
  }
}

/** Interval of the mean access of stations, whose draws share what their sightings share; of one station, its own. */
export function accessInterval(drawn: readonly DrawnAccess[], survey: DrawnSurvey): AccessInterval {
  const access = meanOf(drawn.map(({ access }) => access));
  const sorted = access.slice().sort();
  return {
    low: quantile(sorted, 0.025),
    high: quantile(sorted, 0.975),
    standardDeviation: Math.sqrt(variance(access, access.length)),
    draws: access.length,
    sources: survey.sources ? rankedSources(drawn, access, survey) : [],
  };
}

function rankedSources(
  drawn: readonly DrawnAccess[],
  access: Float64Array,
  { pointed, climate }: DrawnSurvey,
): IntervalSource[] {
  const count = Math.min(SOURCE_DRAWS, access.length);
  const whole = variance(access, count);
  const spread = Math.sqrt(variance(access, access.length));
  const stations = drawn.map(({ station }) => station);
  const sources = INTERVAL_SOURCES.flatMap((source) => {
    const lefts = drawn.flatMap(({ cured }) => cured.get(source)?.left ?? []);
    if (lefts.length === 0 || !(whole > 0)) return [];
    const left = lefts.reduce((sum, share) => sum + share, 0) / lefts.length;
    const after = variance(
      meanOf(
        drawn.map((one) => one.cured.get(source)?.access ?? one.access),
        count,
      ),
      count,
    );
    const share = left < 1 ? Math.max(0, (whole - after) / (1 - left)) / whole : 0;
    const cure = cureOf(source, stations, pointed, climate);
    const standardDeviationAfter = cure === null ? null : spread * Math.sqrt(Math.min(1, after / whole));
    return [{ source, share, cure, standardDeviationAfter }];
  });
  const total = Math.max(
    1e-12,
    sources.reduce((sum, { share }) => sum + share, 0),
  );
  return sources.map((one) => ({ ...one, share: one.share / total })).sort((a, b) => b.share - a.share);
}

function meanOf(
  rows: readonly Float64Array[],
  count = Math.min(...rows.map(({ length }) => length)),
): Float64Array {
  const mean = new Float64Array(count);
  for (const row of rows) for (let i = 0; i < count; i++) mean[i] += row[i] / rows.length;
  return mean;
}

function variance(values: Float64Array, count: number): number {
  let [sum, squares] = [0, 0];
  for (let i = 0; i < count; i++) sum += values[i];
  const mean = sum / count;
  for (let i = 0; i < count; i++) squares += (values[i] - mean) ** 2;
  return squares / count;
}
