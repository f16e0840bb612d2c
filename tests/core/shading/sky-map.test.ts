import { describe, expect, test } from 'vitest';
import { blockedSpans } from '../../../src/core/horizon/blocked-spans.ts';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { weatherFileClimate } from '../../../src/core/irradiance/weather-file-climate.ts';
import { parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { DEFAULT_STEP_MINUTES } from '../../../src/core/shading/site-light.ts';
import { blockedLight, shadedMonths } from '../../../src/core/shading/blocked-light.ts';
import { skyGrid } from '../../../src/core/shading/sky-grid.ts';
import { skyMap, unshadedMonths } from '../../../src/core/shading/sky-map.ts';
import { skyYear } from '../../../src/core/shading/sky-year.ts';
import { sunPaths } from '../../../src/core/shading/sun-paths.ts';
import { sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import { hayDavies } from '../../../src/core/transposition/hay-davies.ts';
import { weatherText } from '../../reference-values/weather-text.ts';
import { minuteByMinute } from './minute-by-minute.ts';
import { computedCase, referenceCases } from './reference-cases.ts';
import { THIN_SCENES } from './thin-scenes.ts';

/** In percentage points, as the design's bars are. */
const ANNUAL = 0.05;
const MONTHLY = 0.2;

const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);

describe('reference cases of an independent one-minute program', () => {
  test('all twelve are there', () => expect(referenceCases.length).toBe(12));

  const models = [
    ['hay-davies', 'solar_access', 'poa_unshaded_kwh_m2'],
    ['isotropic', 'solar_access_isotropic_model', 'poa_unshaded_isotropic_model_kwh_m2'],
  ] as const;
  describe.each(models)('%s', (model, access, unshaded) => {
    test.each(referenceCases)('$input.id $input.name', (reference) => {
      const { map, profile } = computedCase(reference, model, DEFAULT_STEP_MINUTES);
      const whole = unshadedMonths(map);
      const light = shadedMonths(map, blockedLight(map, blockedSpans(profile)));
      const { annual, monthly } = reference.expected;
      expect(Math.abs(100 * (sum(light) / sum(whole) - annual[access]))).toBeLessThan(ANNUAL);
      expect(Math.abs(sum(whole) / annual[unshaded] - 1)).toBeLessThan(2e-4);
      monthly[access].forEach((expected, month) => {
        if (expected === null) expect(whole[month]).toBeLessThan(1e-4);
        else expect(Math.abs(100 * (light[month] / whole[month] - expected))).toBeLessThan(MONTHLY);
      });
    });
  });

  test.each(referenceCases)('parts of $input.id', (reference) => {
    const { map, profile } = computedCase(reference, 'hay-davies', DEFAULT_STEP_MINUTES);
    const blocked = blockedLight(map, blockedSpans(profile));
    const { monthly } = reference.expected;
    for (let month = 0; month < 12; month++) {
      const direct = monthly.beam_shaded_kwh_m2[month]! + monthly.circumsolar_shaded_kwh_m2[month]!;
      const whole = monthly.beam_unshaded_kwh_m2[month]! + monthly.circumsolar_unshaded_kwh_m2[month]!;
      const poa = monthly.poa_unshaded_kwh_m2[month]!;
      const close = (value: number, expected: number, part: string) =>
        expect(Math.abs(value - expected), part).toBeLessThan(0.002 * poa + 0.003);
      close(map.direct[month], whole, 'direct, unshaded');
      close(map.direct[month] - blocked.direct[month], direct, 'direct, shaded');
      close(
        map.dome[month] * (1 - blocked.domeShare[month]),
        monthly.isotropic_shaded_kwh_m2[month]!,
        'dome, shaded',
      );
      close(map.ground[month], monthly.ground_kwh_m2[month]!, 'ground');
    }
  });
});

describe('against a pass over every minute', () => {
  const tucson = parseWeatherFile(weatherText('USA_AZ_Tucson.Intl.AP.722740_TMY3.epw'), 'tucson');
  if (!tucson.ok) throw new Error('the weather file must be readable');
  const climates = [
    ['clear sky', clearSkyClimate('ineichen')],
    ['weather file', weatherFileClimate(tucson.value, tucson.value)],
  ] as const;
  const site = { latitude: 32.13, longitude: -110.95, altitude: 777, utcOffset: -420 };
  const planes = [
    { tilt: 30, azimuth: 178 },
    { tilt: 75, azimuth: 245 },
  ];

  describe.each(climates)('%s', (_, climate) => {
    const paths = sunPaths(sunTrack(site, DEFAULT_STEP_MINUTES));
    const grid = skyGrid(paths);
    const year = skyYear(paths, climate, hayDavies, 0.2);
    describe.each(planes)('tilt $tilt, azimuth $azimuth', (plane) => {
      const map = skyMap(year, grid, plane.tilt, plane.azimuth);
      test.each(THIN_SCENES)('$name', ({ scene }) => {
        const whole = unshadedMonths(map);
        const light = shadedMonths(map, blockedLight(map, blockedSpans(horizonProfile(scene))));
        const minute = minuteByMinute(site, plane, climate, hayDavies, scene);
        const loss = 100 * (1 - sum(minute.light) / sum(minute.whole));
        expect(loss).toBeGreaterThan(0.02); // the scene does block something
        expect(Math.abs(100 * (1 - sum(light) / sum(whole)) - loss)).toBeLessThan(ANNUAL);
        for (let month = 0; month < 12; month++)
          expect(
            Math.abs(100 * (light[month] / whole[month] - minute.light[month] / minute.whole[month])),
          ).toBeLessThan(MONTHLY);
      });
    });
  });
});
