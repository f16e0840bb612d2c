import { fc } from '@fast-check/vitest';
import type { Survey } from '../../../src/core/survey/survey.ts';

// Surveys only as sound as field changes need: rows with ids, whatever else they hold. The ids come from a few, so
// that two surveys share rows; some would break a path if it did not escape them.
const id = fc.constantFrom('a', 'b', 'c', 'a/b', 'a~1b', '#', '+', '~', '__proto__', 'constructor', ' ', '0');
const fieldName = fc.constantFrom(
  'x',
  'latitude+longitude',
  'a/b',
  '#',
  '~0',
  'toString',
  'planes',
  'sightings',
);
const extras = fc.dictionary(fieldName, fc.jsonValue({ maxDepth: 2 }), { maxKeys: 3, noNullPrototype: true });
const order = fc.option(fc.integer({ min: 0, max: 4 }), { nil: undefined });

/** A list of rows with distinct ids, each with some unknown fields. */
const rows = <T extends object>(shape: { [K in keyof T]: fc.Arbitrary<T[K]> }) =>
  fc
    .uniqueArray(fc.tuple(extras, fc.record({ id, ...shape })), {
      maxLength: 4,
      selector: ([, row]) => row.id,
    })
    .map((list) => list.map(([unknown, row]) => plain({ ...unknown, ...row })));

/** As JSON would carry it: without undefined fields. */
const plain = <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T;

const instant = fc.constantFrom('2026-05-14T09:30:00Z', '2026-05-14T09:31:00Z', '2026-05-14T09:32:00Z');
const sightings = rows({ order, azimuth: fc.constantFrom(1, 2), elevation: fc.constantFrom(1, 2) });
const traces = rows({ order, sightings });
const headingChecks = fc.option(rows({ method: fc.constantFrom('sun-shadow', 'known-mark') }), {
  nil: undefined,
});
const perhaps = <T extends object>(shape: { [K in keyof T]: fc.Arbitrary<T[K]> }) =>
  fc.option(rows(shape), { nil: undefined });
const placings = perhaps({ order, reading: id });
const serves = fc.subarray(['a', 'b', 'c']);

export const arbitrarySurvey: fc.Arbitrary<Survey> = fc
  .record({
    format: fc.constant('noonmark-survey'),
    version: fc.constant(1),
    id: fc.constantFrom('one', 'two'),
    title: fc.string(),
    site: fc.record({
      latitude: fc.constantFrom(1, 2),
      longitude: fc.constantFrom(3, 4),
      albedo: fc.constantFrom(0, 1),
    }),
    climate: fc.constantFrom({ source: 'world' }, { source: 'weather-file', name: 'x' }),
    planes: rows({
      order,
      surfaceTilt: fc.constantFrom(0, 30),
      tiltPlacings: placings,
      azimuthSightings: placings,
    }),
    obstructions: rows({ order, transmittance: fc.constantFrom(0.5, Array(12).fill(0.1)) }),
    runs: rows({ startedAt: instant }),
    readings: rows({ takenAt: instant, alpha: fc.constantFrom(1, 2) }),
    stations: rows({
      order,
      serves,
      headingChecks,
      traces,
      markSightings: fc.option(sightings, { nil: undefined }),
      indexChecks: perhaps({ order, upright: id, turned: id }),
      openLooks: perhaps({ order, run: id, azimuths: fc.constantFrom([1, 2], [3, 4]) }),
    }),
    later: fc.option(fc.jsonValue({ maxDepth: 2 }), { nil: undefined }),
  })
  .map((survey) => plain(survey) as unknown as Survey);
