import { describe, expect, test } from 'vitest';
import { blockedSpans } from '../../../src/core/horizon/blocked-spans.ts';
import { blockedView } from '../../../src/core/horizon/blocked-view.ts';
import type { HorizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { planeFacing } from '../../../src/core/horizon/sky-view.ts';
import { changedProfile } from '../../../src/core/shading/what-if.ts';
import { months, obstruction, points, trace } from '../horizon/made-up-traces.ts';

const tree = obstruction([trace('skyline', points([150, 10], [180, 45], [210, 10]))], months(0.2), 'tree');
const wall = obstruction([trace('skyline', points([90, 20], [140, 20]))], months(0), 'wall');
const profile = horizonProfile([tree, wall]);

const taken = (changed: HorizonProfile) => blockedView(blockedSpans(changed), planeFacing(30, 180))[0];
const highest = (changed: HorizonProfile, index: number) =>
  Math.max(...changed.high.filter((_, k) => changed.intervalObstruction[k] === index));

describe('an imagined change', () => {
  test('gone is as if never traced', () => {
    const gone = changedProfile(profile, [{ obstruction: 'tree', kind: 'gone' }]);
    expect(taken(gone)).toBeCloseTo(taken(horizonProfile([wall])), 12);
  });

  test('cut to a height keeps what is below: 10 m away and 10 m high stands at 45°', () => {
    const change = { obstruction: 'tree', kind: 'cut-to-height', distance: 10 } as const;
    expect(taken(changedProfile(profile, [{ ...change, height: 10 }]))).toBe(taken(profile));
    const cut = changedProfile(profile, [{ ...change, height: 10 * Math.tan(Math.PI / 9) }]);
    expect(highest(cut, 0)).toBeCloseTo(20, 9);
    expect(highest(cut, 1)).toBe(highest(profile, 1));
    expect(taken(changedProfile(profile, [{ ...change, height: 0 }]))).toBeCloseTo(
      taken(horizonProfile([wall])),
      12,
    );
  });

  test('grown by its height over the instrument doubles the tangent', () => {
    const top = highest(profile, 0);
    const height = 10 * Math.tan((top * Math.PI) / 180);
    const grown = changedProfile(profile, [{ obstruction: 'tree', kind: 'grown', by: height, distance: 10 }]);
    expect(Math.tan((highest(grown, 0) * Math.PI) / 180)).toBeCloseTo(2 * Math.tan((top * Math.PI) / 180), 9);
    expect(taken(grown)).toBeGreaterThan(taken(profile));
  });

  test('bare lets more through, in proportion', () => {
    const alone = horizonProfile([tree]);
    const bare = changedProfile(alone, [
      { obstruction: 'tree', kind: 'transmittance', transmittance: months(0.6) },
    ]);
    expect(taken(bare) / taken(alone)).toBeCloseTo(0.4 / 0.8, 9);
  });

  test('several follow each other, and the measured profile stays as it was', () => {
    const before = Array.from(profile.high);
    changedProfile(profile, [
      { obstruction: 'tree', kind: 'gone' },
      { obstruction: 'wall', kind: 'grown', by: 3, distance: 12 },
    ]);
    expect(Array.from(profile.high)).toEqual(before);
  });

  test('impossible changes are refused by name', () => {
    expect(() => changedProfile(profile, [{ obstruction: 'hedge', kind: 'gone' }])).toThrow(
      'obstruction hedge is not',
    );
    expect(() =>
      changedProfile(profile, [{ obstruction: 'tree', kind: 'cut-to-height', height: 1, distance: 0 }]),
    ).toThrow('distance must be above 0 m, got 0');
    expect(() =>
      changedProfile(profile, [{ obstruction: 'tree', kind: 'grown', by: -1, distance: 5 }]),
    ).toThrow('growth must be 0 m or more, got -1');
  });
});
