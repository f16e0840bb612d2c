import { clearSkyClimate } from '../core/irradiance/clear-sky-climate.ts';
import type { Climate } from '../core/irradiance/climate.ts';
import { parseWeatherFile } from '../core/irradiance/weather-file.ts';
import { weatherFileClimate } from '../core/irradiance/weather-file-climate.ts';
import { weatherFileText } from '../core/irradiance/weather-file-text.ts';
import { worldClimate } from '../core/irradiance/world-climate.ts';
import type { WorldGrid } from '../core/irradiance/world-grid.ts';
import { decodeWorldGrid } from '../core/irradiance/world-grid.ts';
import type { AssessRequest } from '../core/shading/calculation.ts';
import { Faulty } from './outcome-of.ts';

/** Text of a weather file's bytes. */
export const textOf = (contents: ArrayBuffer): string =>
  weatherFileText(new Uint8Array(contents), TextDecoder);

/** Makes the climate that a survey names; the world's grid is fetched when it is first asked for. */
export class ClimateSource {
  private grid: Promise<WorldGrid> | null = null;

  constructor(private readonly gridBytes: () => Promise<ArrayBuffer>) {}

  async of({ survey, weatherFile }: AssessRequest): Promise<Climate> {
    const { climate, site } = survey;
    switch (climate.source) {
      case 'world':
        return worldClimate(await this.worldGrid(), site);
      case 'clear-sky':
        return clearSkyClimate(climate.model, climate.linkeTurbidity);
      case 'weather-file': {
        if (!weatherFile) throw new Faulty({ code: 'weather-file-missing', detail: climate.name });
        const parsed = parseWeatherFile(textOf(weatherFile.contents), weatherFile.name);
        if (!parsed.ok) throw new Faulty({ code: 'weather-file-refused', problems: parsed.problems });
        return weatherFileClimate(parsed.value, site);
      }
    }
  }

  private worldGrid(): Promise<WorldGrid> {
    this.grid ??= this.gridBytes()
      .then((bytes) => {
        const decoded = decodeWorldGrid(bytes);
        if (decoded.ok) return decoded.value;
        throw new Faulty({ code: 'climate-missing', problems: decoded.problems });
      })
      .catch((error: unknown) => {
        this.grid = null; // the next call tries again
        throw error instanceof Faulty
          ? error
          : new Faulty({ code: 'climate-missing', detail: String(error) });
      });
    return this.grid;
  }
}
