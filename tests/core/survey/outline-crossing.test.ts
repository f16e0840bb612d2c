import { fc, test } from '@fast-check/vitest';
import { expect } from 'vitest';
import { outlineCrossing } from '../../../src/core/survey/outline-crossing.ts';
import type { TraceEdge } from '../../../src/core/survey/survey.ts';

const at = (...pairs: [azimuth: number, elevation: number][]) =>
  pairs.map(([azimuth, elevation]) => ({ azimuth, elevation }));

const edges: TraceEdge[] = ['drawn', 'straight'];

test.each(edges)('a %s square does not cross itself, nor across north', (edge) => {
  expect(outlineCrossing(at([100, 10], [120, 10], [120, 30], [100, 30]), edge)).toBe(null);
  expect(outlineCrossing(at([350, 10], [10, 10], [10, 30], [350, 30]), edge)).toBe(null);
});

test.each(edges)('a %s bow tie does, and the places of the edges are told', (edge) => {
  expect(outlineCrossing(at([100, 10], [120, 30], [120, 10], [100, 30]), edge)).toEqual([0, 2]);
  expect(outlineCrossing(at([350, 10], [10, 30], [10, 10], [350, 30]), edge)).toEqual([0, 2]);
});

test.each(edges)('a %s outline around the zenith does not cross itself', (edge) => {
  expect(outlineCrossing(at([0, 60], [90, 70], [180, 55], [270, 80]), edge)).toBe(null);
});

test.each(edges)('a %s outline twice around the zenith does', (edge) => {
  const twice = at([0, 60], [120, 62], [240, 60], [0, 70], [120, 50], [240, 70]);
  expect(outlineCrossing(twice, edge)).not.toBe(null);
});

test.each(edges)('sightings repeated, and the first given again at the end, are passed over (%s)', (edge) => {
  const square = at([100, 10], [120, 10], [120, 10], [120, 30], [100, 30], [100, 10]);
  expect(outlineCrossing(square, edge)).toBe(null);
});

test('a drawn edge that touches another counts as meeting', () => {
  expect(outlineCrossing(at([100, 10], [120, 10], [120, 30], [110, 10], [100, 30]), 'drawn')).toEqual([0, 2]);
});

// A straight edge 100° wide at 20° stands at 29.5° in its middle: tan e = tan 20° / cos 50°.
test('a straight edge bulges up past a point that a drawn one leaves above', () => {
  const outline = at([130, 20], [230, 20], [200, 32], [180, 27], [160, 32]);
  expect(outlineCrossing(outline, 'drawn')).toBe(null);
  expect(outlineCrossing(outline, 'straight')).toEqual([0, 2]);
});

const star = fc
  .record({
    centre: fc.record({ azimuth: fc.double({ min: 0, max: 359, noNaN: true }), elevation: fc.constant(40) }),
    radii: fc.array(fc.double({ min: 2, max: 15, noNaN: true }), { minLength: 4, maxLength: 40 }),
  })
  .map(({ centre, radii }) =>
    radii.map((radius, i) => {
      const angle = (2 * Math.PI * i) / radii.length;
      return {
        azimuth: (centre.azimuth + radius * Math.cos(angle) + 360) % 360,
        elevation: centre.elevation + radius * Math.sin(angle),
      };
    }),
  );

test.prop([star, fc.nat()])(
  'a star about a point never crosses itself, wherever it starts',
  (outline, start) => {
    const first = start % outline.length;
    const turned = [...outline.slice(first), ...outline.slice(0, first)];
    expect(outlineCrossing(turned, 'drawn')).toBe(null);
    expect(outlineCrossing([...turned].reverse(), 'drawn')).toBe(null);
  },
);

test.prop([star, fc.double({ min: 0, max: 360, noNaN: true }), fc.nat(), fc.nat()])(
  'turning the compass changes nothing',
  (outline, turn, i, j) => {
    const swapped = [...outline];
    const [a, b] = [i % outline.length, j % outline.length];
    [swapped[a], swapped[b]] = [swapped[b], swapped[a]];
    const turned = swapped.map((s) => ({ ...s, azimuth: (s.azimuth + turn) % 360 }));
    for (const edge of edges)
      expect(outlineCrossing(turned, edge) === null).toBe(outlineCrossing(swapped, edge) === null);
  },
);
