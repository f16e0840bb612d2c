import { expect, test } from 'vitest';
import { sightingDirection } from '../../../src/core/survey/sighting-direction.ts';

const amendment = (azimuth: number, elevation: number) => ({
  azimuth,
  elevation,
  reason: 'typed',
  madeAt: '2026-05-14T10:00:00Z',
});

test('the last amendment counts, else the typed values, else there is none', () => {
  const typed = { id: 's', azimuth: 10, elevation: 20, reading: 'q' };
  expect(sightingDirection({ ...typed, amendments: [amendment(1, 2), amendment(3, 4)] })).toEqual({
    azimuth: 3,
    elevation: 4,
  });
  expect(sightingDirection({ ...typed, amendments: [] })).toEqual({ azimuth: 10, elevation: 20 });
  expect(sightingDirection({ id: 's', reading: 'q' })).toBe(null);
});
