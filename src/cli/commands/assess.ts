import { assessSurvey } from '../../core/assessment/assess-survey.ts';
import type { Assessment } from '../../core/shading/assessment.ts';
import { parseSurvey } from '../../core/survey/parse-survey.ts';
import type { Problem } from '../../core/survey/problem.ts';
import type { Survey } from '../../core/survey/survey.ts';
import type { AssessChoice } from '../assess-choice.ts';
import { ASSESS_OPTIONS, ASSESS_OPTIONS_HELP, assessChoice, chosenClimate } from '../assess-choice.ts';
import { assessmentText } from '../assessment-text.ts';
import type { Command, Terminal } from '../command.ts';
import { problemLines, warningLines } from '../problem-lines.ts';
import { progressTeller } from '../progress.ts';
import { readSurveyText } from '../read-file.ts';

type Assessed =
  { file: string; problems: Problem[]; planes: [] } | ({ file: string; title: string } & Assessment);

export const assess: Command = {
  name: 'assess',
  usage: 'FILE... [options]',
  summary: 'Annual shading loss of surveys: by plane, station, month, hour and obstruction.',
  help: `
${ASSESS_OPTIONS_HELP}
  --json                       { surveys: [ { file, problems?, climate, transposition, stepMinutes, warnings,
                                 planes: [ { id, orientationFactor, orientationInterval, unshaded,
                                 solarAccess, stations } ] } ] }
                               irradiation in kWh/m2, shares 0 to 1, null for a month without sun;
                               hours are local standard time; solarAccess of planes and stations has
                               interval: { low, high, standardDeviation, draws, sources: [ { source,
                               share, cure, standardDeviationAfter } ] }, 95 % on the annual access;
                               stations have coverage and unseen: [ { from, to, share, inSunBand } ], the
                               azimuths nobody looked at (clockwise degrees from true north): their
                               shares of the light and coverage sum to 1

A file that cannot be used is told, the others are assessed, and the exit code is 1.
Counted: light from the sun and the sky that obstructions block. Not counted: what obstructions reflect.`,
  options: {
    ...ASSESS_OPTIONS,
    json: { type: 'boolean' },
  },
  async run(call) {
    const choice = assessChoice(call);
    const { terminal, values } = call;
    const surveys: Assessed[] = [];
    for (const file of call.files) {
      const assessed = await assessedOrFault(file, choice, terminal);
      surveys.push(assessed);
      if ('problems' in assessed) terminal.err(problemLines(file, assessed.problems));
      else {
        terminal.err(warningLines(file, assessed.warnings));
        if (!values.json) terminal.out(assessmentText(assessed));
      }
    }
    if (values.json) terminal.out(`${JSON.stringify({ surveys })}\n`);
    return surveys.some((assessed) => 'problems' in assessed) ? 1 : 0;
  },
};

/** One file's unexpected error must not cost the others their results. */
async function assessedOrFault(file: string, choice: AssessChoice, terminal: Terminal): Promise<Assessed> {
  try {
    return await assessFile(file, choice, terminal);
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    const message = `Noonmark could not assess this file, by a fault of its own (${reason}). Please report it, with the file if you can.`;
    return { file, problems: [{ path: 'file', message }], planes: [] };
  }
}

async function assessFile(file: string, choice: AssessChoice, terminal: Terminal): Promise<Assessed> {
  const tell = progressTeller(terminal, file);
  const read = readSurveyText(file);
  const parsed = read.ok ? parseSurvey(read.value.text) : read;
  if (!parsed.ok) return { file, problems: parsed.problems, planes: [] };
  const survey: Survey = parsed.value;
  const climate = chosenClimate(choice, survey, file);
  if (!climate.ok) return { file, problems: climate.problems, planes: [] };
  const { transposition, stepMinutes } = choice;
  const assessment = await assessSurvey(survey, climate.value, {
    transposition,
    stepMinutes,
    onProgress: tell,
  });
  const warnings = [...parsed.warnings, ...climate.warnings, ...assessment.warnings];
  return { file, title: survey.title, ...assessment, warnings };
}
