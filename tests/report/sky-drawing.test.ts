import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { solarPosition } from '../../src/core/solar-position/solar-position.ts';
import { contourLines } from '../../src/report/pictures/contours.ts';
import { halftone } from '../../src/report/pictures/halftone.ts';
import type { SkyFrame } from '../../src/report/pictures/sky-frame.ts';
import { directionAt, linesOf, xOf, yOf } from '../../src/report/pictures/sky-frame.ts';
import { contourLevels, densityAt, smoothDensity } from '../../src/report/pictures/smooth-density.ts';
import { dayLines, hourLines } from '../../src/report/pictures/sun-lines.ts';

const frame: SkyFrame = { centre: 180, span: 360, top: 90, left: 0, right: 720, above: 0, below: 180 };

/** A cone of energy around a direction, falling to nothing at 40°. */
function cone(azimuth: number, elevation: number) {
  const irradiation = new Float32Array(360 * 90);
  for (let row = 0; row < 90; row++)
    for (let column = 0; column < 360; column++) {
      const turn = ((column + 0.5 - azimuth + 540) % 360) - 180;
      irradiation[row * 360 + column] = Math.max(0, 40 - Math.hypot(turn, row + 0.5 - elevation)) / 100;
    }
  return smoothDensity({ cell: 1, columns: 360, rows: 90, irradiation });
}

describe('the frame', () => {
  test.prop([fc.double({ min: 0, max: 359.99, noNaN: true }), fc.double({ min: 0, max: 90, noNaN: true })])(
    'gives back the direction of a place',
    (azimuth, elevation) => {
      const at = directionAt(frame, xOf(frame, azimuth), yOf(frame, elevation));
      expect(Math.cos(((at.azimuth - azimuth) * Math.PI) / 180)).toBeCloseTo(1, 9);
      expect(at.elevation).toBeCloseTo(elevation, 9);
    },
  );

  it('cuts a path at the far side of the circle, both ends at the edge', () => {
    const lines = linesOf(frame, [
      { azimuth: 350, elevation: 10 },
      { azimuth: 20, elevation: 10 },
    ]);
    expect(lines).toHaveLength(2);
    expect(Math.max(...lines[0].filter((_, i) => i % 2 === 0))).toBeGreaterThanOrEqual(frame.right);
    expect(Math.min(...lines[1].filter((_, i) => i % 2 === 0))).toBeLessThanOrEqual(frame.left);
  });
});

describe('contours', () => {
  it.each([180, 0])('of a cone at azimuth %i are circles of the cone’s width', (azimuth) => {
    const lines = contourLines(cone(azimuth, 45), 20);
    expect(lines).toHaveLength(1);
    for (const point of lines[0]) {
      const turn = ((point.azimuth - azimuth + 540) % 360) - 180;
      expect(Math.hypot(turn, point.elevation - 45)).toBeCloseTo(20, 0);
    }
    expect(lines[0][0]).toEqual(lines[0][lines[0].length - 1]);
  });

  test.prop([fc.double({ min: 1e-3, max: 1e4, noNaN: true })])(
    'are two to four round numbers below the highest',
    (highest) => {
      const levels = contourLevels(highest);
      expect(levels.length).toBeGreaterThanOrEqual(1);
      expect(levels.length).toBeLessThanOrEqual(4);
      for (const level of levels) expect(level).toBeLessThan(highest);
    },
  );

  it('are none where there is no light', () => expect(contourLevels(0)).toEqual([]));
});

describe('printer’s dots', () => {
  it('ink the paper in proportion to the energy', () => {
    const density = cone(180, 45);
    const inkNear = (azimuth: number, elevation: number) => {
      let ink = 0;
      for (const { at, radius } of halftone(frame, density, 2))
        for (let i = 0; i < at.length; i += 2) {
          const place = directionAt(frame, at[i], at[i + 1]);
          if (Math.abs(place.azimuth - azimuth) < 5 && Math.abs(place.elevation - elevation) < 5)
            ink += radius ** 2;
        }
      return ink;
    };
    const ratio = inkNear(200, 45) / inkNear(190, 45);
    expect(ratio).toBeCloseTo(densityAt(density, 200, 45) / densityAt(density, 190, 45), 1);
  });
});

describe('the sun’s lines', () => {
  const site = (latitude: number, longitude = 15) => ({ latitude, longitude, timeZone: 'Europe/Berlin' });
  const highest = (latitude: number, label: string) =>
    Math.max(
      ...dayLines(site(latitude))
        .find((line) => line.label === label)!
        .path.flatMap((part) => part.map((p) => p.elevation)),
    );

  // The obliquity of the ecliptic, 23.44°, is the sun's declination at the solstices (Astronomical Almanac).
  it.each([
    [50, 'Jun', 90 - 50 + 23.44],
    [50, 'Dec', 90 - 50 - 23.44],
    [-35, 'Jun', 90 - 35 - 23.44],
    [5, 'Jun', 90 - (23.44 - 5)],
    [70, 'Jun', 90 - 70 + 23.44],
  ])('reach the noon of a solstice at latitude %i in %s', (latitude, label, noon) => {
    expect(highest(latitude, label)).toBeCloseTo(noon, 0);
  });

  it('go all around beyond the polar circle in June, and are none in December', () => {
    const lines = dayLines(site(72));
    const june = lines.find(({ label }) => label === 'Jun')!.path;
    expect(june).toHaveLength(1);
    expect(new Set(june[0].map(({ azimuth }) => Math.floor(azimuth / 45))).size).toBe(8);
    expect(lines.find(({ label }) => label === 'Dec')!.path).toEqual([]);
  });

  it('end on the horizon and stay above it', () => {
    for (const { path } of [...dayLines(site(48)), ...hourLines(site(48))])
      for (const part of path) for (const { elevation } of part) expect(elevation).toBeGreaterThanOrEqual(0);
  });

  it('leave no gap wider than a few degrees of azimuth below the zenith', () => {
    for (const { path } of dayLines(site(23.3)))
      for (const part of path)
        for (let i = 1; i < part.length; i++) {
          const turn = Math.abs(((part[i].azimuth - part[i - 1].azimuth + 540) % 360) - 180);
          const wide = Math.cos((part[i].elevation * Math.PI) / 180) * turn;
          expect(wide).toBeLessThan(4);
        }
  });

  it('stand at whole hours of standard time, in summer too', () => {
    const noon = hourLines(site(48)).find(({ hour }) => hour === 12)!.path[0];
    const sun = solarPosition(Date.UTC(2025, 0, 1, 11), 48, 15);
    expect(noon[0].azimuth).toBeCloseTo(sun.solarAzimuth, 6);
    expect(noon[0].elevation).toBeCloseTo(sun.apparentElevation, 6);
  });
});
