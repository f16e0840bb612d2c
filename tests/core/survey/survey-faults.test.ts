import { describe, expect, test } from 'vitest';
import {
  obstruction,
  plane,
  headingCheck,
  problemsAfter,
  reading,
  run,
  sightings,
  station,
  trace,
} from './small-survey.ts';
import type { Changes } from './small-survey.ts';

type Fault = [what: string, changes: Changes, path: string, message: RegExp];

function expectOneProblem(_: string, changes: Changes, path: string, message: RegExp): void {
  expect(problemsAfter(changes)).toEqual([{ path, message: expect.stringMatching(message) as string }]);
}

const THERE = 'stations[0].traces[0]';
const months = (count: number, value: number) => Array<number>(count).fill(value);
const clearSky = { source: 'clear-sky', model: 'ineichen', linkeTurbidity: months(13, 3) };

describe('one field is wrong', () => {
  test.each<Fault>([
    [
      'missing number',
      { 'site.latitude': undefined },
      'site.latitude',
      /is missing. Give a number from -90 to 90/,
    ],
    ['missing list', { readings: undefined }, 'readings', /is missing. Give a list/],
    [
      'missing climate',
      { climate: undefined },
      'climate',
      /is missing. Give one of the climate sources "world"/,
    ],
    ['null for a number', { 'site.longitude': null }, 'site.longitude', /it is null/],
    ['text for a number', { 'planes[0].surfaceTilt': '30' }, 'planes[0].surfaceTilt', /it is "30"/],
    ['infinite number', { 'site.altitude': Infinity }, 'site.altitude', /from -430 to 9000/],
    ['NaN', { 'planes[0].surfaceAzimuth': NaN }, 'planes[0].surfaceAzimuth', /it is NaN/],
    ['latitude beyond the pole', { 'site.latitude': 90.01 }, 'site.latitude', /from -90 to 90/],
    ['longitude beyond 180', { 'site.longitude': -180.5 }, 'site.longitude', /from -180 to 180/],
    ['overhanging plane', { 'planes[0].surfaceTilt': 91 }, 'planes[0].surfaceTilt', /from 0 to 90/],
    ['azimuth over 360', { 'planes[0].surfaceAzimuth': 361 }, 'planes[0].surfaceAzimuth', /from 0 to 360/],
    ['width of nothing', { 'planes[0].width': 0 }, 'planes[0].width', /over 0/],
    [
      'corner as a list',
      { 'planes[0].corner': [0, 0, 0] },
      'planes[0].corner',
      /east, north and up, in metres; it is a list of 3/,
    ],
    [
      'outline of two corners',
      {
        'planes[0].outline': [
          { x: 0, y: 0 },
          { x: 1, y: 0 },
        ],
      },
      'planes[0].outline',
      /three/,
    ],
    [
      'elevation over the zenith',
      { [`${THERE}.sightings[1].elevation`]: 90.5 },
      `${THERE}.sightings[1].elevation`,
      /from -90 to 90/,
    ],
    ['albedo over 1', { 'site.albedo': 1.2 }, 'site.albedo', /from 0 to 1/],
    [
      'transmittance in percent',
      { 'obstructions[0].transmittance': 40 },
      'obstructions[0].transmittance',
      /0 to 1/,
    ],
    [
      'eleven months',
      { 'obstructions[0].transmittance': months(11, 0.5) },
      'obstructions[0].transmittance',
      /list of twelve/,
    ],
    ['thirteen turbidities', { climate: clearSky }, 'climate.linkeTurbidity', /twelve numbers/],
    ['unknown climate', { 'climate.source': 'tea leaves' }, 'climate.source', /"world", "weather-file"/],
    ['unknown kind', { 'obstructions[0].kind': 'cloud' }, 'obstructions[0].kind', /one of "deciduous-tree"/],
    ['unknown shape', { [`${THERE}.shape`]: 'blob' }, `${THERE}.shape`, /"skyline"/],
    ['unknown time zone', { 'site.timeZone': 'Mars/Olympus' }, 'site.timeZone', /IANA name/],
    ['day that is not in the calendar', { surveyedOn: '2026-02-30' }, 'surveyedOn', /calendar day/],
    ['instant without zone', { 'runs[0].startedAt': '2026-05-14T09:30:00' }, 'runs[0].startedAt', /in UTC/],
    [
      'instant at 25 hours',
      { 'readings[0].takenAt': '2026-05-14T25:30:00Z' },
      'readings[0].takenAt',
      /in UTC/,
    ],
    [
      'position of no sort',
      { 'stations[0].position': { x: 1 } },
      'stations[0].position',
      /a place on a plane/,
    ],
    [
      'open range of three',
      { 'stations[0].observedOpen': [[1, 2, 3]] },
      'stations[0].observedOpen[0]',
      /pair of azimuths/,
    ],
    [
      'open range of one',
      { 'stations[0].observedOpen': [[1]] },
      'stations[0].observedOpen[0][1]',
      /is missing/,
    ],
    ['empty id', { id: '' }, 'id', /1 to 200 characters/],
    ['station that is a number', { 'stations[0]': 7 }, 'stations[0]', /one station; it is 7/],
    ['field named __proto__', { 'site.__proto__': { albedo: 1 } }, 'site.__proto__', /may not be named/],
  ])('%s', expectOneProblem);
});

