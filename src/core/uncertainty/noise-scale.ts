import type { PointedSurvey } from '../pointing/pointed-survey.ts';
import { NOISE } from './planning-values.ts';
import type { RandomSource } from './random-source.ts';
import type { Repeat } from './repeats.ts';
import { repeatsOf } from './repeats.ts';

/** Scales that are weighed against each other: even steps of their logarithm, five standard deviations and more each way. */
const STEPS = 121;
const LOG_REACH = 3;

/**
 * How much worse than planned a survey was pointed, `count` times: the planned deviations of all its runs are multiplied by
 * it, draw by draw. What is believed beforehand, a factor of two either way, is weighed by the survey's own repeats; few
 * repeats leave it wide, so that draws have the heavy tails of a deviation that is not known (as Student's t has). A
 * survey that repeats nothing shows nothing of it, and is drawn as planned: 1.
 * Ref: Gelman and others (2013), Bayesian Data Analysis, 3rd ed., chapters 2 (normal data, unknown scale) and 3 (grids).
 */
export function noiseScales(
  pointed: Pick<PointedSurvey, 'runs'>,
  random: RandomSource,
  count: number,
): Float64Array {
  const repeats = repeatsOf(pointed);
  if (repeats.length === 0) return new Float64Array(count).fill(1);
  const weights = Array.from({ length: STEPS }, (_, k) => posterior(Math.exp(logScale(k)), repeats));
  const whole = weights.reduce((sum, weight) => sum + weight, 0);
  return Float64Array.from({ length: count }, () =>
    Math.max(NOISE.least, Math.exp(logScale(stepAt(weights, whole * random.uniform())))),
  );
}

const logScale = (step: number) => LOG_REACH * ((2 * step) / (STEPS - 1) - 1);

/** Belief in a scale, per step of its logarithm and up to a common factor. */
function posterior(scale: number, repeats: readonly Repeat[]): number {
  const before = Math.exp(-((Math.log(scale) / NOISE.logDeviation) ** 2) / 2);
  return repeats.reduce((belief, repeat) => belief * likelihood(repeat, scale), before);
}

/** Density of a difference where everything is `scale` times as planned; of outliers, even over their reach. */
function likelihood({ difference, outliers }: Repeat, scale: number): number {
  const size = Math.min(NOISE.farthest, Math.abs(difference));
  const usual = Math.exp(-((size / scale) ** 2) / 2) / (scale * Math.sqrt(2 * Math.PI));
  if (!outliers) return usual;
  const { share, reach } = outliers;
  return (1 - share) * usual + (size <= reach ? share / (2 * reach) : 0);
}

function stepAt(weights: readonly number[], target: number): number {
  let step = 0;
  for (let sum = weights[0]; sum < target && step < weights.length - 1; sum += weights[step]) step++;
  return step;
}
