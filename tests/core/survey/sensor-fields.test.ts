import { describe, expect, test } from 'vitest';
import { changesBetween, fieldsOf } from '../../../src/core/survey/field-changes.ts';
import { LIMITS } from '../../../src/core/survey/limits.ts';
import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { plane, problemsAfter, reading, smallSurvey, station } from './small-survey.ts';
import type { Changes } from './small-survey.ts';

/** Every field a phone with sensors writes. */
const sensed: Changes = {
  'planes[0].tiltPlacings': [
    { id: 'p1', reading: 'q1' },
    { id: 'p2', order: 2, reading: 'q1', held: 'edge' },
  ],
  'planes[0].azimuthSightings': [{ id: 'a1', reading: 'q1', along: 'eave' }],
  'readings[0]': {
    ...reading,
    axis: 'top-edge',
    samples: [
      [0, 10, 80, 0],
      [17, 10.1, 79.9, -0.1],
    ],
    compassHeading: 350,
    compassAccuracy: -1,
    absolute: false,
    screenAngle: 270,
  },
  'stations[0].headingChecks': [
    { id: 'h1', method: 'sun-shadow', reading: 'q1', shadowHeight: 1.2, shadowLength: 2 },
    { id: 'h2', method: 'plan-bearing', mark: 'gable', bearing: 10, frame: 'grid', convergence: -1.2 },
    {
      id: 'h3',
      method: 'known-mark',
      mark: 'gable',
      bearing: 10,
      bearingDeviation: 0.5,
      gridZone: '18N',
      frame: 'grid',
    },
  ],
  'stations[0].markSightings': [
    { id: 'm1', reading: 'q1', mark: 'gable' },
    { id: 'm2', reading: 'q1', readings: ['q1'], sampleAt: 17 },
    { id: 'm3', readings: ['q1'] },
  ],
  'stations[0].indexChecks': [{ id: 'i1', upright: 'q1', turned: 'q1' }],
  'stations[0].observedOpen': [[20, 40]],
  'stations[0].openLooks': [
    { id: 'o1', run: 'r1', azimuths: [300, 20], lookedAt: '2026-05-14T09:00:00Z', readings: ['q1'] },
    { id: 'o2', order: 3, run: 'r1', azimuths: [0, 360], lookedAt: '2026-05-14T09:01:00Z' },
  ],
  photos: [
    {
      id: 'f1',
      of: { kind: 'site' },
      takenAt: '2026-05-14T09:00:00Z',
      reading: 'q1',
      width: 4,
      height: 3,
      bytes: 9,
      sha256: 'a'.repeat(64),
    },
  ],
};

test('what a phone with sensors writes is read, nothing of it unknown', () => {
  expect(surveyFromJson(smallSurvey(sensed))).toMatchObject({ ok: true, warnings: [] });
});

const LOOK = { id: 'o', run: 'r1', azimuths: [10, 20], lookedAt: '2026-05-14T09:00:00Z' };
const THERE = 'stations[0]';
const mark = (fields: object): Changes => ({ [`${THERE}.markSightings`]: [{ id: 'm', ...fields }] });
const check = (fields: object): Changes => ({
  [`${THERE}.headingChecks`]: [{ id: 'h', method: 'plan-bearing', ...fields }],
});

