import { describe, expect, it } from 'vitest';
import { surveyEvidence } from '../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../src/core/irradiance/clear-sky-climate.ts';
import type { Block } from '../../src/report/contents/report-contents.ts';
import { figuresOf } from '../../src/report/forms/figure-rows.ts';
import { reportContents } from '../../src/report/report-contents.ts';
import type { ReportInput } from '../../src/report/report-input.ts';
import { CHOICES } from './report-of.ts';
import { SAMPLE_FILES, sampleSurvey } from './sample-shades.ts';

/** Sections whose every percentage is one that `assess` gives, of a year or a month; others tell of imagined changes. */
const MEASURED = ['at-a-glance', 'month-by-month', 'what-to-expect'];

/** Everything a person reads in a block, pictures by their words. */
const wordsOf = (block: Block): string =>
  JSON.stringify(block.kind === 'picture' ? { ...block, picture: 0 } : block);

const percentages = (words: string) =>
  [...words.matchAll(/(\d+(?:\.\d+)?)\s?%/g)].map(([, digits]) => digits);

describe('percentages of the letter', () => {
  it.each(SAMPLE_FILES)('of %s are rounded figures of its assessment', async (file) => {
    const survey = sampleSurvey(file);
    const evidence = await surveyEvidence(survey, clearSkyClimate('ineichen'), { stepMinutes: 15 });
    const report: ReportInput = {
      ...evidence,
      survey,
      fingerprint: '0'.repeat(64),
      madeOn: '2026-06-02',
      version: '0.1.0',
      photos: new Map(),
      firm: { name: '', lines: [], colour: null },
      compared: null,
      choices: CHOICES,
    };
    const { sections } = reportContents(report);
    const shares = figuresOf(report)
      .filter(
        ({ unit, period, obstruction }) => unit === 'share' && !obstruction && !/hour|azimuth/.test(period),
      )
      .flatMap(({ value, low, high }) => [value, low, high].filter((share) => share !== null));
    const isFigure = (digits: string) => {
      const decimals = digits.split('.')[1]?.length ?? 0;
      // a share halfway between two steps may be told as either
      return shares.some((share) => Math.abs(share * 100 - Number(digits)) <= 0.5 * 10 ** -decimals + 1e-9);
    };
    const told = sections
      .filter(({ id }) => MEASURED.includes(id))
      .flatMap(({ blocks }) => blocks.flatMap((block) => percentages(wordsOf(block))));
    expect(told.length).toBeGreaterThan(0);
    expect(told.filter((digits) => !isFigure(digits))).toEqual([]);

    // and those of the first page belong to its own planes, in their order
    const firstPage = JSON.stringify(sections[0].blocks.filter(({ kind }) => kind !== 'picture'));
    for (const { solarAccess, name } of evidence.assessment.planes) {
      if (!solarAccess || 1 - solarAccess.annual < 0.005) continue;
      const told = firstPage
        .split(name)
        .slice(1)
        .map((after) => after.slice(0, 300));
      const own = new Intl.NumberFormat('en-GB', { style: 'percent' }).format(solarAccess.annual);
      expect(
        told.some((words) => words.includes(own)),
        `${name}: ${own}`,
      ).toBe(true);
    }
  });
});
