import { expect, it } from 'vitest';
import { ineichen } from '../../../src/core/irradiance/ineichen.ts';
import { standardPressure } from '../../../src/core/solar-position/refraction.ts';

it.each([
  ['standardPressure', standardPressure],
  ['ineichen', (altitude: number) => ineichen(altitude, 3)],
])('%s holds from -1000 to 11000 m and refuses what lies outside', (_name, at) => {
  for (const altitude of [-1000, 11_000]) expect(() => at(altitude)).not.toThrow();
  for (const altitude of [-1001, 11_001])
    expect(() => at(altitude)).toThrow(/altitude must be -1000 to 11000/);
});
