import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import { DEGREES, RADIANS } from '../../../src/core/angles/angles.ts';
import { refraction } from '../../../src/core/solar-position/refraction.ts';
import { solarPosition, sunDirection } from '../../../src/core/solar-position/solar-position.ts';
import { cell, publishedExample, readTable } from '../../reference-values/published-table.ts';

function skyVector(azimuth: number, elevation: number) {
  const [a, e] = [azimuth * RADIANS, elevation * RADIANS];
  return [Math.cos(e) * Math.sin(a), Math.cos(e) * Math.cos(a), Math.sin(e)];
}

/** Angle between two directions, degrees. */
function onTheSky(azimuth: number, elevation: number, otherAzimuth: number, otherElevation: number): number {
  const [a, b] = [skyVector(azimuth, elevation), skyVector(otherAzimuth, otherElevation)];
  return 2 * Math.asin(Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]) / 2) * DEGREES;
}

const median = (values: number[]) => [...values].sort((a, b) => a - b)[1];

describe('solarPosition against three ephemerides (solar_position_dense.csv)', () => {
  const rows = readTable('solar_position_dense.csv').map((row) => {
    const of = (column: string) => cell(row, column);
    const timeMs = Date.parse(row.utc);
    return {
      sun: solarPosition(timeMs, of('lat_deg'), of('lon_deg'), of('height_m')),
      elevation: median([of('astropy_alt_geom_deg'), of('spa_alt_geom_deg'), of('ephem_alt_geom_deg')]),
      azimuth: median([of('astropy_az_deg'), of('spa_az_deg'), of('ephem_az_deg')]),
      refracted: of('spa_alt_refracted_deg'),
      pressure: of('pressure_hPa'),
      temperature: of('temp_C'),
    };
  });

  it('reads every row', () => expect(rows).toHaveLength(2000));

  it('keeps the geometric position within 0.02° on the sky, 0.006° in the mean', () => {
    const off = rows.map(({ sun, azimuth, elevation }) =>
      onTheSky(sun.solarAzimuth, sun.geometricElevation, azimuth, elevation),
    );
    expect(Math.max(...off)).toBeLessThan(0.02);
    expect(off.reduce((a, b) => a + b, 0) / off.length).toBeLessThan(0.006);
  });

  it('keeps the apparent elevation within 0.02° above 5°', () => {
    const high = rows.filter(({ elevation }) => elevation > 5);
    expect(high.length).toBeGreaterThan(1000);
    for (const { sun, refracted } of high)
      expect(Math.abs(sun.apparentElevation - refracted)).toBeLessThan(0.02);
  });

  it('keeps it within 0.02° in the air of the table', () => {
    for (const { sun, elevation, refracted, pressure, temperature } of rows.filter(
      ({ elevation }) => elevation > 5,
    )) {
      // Meeus, eq. 16.4: refraction goes as 283 / (273 + temperature); ours is taken at 12 °C
      const bent = (refraction(sun.geometricElevation, pressure) * (273 + 12)) / (273 + temperature);
      expect(Math.abs(sun.geometricElevation + bent - refracted), `elevation ${elevation}`).toBeLessThan(
        0.02,
      );
    }
  });
});

describe('solarPosition against published values', () => {
  it('gives the worked example of the NREL SPA report, Table A4.1', () => {
    const { input, expected } = publishedExample('SPA_A4.1');
    const published = expected as Record<string, number>;
    const sun = solarPosition(Date.UTC(2003, 9, 17, 19, 30, 30), input.lat, input.lon, input.elevation_m);
    const off = onTheSky(sun.solarAzimuth, sun.geometricElevation, published.azimuth_deg, published.e0_deg);
    expect(off).toBeLessThan(0.02);
    expect(Math.abs(90 - sun.apparentElevation - published.zenith_deg)).toBeLessThan(0.02);
  });

  it("follows NOAA's spreadsheet through a day", () => {
    const rows = readTable('noaa_spreadsheet_day_2010-06-21_40N_105W.csv');
    expect(rows).toHaveLength(240);
    for (const row of rows) {
      const sun = solarPosition(Math.round((cell(row, 'Julian Day') - 2440587.5) * 86_400_000), 40, -105);
      const elevation = cell(row, 'Solar Elevation Angle (deg)');
      const azimuth = cell(row, 'Solar Azimuth Angle (deg cw from N)');
      expect(onTheSky(sun.solarAzimuth, sun.geometricElevation, azimuth, elevation)).toBeLessThan(0.02);
      if (elevation < 5) continue;
      const corrected = cell(row, 'Solar Elevation corrected for atm refraction (deg)');
      expect(Math.abs(sun.apparentElevation - corrected)).toBeLessThan(0.02);
    }
  });

  it('turns declination and hour angle into the altitudes and azimuths of the handbook table, 40° N (from memory)', () => {
    const rows = readTable('ashrae_40N_solar_angles.csv');
    expect(rows).toHaveLength(77);
    for (const row of rows) {
      const hourAngle = (cell(row, 'solar_hour') - 12) * 15 * RADIANS;
      const { east, north, up } = sunDirection(
        cell(row, 'declination_deg') * RADIANS,
        hourAngle,
        40 * RADIANS,
      );
      const fromSouth = Math.abs(Math.atan2(east, -north)) * DEGREES;
      // the table's rounding is 0.05; a value computed to 0.05001 rounds to it too
      expect(Math.abs(Math.asin(up) * DEGREES - cell(row, 'altitude_recalled'))).toBeLessThan(0.051);
      expect(Math.abs(fromSouth - cell(row, 'azimuth_from_south_recalled'))).toBeLessThan(0.051);
    }
  });

  it('gives the zenith and azimuth of Duffie and Beckman, example 1.6.2', () => {
    const { input, expected } = publishedExample('DB_1.6.2');
    const cases = input as unknown as { lat: number; delta: number; omega: number }[];
    const answers = expected as { zenith: number; solar_azimuth_from_south: number }[];
    cases.forEach(({ lat, delta, omega }, i) => {
      const { east, north, up } = sunDirection(delta * RADIANS, omega * RADIANS, lat * RADIANS);
      expect(Math.abs(Math.acos(up) * DEGREES - answers[i].zenith)).toBeLessThan(0.06);
      // the book counts westward of south; it prints the first with two figures
      expect(
        Math.abs(-Math.atan2(east, -north) * DEGREES - answers[i].solar_azimuth_from_south),
      ).toBeLessThan(0.1);
    });
  });
});

