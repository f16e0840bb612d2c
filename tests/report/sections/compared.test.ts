import { beforeAll, describe, expect, test } from 'vitest';
import type { Survey } from '../../../src/core/survey/survey.ts';
import type { Block, Section } from '../../../src/report/contents/report-contents.ts';
import type { ReportInput } from '../../../src/report/report-input.ts';
import { reportOf } from '../report-of.ts';
import { sampleSurvey, underClearSky } from '../sample-shades.ts';
import { letterOf, letterSection, runningText } from './letter-of.ts';
import { readingGrade, sentencesOf } from './reading-grade.ts';

const survey = underClearSky(sampleSurvey('suburban-maple-and-gable.json'));
/** Nothing stands in the way, all that was looked at stays looked at. */
const cleared = (from: Survey): Survey => ({
  ...from,
  obstructions: from.obstructions.map((one) => ({ ...one, transmittance: 1 })),
});

let here: ReportInput;
let open: ReportInput;
beforeAll(async () => {
  here = await reportOf(survey);
  open = await reportOf(cleared(survey));
}, 60_000);

const beside = (other: ReportInput, sameSurvey = false, name = 'With nothing in the way'): ReportInput => ({
  ...here,
  compared: { name, assessment: other.assessment, sameSurvey },
});
const compared = (report: ReportInput): Section => letterSection(report, 'compared');
const kinds = (section: Section) => section.blocks.map(({ kind }) => kind);
const only = <K extends Block['kind']>(section: Section, kind: K) =>
  section.blocks.filter((block): block is Extract<Block, { kind: K }> => block.kind === kind);
const percent = (share: number) => `${Math.round(100 * share)}%`;

describe('beside another result', () => {
  test('is left out where there is none', () => {
    expect(letterOf(here).map(({ id }) => id)).not.toContain('compared');
  });

  test('each roof is answered first, then one picture of all, then the months', () => {
    const section = compared(beside(open));
    expect(kinds(section).filter((kind) => kind !== 'paragraph')).toEqual([
      'answer',
      'answer',
      'picture',
      'table',
      'table',
    ]);
    const { planes } = here.assessment;
    only(section, 'answer').forEach(({ text }, i) => {
      expect(text).toContain(`${planes[i].name} gets ${percent(planes[i].solarAccess!.annual)}`);
      expect(text).toContain('it gets 100%. That is less sunlight here.');
    });
    only(section, 'table').forEach(({ table }, i) => {
      const { monthly, annual } = planes[i].solarAccess!;
      expect(table.rows.map((row) => row[1])).toEqual(monthly.map((share) => percent(share!)));
      expect(table.rows.map((row) => row[2])).toEqual(Array(12).fill('100%'));
      expect(table.sums).toEqual([['Year', percent(annual), '100%']]);
    });
  });

  test('the picture has a solid bar for here and one for there, as long as what arrives', () => {
    const [{ picture }] = only(compared(beside(open)), 'picture');
    const solid = picture.marks.flatMap((mark) =>
      mark.kind === 'path' && mark.fill && 'tone' in mark.fill && mark.fill.tone === 'ink'
        ? [mark.lines[0][2] - mark.lines[0][0]]
        : [],
    );
    const [first, second] = here.assessment.planes;
    const light = [first, second].flatMap((plane) => [
      plane.unshaded.annual * plane.solarAccess!.annual,
      plane.unshaded.annual,
    ]);
    expect(solid).toHaveLength(4);
    solid.forEach((width, i) => expect(width / solid[0]).toBeCloseTo(light[i] / light[0], 3));
    expect(picture.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []))).toEqual(
      expect.arrayContaining([`${first.name} – Here`, `${first.name} – With nothing in the way`]),
    );
  });

  test('ranges that meet: chance between two surveys, shared errors within one', () => {
    const nearly = structuredClone(here.assessment);
    for (const { solarAccess } of nearly.planes) solarAccess!.annual -= 0.02;
    const near = { ...here, assessment: nearly };
    const told = (report: ReportInput) => only(compared(report), 'paragraph').map(({ text }) => text);
    expect(told(beside(near))).toEqual([expect.stringContaining('may come from measuring alone')]);
    expect(told(beside(near, true))).toEqual([expect.stringContaining('from the same measuring')]);
    // ranges that lie apart need no word
    const far = structuredClone(here.assessment);
    for (const { solarAccess } of far.planes) {
      solarAccess!.annual = 0.5;
      Object.assign(solarAccess!.interval!, { low: 0.48, high: 0.52 });
    }
    expect(told(beside({ ...here, assessment: far }))).toEqual([]);
    expect(only(compared(beside(here)), 'answer')[0].text).toMatch(
      /, and the same in “With nothing in the way”\.$/,
    );
  });

  test('roofs that are in one only, or measured in one only, are told', () => {
    const other = structuredClone(here.assessment);
    const [first, second] = other.planes;
    first.solarAccess = null;
    Object.assign(second, { id: 'barn', name: 'Barn' });
    const section = compared(beside({ ...here, assessment: other }));
    expect(kinds(section)).toEqual(['list']);
    const [south, garage] = here.assessment.planes;
    expect(only(section, 'list')[0].items).toEqual([
      `${south.name} was not measured in both. So we cannot compare it.`,
      `${garage.name} is only in this report.`,
      'Barn is only in “With nothing in the way”.',
    ]);
  });

  test('is read in school grade below 7', () => {
    const sentences = sentencesOf(runningText(compared(beside(open))));
    expect(readingGrade(sentences)).toBeLessThan(7);
  });
});
