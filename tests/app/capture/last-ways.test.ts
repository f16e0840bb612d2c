import { describe, expect, it } from 'vitest';
import { checkMethodLast, tracedLast } from '../../../src/app/capture/last-ways.ts';
import { bearingFrom, checkMarksOf } from '../../../src/app/capture/marks.ts';
import type { HeadingCheck, Station } from '../../../src/core/survey/survey.ts';

const check = (id: string, order: number, rest: Partial<HeadingCheck>): HeadingCheck => ({
  id,
  order,
  method: 'known-mark',
  reading: id,
  ...rest,
});
const station = (id: string, order: number, rest: Partial<Station>): Station => ({
  id,
  order,
  name: id,
  serves: [],
  traces: [],
  ...rest,
});
const trace = (obstruction: string) => ({
  id: obstruction,
  obstruction,
  shape: 'skyline' as const,
  sightings: [{ id: `${obstruction} tip`, azimuth: 1, elevation: 2, mark: `${obstruction} tip` }],
});

const stations = [
  station('B', 1, { headingChecks: [check('2', 0, { mark: 'mast', bearing: 80, frame: 'grid' })] }),
  station('A', 0, {
    headingChecks: [
      check('0', 0, { method: 'sun-shadow' }),
      check('1', 1, { mark: 'church', bearing: 150 }),
      check('3', 2, { mark: 'church' }),
    ],
    traces: [trace('maple'), trace('barn')],
  }),
];

describe('what was done last in a survey', () => {
  it('goes by the order of the stations, not by that of the list', () => {
    expect(checkMethodLast({ stations })).toBe('known-mark');
    expect(tracedLast({ stations })).toBe('barn');
  });

  it('is nothing in an empty survey', () => {
    expect(checkMethodLast({ stations: [] })).toBeNull();
    expect(tracedLast({ stations: [station('A', 0, {})] })).toBeNull();
  });
});

describe('marks for a heading check', () => {
  it('are those of earlier checks, the last first, then those sighted', () => {
    expect(checkMarksOf({ stations })).toEqual(['mast', 'church', 'maple tip', 'barn tip']);
  });

  it('have a bearing from the station it was given at, and from no other', () => {
    const [b, a] = stations;
    expect(bearingFrom(a, 'church')).toEqual({ bearing: 150, frame: 'true' });
    expect(bearingFrom(b, 'mast')).toEqual({ bearing: 80, frame: 'grid' });
    expect(bearingFrom(b, 'church')).toBeNull();
    expect(bearingFrom(a, 'mast')).toBeNull();
  });
});