const sameSightingElsewhere = {
  ...station,
  id: 'B',
  traces: [{ ...trace, sightings: [sightings[0], { ...sightings[1], id: 'n' }] }],
};

describe('an id names two things', () => {
  test.each<Fault>([
    ['planes', { 'planes[1]': plane }, 'planes[1].id', /already names the plane at planes\[0\]/],
    ['obstructions', { 'obstructions[1]': obstruction }, 'obstructions[1].id', /an id of its own/],
    ['runs', { 'runs[1]': run }, 'runs[1].id', /an id of its own/],
    ['readings', { 'readings[1]': reading }, 'readings[1].id', /an id of its own/],
    [
      'heading checks',
      { 'stations[0].headingChecks[1]': headingCheck },
      'stations[0].headingChecks[1].id',
      /own/,
    ],
    ['stations', { 'stations[1]': { ...station, traces: [] } }, 'stations[1].id', /an id of its own/],
    [
      'traces',
      { 'stations[0].traces[1]': { ...trace, sightings: sightings.map((s) => ({ ...s, id: `${s.id}b` })) } },
      'stations[0].traces[1].id',
      /own/,
    ],
    [
      'sightings of two stations',
      { 'stations[1]': sameSightingElsewhere },
      'stations[1].traces[0].sightings[0].id',
      /already names the sighting/,
    ],
  ])('%s', expectOneProblem);
});

describe('a reference leads nowhere', () => {
  test.each<Fault>([
    [
      'trace to obstruction',
      { [`${THERE}.obstruction`]: 'gone' },
      `${THERE}.obstruction`,
      /No obstruction has the id "gone"/,
    ],
    ['station to plane', { 'stations[0].serves': ['south', 'west'] }, 'stations[0].serves[1]', /No plane/],
    ['position to plane', { 'stations[0].position.on': 'west' }, 'stations[0].position.on', /No plane/],
    [
      'sighting to reading',
      { [`${THERE}.sightings[2].reading`]: 'q9' },
      `${THERE}.sightings[2].reading`,
      /No reading/,
    ],
    ['reading to run', { 'readings[0].run': 'r9' }, 'readings[0].run', /No run/],
    [
      'heading check to reading',
      { 'stations[0].headingChecks[0].reading': 'q9' },
      'stations[0].headingChecks[0].reading',
      /No reading/,
    ],
  ])('%s', expectOneProblem);
});

const bowTie = [
  { id: 's1', azimuth: 350, elevation: 10 },
  { id: 's2', azimuth: 10, elevation: 20 },
  { id: 's3', azimuth: 10, elevation: 10 },
  { id: 's4', azimuth: 350, elevation: 20 },
];

