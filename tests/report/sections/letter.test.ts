import { beforeAll, describe, expect, test } from 'vitest';
import type { SurveyEvidence } from '../../../src/core/assessment/survey-evidence.ts';
import { surveyEvidence } from '../../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { worldClimate } from '../../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../../src/core/irradiance/world-grid.ts';
import type { Station, Survey } from '../../../src/core/survey/survey.ts';
import type { ReportInput } from '../../../src/report/report-input.ts';
import { sampleSurvey } from '../../core/survey/sample-surveys.ts';
import { CHOICES } from '../report-of.ts';
import { worldGridBytes } from '../sample-shades.ts';
import { letterOf, letterSection, letterText, runningText, textsOf } from './letter-of.ts';
import { readingGrade, sentencesOf, syllablesOf } from './reading-grade.ts';

const around = (survey: Survey, evidence: SurveyEvidence): ReportInput => ({
  ...evidence,
  survey,
  fingerprint: '0123456789abcdef'.repeat(4),
  madeOn: '2026-06-02',
  version: '0.1.0',
  photos: new Map(),
  firm: { name: 'Larkfield Roofs', lines: [], colour: null },
  choices: CHOICES,
  compared: null,
});

/** A report with the climate that ships, as the phone makes it. */
async function reportInWorldClimate(survey: Survey): Promise<ReportInput> {
  const grid = decodeWorldGrid(worldGridBytes());
  if (!grid.ok) throw new Error(grid.problems[0].message);
  return around(survey, await surveyEvidence(survey, worldClimate(grid.value, survey.site)));
}

/** Under a clear sky and in coarse steps, where no figure is asked. */
const quickReport = async (survey: Survey, intervals = true): Promise<ReportInput> =>
  around(survey, await surveyEvidence(survey, clearSkyClimate('ineichen'), { stepMinutes: 15, intervals }));

const sample = (name: string) => reportInWorldClimate(sampleSurvey(`${name}.json`));

const answerOf = (report: ReportInput, id: string): string =>
  letterSection(report, id)
    .blocks.filter(({ kind }) => kind === 'answer')
    .flatMap(textsOf)
    .join(' ');
const sectionText = (report: ReportInput, id: string): string =>
  letterSection(report, id).blocks.flatMap(textsOf).join('\n');

const LETTER = [
  'at-a-glance',
  'sun-and-roof',
  'month-by-month',
  'what-could-be-done',
  'what-to-expect',
  'how-it-may-change',
  'how-sure',
  'cautions',
];

let maple: ReportInput;
let south: ReportInput;
let polar: ReportInput;
let tropics: ReportInput;
beforeAll(async () => {
  maple = await sample('suburban-maple-and-gable');
  south = await sample('southern-house-facing-north');
  polar = await sample('polar-wall-and-steep-roof');
  tropics = await sample('tropical-two-roofs');
}, 240_000);

describe('the whole letter, word for word', () => {
  test('of a house with a maple', () =>
    expect(letterText(maple)).toMatchFileSnapshot('./letters/suburban-maple-and-gable.txt'));
  test('of a house in the south', () =>
    expect(letterText(south)).toMatchFileSnapshot('./letters/southern-house-facing-north.txt'));
});

describe('what every letter keeps to', () => {
  const letters = (): [string, ReportInput][] => Object.entries({ maple, south, polar, tropics });

  test('its sections, each headed by a question and answered first', () => {
    for (const [name, report] of letters()) {
      expect(
        letterOf(report).map(({ id }) => id),
        name,
      ).toEqual(LETTER);
      for (const { heading, blocks } of letterOf(report)) {
        expect(heading).toMatch(/\?$/);
        expect(blocks[0].kind).toBe('answer');
      }
    }
  });

  test('every share in it is one of the assessment or of what stands beside it', () => {
    for (const [name, report] of letters()) {
      const known = knownShares(report);
      const found = letterText(report).match(/\d+(?:\.\d)?%/g) ?? [];
      expect(found.length).toBeGreaterThan(20);
      for (const share of found) expect(known, `${name}: ${share}`).toContain(share);
    }
  });

  test('is read in school grade 7 or below', () => {
    for (const [name, report] of letters()) {
      const sentences = sentencesOf(letterOf(report).flatMap(runningText));
      expect(sentences.length).toBeGreaterThan(60);
      expect(readingGrade(sentences), name).toBeLessThan(7);
    }
  });

  test('uses no word of the trade', () => {
    for (const [name, report] of letters())
      expect(letterText(report), name).not.toMatch(
        /percentage|irradiation|irradiance|azimuth|elevation|solar access|obstruction|transmittance|Monte Carlo|\bplane\b/i,
      );
  });

  test('its pictures and tables are those of every measured roof', () => {
    for (const [, report] of letters()) {
      const roofs = report.assessment.planes.length;
      const pictures = (id: string) =>
        letterSection(report, id).blocks.filter(({ kind }) => kind === 'picture');
      expect(pictures('at-a-glance')).toHaveLength(1);
      expect(pictures('sun-and-roof')).toHaveLength(roofs);
      expect(pictures('month-by-month')).toHaveLength(roofs);
    }
  });
});

