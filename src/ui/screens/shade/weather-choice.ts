import type { WeatherStore } from '../../../app/weather-store.ts';
import type { ClimateChoice } from '../../../core/survey/survey.ts';

/** The kept weather file a survey names: by its hash, else by its name; null where none is named or kept. */
export async function weatherBytes(
  weather: WeatherStore,
  climate: ClimateChoice,
): Promise<{ name: string; contents: ArrayBuffer } | null> {
  if (climate.source !== 'weather-file') return null;
  const kept = await weather.list();
  const found =
    kept.find(({ sha256 }) => sha256 === climate.sha256) ??
    (climate.sha256 === undefined ? kept.find(({ name }) => name === climate.name) : undefined);
  const contents = found ? await weather.bytes(found.sha256) : null;
  return found && contents ? { name: found.name, contents } : null;
}
