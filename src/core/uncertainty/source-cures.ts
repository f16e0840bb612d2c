import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import type { Climate } from '../irradiance/climate.ts';
import type { CureId, IntervalSourceId } from './interval-source.ts';
import { DIFFUSE_SPREAD, LEFT_AFTER } from './planning-values.ts';
import type { SurveyDraws } from './survey-draws.ts';
import { hasTwoFaceCure } from './survey-draws.ts';
import type { UncertainStation } from './uncertain-station.ts';

/** What would shrink a source at these stations; null where nothing that can be named would. */
export function cureOf(
  source: IntervalSourceId,
  stations: readonly UncertainStation[],
  pointed: PointedSurvey,
  climate: Climate['source'],
): CureId | null {
  switch (source) {
    case 'heading':
      return headingCure(stations, pointed);
    case 'elevation-index':
      return hasIndexCure(stations, pointed) ? 'two-face-check' : null;
    case 'pointing':
      return 'sight-again';
    case 'gaps':
      return 'more-sightings';
    case 'unseen':
      return 'look';
    case 'transmittance':
      return 'measure-transmittance';
    case 'diffuse-share':
      return climate === 'world' ? 'weather-file' : null;
  }
}

/** Share of the diffuse share's deviation that its cure leaves; half where it has none. */
export const diffuseLeft = (climate: Climate['source']): number =>
  climate === 'world' ? LEFT_AFTER.weatherFile : 0.5;

export const diffuseSpread = (climate: Climate['source']): number => DIFFUSE_SPREAD[climate];

function headingCure(stations: readonly UncertainStation[], pointed: PointedSurvey): CureId {
  const used = usedRuns(stations);
  const runs = pointed.runs.filter(({ id }) => used.has(id));
  if (runs.length === 0) return 'known-bearing';
  return runs.every(({ heading }) => heading?.source === 'check') ? 'second-heading-check' : 'heading-check';
}

function hasIndexCure(stations: readonly UncertainStation[], pointed: PointedSurvey): boolean {
  const byId = new Map(pointed.runs.map((run) => [run.id, run]));
  return errorsOf(stations).some(({ run, axis }) =>
    hasTwoFaceCure(
      (run === null ? undefined : byId.get(run)?.index[axis].standardDeviation) ?? pointed.typed.index,
    ),
  );
}

/** Share of the variance of headings, or of elevation indexes, that is left in the second set of draws. */
export function varianceLeft(
  source: 'heading' | 'elevation-index',
  stations: readonly UncertainStation[],
  before: SurveyDraws,
  after: SurveyDraws,
): number {
  let [all, left] = [0, 0];
  for (const [key, count] of sightingsByRun(stations)) {
    const [run, axis] = key;
    const rows = [before, after].map((draws) => {
      const own = run === null ? undefined : draws.runs.get(run);
      if (source === 'heading') return own ? own.heading : draws.typed.heading;
      return own ? own.index[axis] : draws.typed.index;
    });
    all += count * meanSquare(rows[0], after.count);
    left += count * meanSquare(rows[1], after.count);
  }
  return all > 0 ? left / all : 1;
}

type RunAxis = readonly [run: string | null, axis: 'camera' | 'top-edge'];

function sightingsByRun(stations: readonly UncertainStation[]): Map<RunAxis, number> {
  const keys = new Map<string, RunAxis>();
  const counts = new Map<RunAxis, number>();
  for (const { run, axis } of errorsOf(stations)) {
    const name = `${run ?? ''} ${axis}`;
    if (!keys.has(name)) keys.set(name, [run, axis]);
    const key = keys.get(name)!;
    counts.set(key, (counts.get(key) ?? 0) + 1);
  }
  return counts;
}

const errorsOf = (stations: readonly UncertainStation[]) =>
  stations.flatMap(({ obstructions }) =>
    obstructions.flatMap(({ traces }) => traces.flatMap(({ errors }) => errors)),
  );

const usedRuns = (stations: readonly UncertainStation[]) => new Set(errorsOf(stations).map(({ run }) => run));

function meanSquare(values: Float64Array, count: number): number {
  let sum = 0;
  for (let i = 0; i < count; i++) sum += values[i] * values[i];
  return sum / count;
}