/** Shares as the letter may write them: whole, or with one decimal. */
function knownShares({ assessment, planes }: ReportInput): Set<string> {
  const shares = assessment.planes.flatMap(
    ({ orientationFactor, orientationInterval: lies, solarAccess, stations }, p) => {
      const { obstructions, groups } = planes[p].prospects;
      const mean = (gains: number[]) => gains.reduce((sum, gain) => sum + gain, 0) / stations.length;
      const gains = obstructions.map(({ id }) =>
        mean(
          stations.map((station) => station.obstructions.find((row) => row.id === id)?.gainIfRemoved ?? 0),
        ),
      );
      const byPoint = stations.flatMap(({ unseen }) =>
        unseen.flatMap((_, i) =>
          unseen
            .slice(i)
            .map((__, j) => unseen.slice(i, i + j + 1).reduce((sum, { share }) => sum + share, 0)),
        ),
      );
      return [
        orientationFactor,
        ...(lies ? [lies.low, lies.high] : []),
        solarAccess!.annual,
        solarAccess!.interval!.low,
        solarAccess!.interval!.high,
        ...solarAccess!.monthly.map((share) => share ?? 0),
        ...stations.flatMap(({ solarAccess: { annual }, coverage }) => [annual, 1 - coverage]),
        ...byPoint,
        ...gains,
        ...groups.map(({ gainIfAllRemoved }) => gainIfAllRemoved),
        ...obstructions.flatMap(({ lower, clear, grown }) => [
          ...lower.map(({ gain }) => gain),
          ...(clear ? [clear.gain] : []),
          ...grown.map(({ loss }) => loss),
        ]),
      ];
    },
  );
  const written = (share: number, digits: number) =>
    new Intl.NumberFormat('en-GB', {
      style: 'percent',
      minimumFractionDigits: digits,
      maximumFractionDigits: digits,
    }).format(share);
  return new Set([...shares.flatMap((share) => [written(share, 0), written(share, 1)]), '95%']);
}

