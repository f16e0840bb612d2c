import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { clearSkyClimate } from '../core/irradiance/clear-sky-climate.ts';
import type { Climate } from '../core/irradiance/climate.ts';
import { weatherFileClimate } from '../core/irradiance/weather-file-climate.ts';
import type { WeatherFile } from '../core/irradiance/weather-file.ts';
import { parseWeatherFile } from '../core/irradiance/weather-file.ts';
import { worldClimate } from '../core/irradiance/world-climate.ts';
import type { WorldGrid } from '../core/irradiance/world-grid.ts';
import { decodeWorldGrid } from '../core/irradiance/world-grid.ts';
import type { Parsed, Problem } from '../core/survey/problem.ts';
import type { ClimateChoice, Site } from '../core/survey/survey.ts';
import { readWeatherText } from './read-file.ts';

const GRID = new URL('../../public/world-climate.bin', import.meta.url);

export type ClimatePlace = Pick<Site, 'latitude' | 'longitude' | 'altitude'>;

let grid: Parsed<WorldGrid> | null = null;

/** The grid that ships with Noonmark, read when it is first asked for. */
export function worldGrid(): Parsed<WorldGrid> {
  if (!grid) {
    const file = readFileSync(GRID);
    const bytes = new ArrayBuffer(file.byteLength);
    new Uint8Array(bytes).set(file);
    grid = decodeWorldGrid(bytes);
  }
  return grid;
}

const weatherFiles = new Map<string, Parsed<WeatherFile & { sha256: string }>>();

/** A weather file by its path; many surveys may ask for the same. */
function weatherFile(path: string): Parsed<WeatherFile & { sha256: string }> {
  let known = weatherFiles.get(path);
  if (!known) {
    known = readWeatherFile(path);
    weatherFiles.set(path, known);
  }
  return known;
}

function readWeatherFile(path: string): Parsed<WeatherFile & { sha256: string }> {
  const file = readWeatherText(path);
  if (!file.ok) return file;
  const parsed = parseWeatherFile(file.value.text, basename(path));
  if (!parsed.ok) return parsed;
  const sha256 = createHash('sha256').update(file.value.bytes).digest('hex');
  return { ...parsed, value: { ...parsed.value, sha256 } };
}

const from = (climate: Climate, warnings: Problem[] = []): Parsed<Climate> => ({
  ok: true,
  value: climate,
  warnings,
});

function worldAt(place: ClimatePlace): Parsed<Climate> {
  const read = worldGrid();
  return read.ok ? from(worldClimate(read.value, place)) : read;
}

/** The climate of `--climate`: `world`, `clear`, or the path of a weather file. */
export function climateByOption(option: string, place: ClimatePlace, own?: ClimateChoice): Parsed<Climate> {
  if (option === 'world') return worldAt(place);
  if (option === 'clear')
    return from(
      own?.source === 'clear-sky'
        ? clearSkyClimate(own.model, own.linkeTurbidity)
        : clearSkyClimate('ineichen'),
    );
  const file = weatherFile(option);
  if (file.ok) return from(weatherFileClimate(file.value, place));
  return {
    ok: false,
    problems: file.problems.map(({ path, message }) => ({ path: `--climate ${option}: ${path}`, message })),
  };
}

/** The climate a survey names; a weather file is looked for beside the survey's own file. */
export function climateOfSurvey(
  choice: ClimateChoice,
  place: ClimatePlace,
  surveyFile: string,
): Parsed<Climate> {
  if (choice.source === 'world') return worldAt(place);
  if (choice.source === 'clear-sky') return from(clearSkyClimate(choice.model, choice.linkeTurbidity));
  const name = choice.name;
  if (name !== basename(name) || name === '..')
    return refused(
      `The weather file "${name}" must be a file's name without a folder; it is looked for beside the survey.`,
    );
  const file = weatherFile(join(dirname(surveyFile), name));
  if (!file.ok) {
    const [{ path, message }] = file.problems;
    return refused(
      `The weather file "${name}" is looked for beside the survey. ${path}: ${message} Put it there, or choose with --climate.`,
    );
  }
  const changed = choice.sha256 !== undefined && choice.sha256.toLowerCase() !== file.value.sha256;
  const warning = {
    path: 'climate.sha256',
    message: `The weather file "${name}" is not the one the survey was made with.`,
  };
  return from(weatherFileClimate(file.value, place), changed ? [warning] : []);
}

const refused = (message: string): Parsed<Climate> => ({
  ok: false,
  problems: [{ path: 'climate.name', message }],
});
