import { beforeAll, describe, expect, test } from 'vitest';
import type { Block, Section, Table } from '../../../src/report/contents/report-contents.ts';
import { reportContents } from '../../../src/report/report-contents.ts';
import type { ReportInput } from '../../../src/report/report-input.ts';
import { sampleSurvey } from '../../core/survey/sample-surveys.ts';
import { reportOf } from '../report-of.ts';

const sectionOf = (report: ReportInput, id: string): Section => {
  const section = reportContents(report).sections.find((one) => one.id === id);
  if (!section) throw new Error(`no section ${id}`);
  return section;
};
const tablesOf = ({ blocks }: Section): Table[] =>
  blocks.flatMap((block) => (block.kind === 'table' ? [block.table] : []));
const textOf = (block: Block | undefined): string => JSON.stringify(block);

describe('the evidence of a terrace', () => {
  let report: ReportInput;
  beforeAll(async () => {
    report = await reportOf(sampleSurvey('terrace-chimneys-mast-balcony.json'));
  });

  test('gives programmes access, orientation and their product as assessed', () => {
    const [annual, intervals, monthly] = tablesOf(sectionOf(report, 'programme-table'));
    const [plane] = report.assessment.planes;
    const percent = (share: number) => `${(100 * share).toFixed(1)}%`;
    const access = plane.solarAccess!;
    expect(annual.rows).toEqual([
      [
        plane.name,
        '38.0°',
        '200.0°',
        percent(access.annual),
        percent(plane.orientationFactor),
        percent(access.annual * plane.orientationFactor),
      ],
    ]);
    expect(intervals.rows[0][1]).toBe(
      `${percent(access.interval!.low)} to ${percent(access.interval!.high)}`,
    );
    expect(monthly.rows.map(([, share]) => share)).toEqual(access.monthly.map((share) => percent(share!)));
    expect(monthly.sums).toEqual([['Year', percent(access.annual)]]);
  });

  test('asks of no threshold unless one is given, and calls a result inside its interval not certain', () => {
    const asked = (solarAccess: number) =>
      tablesOf(
        sectionOf(
          { ...report, choices: { ...report.choices, thresholds: { solarAccess } } },
          'programme-table',
        ),
      )[2].rows[0][3];
    expect(tablesOf(sectionOf(report, 'programme-table'))).toHaveLength(3);
    expect(asked(0.8)).toMatch(/, met$/);
    expect(asked(0.995)).toMatch(/, not met$/);
    const { low, high } = report.assessment.planes[0].solarAccess!.interval!;
    expect(asked((low + high) / 2)).toMatch(/not certain$/);
  });

  test('holds every sighting of the record, in true directions', () => {
    const cells = tablesOf(sectionOf(report, 'field-book')).flatMap(({ rows }) => rows.map((row) => row[2]));
    for (const { traces } of report.survey.stations)
      for (const { sightings } of traces)
        for (const { azimuth, elevation } of sightings)
          expect(
            cells.some((cell) => cell.includes(`${azimuth!.toFixed(1)}° ${elevation!.toFixed(1)}°`)),
          ).toBe(true);
  });

  test('says in US units what was measured in metres', () => {
    const us = { ...report, choices: { ...report.choices, units: 'us' as const } };
    const [planes] = tablesOf(sectionOf(us, 'planes-and-stations'));
    // 5.40 m is 17 ft 8.6 in, 6.10 m is 20 ft 0.2 in
    expect(planes.rows[0][3]).toBe('17\u00a0ft 9\u00a0in along the eave, 20\u00a0ft up the slope');
  });

  test('names the climate, the methods and the whole fingerprint', () => {
    const pairs = textOf(sectionOf(report, 'method').blocks[0]);
    expect(pairs).toContain(report.fingerprint);
    expect(pairs).toContain(report.assessment.climate.reference);
    expect(pairs).toContain('Perez et al. (1990)'); // what this survey asks for;
  });
});

describe('a survey taken with a phone', () => {
  test('shows its runs, what ties them to true north, and who took it', async () => {
    const survey = sampleSurvey('suburban-maple-and-gable.json');
    const report = await reportOf({ ...survey, surveyor: 'R. Vance' });
    const runs = tablesOf(sectionOf(report, 'heading-evidence'))[0];
    expect(runs.rows).toHaveLength(survey.runs.length);
    expect(textOf(sectionOf(report, 'method').blocks[0])).toContain('R. Vance');
  });
});