const angle = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true });
const anyTime = fc.integer({ min: Date.UTC(1950, 0, 1), max: Date.UTC(2099, 0, 1) });

describe('solarPosition anywhere', () => {
  test.prop([anyTime, angle(-90, 90), angle(-180, 180)])(
    'is finite and in its ranges',
    (timeMs, latitude, longitude) => {
      const sun = solarPosition(timeMs, latitude, longitude);
      expect(sun.solarAzimuth).toBeGreaterThanOrEqual(0);
      expect(sun.solarAzimuth).toBeLessThan(360);
      expect(Math.abs(sun.geometricElevation)).toBeLessThanOrEqual(90.01);
      expect(sun.apparentElevation).toBeGreaterThanOrEqual(sun.geometricElevation);
    },
  );

  test.prop([anyTime, angle(-90, 90)])('is the same at longitude 180 and -180', (timeMs, latitude) => {
    const [east, west] = [solarPosition(timeMs, latitude, 180), solarPosition(timeMs, latitude, -180)];
    const off = onTheSky(
      east.solarAzimuth,
      east.geometricElevation,
      west.solarAzimuth,
      west.geometricElevation,
    );
    expect(off).toBeLessThan(1e-6);
  });

  test.prop([anyTime, angle(-180, 180)])(
    'stands as high at one pole as it stands low at the other',
    (timeMs, longitude) => {
      const north = solarPosition(timeMs, 90, longitude).geometricElevation;
      const south = solarPosition(timeMs, -90, longitude).geometricElevation;
      expect(Math.abs(north + south)).toBeLessThan(0.01); // parallax lowers it at both
    },
  );

  it.each([
    [Number.NaN, 0, 0],
    [0, 90.001, 0],
    [0, Number.NaN, 0],
    [0, 0, Number.POSITIVE_INFINITY],
  ])('refuses time %d, latitude %d, longitude %d', (timeMs, latitude, longitude) => {
    expect(() => solarPosition(timeMs, latitude, longitude)).toThrow(RangeError);
  });
});

describe('sunDirection with declination held fixed', () => {
  type Path = [fc.Arbitrary<number>, fc.Arbitrary<number>, fc.Arbitrary<number>];
  const path: Path = [angle(-0.41, 0.41), angle(-Math.PI, Math.PI), angle(-Math.PI / 2, Math.PI / 2)];

  test.prop(path)('mirrors the day at the meridian', (declination, hourAngle, latitude) => {
    const morning = sunDirection(declination, -hourAngle, latitude);
    const evening = sunDirection(declination, hourAngle, latitude);
    expect(morning.east).toBeCloseTo(-evening.east, 12);
    expect(morning.north).toBeCloseTo(evening.north, 12);
    expect(morning.up).toBeCloseTo(evening.up, 12);
  });

  test.prop(path)('mirrors north and south between the hemispheres', (declination, hourAngle, latitude) => {
    const here = sunDirection(declination, hourAngle, latitude);
    const there = sunDirection(-declination, hourAngle, -latitude);
    expect(there.east).toBeCloseTo(here.east, 12);
    expect(there.north).toBeCloseTo(-here.north, 12);
    expect(there.up).toBeCloseTo(here.up, 12);
  });

  test.prop(path)('is a unit vector', (declination, hourAngle, latitude) => {
    const { east, north, up } = sunDirection(declination, hourAngle, latitude);
    expect(Math.hypot(east, north, up)).toBeCloseTo(1, 12);
  });
});
