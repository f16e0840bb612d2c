import { describe, expect, test } from 'vitest';
import { parseSurvey, surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import { problemsAfter, sightings, smallSurvey, trace } from './small-survey.ts';
import type { Changes } from './small-survey.ts';

const THERE = 'stations[0].traces[0]';

test('a sound survey is read as it stands, without warnings', () => {
  const parsed = parseSurvey(JSON.stringify(smallSurvey()));
  expect(parsed).toEqual({ ok: true, value: smallSurvey(), warnings: [] });
});

test('a byte order mark before the text is passed over', () => {
  expect(parseSurvey(`\ufeff${JSON.stringify(smallSurvey())}`).ok).toBe(true);
});

describe('a text that is no survey', () => {
  test.each([
    ['empty', '', 'file', /empty/],
    ['not JSON', '{\n  "format": noonmark }', 'line 2, column 13', /not JSON/],
    ['cut short', JSON.stringify(smallSurvey(), null, 1).slice(0, 60), 'line 4, column 14', /cut short/],
    ['a list', '[]', 'file', /must hold one survey, an object; it holds a list of 0/],
    ['a number', '12', 'file', /it holds 12/],
    ['of no format', '{}', 'format', /it has no format/],
    ['of another format', '{"format":"other","version":1}', 'format', /its format is "other"/],
    ['of a newer version', '{"format":"noonmark-survey","version":2}', 'version', /Update Noonmark/],
    ['of a version that is none', '{"format":"noonmark-survey","version":"1"}', 'version', /whole number/],
    ['of version 0', '{"format":"noonmark-survey","version":0}', 'version', /whole number/],
  ])('%s', (_, text, path, message) => {
    const parsed = parseSurvey(text);
    expect(parsed).toEqual({
      ok: false,
      problems: [{ path, message: expect.stringMatching(message) as string }],
    });
  });
});

test('all problems are listed, of the fields and between them', () => {
  const problems = problemsAfter({
    'site.latitude': undefined,
    'planes[0].surfaceTilt': -1,
    'stations[0].serves': ['west'],
    [`${THERE}.sightings`]: sightings.slice(0, 1),
  });
  expect(problems.map(({ path }) => path)).toEqual([
    'site.latitude',
    'planes[0].surfaceTilt',
    'stations[0].serves[0]',
    `${THERE}.sightings`,
  ]);
});

test('at most a hundred problems are listed, the rest counted', () => {
  const planes = Array.from({ length: 300 }, (_, i) => ({
    id: `p${i}`,
    name: 'P',
    surfaceTilt: 99,
    surfaceAzimuth: 0,
  }));
  const problems = problemsAfter({ planes, stations: [] });
  expect(problems).toHaveLength(101);
  expect(problems[99].path).toBe('planes[99].surfaceTilt');
  expect(problems[100].message).toMatch(/^and 200 more/);
});

test('unknown fields are kept, with one warning for each sort of place', () => {
  const survey = smallSurvey({
    weather: 'fine',
    'site.constructor': { deep: [1] },
    'stations[0].position.z': 3,
    'climate.prototype': 1,
    [`${THERE}.sightings[0].by whom`]: 'K',
    [`${THERE}.sightings[2].by whom`]: 'L',
  });
  const parsed = parseSurvey(JSON.stringify(survey));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  expect(parsed.value).toEqual(survey);
  const warnings = new Map(parsed.warnings.map(({ path, message }) => [path, message]));
  expect([...warnings.keys()].sort()).toEqual([
    'climate.prototype',
    'site.constructor',
    'stations[0].position.z',
    `${THERE}.sightings[0]["by whom"]`,
    'weather',
  ]);
  expect(warnings.get(`${THERE}.sightings[0]["by whom"]`)).toMatch(/in 1 more such place/);
});

const amendments = [{ azimuth: 120, elevation: 9, reason: 'typed', madeAt: '2026-05-14T10:00:00Z' }];
const elsewhere = {
  ...trace,
  sightings: sightings.map((sighting) => ({ ...sighting, id: `${sighting.id}b` })),
};
const directed = (...azimuths: number[]) =>
  azimuths.map((azimuth, i) => ({ id: `s${i}`, azimuth, elevation: 9 }));

test.each<[string, Changes]>([
  ['at the north pole', { 'site.latitude': 90 }],
  ['at the south pole', { 'site.latitude': -90 }],
  ['at 180 degrees', { 'site.longitude': 180 }],
  ['at -180 degrees', { 'site.longitude': -180 }],
  ['with a sighting that has only its reading', { [`${THERE}.sightings[0]`]: { id: 's1', reading: 'q1' } }],
  ['with a sighting that has only an amendment', { [`${THERE}.sightings[0]`]: { id: 's1', amendments } }],
  [
    'with the same trace id at two stations',
    { 'stations[1]': { id: 'B', name: 'B', serves: [], traces: [elsewhere] } },
  ],
  ['with a skyline across north', { [`${THERE}.sightings`]: directed(300, 20, 90) }],
  [
    'with a skyline all around',
    { [`${THERE}.sightings`]: directed(10, 130, 250), [`${THERE}.fullCircle`]: true },
  ],
  [
    'with a skyline all around, the other way',
    { [`${THERE}.sightings`]: directed(250, 130, 10), [`${THERE}.fullCircle`]: true },
  ],
  ['with a name of markup and right-to-left marks', { 'planes[0].name': '<script>\u202e👷</script>' }],
  ['without stations', { stations: [] }],
])('a survey is sound %s', (_, changes) => {
  expect(problemsAfter(changes)).toEqual([]);
});

test('the value given is not changed', () => {
  const survey = smallSurvey();
  surveyFromJson(survey);
  expect(survey).toEqual(smallSurvey());
});
