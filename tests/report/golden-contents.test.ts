import { describe, expect, test } from 'vitest';
import { surveyEvidence } from '../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../src/core/irradiance/clear-sky-climate.ts';
import { reportContents } from '../../src/report/report-contents.ts';
import { LANGUAGES } from '../../src/report/words/languages.ts';
import { sampleSurvey, sampleTexts } from '../core/survey/sample-surveys.ts';
import { CHOICES } from './report-of.ts';
import { linesOf } from './sections/letter-of.ts';

/** Long lists of numbers, the same in every language; they have tests of their own. */
const LEFT_OUT = ['field-book'];

/**
 * What every sample's report says in every language, to be read when it changes. The platform's tables of dates and numbers
 * have several kinds of space, which differ from version to version.
 */
describe.each(sampleTexts.map(({ file }) => file.replace('.json', '')))('the report of %s', (sample) => {
  const survey = sampleSurvey(`${sample}.json`);
  const evidence = surveyEvidence(survey, clearSkyClimate('ineichen'), { stepMinutes: 15, intervals: false });

  test.each(LANGUAGES.map(({ id }) => id))('in %s', async (language) => {
    const contents = reportContents({
      ...(await evidence),
      survey,
      fingerprint: '0'.repeat(64),
      madeOn: '2026-06-02',
      version: '0.1.0',
      photos: new Map(),
      firm: { name: 'Larkfield Roofs', lines: [], colour: null },
      compared: null,
      choices: { ...CHOICES, language },
    });
    const text = contents.sections
      .filter(({ id }) => !LEFT_OUT.includes(id))
      .flatMap(({ heading, blocks }) => [`# ${heading}`, ...blocks.flatMap(linesOf), ''])
      .join('\n')
      .replace(/[\u00a0\u202f\u2009]/g, ' ');
    await expect(`${contents.title}\n${text}`).toMatchFileSnapshot(`./golden/${sample}.${language}.txt`);
  });
});
