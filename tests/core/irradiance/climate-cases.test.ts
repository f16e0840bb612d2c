import { describe, expect, it } from 'vitest';
import type { Climate } from '../../../src/core/irradiance/climate.ts';
import { skyStates } from '../../../src/core/irradiance/climate.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { monthlyOf } from '../../../src/core/irradiance/monthly-climate.ts';
import { weatherFileClimate } from '../../../src/core/irradiance/weather-file-climate.ts';
import { cosZenithOf, sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import type { ReferenceCase } from '../shading/reference-cases.ts';
import { referenceCases } from '../shading/reference-cases.ts';
import { weatherFile } from './weather-files.ts';

function climateOf({ irradiance, lat, lon }: ReferenceCase['input']): Climate {
  if (irradiance.type === 'ineichen') return clearSkyClimate('ineichen', irradiance.linke_turbidity);
  if (irradiance.type === 'haurwitz_erbs') return clearSkyClimate('haurwitz-erbs');
  return weatherFileClimate(weatherFile(irradiance.file), { latitude: lat, longitude: lon });
}

describe('months of clear skies and weather files', () => {
  // shading_cases_open.json: an independent brute-force program in one-minute steps
  it.each(referenceCases)('$input.id $input.name: within 0.01 kWh/m2 a month', ({ input, expected }) => {
    const track = sunTrack(
      {
        latitude: input.lat,
        longitude: input.lon,
        altitude: input.altitude_m,
        utcOffset: input.utc_offset_h * 60,
      },
      2,
    );
    const months = monthlyOf(climateOf(input), track);
    for (const key of ['ghi', 'dni', 'dhi'] as const) {
      const wanted = expected.monthly[`${key}_kwh_m2`];
      expect(wanted).toHaveLength(12);
      months[key].forEach((value, month) => expect(Math.abs(value - wanted[month]!)).toBeLessThan(0.01));
    }
  });
});

describe('clearSkyClimate', () => {
  it.each(['ineichen', 'haurwitz-erbs'] as const)('%s has no light with the sun down', (model) => {
    const track = sunTrack({ latitude: 69.65, longitude: 18.96, utcOffset: 60 }, 15);
    const read = clearSkyClimate(model).over(track);
    const sky = skyStates(1);
    for (let step = 0; step < track.steps; step++) expect(read(step, sky)).toBe(cosZenithOf(track, step) > 0);
  });

  it('refuses turbidity that cannot be', () => {
    expect(() => clearSkyClimate('ineichen', [0, 3, 3, 3, 3, 3, 3, 3, 3, 3, 3, 3])).toThrow(RangeError);
  });
});
