import type { AppServices } from '../app-services.ts';
import type { WeatherFileSummary } from '../weather-store.ts';

type Needs = Pick<AppServices, 'state' | 'weather'>;

/** Reads the list of kept weather files again. */
export async function refreshWeatherFiles({ state, weather }: Needs): Promise<void> {
  state.weatherFiles.value = await weather.list();
}

/** Removes a kept weather file, and offers to take that back. */
export async function forgetWeatherFile(
  services: Needs,
  { sha256, name }: WeatherFileSummary,
): Promise<void> {
  const { state, weather } = services;
  const contents = await weather.bytes(sha256);
  await weather.forget(sha256);
  state.notice.value = {
    code: 'weather-file-forgotten',
    title: name,
    ...(contents && {
      undo: async () => {
        await weather.keep(name, contents);
        await refreshWeatherFiles(services);
      },
    }),
  };
  await refreshWeatherFiles(services);
}
