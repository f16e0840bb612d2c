import { fc, test as property } from '@fast-check/vitest';
import { describe, expect, test } from 'vitest';
import type { SettledTrace, TracedObstruction } from '../../../src/core/horizon/traced-obstruction.ts';
import { edgeElevation, edgesBetween } from '../../../src/core/horizon/horizon-edge.ts';
import type { HorizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { blockedView } from '../../../src/core/horizon/blocked-view.ts';
import { blockedSpans } from '../../../src/core/horizon/blocked-spans.ts';
import { planeFacing } from '../../../src/core/horizon/sky-view.ts';
import { months, obstruction, points, ring, trace } from './made-up-traces.ts';

/** Blocked intervals at an azimuth. */
function intervalsAt(profile: HorizonProfile, azimuth: number): [number, number][] {
  const found: [number, number][] = [];
  for (let slice = 0; slice < profile.sliceColumn.length; slice++)
    if (azimuth >= profile.sliceFrom[slice] && azimuth < profile.sliceTo[slice])
      for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
        found.push([profile.low[k], profile.high[k]]);
  return found.sort((a, b) => a[0] - b[0]);
}

/** Solid angle that a profile blocks, steradians: the view of a half-sphere that faces every way alike. */
function blockedSolidAngle(profile: HorizonProfile): number {
  let sum = 0;
  for (let slice = 0; slice < profile.sliceColumn.length; slice++)
    for (let k = profile.intervalFirst[slice]; k < profile.intervalFirst[slice + 1]; k++)
      sum +=
        (((profile.sliceTo[slice] - profile.sliceFrom[slice]) * Math.PI) / 180) *
        (Math.sin((profile.high[k] * Math.PI) / 180) - Math.sin((profile.low[k] * Math.PI) / 180));
  return sum;
}

describe('edges', () => {
  /** Spherical trigonometry: tan e = tan 20° / cos 50° in the middle of a level great circle 100° wide. */
  test('a straight ridge 100° wide with ends at 20° stands at 29.5° in its middle', () => {
    const [edge] = edgesBetween({ azimuth: 130, elevation: 20 }, { azimuth: 230, elevation: 20 }, true);
    expect(edgeElevation(edge, 180)).toBeCloseTo(29.52, 2);
    expect(edgeElevation(edge, 130)).toBeCloseTo(20, 9);
    expect(edgeElevation(edge, 230)).toBeCloseTo(20, 9);
  });

  test('a drawn edge is linear, over north too', () => {
    const edges = edgesBetween({ azimuth: 350, elevation: 10 }, { azimuth: 10, elevation: 20 }, false);
    expect(edges.map(({ from, to }) => [from, to])).toEqual([
      [350, 360],
      [0, 10],
    ]);
    expect(edgeElevation(edges[0], 355)).toBeCloseTo(12.5, 9);
    expect(edgeElevation(edges[1], 5)).toBeCloseTo(17.5, 9);
  });

  property.prop([
    fc.double({ min: 0, max: 359.9, noNaN: true }),
    fc.double({ min: -170, max: 170, noNaN: true }),
    fc.double({ min: -20, max: 80, noNaN: true }),
    fc.double({ min: -20, max: 80, noNaN: true }),
  ])('a straight edge lies in the plane of the eye and both its ends', (azimuth, turn, first, second) => {
    fc.pre(Math.abs(turn) > 0.01);
    const vector = (a: number, e: number) => {
      const [x, y] = [(a * Math.PI) / 180, (e * Math.PI) / 180];
      return [Math.sin(x) * Math.cos(y), Math.cos(x) * Math.cos(y), Math.sin(y)];
    };
    const [p, q] = [vector(azimuth, first), vector(azimuth + turn, second)];
    const ends = [
      { azimuth, elevation: first },
      { azimuth: (azimuth + turn + 360) % 360, elevation: second },
    ];
    for (const edge of edgesBetween(ends[0], ends[1], true)) {
      const middle = (edge.from + edge.to) / 2;
      const m = vector(middle, edgeElevation(edge, middle));
      const volume =
        p[0] * (q[1] * m[2] - q[2] * m[1]) -
        p[1] * (q[0] * m[2] - q[2] * m[0]) +
        p[2] * (q[0] * m[1] - q[1] * m[0]);
      expect(Math.abs(volume)).toBeLessThan(1e-9);
    }
  });

  test('neighbours 180° apart are refused with the angle named', () => {
    expect(() => edgesBetween({ azimuth: 0, elevation: 5 }, { azimuth: 180, elevation: 5 }, true)).toThrow(
      'under 180° apart, got 180',
    );
  });
});

describe('shapes', () => {
  test('a skyline blocks down to the horizon and ends upright', () => {
    const profile = horizonProfile([obstruction([trace('skyline', points([100.25, 10], [140.25, 30]))])]);
    expect(intervalsAt(profile, 100.2)).toEqual([]);
    expect(intervalsAt(profile, 120.25)[0][0]).toBe(0);
    expect(intervalsAt(profile, 120.25)[0][1]).toBeCloseTo(20, 0);
    expect(intervalsAt(profile, 140.3)).toEqual([]);
  });

  test('an outline leaves the sky under and over it open', () => {
    const crown = trace('outline', points([170, 20], [170, 40], [190, 40], [190, 20]));
    const profile = horizonProfile([obstruction([crown])]);
    expect(intervalsAt(profile, 180)).toEqual([[20, 40]]);
    // area of a rectangle in azimuth and elevation: width times the difference of sines
    const sine = (degrees: number) => Math.sin((degrees * Math.PI) / 180);
    expect(blockedSolidAngle(profile)).toBeCloseTo(((20 * Math.PI) / 180) * (sine(40) - sine(20)), 9);
  });

  test('an outline with a bay has two intervals where the bay is', () => {
    const horseshoe = trace(
      'outline',
      points([170, 10], [190, 10], [190, 15], [175, 15], [175, 25], [190, 25], [190, 30], [170, 30]),
    );
    expect(intervalsAt(horizonProfile([obstruction([horseshoe])]), 185)).toEqual([
      [10, 15],
      [25, 30],
    ]);
  });

  test('an outline around the zenith blocks up to it', () => {
    const roof = trace('outline', points([0, 60], [90, 60], [180, 60], [270, 60]), { straight: false });
    const profile = horizonProfile([obstruction([roof])]);
    expect(intervalsAt(profile, 33)).toEqual([[60, 90]]);
    // a cap of half-angle 30°: 2 pi (1 - cos 30°)
    expect(blockedSolidAngle(profile)).toBeCloseTo(2 * Math.PI * (1 - Math.cos(Math.PI / 6)), 9);
  });

  test.each([
    ['an upright mast', points([200.3, 5], [200.3, 35]), 30],
    ['a level wire', points([160, 25], [200, 25]), 0],
    ['a slanting wire', points([100, 10], [130, 50]), 0],
  ])('%s covers its length times its width', (_, at, length) => {
    const width = 0.5;
    const profile = horizonProfile([
      obstruction([trace('line', at, { straight: true, angularWidth: width })]),
    ]);
    const radians = Math.PI / 180;
    const [p, q] = at;
    const reach =
      length ||
      Math.acos(
        Math.sin(p.elevation * radians) * Math.sin(q.elevation * radians) +
          Math.cos(p.elevation * radians) *
            Math.cos(q.elevation * radians) *
            Math.cos((q.azimuth - p.azimuth) * radians),
      ) / radians;
    const area = blockedSolidAngle(profile);
    expect(area / (reach * radians * width * radians)).toBeCloseTo(1, 2);
  });
});

/** Slices are cut at the points of a trace, so one more point moves the sum of a steep edge by a little. */
const cutting = (view: number) => 2e-4 * Math.max(0.05, view);

describe('properties', () => {
  const elevation = fc.double({ min: 0, max: 80, noNaN: true });
  const skyline = fc
    .tuple(
      fc.integer({ min: 0, max: 359 }),
      fc.array(fc.tuple(fc.double({ min: 0.1, max: 40, noNaN: true }), elevation), {
        minLength: 2,
        maxLength: 7,
      }),
      fc.boolean(),
    )
    .map(([start, steps, straight]): SettledTrace => {
      let azimuth = start;
      return trace(
        'skyline',
        steps.map(([turn, height]) => ({ azimuth: (azimuth += turn) % 360, elevation: height })),
        { straight },
      );
    });
  const view = (traced: TracedObstruction[], tilt = 30, azimuth = 180) =>
    blockedView(blockedSpans(horizonProfile(traced)), planeFacing(tilt, azimuth));

  property.prop([skyline])('tracing an obstruction twice changes nothing', (once) => {
    expect(view([obstruction([once, once], months(0.3))])).toEqual(view([obstruction([once], months(0.3))]));
  });

  property.prop([skyline, fc.double({ min: 0.01, max: 0.99, noNaN: true })])(
    'a point on an edge changes nothing',
    (whole, share) => {
      const [first, second] = whole.points;
      const [edge, ...rest] = edgesBetween(first, second, whole.straight);
      fc.pre(rest.length === 0);
      const azimuth = edge.from + share * (edge.to - edge.from);
      const added = { azimuth, elevation: edgeElevation(edge, azimuth) };
      const split = { ...whole, points: [first, added, ...whole.points.slice(1)] };
      const [before, after] = [view([obstruction([whole])]), view([obstruction([split])])];
      expect(Math.abs(before[0] - after[0])).toBeLessThan(cutting(before[0]));
    },
  );

  property.prop([skyline, fc.nat(), fc.double({ min: 0, max: 9, noNaN: true })])(
    'raising a point never opens the sky',
    (low, which, by) => {
      const at = which % low.points.length;
      const high = {
        ...low,
        points: low.points.map((p, i) => (i === at ? { ...p, elevation: p.elevation + by } : p)),
      };
      const before = view([obstruction([low])])[0];
      expect(view([obstruction([high])])[0]).toBeGreaterThanOrEqual(before - cutting(before));
    },
  );

  property.prop([skyline])('transmittance 1 is as good as nothing there', (any) => {
    expect(Array.from(view([obstruction([any], months(1))]))).toEqual(Array<number>(12).fill(0));
  });

  property.prop([skyline, skyline])(
    'one behind another: transmittances multiply, and the order does not matter',
    (one, other) => {
      const a = obstruction([one], months(0.5), 'a');
      const b = obstruction([other], months(0.2), 'b');
      const [ab, ba] = [view([a, b])[0], view([b, a])[0]];
      expect(ab).toBeCloseTo(ba, 9);
      const together = view([obstruction([one, other], months(0))])[0];
      expect(ab).toBeLessThanOrEqual(together + cutting(together));
      const single = Math.max(view([a])[0], view([b])[0]);
      expect(ab).toBeGreaterThanOrEqual(single - cutting(single));
    },
  );

  test('two rings multiply exactly', () => {
    const both = view(
      [obstruction([ring(30)], months(0.5), 'a'), obstruction([ring(30)], months(0.2), 'b')],
      0,
    );
    expect(both[0] / Math.PI).toBeCloseTo(0.9 * Math.sin(Math.PI / 6) ** 2, 9);
  });
});
