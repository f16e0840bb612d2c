import { expect, it } from 'vitest';
import { weatherFileText } from '../../../src/core/irradiance/weather-file-text.ts';

it.each([
  ['UTF-8', 'utf8'],
  ['ISO 8859-1', 'latin1'],
] as const)('weatherFileText reads %s', (_name, encoding) => {
  const bytes = new Uint8Array(Buffer.from('LOCATION,Cañada de São João', encoding));
  expect(weatherFileText(bytes, TextDecoder)).toBe('LOCATION,Cañada de São João');
});
