import { PLANNING } from '../pointing/planning-values.ts';
import type { PointedRun, PointedSurvey, RunHeading } from '../pointing/pointed-survey.ts';
import type { SightingAxis } from '../survey/survey.ts';
import type { IntervalSourceId } from './interval-source.ts';
import { noiseScales } from './noise-scale.ts';
import { CHECKED_HEADING, LEFT_AFTER } from './planning-values.ts';
import { randomSource } from './random-source.ts';

/** What is drawn once for a whole survey: all stations and planes share it, draw by draw. Degrees. */
export interface SurveyDraws {
  readonly seed: string;
  readonly count: number;
  /** How much worse than planned the survey was pointed, 1 for as planned; in all that is drawn for its runs. */
  readonly noise: Float64Array;
  readonly runs: ReadonlyMap<string, RunDraws>;
  readonly typed: { heading: Float64Array; index: Float64Array };
  /** Normal, of standard deviation 1. */
  readonly diffuse: Float64Array;
  /** Even over 0 to 1: where in its range an obstruction's transmittance lies. */
  passing(obstruction: string): Float64Array;
}

export interface RunDraws {
  /** At the run's best instant. */
  heading: Float64Array;
  /** Degrees a minute. */
  rate: Float64Array;
  index: Record<SightingAxis, Float64Array>;
}

/**
 * Draws the errors that a survey's sightings have in common, as the pointing's error model says. With `cured`, the source
 * of that name has what is left of its deviation after its cure; all else stays the same numbers.
 */
export function surveyDraws(
  pointed: PointedSurvey,
  seed: string,
  count: number,
  cured?: IntervalSourceId,
): SurveyDraws {
  const runs = new Map<string, RunDraws>();
  const byId = new Map(pointed.runs.map((run) => [run.id, run]));
  const noise = noiseScales(pointed, randomSource(seed, 'noise'), count);
  for (const run of pointed.runs) drawRun(run, byId, runs, { seed, count, noise, cured });
  const normals = (name: string, deviation: number) => {
    const random = randomSource(seed, name);
    return Float64Array.from({ length: count }, () => deviation * random.normal());
  };
  const passing = new Map<string, Float64Array>();
  const { heading, index } = pointed.typed;
  return {
    seed,
    count,
    noise,
    runs,
    typed: {
      heading: normals('typed heading', cured === 'heading' ? Math.min(heading, CHECKED_HEADING) : heading),
      index: normals('typed index', cured === 'elevation-index' ? curedIndex(index) : index),
    },
    diffuse: normals('diffuse share', 1),
    passing(obstruction) {
      let drawn = passing.get(obstruction);
      if (!drawn) {
        const random = randomSource(seed, 'transmittance', obstruction);
        drawn = Float64Array.from({ length: count }, () => random.uniform());
        passing.set(obstruction, drawn);
      }
      return drawn;
    },
  };
}

interface RunDrawing {
  seed: string;
  count: number;
  noise: Float64Array;
  cured?: IntervalSourceId;
}

/** Draws a run, the one it takes its heading from before it. */
function drawRun(
  run: PointedRun,
  byId: ReadonlyMap<string, PointedRun>,
  drawn: Map<string, RunDraws>,
  drawing: RunDrawing,
): void {
  const { seed, count, noise, cured } = drawing;
  if (drawn.has(run.id)) return;
  const { heading, index } = run;
  const draws: RunDraws = {
    heading: new Float64Array(count),
    rate: new Float64Array(count),
    index: { camera: new Float64Array(count), 'top-edge': new Float64Array(count) },
  };
  drawn.set(run.id, draws);
  if (heading) drawHeading(run.id, heading, draws, drawing);
  const from = heading?.from ? byId.get(heading.from) : undefined;
  const apart = cured === 'heading' && heading !== null && curedDeviation(heading) !== heading.ownDeviation;
  if (from && !apart) {
    drawRun(from, byId, drawn, drawing);
    const other = drawn.get(from.id)!.heading;
    for (let i = 0; i < count; i++) draws.heading[i] += other[i];
  }
  for (const axis of ['camera', 'top-edge'] as const) {
    const random = randomSource(seed, 'index', run.id, axis);
    const { standardDeviation } = index[axis];
    const deviation = cured === 'elevation-index' ? curedIndex(standardDeviation) : standardDeviation;
    for (let i = 0; i < count; i++) draws.index[axis][i] = noise[i] * deviation * random.normal();
  }
}

function drawHeading(
  run: string,
  heading: RunHeading,
  draws: RunDraws,
  { seed, noise, cured }: RunDrawing,
): void {
  const random = randomSource(seed, 'heading', run);
  const deviation = cured === 'heading' ? curedDeviation(heading) : heading.ownDeviation;
  const outliers = cured === 'heading' ? null : heading.outliers;
  for (let i = 0; i < draws.heading.length; i++) {
    const [usual, rate, chance, far] = [random.normal(), random.normal(), random.uniform(), random.uniform()];
    const isOutlier = outliers !== null && chance < outliers.share;
    draws.heading[i] = isOutlier ? outliers.reach * (2 * far - 1) : noise[i] * deviation * usual;
    draws.rate[i] = noise[i] * heading.ratePerMinuteDeviation * rate;
  }
}

/** A checked run is checked once more; any other gets a check of its own, and then does not share another's error. */
const curedDeviation = ({ source, ownDeviation }: RunHeading): number =>
  source === 'check' ? ownDeviation * LEFT_AFTER.secondCheck : Math.min(ownDeviation, CHECKED_HEADING);

/** Whether turning the phone about its axis would still help an index of this deviation. */
export const hasTwoFaceCure = (deviation: number): boolean => deviation > PLANNING.elevationIndexTurned;

/** Turning the phone leaves a known part; where it was turned already, half, to see what the index does at all. */
const curedIndex = (deviation: number): number =>
  hasTwoFaceCure(deviation) ? PLANNING.elevationIndexTurned : deviation / 2;