describe('figures to the letter', () => {
  const percent = (share: number, digits = 0) => `${(100 * share).toFixed(digits)}%`;
  const tableIn = (report: ReportInput, id: string, place = 0) => {
    const tables = letterSection(report, id).blocks.flatMap((block) =>
      block.kind === 'table' ? [block.table] : [],
    );
    return tables[place];
  };

  test('the first page has the access, its range, how the roof lies, and the light', () => {
    const plane = [...maple.assessment.planes].sort(
      (a, b) => b.unshaded.annual * b.solarAccess!.annual - a.unshaded.annual * a.solarAccess!.annual,
    )[0];
    const { annual, interval } = plane.solarAccess!;
    const block = letterSection(maple, 'at-a-glance').blocks.find(({ kind }) => kind === 'key-figures');
    const figures = block?.kind === 'key-figures' ? block.figures : [];
    expect(figures.map(({ value }) => value)).toEqual([
      percent(annual),
      percent(plane.orientationFactor),
      `${Math.round(annual * plane.unshaded.annual).toLocaleString('en-GB')}\u202fkWh/m²`.replace(
        '\u202f',
        figures[2].value.match(/\s/)![0],
      ),
    ]);
    expect(figures[0].range).toBe(`${percent(interval!.low)} to ${percent(interval!.high)}`);
  });

  test('months', () => {
    maple.assessment.planes.forEach(({ solarAccess, unshaded }, p) => {
      const { rows, sums } = tableIn(maple, 'month-by-month', p);
      expect(rows.map((row) => row[3])).toEqual(solarAccess!.monthly.map((share) => percent(share!)));
      expect(rows.map((row) => Number(row[1]))).toEqual(unshaded.monthly.map(Math.round));
      expect(sums![0][3]).toBe(percent(solarAccess!.annual));
    });
  });

  test('what comes back without the maple, and with a metre off it', () => {
    maple.assessment.planes.forEach(({ stations, unshaded }, p) => {
      const gains = stations.map(
        ({ obstructions }) => obstructions.find(({ id }) => id === 'maple')?.gainIfRemoved ?? 0,
      );
      const gain = gains.reduce((sum, one) => sum + one, 0) / stations.length;
      const { rows } = tableIn(maple, 'what-could-be-done', p);
      const light = gain * unshaded.annual;
      expect(rows[0].slice(0, 2)).toEqual(['Sugar maple by the street gone', percent(gain, 1)]);
      expect(rows[0][2]).toMatch(new RegExp(`^${light.toFixed(light < 10 ? 1 : 0)}\\skWh/m²$`));
    });
  });

  test('the whole roof: light on a square metre times its size, to three figures', () => {
    const { rows } = tableIn(maple, 'what-to-expect');
    maple.assessment.planes.forEach(({ id, solarAccess, unshaded }, p) => {
      const { width, slopeLength } = maple.survey.planes.find((plane) => plane.id === id)!;
      const whole = solarAccess!.annual * unshaded.annual * width! * slopeLength!;
      expect(Number(rows[p][4].replace(/[^\d]/g, ''))).toBe(Number(whole.toPrecision(3)));
    });
  });
});

describe('by place', () => {
  test('the house with the maple: when, from when to when, and what could be done', () => {
    const text = sectionText(maple, 'sun-and-roof');
    expect(text).toMatch(
      /Shade from Sugar maple by the street falls on South roof from \d+ October to \d+ (February|March), at midday and in the afternoon\. It lasts longest about \d+ December: from 12:\d\d to 14:\d\d\./,
    );
    expect(answerOf(maple, 'what-could-be-done')).toContain('Sugar maple by the street');
    expect(sectionText(maple, 'what-could-be-done')).toMatch(/this will stay: Neighbour’s gable/);
    expect(sectionText(maple, 'how-it-may-change')).toContain('On the north side of the house');
  });

  test('the southern house: the dark months are those in the middle of the year', () => {
    expect(answerOf(south, 'month-by-month')).toMatch(/the least in June\.$/);
    expect(sectionText(south, 'how-it-may-change')).toContain('On the south side of the house');
  });

  test('beyond the polar circle: months without sun are told, the summer night has hours over midnight', () => {
    expect(sectionText(polar, 'month-by-month')).toMatch(/No sun worth naming comes in .*December\./);
    expect(sectionText(polar, 'sun-and-roof')).toMatch(/2[123]:\d\d–00:\d\d/);
  });

  test('in the tropics no side of the house is free of the sun', () => {
    expect(sectionText(tropics, 'how-it-may-change')).toContain('Here the sun comes from both sides');
    const hours = letterSection(tropics, 'sun-and-roof').blocks.flatMap((block) =>
      block.kind === 'table' ? [block.table.rows] : [],
    );
    // the roofs face apart: what shades one in June leaves the other alone
    expect(hours).toHaveLength(2);
  });

  test('trees that hide each other: their gain together is told', async () => {
    const trees = await reportInWorldClimate(sampleSurvey('two-trees-one-behind-the-other.json'));
    const [group] = trees.planes[0].prospects.groups;
    expect(sectionText(trees, 'what-could-be-done')).toContain(
      `all gone, ${(100 * group.gainIfAllRemoved).toFixed(1)}% of the year’s sunlight would come back.`,
    );
  });

  test('a tree wholly behind another is no gain unless that goes too', async () => {
    const trees = sampleSurvey('two-trees-one-behind-the-other.json');
    const [first] = trees.stations;
    const opaque = {
      ...trees,
      obstructions: trees.obstructions.map((one) => ({ ...one, transmittance: 0 })),
      stations: [{ ...first, traces: first.traces.flatMap((trace) => bothTrees(trace)) }],
    };
    const report = await quickReport(opaque);
    const text = sectionText(report, 'what-could-be-done');
    expect(text).toMatch(/Taking away .* alone brings no gain\. .* would have to go too\./);
    expect(answerOf(report, 'what-could-be-done')).toMatch(/^One alone would not help much\./);
  });
});

