import { describe, expect, test } from 'vitest';
import { obstructionKinds } from '../../../src/core/survey/obstruction-kinds.ts';
import { parseSurvey } from '../../../src/core/survey/parse-survey.ts';
import { sampleSurvey, sampleTexts } from './sample-surveys.ts';

const surveys = sampleTexts.map(({ file }) => sampleSurvey(file));
const traces = surveys.flatMap(({ stations }) => stations.flatMap((station) => station.traces));

test('there are at least seven samples', () => {
  expect(sampleTexts.length).toBeGreaterThanOrEqual(7);
});

test.each(sampleTexts)('$file is sound and holds nothing unknown', ({ text }) => {
  expect(parseSurvey(text)).toMatchObject({ ok: true, warnings: [] });
});

test.each(surveys.map((survey) => [survey.title, survey] as const))(
  '%s: every plane has a station, every obstruction a trace',
  (_, survey) => {
    const served = new Set(survey.stations.flatMap(({ serves }) => serves));
    const traced = new Set(
      survey.stations.flatMap((station) => station.traces.map(({ obstruction }) => obstruction)),
    );
    expect(survey.planes.filter(({ id }) => !served.has(id))).toEqual([]);
    expect(survey.obstructions.filter(({ id }) => !traced.has(id))).toEqual([]);
  },
);

test('no two samples share an id', () => {
  expect(new Set(surveys.map(({ id }) => id)).size).toBe(surveys.length);
});

describe('between them the samples have', () => {
  test.each(['skyline', 'outline', 'line'])('a trace of shape %s', (shape) => {
    expect(traces.some((trace) => trace.shape === shape)).toBe(true);
  });

  test('every kind of obstruction', () => {
    const used = new Set(surveys.flatMap(({ obstructions }) => obstructions.map(({ kind }) => kind)));
    expect(obstructionKinds.map(({ kind }) => kind).filter((kind) => !used.has(kind))).toEqual([]);
  });

  test('a full circle, a raw reading, an amendment, a heading check and open azimuths', () => {
    const sightings = traces.flatMap((trace) => trace.sightings);
    expect(traces.some(({ fullCircle }) => fullCircle)).toBe(true);
    expect(sightings.some(({ reading }) => reading)).toBe(true);
    expect(sightings.some(({ amendments }) => amendments?.length)).toBe(true);
    expect(surveys.some(({ stations }) => stations.some(({ headingChecks }) => headingChecks))).toBe(true);
    expect(surveys.some(({ stations }) => stations.some(({ observedOpen }) => observedOpen))).toBe(true);
  });

  test.each([
    ['a site in the north', (latitude: number) => latitude > 30 && latitude < 60],
    ['a site in the south', (latitude: number) => latitude < -30],
    ['a site between the tropics', (latitude: number) => Math.abs(latitude) < 23],
    ['a site beyond the polar circle', (latitude: number) => latitude > 67],
  ])('%s', (_, fits) => {
    expect(surveys.some(({ site }) => fits(site.latitude))).toBe(true);
  });
});