describe('a trace cannot be drawn', () => {
  test.each<Fault>([
    [
      'one sighting',
      { [`${THERE}.sightings`]: sightings.slice(0, 1) },
      `${THERE}.sightings`,
      /one sighting; its shape, skyline, needs at least 2/,
    ],
    ['no sighting', { [`${THERE}.sightings`]: [] }, `${THERE}.sightings`, /0 sightings/],
    [
      'outline of two',
      { [`${THERE}.shape`]: 'outline', [`${THERE}.sightings`]: sightings.slice(0, 2) },
      `${THERE}.sightings`,
      /needs at least 3/,
    ],
    [
      'line of one',
      {
        [`${THERE}.shape`]: 'line',
        [`${THERE}.angularWidth`]: 1,
        [`${THERE}.sightings`]: sightings.slice(1, 2),
      },
      `${THERE}.sightings`,
      /line, needs at least 2/,
    ],
    ['line without width', { [`${THERE}.shape`]: 'line' }, `${THERE}.angularWidth`, /angular width/],
    [
      'full circle of an outline',
      { [`${THERE}.shape`]: 'outline', [`${THERE}.fullCircle`]: true },
      `${THERE}.fullCircle`,
      /Only a skyline/,
    ],
    [
      'neighbours 180 degrees apart',
      { [`${THERE}.sightings[1].azimuth`]: 300 },
      `${THERE}.sightings[1]`,
      /180 degrees from its neighbour/,
    ],
    [
      'first and last of a full circle 180 degrees apart',
      { [`${THERE}.fullCircle`]: true, [`${THERE}.sightings[2].azimuth`]: 300 },
      `${THERE}.sightings[0]`,
      /180 degrees from its neighbour/,
    ],
    [
      'full circle with a gap over 180 degrees',
      { [`${THERE}.fullCircle`]: true },
      `${THERE}.fullCircle`,
      /180 degrees or more apart/,
    ],
    [
      'outline that crosses itself across north',
      { [`${THERE}.shape`]: 'outline', [`${THERE}.sightings`]: bowTie },
      `${THERE}.sightings`,
      /crosses or touches itself/,
    ],
    [
      'azimuth without elevation',
      { [`${THERE}.sightings[0].elevation`]: undefined },
      `${THERE}.sightings[0].elevation`,
      /azimuth but no elevation/,
    ],
    [
      'elevation without azimuth',
      { [`${THERE}.sightings[0].azimuth`]: undefined },
      `${THERE}.sightings[0].azimuth`,
      /elevation but no azimuth/,
    ],
    [
      'sighting that points nowhere',
      { [`${THERE}.sightings[0]`]: { id: 's1' } },
      `${THERE}.sightings[0]`,
      /points nowhere/,
    ],
  ])('%s', expectOneProblem);
});

describe('a gap of more than half the horizon', () => {
  const along = (...azimuths: number[]) =>
    azimuths.map((azimuth, i) => ({ id: `s${i}`, azimuth, elevation: 9 }));

  test.each([
    ['clockwise', along(60, 100, 290)],
    ['counter-clockwise', along(300, 260, 70)],
  ])('is refused: %s', (_, gap) => {
    expectOneProblem('', { [`${THERE}.sightings`]: gap }, `${THERE}.sightings[2]`, /190 degrees away/);
  });

  test('is not seen in a small step back, as under an overhang', () => {
    expect(problemsAfter({ [`${THERE}.sightings`]: along(60, 100, 95, 130) })).toEqual([]);
  });
});

test('a plane’s outline may not cross itself', () => {
  const corner = (x: number, y: number) => ({ x, y });
  const square = [corner(0, 0), corner(4, 0), corner(4, 3), corner(0, 3)];
  expect(problemsAfter({ 'planes[0].outline': square })).toEqual([]);
  const [a, b, c, d] = square;
  expectOneProblem(
    '',
    { 'planes[0].outline': [a, c, b, d] },
    'planes[0].outline',
    /edge after corner 1 meets its edge after corner 3/,
  );
});

test('an amendment counts in the checks of the trace', () => {
  const amendment = { azimuth: 300, elevation: 9, reason: 'typed', madeAt: '2026-05-14T10:00:00Z' };
  const problems = problemsAfter({ [`${THERE}.sightings[1].amendments`]: [amendment] });
  expect(problems.map(({ path }) => path)).toEqual([`${THERE}.sightings[1]`]);
});

test('sightings are checked in the order of their order keys', () => {
  const inOrder = [
    { id: 's1', order: 1, azimuth: 120, elevation: 10 },
    { id: 's2', order: 3, azimuth: 300, elevation: 10 },
    { id: 's3', order: 2, azimuth: 200, elevation: 10 },
  ];
  expect(problemsAfter({ [`${THERE}.sightings`]: inOrder })).toEqual([]);
});
