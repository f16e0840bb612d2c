import { describe, expect, it } from 'vitest';
import { forgetWeatherFile } from '../../src/app/actions/forget-weather-file.ts';
import { appState } from '../../src/app/app-state.ts';
import type { WeatherStore } from '../../src/app/weather-store.ts';

function plainWeather(): WeatherStore {
  const kept = new Map<string, { name: string; contents: ArrayBuffer }>();
  const summary = (sha256: string, name: string, bytes: number) => ({ sha256, name, bytes, keptAt: 0 });
  return {
    list: () =>
      Promise.resolve([...kept].map(([key, { name, contents }]) => summary(key, name, contents.byteLength))),
    bytes: (key) => Promise.resolve(kept.get(key)?.contents ?? null),
    keep: (name, contents) => {
      kept.set(`hash of ${contents.byteLength}`, { name, contents });
      return Promise.resolve(summary(`hash of ${contents.byteLength}`, name, contents.byteLength));
    },
    forget: (key) => Promise.resolve(void kept.delete(key)),
  };
}

describe('forgetting a weather file', () => {
  it('removes it, and brings it back whole when that is taken back', async () => {
    const services = { state: appState(), weather: plainWeather() };
    const file = await services.weather.keep('nowhere.epw', new ArrayBuffer(12));
    await forgetWeatherFile(services, file);
    expect(services.state.weatherFiles.value).toEqual([]);
    expect(services.state.notice.value).toMatchObject({
      code: 'weather-file-forgotten',
      title: 'nowhere.epw',
    });
    await services.state.notice.value?.undo?.();
    expect(services.state.weatherFiles.value).toEqual([file]);
  });
});
