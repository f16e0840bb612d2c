import { describe, expect, test } from 'vitest';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { skyMap } from '../../../src/core/shading/sky-map.ts';
import { annualLight } from '../../../src/core/uncertainty/annual-light.ts';
import { UNSEEN } from '../../../src/core/uncertainty/planning-values.ts';
import { randomSource } from '../../../src/core/uncertainty/random-source.ts';
import { takeUnseen, unseenPatches } from '../../../src/core/uncertainty/unseen-sky.ts';
import { obstruction, points, trace } from '../horizon/made-up-traces.ts';
import { sampleSurvey } from '../survey/sample-surveys.ts';
import { lightOf } from './drawn-scenes.ts';

const { year, grid } = lightOf(sampleSurvey());
const light = annualLight(skyMap(year, grid, 34, 172), Array<string>(12).fill(''));
const nothing = horizonProfile([]);
const hills = (...spans: [number, number][]) =>
  horizonProfile([obstruction(spans.map(([from, to]) => trace('skyline', points([from, 20], [to, 20]))))]);

describe('patches that nobody looked at', () => {
  test('are cut to no more than their width and lie only where nothing was observed', () => {
    expect(unseenPatches(light, [[0, 360]], nothing)).toHaveLength(0);
    expect(unseenPatches(light, [], nothing)).toHaveLength(360 / UNSEEN.patch);
    expect(unseenPatches(light, [[200, 150]], nothing)).toHaveLength(3);
    expect(unseenPatches(light, [[10, 350]], nothing)).toHaveLength(1); // over north, in one piece
  });

  test('know what was traced beside them', () => {
    const [alone] = unseenPatches(light, [[190, 180]], nothing);
    const [ended] = unseenPatches(light, [[190, 180]], hills([150, 180]));
    const [between] = unseenPatches(light, [[190, 180]], hills([150, 180], [190, 220]));
    expect(alone.beside).toEqual({ height: 0, goesOn: false });
    expect(ended.beside).toEqual({ height: 20, goesOn: false });
    expect(between.beside).toEqual({ height: 20, goesOn: true });
  });

  test('take less light the less they are in the sun’s way, and never more than they bring', () => {
    const mean = (range: [number, number], profile = nothing) => {
      const patches = unseenPatches(light, [range], profile);
      const random = randomSource('mean');
      let sum = 0;
      for (let draw = 0; draw < 2000; draw++) {
        const taken = { direct: 0, even: 0 };
        takeUnseen(patches, random, taken);
        expect(taken.direct + taken.even).toBeLessThan(light.direct + light.even);
        sum += (taken.direct + taken.even) / 2000;
      }
      return sum;
    };
    expect(mean([200, 180])).toBeGreaterThan(2 * mean([20, 0]));
    expect(mean([190, 180], hills([150, 180]))).toBeGreaterThan(mean([190, 180]));
    expect(mean([190, 180], hills([150, 180], [190, 220]))).toBeGreaterThan(
      mean([190, 180], hills([150, 180])),
    );
  });

  test('are open in the stated share of draws', () => {
    const patches = unseenPatches(light, [[190, 180]], nothing);
    const random = randomSource('open');
    let open = 0;
    for (let draw = 0; draw < 5000; draw++) {
      const taken = { direct: 0, even: 0 };
      takeUnseen(patches, random, taken);
      if (taken.even === 0) open++;
    }
    // A height under half a node counts as open too.
    const expected = UNSEEN.open + (1 - UNSEEN.open) * (1 - Math.exp(-0.125 / UNSEEN.height));
    expect(Math.abs(open / 5000 - expected)).toBeLessThan(5 * Math.sqrt(0.25 / 5000));
  });
});
