import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { worldClimate } from '../../../src/core/irradiance/world-climate.ts';
import type { UnseenRange } from '../../../src/core/shading/assessment.ts';
import { observedLight } from '../../../src/core/shading/coverage.ts';
import { siteLight } from '../../../src/core/shading/site-light.ts';
import type { SkyMap } from '../../../src/core/shading/sky-map.ts';
import { skyMap } from '../../../src/core/shading/sky-map.ts';
import { worldGrid } from '../irradiance/world-bytes.ts';

/** Planes at four places: towards the equator, aside, in the south, and steep near the tropics. */
const maps = (
  [
    [44, 30, 180],
    [52, 45, 230],
    [-33, 20, 10],
    [5, 80, 90],
  ] as const
).map(([latitude, tilt, azimuth]) => {
  const site = { latitude, longitude: 0, timeZone: 'UTC' };
  const { year, grid } = siteLight(site, worldClimate(worldGrid, site), {
    stepMinutes: 15,
    transposition: 'perez',
  });
  return skyMap(year, grid, tilt, azimuth);
});
const [south, , southern] = maps;

const width = ({ from, to }: UnseenRange) => (to - from + 360) % 360 || 360;
const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);

const azimuth = fc.double({ min: 0, max: 360, noNaN: true });
const someRanges = fc.array(fc.tuple(azimuth, azimuth), { maxLength: 6 });

describe('the light nobody looked at', () => {
  test.prop([fc.constantFrom(...maps), someRanges])('is with the coverage the whole', (map, observed) => {
    const { coverage, unseen } = observedLight(map, observed);
    expect(sum(unseen.map(({ share }) => share))).toBeCloseTo(1 - coverage, 9);
    for (const { from, to, share } of unseen) {
      expect(share).toBeGreaterThanOrEqual(0);
      expect(Math.min(from, to)).toBeGreaterThanOrEqual(0);
      expect(from).toBeLessThan(360);
      expect(to).toBeLessThanOrEqual(360);
    }
  });

  test.prop([fc.constantFrom(...maps), someRanges])(
    'is, of each range, what a look there covers',
    (map, observed) => {
      const { coverage, unseen } = observedLight(map, observed);
      for (const { from, to, share } of unseen)
        expect(observedLight(map, [...observed, [from, to]]).coverage).toBeCloseTo(coverage + share, 9);
    },
  );

  it('is told in the very ranges left out', () => {
    const { unseen } = observedLight(south, [
      [20, 150.3],
      [219.9, 340],
    ]);
    expect(unseen.map(({ from, to, inSunBand }) => [from, to, inSunBand])).toEqual([
      [150.3, 219.9, true],
      [340, 20, false],
    ]);
  });

  it('is cut where the sun’s band ends: on a flat plane at midsummer’s rising and setting', () => {
    const { unseen } = observedLight(flat(south), []);
    // cos A = sin 23.44° / cos 44° at the horizontal; refraction and the sun's disc move it by less than a degree
    const rising =
      (Math.acos(Math.sin((23.44 * Math.PI) / 180) / Math.cos((44 * Math.PI) / 180)) * 180) / Math.PI;
    expect(unseen.map(({ inSunBand }) => inSunBand)).toEqual([true, false]);
    const [band, rest] = unseen;
    expect(Math.abs(band.from - rising)).toBeLessThan(1.5);
    expect(Math.abs(band.to - (360 - rising))).toBeLessThan(1.5);
    expect([rest.from, rest.to]).toEqual([band.to, band.from]);
  });

  it('over north is one range where the sun stands in the north', () => {
    const { unseen } = observedLight(southern, []);
    expect(unseen).toHaveLength(2);
    const band = unseen.find(({ inSunBand }) => inSunBand)!;
    expect(band.from).toBeGreaterThan(band.to);
    expect(sum(unseen.map(width))).toBeCloseTo(360, 9);
    expect(observedLight(southern, [[20, 340]]).unseen).toMatchObject([
      { from: 340, to: 20, inSunBand: true },
    ]);
  });

  it('is nothing where all was seen, and nothing behind a wall', () => {
    expect(observedLight(south, [[0, 360]])).toMatchObject({ unseen: [] });
    const wall = skyMap(south.year, south.grid, 90, 180);
    const { coverage, unseen } = observedLight(wall, [[89, 271]]);
    // a step's light is laid along its whole way, also where the sun goes behind the wall in the course of it
    expect(coverage).toBeCloseTo(1, 6);
    expect(unseen).toMatchObject([{ from: 271, to: 89, inSunBand: false }]);
    expect(unseen[0].share).toBeCloseTo(0, 6);
  });
});

const flat = ({ year, grid }: SkyMap) => skyMap(year, grid, 0, 180);
