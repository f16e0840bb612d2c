import { describe, expect, it } from 'vitest';
import type { WeatherStore } from '../../../src/app/weather-store.ts';
import { weatherBytes } from '../../../src/ui/screens/shade/weather-choice.ts';

const contents = new ArrayBuffer(3);
const kept = { sha256: 'aa', name: 'town.epw', bytes: 3, keptAt: 0 };
const store = {
  list: () => Promise.resolve([kept]),
  bytes: (sha256: string) => Promise.resolve(sha256 === 'aa' ? contents : null),
} as unknown as WeatherStore;

describe('the weather file a survey names', () => {
  it('is found by its hash, whatever it is called there', async () => {
    expect(await weatherBytes(store, { source: 'weather-file', name: 'other.epw', sha256: 'aa' })).toEqual({
      name: 'town.epw',
      contents,
    });
  });
  it('is found by its name where the survey has no hash', async () => {
    expect(await weatherBytes(store, { source: 'weather-file', name: 'town.epw' })).not.toBeNull();
  });
  it('is not another file of the same name', async () => {
    expect(await weatherBytes(store, { source: 'weather-file', name: 'town.epw', sha256: 'bb' })).toBeNull();
  });
  it('is none for another climate', async () =>
    expect(await weatherBytes(store, { source: 'world' })).toBeNull());
});
