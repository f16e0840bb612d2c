import { describe, expect, it } from 'vitest';
import { surveyEvidence } from '../../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import type { ReportInput } from '../../../src/report/report-input.ts';
import { assessmentFigures } from '../../../src/report/forms/assessment-figures.ts';
import type { FigureRow } from '../../../src/report/forms/figure-row.ts';
import { figuresOf } from '../../../src/report/forms/figure-rows.ts';
import { QUANTITIES } from '../../../src/report/forms/quantities.ts';
import { figuresCsv } from '../../../src/report/forms/figures-csv.ts';
import type { FiguresDocument } from '../../../src/report/forms/figures-json.ts';
import { figuresJson } from '../../../src/report/forms/figures-json.ts';
import { CHOICES, reportOf } from '../report-of.ts';
import { SAMPLE_FILES, sampleSurvey, underClearSky } from '../sample-shades.ts';
import { csvRows } from './csv-reader.ts';

/** A sample in coarse steps, which change the figures but not which there are. */
async function assessed(file: string): Promise<ReportInput> {
  const survey = sampleSurvey(file);
  return {
    ...(await surveyEvidence(survey, clearSkyClimate('ineichen'), { stepMinutes: 15 })),
    survey,
    fingerprint: '0'.repeat(64),
    madeOn: '2026-06-02',
    version: '0.1.0',
    photos: new Map(),
    firm: { name: '', lines: [], colour: null },
    choices: CHOICES,
    compared: null,
  };
}

let made: Promise<ReportInput> | undefined;
const suburban = () => (made ??= assessed('suburban-maple-and-gable.json'));

/** Every number under a value of JSON. */
const numbersIn = (value: unknown): number[] =>
  typeof value === 'number'
    ? [value]
    : typeof value === 'object' && value !== null
      ? Object.values(value).flatMap(numbersIn)
      : [];

const named = (rows: readonly FigureRow[], ...[quantity, period, plane, station]: string[]) =>
  rows.filter(
    (row) =>
      row.quantity === quantity &&
      row.period === period &&
      row.plane_id === plane &&
      row.station_id === (station ?? ''),
  );

describe('figures of a report', () => {
  it.each(SAMPLE_FILES)('are all figures of the assessment of %s, unrounded', async (file) => {
    const report = await assessed(file);
    const rows = figuresOf(report);
    const has = new Set(rows.flatMap(({ value, low, high }) => [value, low, high]));
    for (const plane of report.assessment.planes)
      for (const { solarAccess, coverage, irradiation, obstructions, groups } of plane.stations) {
        const { interval, ...access } = solarAccess;
        const wanted = [
          access,
          coverage,
          irradiation,
          obstructions,
          groups.map((group) => group.gainIfAllRemoved),
        ];
        const numbers = [...numbersIn(wanted), interval!.low, interval!.high];
        expect(numbers.filter((number) => !has.has(number))).toEqual([]);
        expect(named(rows, 'solar-access', 'year', plane.id).length).toBe(1);
      }
  });

  it('name each once: no two rows are of the same thing', async () => {
    const rows = figuresOf(await suburban());
    const keys = rows.map((row) =>
      [row.quantity, row.period, row.plane_id, row.station_id, row.obstruction_id, row.compared]
        .concat(row.run_id, row.item_id, String(row.change_m))
        .join('\n'),
    );
    expect(new Set(keys).size).toBe(rows.length);
    for (const { quantity, period } of rows) {
      expect(Object.keys(QUANTITIES)).toContain(quantity);
      expect(period).toMatch(
        /^(|year|month (0[1-9]|1[0-2])( hour ([01]\d|2[0-3])| day 21 span \d)?|year azimuth [\d.]+ to [\d.]+|stretch \d+|\d{4}-\d\d-\d\dT[\d:.]+Z)$/,
      );
    }
  });

  it('hold together: loss with access, light with share, product with factors, low below high', async () => {
    const { assessment } = await suburban();
    const rows = figuresOf(await suburban());
    for (const { id } of assessment.planes) {
      const year = (quantity: string) => named(rows, quantity, 'year', id)[0];
      const access = year('solar-access');
      expect(year('shading-loss').value! + access.value!).toBeCloseTo(1, 12);
      expect(year('shading-loss').low! + access.high!).toBeCloseTo(1, 12);
      expect(year('irradiation').value!).toBeCloseTo(access.value! * year('unshaded-irradiation').value!, 9);
      expect(year('access-times-orientation').value!).toBeCloseTo(
        access.value! * year('orientation-factor').value!,
        12,
      );
    }
    for (const { low, high } of rows) if (low !== null) expect(low).toBeLessThanOrEqual(high!);
  });

  it('name what the survey is compared with', async () => {
    const report = await suburban();
    const compared = { name: 'Visit of 2024', assessment: report.assessment, sameSurvey: false };
    const rows = figuresOf({ ...report, compared });
    expect(rows.filter(({ compared: name }) => name === 'Visit of 2024')).toEqual(
      assessmentFigures(report.assessment, 'Visit of 2024'),
    );
  });

  it('have no value in a month without sun', async () => {
    const rows = figuresOf(await assessed('polar-wall-and-steep-roof.json'));
    const dark = rows.filter(({ value }) => value === null);
    expect(dark.length).toBeGreaterThan(0);
    expect(csvRows(figuresCsv(dark))[1][5]).toBe('');
  });
});

describe('figures as CSV', () => {
  const NAMES = [
    '=HYPERLINK("http://x")',
    '+1',
    '-2+3',
    '@SUM(A1)',
    '  =1',
    '\t=1',
    '＝1',
    'plain, with "quotes"\r\nand a line',
    '<script>',
  ];

  it.each(NAMES)('hold the name %j as words', async (name) => {
    const report = structuredClone(await suburban());
    const { assessment, survey } = report;
    for (const plane of assessment.planes)
      for (const entry of [plane, ...plane.stations, ...plane.stations.flatMap((one) => one.obstructions)])
        entry.name = name;
    for (const entry of [...survey.planes, ...survey.stations, ...survey.obstructions]) entry.name = name;
    const rows = csvRows(
      figuresCsv(figuresOf({ ...report, compared: { name, assessment, sameSurvey: false } })),
    );
    expect(rows[0].slice(0, 3)).toEqual(['quantity', 'plane', 'station']);
    expect(rows.filter((row) => row.length !== rows[0].length)).toEqual([]);
    const formulas = rows
      .flat()
      .filter((cell) => /^\s*[=+\-@＝＋－＠]/.test(cell) && Number.isNaN(Number(cell)));
    expect(formulas).toEqual([]);
    const words = name.replace(/\s+/g, ' ').trim();
    expect(rows[1][1].replace(/^'/, '')).toBe(words);
  });

  it('give back every number to its last digit', async () => {
    const rows = figuresOf(await suburban());
    const read = csvRows(figuresCsv(rows)).slice(1);
    expect(read.map((row) => (row[5] === '' ? null : Number(row[5])))).toEqual(
      rows.map(({ value }) => value),
    );
  });
});

describe('figures as JSON', () => {
  it('say what they are of, and are those of the table', async () => {
    const report = await reportOf(underClearSky(sampleSurvey('two-trees-one-behind-the-other.json')));
    const read = JSON.parse(figuresJson(report)) as FiguresDocument;
    expect(read).toMatchObject({
      format: 'noonmark-figures',
      version: 1,
      survey: { id: report.survey.id, fingerprint: report.fingerprint },
      madeOn: '2026-06-02',
      transposition: 'hay-davies',
    });
    expect(read.figures).toEqual(figuresOf(report));
  });
});
