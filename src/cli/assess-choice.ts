import type { Climate } from '../core/irradiance/climate.ts';
import type { Parsed } from '../core/survey/problem.ts';
import type { Survey, TranspositionId } from '../core/survey/survey.ts';
import { TRANSPOSITIONS } from '../core/transposition/transposition-models.ts';
import { climateByOption, climateOfSurvey } from './climate-choice.ts';
import type { CommandCall } from './command.ts';
import { numberOption, textOption, UsageError, wordOption } from './command.ts';

const MODELS = TRANSPOSITIONS.map(({ id }) => id);
/** Whole minutes that divide an hour. */
const STEPS = [1, 2, 3, 4, 5, 6, 10, 12, 15];

/** How surveys are to be assessed, where the call says otherwise than they do. */
export interface AssessChoice {
  climate?: string;
  transposition?: TranspositionId;
  stepMinutes?: number;
}

export const ASSESS_OPTIONS = {
  climate: { type: 'string' },
  transposition: { type: 'string' },
  step: { type: 'string' },
} as const;

export const ASSESS_OPTIONS_HELP = `\
  --climate world|clear|FILE   where the sunlight comes from: the world grid, a clear sky, or a weather file
                               (EPW, TMY3 CSV); without it, what the survey says. A weather file that a survey
                               names is looked for beside the survey.
  --transposition MODEL        ${MODELS.join(', ')}; without it, what the survey says
  --step MINUTES               ${STEPS.join(', ')}`;

export function assessChoice(call: CommandCall): AssessChoice {
  const stepMinutes = numberOption(call, 'step', 1, 15);
  if (stepMinutes !== undefined && !STEPS.includes(stepMinutes))
    throw new UsageError(`--step must be one of ${STEPS.join(', ')} minutes, got ${stepMinutes}`);
  return {
    climate: textOption(call, 'climate'),
    transposition: wordOption(call, 'transposition', MODELS),
    stepMinutes,
  };
}

/** The climate for a survey that was read from `file`. */
export const chosenClimate = ({ climate }: AssessChoice, survey: Survey, file: string): Parsed<Climate> =>
  climate === undefined
    ? climateOfSurvey(survey.climate, survey.site, file)
    : climateByOption(climate, survey.site, survey.climate);