describe('one thing is wrong', () => {
  test.each<[string, Changes, string, RegExp]>([
    [
      'axis of another kind',
      { 'readings[0].axis': 'left' },
      'readings[0].axis',
      /one of "camera", "top-edge"/,
    ],
    ['row of three', { 'readings[0].samples': [[0, 1, 2]] }, 'readings[0].samples[0][3]', /missing/],
    [
      'row with null',
      { 'readings[0].samples': [[0, null, 2, 3]] },
      'readings[0].samples[0][1]',
      /-360 to 360/,
    ],
    [
      'row before the start',
      { 'readings[0].samples': [[-1, 0, 0, 0]] },
      'readings[0].samples[0][0]',
      /from 0 to 60000 milliseconds/,
    ],
    [
      'too many rows',
      { 'readings[0].samples': Array(LIMITS.samples + 1).fill([0, 0, 0, 0]) },
      'readings[0].samples',
      /at most 1000 rows/,
    ],
    ['heading of 400', { 'readings[0].compassHeading': 400 }, 'readings[0].compassHeading', /from 0 to 360/],
    ['word for yes', { 'readings[0].absolute': 'yes' }, 'readings[0].absolute', /true or false/],
    [
      'zone that is not',
      check({ gridZone: '61N' }),
      `${THERE}.headingChecks[0].gridZone`,
      /a UTM zone with its hemisphere/,
    ],
    ['zone without its hemisphere', check({ gridZone: '33' }), `${THERE}.headingChecks[0].gridZone`, /"33N"/],
    [
      'deviation of 0',
      check({ bearingDeviation: 0 }),
      `${THERE}.headingChecks[0].bearingDeviation`,
      /over 0/,
    ],
    [
      'height without a length',
      check({ shadowHeight: 1 }),
      `${THERE}.headingChecks[0].shadowLength`,
      /Give both, or neither/,
    ],
    [
      'length without a height',
      check({ shadowLength: 1 }),
      `${THERE}.headingChecks[0].shadowHeight`,
      /Give both, or neither/,
    ],
    ['mark that points nowhere', mark({}), `${THERE}.markSightings[0]`, /points nowhere/],
    ['mark with half a direction', mark({ azimuth: 3 }), `${THERE}.markSightings[0].elevation`, /Give both/],
    [
      'time without a reading',
      mark({ azimuth: 3, elevation: 4, sampleAt: 5 }),
      `${THERE}.markSightings[0].sampleAt`,
      /Name the reading/,
    ],
    [
      'mark with the id of a trace’s sighting',
      { [`${THERE}.markSightings`]: [{ id: 's1', reading: 'q1' }] },
      `${THERE}.markSightings[0].id`,
      /already names the sighting/,
    ],
    [
      'reading that is not',
      mark({ readings: ['q1', 'q9'] }),
      `${THERE}.markSightings[0].readings[1]`,
      /No reading has the id "q9"/,
    ],
    [
      'check of no reading',
      { [`${THERE}.indexChecks`]: [{ id: 'i', upright: 'q1', turned: 'q9' }] },
      `${THERE}.indexChecks[0].turned`,
      /No reading/,
    ],
    [
      'half a two-face check',
      { [`${THERE}.indexChecks`]: [{ id: 'i', upright: 'q1' }] },
      `${THERE}.indexChecks[0].turned`,
      /missing/,
    ],
    [
      'look in no run',
      { [`${THERE}.openLooks`]: [{ ...LOOK, run: 'r9' }] },
      `${THERE}.openLooks[0].run`,
      /No run has the id "r9"/,
    ],
    [
      'look by no reading',
      { [`${THERE}.openLooks`]: [{ ...LOOK, readings: ['q9'] }] },
      `${THERE}.openLooks[0].readings[0]`,
      /No reading has the id "q9"/,
    ],
    [
      'look from nowhere',
      { [`${THERE}.openLooks`]: [{ ...LOOK, azimuths: [10] }] },
      `${THERE}.openLooks[0].azimuths[1]`,
      /from 0 to 360/,
    ],
    [
      'photo aimed by no reading',
      { photos: [{ ...(sensed.photos as object[])[0], reading: 'q9' }] },
      'photos[0].reading',
      /No reading has the id "q9"/,
    ],
    [
      'placing of no reading',
      { 'planes[0].tiltPlacings': [{ id: 'p', reading: 'q9' }] },
      'planes[0].tiltPlacings[0].reading',
      /No reading/,
    ],
    [
      'edge of another kind',
      { 'planes[0].azimuthSightings': [{ id: 'a', reading: 'q1', along: 'hip' }] },
      'planes[0].azimuthSightings[0].along',
      /one of "eave", "fall"/,
    ],
    [
      'two placings of one id',
      {
        'planes[0].tiltPlacings': [
          { id: 'p', reading: 'q1' },
          { id: 'p', reading: 'q1' },
        ],
      },
      'planes[0].tiltPlacings[1].id',
      /already names the placing on this plane/,
    ],
  ])('%s', (_, changes, path, message) => {
    expect(problemsAfter(changes)).toEqual([{ path, message: expect.stringMatching(message) as string }]);
  });

  test('too many of a thing', () => {
    const many = (count: number) => Array.from({ length: count }, (_, i) => ({ id: `x${i}` }));
    expect(problemsAfter({ [`${THERE}.indexChecks`]: many(2001) })[0].message).toMatch(
      /2001 two-face checks; the limit is 2000/,
    );
    expect(problemsAfter({ 'planes[0].tiltPlacings': many(20_001) })[0].message).toMatch(
      /the limit is 20000/,
    );
    expect(problemsAfter({ [`${THERE}.markSightings`]: many(20_001) })[0].message).toMatch(
      /the limit is 20000/,
    );
  });
});

describe('as fields', () => {
  const survey = () => smallSurvey(structuredClone(sensed)) as unknown as Survey;

  test('a reading with its samples is one value', () => {
    const paths = fieldsOf(survey()).map(({ path }) => path);
    expect(paths.filter((path) => path.startsWith('readings/'))).toEqual(['readings/q1']);
  });

  test('marks, checks, placings and edges are rows of their own', () => {
    const after = survey();
    after.stations[0].markSightings![0].mark = 'spire';
    after.stations[0].indexChecks![0].order = 4;
    after.stations[0].openLooks![1].azimuths = [10, 20];
    after.planes[0].tiltPlacings![0].held = 'edge';
    after.planes[0].azimuthSightings![0].along = 'fall';
    expect(
      changesBetween(survey(), after)
        .map(({ path }) => path)
        .sort(),
    ).toEqual([
      `planes/${plane.id}/azimuthSightings/a1/along`,
      `planes/${plane.id}/tiltPlacings/p1/held`,
      `stations/${station.id}/indexChecks/i1/order`,
      `stations/${station.id}/markSightings/m1/mark`,
      `stations/${station.id}/openLooks/o2/azimuths`,
    ]);
  });
});
