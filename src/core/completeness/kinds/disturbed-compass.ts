import { compassLook } from '../../pointing/compass-heading.ts';
import { groupedBy } from '../../pointing/grouped-by.ts';
import type { PointedRun } from '../../pointing/pointed-survey.ts';
import type { Problem } from '../../survey/problem.ts';
import type { Reading, Run, Site } from '../../survey/survey.ts';
import { stationNames } from '../names.ts';
import type { OpenPointKind } from '../open-point.ts';
import { runsInUse } from '../stations-of-runs.ts';

export const disturbedCompass: OpenPointKind = {
  id: 'disturbed-compass',
  title: 'A compass in doubt',
  isGrave: false,
  find: ({ survey, pointed }) => {
    const readings = groupedBy(survey.readings, ({ run }) => run);
    const said = groupedBy(pointed.warnings, ({ path }) => path);
    const places = new Map(survey.runs.map(({ id }, place) => [id, place]));
    return runsInUse(pointed).flatMap(({ run, stations, pointed: found }) => {
      const place = places.get(run)!;
      const path = `runs[${place}]`;
      const signs = signsOf(survey.runs[place], path, readings.get(run) ?? [], survey.site);
      return doubtsOf(found, signs, said.get(path) ?? []).map((message) => ({
        subject: stationNames(survey, stations),
        sentence: message,
        effect: null,
        cure: { at: 'run', run, station: [...stations].at(-1)!, words: 'Take a heading check' } as const,
      }));
    });
  },
};

/** Signs of steel or of a weak field; where a check has settled the heading, only that its checks disagree. */
function doubtsOf({ heading, refused }: PointedRun, signs: string[], said: readonly Problem[]): string[] {
  if (refused) return [];
  if (heading?.source !== 'check') return signs;
  return said.map(({ message }) => message).filter((message) => !signs.includes(message));
}

const signsOf = (run: Run, path: string, readings: readonly Reading[], site: Site): string[] =>
  compassLook(run, path, readings, site).warnings.map(({ message }) => message);
