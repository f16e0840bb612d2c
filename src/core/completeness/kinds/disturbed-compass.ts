import { compassLook } from '../../pointing/compass-heading.ts';
import type { Run, Survey } from '../../survey/survey.ts';
import { stationNames } from '../names.ts';
import type { OpenPointKind, SurveyLook } from '../open-point.ts';
import { runsInUse } from '../stations-of-runs.ts';

export const disturbedCompass: OpenPointKind = {
  id: 'disturbed-compass',
  title: 'A compass in doubt',
  isGrave: false,
  find: (look) =>
    runsInUse(look.pointed).flatMap(({ run, stations }) =>
      doubtsOf(run, look).map((message) => ({
        subject: stationNames(look.survey, stations),
        sentence: message,
        effect: null,
        cure: { at: 'run', run, station: [...stations].at(-1)!, words: 'Take a heading check' } as const,
      })),
    ),
};

/** Signs of steel or of a weak field; where a check has settled the heading, only that its checks disagree. */
function doubtsOf(id: string, { survey, pointed }: SurveyLook): string[] {
  const place = survey.runs.findIndex((run) => run.id === id);
  const found = pointed.runs.find((run) => run.id === id);
  if (!found || found.refused) return [];
  const signs = signsOf(survey.runs[place], `runs[${place}]`, survey);
  if (found.heading?.source !== 'check') return signs;
  return pointed.warnings
    .filter(({ path, message }) => path === `runs[${place}]` && !signs.includes(message))
    .map(({ message }) => message);
}

function signsOf(run: Run, path: string, survey: Survey): string[] {
  const readings = survey.readings.filter((reading) => reading.run === run.id);
  return compassLook(run, path, readings, survey.site).warnings.map(({ message }) => message);
}
