import { describe, expect, it } from 'vitest';
import { lightAfterDark } from '../../../src/core/irradiance/light-after-dark.ts';
import { parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { weatherDoubts } from '../../../src/core/irradiance/weather-doubts.ts';
import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import { TRACK_YEAR } from '../../../src/core/solar-position/sun-track.ts';
import { weatherText } from '../../reference-values/weather-text.ts';
import { EPW } from './bent-weather.ts';
import { WEATHER_FILES, weatherFile } from './weather-files.ts';

describe('lightAfterDark', () => {
  // the sun's place itself, once a minute, is checked against published positions elsewhere
  it.each([
    ['Tucson', 32.1, -110.9, -420],
    ['beyond the polar circle', 71.3, -156.8, -540],
    ['the far south', -54.8, -68.3, -180],
    ['the equator, its clock hours off', 0, 80, 600],
  ])(
    '%s: counts the hours in which the sun stays down, and no twilight hour',
    (_n, latitude, longitude, utcOffset) => {
      const place = { latitude, longitude, utcOffset };
      for (const day of [0, 79, 120, 171, 265, 300, 354])
        for (let hour = 0; hour < 24; hour++) {
          const only = new Float32Array(8760);
          only[day * 24 + hour] = 100;
          const startMs = Date.UTC(TRACK_YEAR, 0, 1 + day, hour) - utcOffset * 60_000;
          let highest = -90;
          for (let minute = 0; minute <= 60; minute++)
            highest = Math.max(
              highest,
              solarPosition(startMs + minute * 60_000, latitude, longitude).geometricElevation,
            );
          if (highest > -50 / 60) expect(lightAfterDark(only, place)).toBe(0);
          if (highest < -50 / 60 - 0.5) expect(lightAfterDark(only, place)).toBe(1);
        }
    },
  );

  it('is 0 where there is no light at all', () => {
    const place = { latitude: 40, longitude: 0, utcOffset: 0 };
    expect(lightAfterDark(new Float32Array(8760), place)).toBe(0);
  });
});

describe('a weather file is doubted', () => {
  it.each(WEATHER_FILES)('not where it is a real one: $name', ({ name }) => {
    const file = weatherFile(name);
    expect(lightAfterDark(file.ghi, file)).toBeLessThan(0.002);
    expect(weatherDoubts(file.ghi, file)).toEqual([]);
  });

  const [header] = weatherText(EPW).split('\n', 1);
  const withHeader = (from: string, to: string) => {
    expect(header).toContain(from);
    const parsed = parseWeatherFile(weatherText(EPW).replace(header, header.replace(from, to)), EPW);
    if (!parsed.ok) throw new Error(parsed.problems[0].message);
    return parsed;
  };

  it.each([
    ['its zone has lost the sign', ',-7.0,', ',7.0,'],
    ['its zone is of another place', ',-7.0,', ',0.0,'],
    ['its longitude has lost the sign', ',-110', ',110'],
  ])('where %s', (_what, from, to) => {
    const { value, warnings } = withHeader(from, to);
    expect(warnings).toEqual([
      {
        path: 'file',
        message: expect.stringMatching(
          /^has \d+ % .*the zone or the coordinates in its header look wrong[.]$/,
        ) as string,
      },
    ]);
    expect(value.warnings).toEqual([`The file ${warnings[0].message}`]);
  });

  it('where its year is darker or brighter than any on land', () => {
    const file = weatherFile(EPW);
    const annual = file.ghi.reduce((sum, value) => sum + value, 0) / 1000;
    const scaled = (to: number) =>
      weatherDoubts(
        file.ghi.map((value) => (value * to) / annual),
        file,
      );
    expect([scaled(301), scaled(2899)]).toEqual([[], []]);
    expect(scaled(299)).toEqual([{ path: 'file', message: expect.stringMatching(/^has 299 kWh/) as string }]);
    expect(scaled(2901)).toEqual([
      { path: 'file', message: expect.stringMatching(/^has 2901 kWh/) as string },
    ]);
  });
});
