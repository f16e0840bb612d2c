import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { skyViewFactor } from '../../../src/core/horizon/blocked-view.ts';
import { months, obstruction, points, ring, trace } from './made-up-traces.ts';

/** view_factors_analytic.json: closed forms derived for the table; see its provenance. */
const { rows } = JSON.parse(
  readFileSync(new URL('../../reference-values/view_factors_analytic.json', import.meta.url), 'utf8'),
) as { rows: { case: string; analytic: number }[] };

const wall = (from: number, to: number) =>
  obstruction([trace('skyline', points([from, 90], [(from + to) / 2, 90], [to, 90]))]);

/** The horizon, tilt and azimuth that a row names. */
function settingOf(name: string): {
  profile: ReturnType<typeof horizonProfile>;
  tilt: number;
  azimuth: number;
} {
  const numbers = (name.match(/\d+(\.\d+)?/g) ?? []).map(Number);
  const make = (traced: Parameters<typeof horizonProfile>[0], tilt: number, azimuth: number) => ({
    profile: horizonProfile(traced),
    tilt,
    azimuth,
  });
  if (name.includes('transmittance'))
    return make([obstruction([ring(numbers[0])], months(numbers[1]))], 0, 0);
  if (name.startsWith('ring') && name.includes('horizontal'))
    return make([obstruction([ring(numbers[0])])], 0, 0);
  if (name.startsWith('ring')) return make([obstruction([ring(numbers[0])])], numbers[1], 180);
  if (name.startsWith('flat')) return make([], numbers[0], numbers[1]);
  if (name.includes('behind')) return make([wall(90, 270)], numbers.at(-1)!, 0);
  return make([wall(90, 270)], numbers.at(-1)!, 180); // in front
}

test('all fifty closed forms are there', () => expect(rows.length).toBe(50));

describe('sky-view factor against closed forms', () => {
  test.each(rows)('$case', ({ case: name, analytic }) => {
    const { profile, tilt, azimuth } = settingOf(name);
    // half-degree columns follow the plane's own horizon to about a millionth
    for (const factor of skyViewFactor(profile, tilt, azimuth))
      expect(Math.abs(factor - analytic)).toBeLessThan(2e-6);
  });
});
