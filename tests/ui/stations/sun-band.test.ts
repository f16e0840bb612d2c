import { describe, expect, it } from 'vitest';
import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import { COLUMN, sunBand } from '../../../src/ui/screens/stations/strip/sun-band.ts';

const START = Date.UTC(2026, 0, 1);
const HOUR = 3_600_000;

describe('the band of the sun', () => {
  it.each([51, 12, 0, -34, 68])('holds the sun at every hour of a year at latitude %d', (latitude) => {
    const band = new Map(sunBand(latitude, 0, 180).map((column) => [column.azimuth, column]));
    for (let hour = 0; hour < 8760; hour += 5) {
      const sun = solarPosition(START + hour * HOUR, latitude, 10);
      if (sun.geometricElevation < 1 || sun.geometricElevation > 86) continue;
      const column = band.get(Math.floor(sun.solarAzimuth / COLUMN) * COLUMN);
      // a column is drawn by the elevations in its middle, where the band may be some degrees higher or lower
      const slack = 3;
      expect(column, `${latitude} ${hour}`).toBeDefined();
      expect(sun.geometricElevation).toBeGreaterThan(column!.low - slack);
      expect(sun.geometricElevation).toBeLessThan(column!.high + slack);
    }
  });

  it('leaves out what lies behind the plane', () => {
    const wall = sunBand(51, 90, 180);
    expect(wall.every(({ azimuth }) => azimuth >= 90 - COLUMN && azimuth <= 270)).toBe(true);
    expect(wall.length).toBeLessThan(sunBand(51, 0, 180).length);
  });
});
