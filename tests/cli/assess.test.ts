import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Assessment } from '../../src/core/shading/assessment.ts';
import type { Problem } from '../../src/core/survey/problem.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import type { Outcome } from './run-noonmark.ts';
import { newFolder, noonmark, project } from './run-noonmark.ts';

type Assessed = Assessment & { file: string; problems?: Problem[] };

const sample = join(project, 'survey-samples/suburban-maple-and-gable.json');
const read = ({ out }: Outcome) => (JSON.parse(out) as { surveys: Assessed[] }).surveys;

let folder: string;
beforeAll(() => {
  folder = newFolder();
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** A sample survey with something changed, written to the folder; gives its name. */
function written(name: string, change: (survey: Survey) => void): string {
  const survey = JSON.parse(readFileSync(sample, 'utf8')) as Survey;
  change(survey);
  writeFileSync(join(folder, name), JSON.stringify(survey));
  return name;
}

const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);

/** A year of 8,760 hours in the EPW form: the same bright noon every day. */
function weatherText(): string {
  const header = [
    'LOCATION,Invented Hill,,,TMY,000000,44.90,-72.20,-5.0,270.0',
    ...Array<string>(7).fill('-,0'),
  ];
  const hours: string[] = [];
  for (
    let day = new Date(Date.UTC(2023, 0, 1));
    day.getUTCFullYear() === 2023;
    day = new Date(+day + 86_400_000)
  )
    for (let hour = 1; hour <= 24; hour++) {
      const light = hour > 8 && hour <= 16 ? [600, 500, 200] : [0, 0, 0];
      const date = [day.getUTCFullYear(), day.getUTCMonth() + 1, day.getUTCDate(), hour, 60];
      hours.push(
        [...date, '?', 10, 5, 70, 97000, 0, 0, 300, ...light, ...Array<number>(19).fill(0)].join(','),
      );
    }
  return [...header, ...hours, ''].join('\n');
}

describe('assess --json', () => {
  it('gives the documented shape and nothing else on standard output', async () => {
    const outcome = await noonmark(['assess', sample, '--json', '--step', '10']);
    expect(outcome.code).toBe(0);
    const [survey] = read(outcome);
    expect(survey).toMatchObject({ file: sample, stepMinutes: 10, transposition: 'hay-davies' });
    expect(survey.problems).toBeUndefined();
    expect(survey.planes.length).toBeGreaterThan(1);
    for (const plane of survey.planes) {
      expect(plane.unshaded.monthly).toHaveLength(12);
      expect(sum(plane.unshaded.monthly)).toBeCloseTo(plane.unshaded.annual, 6);
      expect(plane.orientationFactor).toBeGreaterThan(0.5);
      expect(plane.orientationFactor).toBeLessThanOrEqual(1);
      expect(plane.solarAccess).toMatchObject({ method: 'stations-mean', count: plane.stations.length });
      for (const station of plane.stations) {
        expect(station.solarAccess.annual).toBeCloseTo(station.irradiation.annual / plane.unshaded.annual, 9);
        expect(station.solarAccess.hourly).toHaveLength(12);
        for (const hours of station.solarAccess.hourly) expect(hours).toHaveLength(24);
        expect(station.coverage).toBeGreaterThan(0);
        expect(station.coverage + sum(station.unseen.map(({ share }) => share))).toBeCloseTo(1, 9);
        for (const { from, to, inSunBand } of station.unseen)
          expect([typeof from, typeof to, typeof inSunBand]).toEqual(['number', 'number', 'boolean']);
        for (const obstruction of station.obstructions)
          expect(Object.keys(obstruction)).toEqual(
            expect.arrayContaining(['id', 'gainIfRemoved', 'lossIfAlone', 'monthly']),
          );
      }
    }
  });

  it('goes on past a bad file, tells its problems with paths, and exits with 1', async () => {
    const bad = written('bad.json', (survey) => {
      survey.site.latitude = 95;
    });
    writeFileSync(join(folder, 'notes.json'), 'not a survey');
    const outcome = await noonmark(
      ['assess', bad, 'notes.json', 'gone.json', sample, '--json', '--step', '15'],
      {
        from: folder,
      },
    );
    expect(outcome.code).toBe(1);
    const surveys = read(outcome);
    expect(surveys.map(({ file, problems }) => [file, problems?.length ?? 0])).toEqual([
      ['bad.json', 1],
      ['notes.json', 1],
      ['gone.json', 1],
      [sample, 0],
    ]);
    expect(surveys[0].problems![0].path).toBe('site.latitude');
    expect(surveys[0].planes).toEqual([]);
    expect(surveys[3].planes.length).toBeGreaterThan(1);
    expect(outcome.err).toContain('bad.json: site.latitude: ');
    expect(outcome.err).toContain('There is no file gone.json');
  });
});

describe('assess with another climate', () => {
  it('takes a weather file by its path, and beside the survey where the survey names it', async () => {
    writeFileSync(join(folder, 'hill.epw'), weatherText());
    const named = written('named.json', (survey) => {
      survey.climate = { source: 'weather-file', name: 'hill.epw', sha256: 'f'.repeat(64) };
    });
    const [own, chosen] = await Promise.all([
      noonmark(['assess', join(folder, named), '--json', '--step', '15']),
      noonmark(['assess', sample, '--climate', 'hill.epw', '--json', '--step', '15'], { from: folder }),
    ]);
    expect([own.code, chosen.code]).toEqual([0, 0]);
    expect(read(own)[0].climate).toMatchObject({
      source: 'weather-file',
      name: expect.stringContaining('Invented Hill') as string,
    });
    expect(read(own)[0].planes).toEqual(read(chosen)[0].planes);
    expect(read(own)[0].warnings.map(({ path }) => path)).toContain('climate.sha256');
  });

  it('says where a weather file is missing, and refuses names with folders', async () => {
    const gone = written('gone-weather.json', (survey) => {
      survey.climate = { source: 'weather-file', name: 'nowhere.epw' };
    });
    const outside = written('outside.json', (survey) => {
      survey.climate = { source: 'weather-file', name: '../secret.epw' };
    });
    const outcome = await noonmark(['assess', gone, outside, '--json'], { from: folder });
    expect(outcome.code).toBe(1);
    for (const { problems } of read(outcome))
      expect(problems!.map(({ path }) => path)).toEqual(['climate.name']);
  });

  it('tells the line of a broken weather file', async () => {
    writeFileSync(join(folder, 'short.epw'), weatherText().split('\n').slice(0, 5000).join('\n'));
    const outcome = await noonmark(['assess', sample, '--climate', 'short.epw', '--json'], { from: folder });
    expect(outcome.code).toBe(1);
    expect(read(outcome)[0].problems![0].path).toMatch(/^--climate short[.]epw/);
  });

  it('takes a clear sky and another transposition', async () => {
    const outcome = await noonmark([
      'assess',
      sample,
      '--climate',
      'clear',
      '--transposition',
      'perez',
      '--step',
      '15',
      '--json',
    ]);
    expect(outcome.code).toBe(0);
    expect(read(outcome)[0]).toMatchObject({ climate: { source: 'clear-sky' }, transposition: 'perez' });
  });
});

describe('assess for a person', () => {
  it('names planes, stations and obstructions', async () => {
    const { code, out } = await noonmark(['assess', sample, '--step', '15']);
    expect(code).toBe(0);
    for (const words of [
      'South roof',
      'Solar access',
      'shading loss',
      'Orientation factor',
      'maple',
      'Year',
      'gain if removed',
    ])
      expect(out).toContain(words);
    expect(out).not.toMatch(/NaN|undefined|null/);
  });
});
