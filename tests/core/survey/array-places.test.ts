import { describe, expect, it } from 'vitest';
import { arrayPlacesOf } from '../../../src/core/survey/array-places.ts';
import type { Station } from '../../../src/core/survey/survey.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';

const plane = { id: 'p', name: 'Roof', surfaceTilt: 30, surfaceAzimuth: 180, width: 9, slopeLength: 4 };
const station = (id: string, x: number, y: number): Station => ({
  id,
  name: id,
  position: { on: 'p', x, y },
  serves: ['p'],
  traces: [],
});
const places = (stations: Station[], change: Partial<typeof plane> = {}) =>
  arrayPlacesOf(inventedSurvey('places', { planes: [{ ...plane, ...change }], stations }), {
    ...plane,
    ...change,
  });

describe('corners and centre of a plane', () => {
  it('are five, all missing before the first station', () => {
    expect(places([]).map(({ name, x, y, isMissing }) => [name, x, y, isMissing])).toEqual([
      ['lower left corner', 0, 0, true],
      ['lower right corner', 9, 0, true],
      ['upper left corner', 0, 4, true],
      ['upper right corner', 9, 4, true],
      ['centre', 4.5, 2, true],
    ]);
  });

  it('come with those first that no station stands nearest to', () => {
    const found = places([station('a', 0.4, 0.3), station('b', 5, 2.2)]);
    expect(found.map(({ name, isMissing }) => `${name} ${isMissing}`)).toEqual([
      'lower right corner true',
      'upper left corner true',
      'upper right corner true',
      'lower left corner false',
      'centre false',
    ]);
  });

  it('are not known where the plane has no size', () => {
    expect(places([], { width: undefined })).toEqual([]);
  });
});
