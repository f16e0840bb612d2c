import { join } from 'node:path';
import { expect, it, vi } from 'vitest';
import type * as AssessSurvey from '../../src/core/assessment/assess-survey.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { runCommandLine } from '../../src/cli/run-command-line.ts';
import { project } from './run-noonmark.ts';
import { typedWith } from './typed-words.ts';

vi.mock('../../src/core/assessment/assess-survey.ts', async (original) => {
  const real = await original<typeof AssessSurvey>();
  return {
    ...real,
    assessSurvey: (survey: Survey, ...rest: [never, never]) => {
      if (survey.title.includes('maple')) throw new TypeError('the sky fell');
      return real.assessSurvey(survey, ...rest);
    },
  };
});

it('an unexpected error at one file becomes its problem, and the others are assessed', async () => {
  const files = ['suburban-maple-and-gable.json', 'valley-full-horizon.json'].map((name) =>
    join(project, 'survey-samples', name),
  );
  const typed = ['assess', ...files, '--climate', 'clear', '--step', '15', '--json'];
  const { code, out, err } = await typedWith((terminal) => runCommandLine(typed, terminal));
  expect(code).toBe(1);
  const { surveys } = JSON.parse(out) as {
    surveys: { problems?: { path: string; message: string }[]; planes: unknown[] }[];
  };
  expect(surveys.map(({ planes }) => planes.length > 0)).toEqual([false, true]);
  expect(surveys[1].problems).toBeUndefined();
  expect(surveys[0].problems).toEqual([
    { path: 'file', message: expect.stringMatching(/the sky fell.*[Pp]lease report it/) as string },
  ]);
  expect(err).toContain(`${files[0]}: file: Noonmark could not assess`);
});
