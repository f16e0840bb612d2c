import { expect, test } from 'vitest';
import { LIMITS } from '../../../src/core/survey/limits.ts';
import { parseSurvey } from '../../../src/core/survey/parse-survey.ts';
import { problemsAfter } from './small-survey.ts';
import type { Changes } from './small-survey.ts';

const many = <T>(length: number, make: (i: number) => T): T[] => Array.from({ length }, (_, i) => make(i));
const THERE = 'stations[0].traces[0]';

test.each<[string, Changes, RegExp]>([
  [
    '50,000 sightings',
    { [`${THERE}.sightings`]: many(50_000, (i) => ({ id: `s${i}` })) },
    /50000 sightings in its traces; the limit is 20000/,
  ],
  ['200,001 readings', { readings: many(200_001, () => 0) }, /200001 readings; the limit is 200000/],
  ['2,001 planes', { planes: many(2_001, () => 0) }, /2001 planes; the limit is 2000/],
  [
    '20,001 corners',
    { 'planes[0].outline': many(20_001, () => 0) },
    /20001 corners in its plane outlines; the limit is 20000/,
  ],
  ['2,001 obstructions', { obstructions: many(2_001, () => 0) }, /2001 obstructions; the limit is 2000/],
  ['2,001 stations', { stations: many(2_001, () => 0) }, /2001 stations; the limit is 2000/],
  ['2,001 traces', { 'stations[0].traces': many(2_001, () => 0) }, /2001 traces; the limit is 2000/],
])('%s are refused with the limit named, and nothing else is looked at', (_, changes, message) => {
  expect(problemsAfter(changes)).toEqual([
    { path: expect.any(String) as string, message: expect.stringMatching(message) as string },
  ]);
});

test('a text of 100 MB is refused with the limit named, unread', () => {
  const message = expect.stringMatching(/the limit is 20000000 .20 MB/) as string;
  expect(parseSurvey(' '.repeat(100_000_000))).toEqual({ ok: false, problems: [{ path: 'file', message }] });
});

test('20,000 sightings in one drawn sweep are read', () => {
  const sightings = many(LIMITS.sightings, (i) => ({
    id: `s${i}`,
    azimuth: i / 100,
    elevation: 5 + (i % 7),
  }));
  expect(problemsAfter({ 'obstructions[0].kind': 'terrain', [`${THERE}.sightings`]: sightings })).toEqual([]);
});

test('an outline beyond its own limit is refused', () => {
  const sightings = many(2_001, (i) => ({ id: `s${i}`, azimuth: 180 + i / 100, elevation: 5 }));
  const problems = problemsAfter({ [`${THERE}.shape`]: 'outline', [`${THERE}.sightings`]: sightings });
  expect(problems.map(({ message }) => message)).toEqual([expect.stringMatching(/the limit is 2000/)]);
});

test('lists a million deep are refused without harm', () => {
  const deep = '['.repeat(1_000_000) + ']'.repeat(1_000_000);
  const parsed = parseSurvey(`{"format":"noonmark-survey","version":1,"site":${deep}}`);
  expect(parsed.ok || parsed.problems[0].message).toMatch(/more than 64 deep/);
});
