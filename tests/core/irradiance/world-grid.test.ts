import { readFileSync } from 'node:fs';
import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { monthlyExtraterrestrial } from '../../../src/core/irradiance/extraterrestrial.ts';
import { decodeWorldGrid, gridAt } from '../../../src/core/irradiance/world-grid.ts';
import type { Months } from '../../../src/core/survey/survey.ts';
import { worldBytes, worldGrid } from './world-bytes.ts';

interface Point extends Record<'kt' | 'kd' | 't2m' | 'h0' | 'ghi', Months> {
  name: string;
  lat: number;
  lon: number;
}
const points = JSON.parse(
  readFileSync(new URL('../../reference-values/world_climate_points.json', import.meta.url), 'utf8'),
) as Point[];

const within = (values: Months, wanted: Months, by: number) => {
  expect(wanted).toHaveLength(12);
  values.forEach((value, month) => expect(Math.abs(value - wanted[month])).toBeLessThan(by));
};

describe('gridAt', () => {
  it('has nine published points to check', () => expect(points).toHaveLength(9));

  it.each(points)('gives the grid maker’s own values at $name', ({ lat, lon, kt, kd, t2m, h0, ghi }) => {
    const here = gridAt(worldGrid, lat, lon);
    within(here.kt, kt, 0.0001);
    within(here.kd, kd, 0.0001);
    within(here.t2m, t2m, 0.006);
    const extraterrestrial = monthlyExtraterrestrial(lat);
    within(extraterrestrial, h0, 0.001);
    within(here.kt.map((share, month) => share * extraterrestrial[month]) as Months, ghi, 0.002);
  });

  const latitude = fc.double({ min: -90, max: 90, noNaN: true });

  test.prop([latitude, fc.double({ min: -180, max: 180, noNaN: true })])('wraps in longitude', (lat, lon) => {
    const here = gridAt(worldGrid, lat, lon);
    within(gridAt(worldGrid, lat, lon > 0 ? lon - 360 : lon + 360).kt, here.kt, 1e-9);
  });

  test.prop([latitude, fc.double({ min: -180, max: 180, noNaN: true })])('has no steps', (lat, lon) => {
    const [a, b] = [
      gridAt(worldGrid, lat, lon),
      gridAt(worldGrid, lat < 0 ? lat + 1e-6 : lat - 1e-6, lon + 1e-6),
    ];
    within(a.kt, b.kt, 1e-5);
    within(a.kd, b.kd, 1e-5);
  });

  it('holds the values of the last row on to the poles', () => {
    expect(gridAt(worldGrid, 90, 10)).toEqual(gridAt(worldGrid, 89, 10));
    expect(gridAt(worldGrid, -90, 10)).toEqual(gridAt(worldGrid, -89, 10));
  });

  it('refuses places that are none', () => {
    expect(() => gridAt(worldGrid, 90.1, 0)).toThrow(/latitude.*90.1/);
    expect(() => gridAt(worldGrid, 0, Number.NaN)).toThrow(/longitude.*NaN/);
  });
});

describe('decodeWorldGrid', () => {
  it('refuses bytes cut short or of something else', () => {
    for (const length of [0, 3, 8, 200, 599, 600, 583_798])
      expect(decodeWorldGrid(worldBytes.slice(0, length)).ok).toBe(false);
    expect(decodeWorldGrid(new TextEncoder().encode('CLG1{"planes":[]}').buffer).ok).toBe(false);
  });

  test.prop([fc.nat(590), fc.nat(255)])('never throws with a byte of the header changed', (at, value) => {
    const bytes = worldBytes.slice(0);
    new Uint8Array(bytes)[at] = value;
    const decoded = decodeWorldGrid(bytes);
    if (!decoded.ok) expect(decoded.problems[0].message).toMatch(/climate grid/);
  });
});
