import { randomSource } from '../../src/core/uncertainty/random-source.ts';
import { measuredAccess, measuredInterval, unseenTruth } from './outcome.ts';
import type { PhoneNoise } from './phone-noise.ts';
import type { SceneLight } from './true-light.ts';
import { annualAccess } from './true-light.ts';
import type { Routine } from './virtual-survey.ts';
import { virtualSurvey } from './virtual-survey.ts';

/** What is tried: which phone, which routine, how many surveys; the same name gives the same surveys. */
export interface Trial {
  name: string;
  noise: PhoneNoise;
  routine: Routine;
  surveys: number;
}

function* surveysOf({ scene }: SceneLight, { name, noise, routine, surveys }: Trial) {
  for (let i = 0; i < surveys; i++) {
    const id = `${name} ${scene.name} ${i}`;
    yield { survey: virtualSurvey(scene, noise, randomSource('phone', id), id, routine), id };
  }
}

/** Errors of annual access, percentage points, sorted by size; refused surveys are counted apart. */
export interface Errors {
  sizes: number[];
  refused: number;
  /** Mean error with its sign. */
  bias: number;
}

export function errorsOf(light: SceneLight, trial: Trial): Errors {
  const truth = annualAccess(light.map, light.profile);
  const errors: number[] = [];
  let refused = 0;
  for (const { survey } of surveysOf(light, trial)) {
    const access = measuredAccess(light, survey);
    if (access === null) refused++;
    else errors.push(100 * (access - truth));
  }
  const bias = errors.reduce((sum, error) => sum + error, 0) / Math.max(1, errors.length);
  return { sizes: errors.map(Math.abs).sort((a, b) => a - b), refused, bias };
}

export const shareWithin = ({ sizes }: Pick<Errors, 'sizes'>, points: number): number =>
  sizes.filter((size) => size <= points).length / sizes.length;

/** How often the truth lies in the interval, and how wide that is, percentage points. */
export interface Coverage {
  inside: number;
  count: number;
  below: number;
  above: number;
  meanWidth: number;
}

export function coverageOf(light: SceneLight, trial: Trial, draws: number): Coverage {
  const coverage = { inside: 0, count: 0, below: 0, above: 0, meanWidth: 0 };
  for (const { survey, id } of surveysOf(light, trial)) {
    const truth = unseenTruth(light, randomSource('truth', id));
    const interval = measuredInterval(light, survey, draws);
    if (!interval) continue;
    coverage.count++;
    coverage.meanWidth += (100 * (interval.high - interval.low)) / trial.surveys;
    if (truth < interval.low) coverage.below++;
    else if (truth > interval.high) coverage.above++;
    else coverage.inside++;
  }
  return coverage;
}