/** The linden's trace for the linden and for the spruce; nothing else. */
const bothTrees = (trace: Station['traces'][number]): Station['traces'] =>
  trace.obstruction !== 'linden'
    ? []
    : [
        trace,
        {
          ...trace,
          id: `${trace.id}-behind`,
          obstruction: 'spruce',
          sightings: trace.sightings.map((sighting) => ({ ...sighting, id: `${sighting.id}-behind` })),
        },
      ];

describe('with little or much to tell', () => {
  const survey = sampleSurvey('two-trees-one-behind-the-other.json');
  const [station] = survey.stations;
  const withStations = (stations: Station[]): Survey => ({ ...survey, stations });
  const open: Station = { ...station, traces: [], observedOpen: [[0, 360]] };

  test('no station: the letter says so and leaves out what nobody knows', async () => {
    const report = await quickReport(withStations([]));
    expect(letterOf(report).map(({ id }) => id)).toEqual(['at-a-glance', 'cautions']);
    expect(answerOf(report, 'at-a-glance')).toMatch(/Nobody has measured from South-west roof yet/);
  });

  test('no roof at all', async () => {
    const report = await quickReport({ ...withStations([]), planes: [] });
    expect(answerOf(report, 'at-a-glance')).toBe('No roof has been measured yet.');
  });

  test('one of two roofs measured: the other is named as not known', async () => {
    const second = { ...survey.planes[0], id: 'second', name: 'Shed' };
    const report = await quickReport({ ...survey, planes: [...survey.planes, second] });
    expect(sectionText(report, 'at-a-glance')).toContain('Nobody has measured from Shed yet');
    expect(sectionText(report, 'how-sure')).toContain('Not measured, so not known: Shed.');
  });

  test('one station', async () => {
    const report = await quickReport(withStations([station]));
    expect(sectionText(report, 'at-a-glance')).toContain('It comes from one place measured on the roof.');
    expect(sectionText(report, 'sun-and-roof')).toContain('The picture shows the sky from “Eave, left”.');
    expect(sectionText(report, 'what-could-be-done')).not.toContain('the place counts');
  });

  test('twelve stations', async () => {
    const twelve = Array.from({ length: 12 }, (_, i) => renamed(survey.stations[i % 2], i));
    const report = await quickReport(withStations(twelve));
    expect(sectionText(report, 'at-a-glance')).toContain('It comes from 12 places measured on the roof.');
    const { annual } = report.assessment.planes[0].solarAccess!;
    expect(answerOf(report, 'at-a-glance')).toContain(`${Math.round(100 * annual)}%`);
  });

  test('nothing blocked: nothing to do, nothing in the way', async () => {
    const report = await quickReport(withStations([open]));
    expect(answerOf(report, 'at-a-glance')).toBe(
      'South-west roof lies open. Almost nothing takes sunlight from it.',
    );
    expect(answerOf(report, 'sun-and-roof')).toBe('Nothing that counts stands in the way of the sun.');
    expect(answerOf(report, 'what-could-be-done')).toMatch(/no need to do anything/);
    expect(sectionText(report, 'month-by-month')).toContain('Shade takes almost nothing in any month.');
    expect(sectionText(report, 'how-sure')).toContain('Every part of the sky that counts was looked at.');
    expect(letterText(report)).not.toMatch(/Before anyone cuts/);
  });

  test('everything blocked: all year, and no promise of a cut', async () => {
    const walls: Station = {
      ...station,
      traces: [
        {
          id: 'ring',
          obstruction: 'garage',
          shape: 'skyline',
          fullCircle: true,
          edge: 'drawn',
          sightings: [0, 90, 180, 270].map((azimuth) => ({ id: `r${azimuth}`, azimuth, elevation: 89 })),
        },
      ],
    };
    const report = await quickReport(withStations([walls]));
    expect(sectionText(report, 'sun-and-roof')).toContain(
      'Shade from Garage next door falls on South-west roof all year',
    );
    expect(answerOf(report, 'what-could-be-done')).toMatch(/^Nothing that could be changed/);
    expect(sectionText(report, 'what-could-be-done')).toContain('this will stay: Garage next door');
  });

  test('much in the way: all of it is told, the table has the four that take the most', async () => {
    const things = Array.from({ length: 8 }, (_, i) => ({
      id: `house-${i}`,
      name: `House ${i + 1}`,
      kind: 'building' as const,
    }));
    const around: Station = {
      ...station,
      observedOpen: [],
      traces: things.map(({ id }, i) => ({
        id: `t${i}`,
        obstruction: id,
        shape: 'skyline',
        edge: 'drawn',
        sightings: [0, 10, 20].map((turn) => ({
          id: `${id}-${turn}`,
          azimuth: 120 + 20 * i + turn,
          elevation: 50,
        })),
      })),
    };
    const report = await quickReport({ ...withStations([around]), obstructions: things });
    const { blocks } = letterSection(report, 'sun-and-roof');
    const items = blocks.flatMap((block) => (block.kind === 'list' ? block.items : []));
    for (const { name } of things)
      expect(items.some((item) => item.startsWith(`Shade from ${name} `))).toBe(true);
    const [table] = blocks.flatMap((block) => (block.kind === 'table' ? [block.table] : []));
    const [{ obstructions }] = report.assessment.planes[0].stations;
    const worst = [...obstructions].sort((x, y) => y.lossIfAlone - x.lossIfAlone).slice(0, 4);
    expect(table.columns.slice(1).map(({ head }) => head)).toEqual(worst.map(({ name }) => name));
  });

  test('without intervals no range is claimed', async () => {
    const report = await quickReport(survey, false);
    expect(answerOf(report, 'how-sure')).toBe('No range was worked out for this report.');
    expect(sectionText(report, 'at-a-glance')).not.toContain('95 times');
  });

  test('a clear sky is called that, since it promises too much', async () => {
    const report = await quickReport(survey);
    expect(answerOf(report, 'what-to-expect')).toMatch(/in a year without clouds\.$/);
    expect(sectionText(report, 'what-to-expect')).toContain('The true amount is less.');
    expect(sectionText(report, 'at-a-glance')).toContain('in a year without clouds');
  });

  test('US units: feet, square feet, the clock of twelve hours', () => {
    const report = { ...maple, choices: { ...maple.choices, units: 'us' as const } };
    const text = letterText(report);
    expect(text).toMatch(/kWh\/ft²/);
    expect(text).not.toMatch(/kWh\/m²/);
    expect(text).toMatch(/3\sft\s3\sin off the top/);
    // platforms differ in the space before AM
    expect(text).toMatch(/from 6:\d\d\sAM to 9:\d\d\sAM/);
  });

  test('hostile names stay on one line and short', async () => {
    const name = `Maple\u202e\u0000 <script>alert(1)</script>\n${'x'.repeat(10_000)}`;
    const report = await quickReport({
      ...survey,
      obstructions: survey.obstructions.map((one) => ({ ...one, name })),
      planes: survey.planes.map((one) => ({ ...one, name })),
      stations: survey.stations.map((one) => ({ ...one, name })),
    });
    for (const section of letterOf(report))
      for (const text of section.blocks.flatMap(textsOf)) {
        expect(text).not.toMatch(/[\u0000-\u001f\u202e]/);
        expect(text.length).toBeLessThan(1500);
      }
  });
});

/** A station again, under ids of its own. */
const renamed = (station: Station, i: number): Station => ({
  ...station,
  id: `s${i}`,
  name: `Place ${i + 1}`,
  traces: station.traces.map((trace) => ({
    ...trace,
    id: `${trace.id}-${i}`,
    sightings: trace.sightings.map((sighting) => ({ ...sighting, id: `${sighting.id}-${i}` })),
  })),
});

describe('the reading grade itself', () => {
  test('of the formula’s usual example, with its 24 syllables in 13 words', () => {
    // from memory: 11.3 in common descriptions of the formula
    const sentence = 'The Australian platypus is seemingly a hybrid of a mammal and reptilian creature.';
    expect(Math.abs(readingGrade([sentence]) - 11.3)).toBeLessThan(1);
  });

  test('syllables of plain words', () => {
    const counted = {
      sunlight: 2,
      takes: 1,
      wanted: 2,
      little: 2,
      hatched: 1,
      branches: 2,
      figures: 2,
      tree: 1,
      the: 1,
    };
    for (const [word, count] of Object.entries(counted)) expect(syllablesOf(word), word).toBe(count);
  });
});
