import { readFileSync } from 'node:fs';
import { horizonProfile } from '../../../src/core/horizon/horizon-profile.ts';
import type { SettledTrace, TracedObstruction } from '../../../src/core/horizon/traced-obstruction.ts';
import type { Climate } from '../../../src/core/irradiance/climate.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import { weatherFileClimate } from '../../../src/core/irradiance/weather-file-climate.ts';
import { parseWeatherFile } from '../../../src/core/irradiance/weather-file.ts';
import { sunTrack } from '../../../src/core/solar-position/sun-track.ts';
import type { Months, TranspositionId } from '../../../src/core/survey/survey.ts';
import { transpositionOf } from '../../../src/core/transposition/transposition-models.ts';
import { skyGrid } from '../../../src/core/shading/sky-grid.ts';
import { skyMap } from '../../../src/core/shading/sky-map.ts';
import { skyYear } from '../../../src/core/shading/sky-year.ts';
import { sunPaths } from '../../../src/core/shading/sun-paths.ts';
import { weatherText } from '../../reference-values/weather-text.ts';

/**
 * tests/reference-values/shading_cases_open.json: twelve cases computed by an independent brute-force program in
 * one-minute steps and half-degree sky patches; conventions inside the file.
 */
export interface ReferenceCase {
  input: {
    id: string;
    name: string;
    lat: number;
    lon: number;
    altitude_m: number;
    utc_offset_h: number;
    tilt_deg: number;
    azimuth_deg: number;
    albedo: number;
    horizon: [number, number][];
    sectors: { from: number; to: number; transmittance: Months }[];
    irradiance:
      | { type: 'ineichen'; linke_turbidity: Months }
      | { type: 'haurwitz_erbs' }
      | { type: 'epw'; file: string };
  };
  expected: {
    view_factor_masked_month: number[];
    monthly: Record<string, (number | null)[]>;
    annual: Record<string, number>;
  };
}

export const referenceCases = (
  JSON.parse(
    readFileSync(new URL('../../reference-values/shading_cases_open.json', import.meta.url), 'utf8'),
  ) as { cases: ReferenceCase[] }
).cases;

function climateOf({ irradiance, lat, lon, altitude_m }: ReferenceCase['input']): Climate {
  if (irradiance.type === 'ineichen') return clearSkyClimate('ineichen', irradiance.linke_turbidity);
  if (irradiance.type === 'haurwitz_erbs') return clearSkyClimate('haurwitz-erbs');
  const file = parseWeatherFile(weatherText(irradiance.file), irradiance.file);
  if (!file.ok) throw new Error(file.problems[0]?.message);
  return weatherFileClimate(file.value, { latitude: lat, longitude: lon, altitude: altitude_m });
}

/** The map and the profile of a case, by this project's code. */
export function computedCase({ input }: ReferenceCase, transposition: TranspositionId, stepMinutes: number) {
  const track = sunTrack(
    {
      latitude: input.lat,
      longitude: input.lon,
      altitude: input.altitude_m,
      utcOffset: input.utc_offset_h * 60,
    },
    stepMinutes,
  );
  const paths = sunPaths(track);
  const year = skyYear(paths, climateOf(input), transpositionOf(transposition), input.albedo);
  const map = skyMap(year, skyGrid(paths), input.tilt_deg, input.azimuth_deg);
  return { map, profile: horizonProfile(caseObstructions(input)) };
}

/** The case's linear profile as drawn skylines, one obstruction for each sector and one for the rest. */
function caseObstructions({ horizon, sectors }: ReferenceCase['input']): TracedObstruction[] {
  const bounds = sectors.flatMap(({ from, to }) => [from, to]);
  const stops = [...horizon.map(([azimuth]) => azimuth), ...bounds, 0, 90, 180, 270].sort((a, b) => a - b);
  const sectorOf = (azimuth: number) =>
    sectors.findIndex(({ from, to }) =>
      from <= to ? azimuth >= from && azimuth < to : azimuth >= from || azimuth < to,
    );
  const traces: SettledTrace[][] = [...sectors, null].map(() => []);
  stops.forEach((start, i) => {
    const end = i + 1 < stops.length ? stops[i + 1] : stops[0] + 360;
    if (end - start < 1e-9) return;
    const sector = sectorOf(((start + end) / 2) % 360);
    traces.at(sector)!.push({
      shape: 'skyline',
      straight: false,
      fullCircle: false,
      angularWidth: 0,
      points: [
        { azimuth: start, elevation: profileAt(horizon, start, 1) },
        { azimuth: end, elevation: profileAt(horizon, end, -1) },
      ],
    });
  });
  return [...sectors.map(({ transmittance }) => transmittance), Array<number>(12).fill(0) as Months].map(
    (transmittance, i) => ({ id: `part ${i}`, transmittance, traces: traces[i] }),
  );
}

/** Linear in azimuth, wrapping; `side` chooses before (-1) or after (1) at a step. */
function profileAt(horizon: [number, number][], azimuth: number, side: number): number {
  if (horizon.length === 1) return horizon[0][1];
  const points = [...horizon].sort((a, b) => a[0] - b[0]);
  const first = points[0];
  const last = points[points.length - 1];
  const around = [[last[0] - 360, last[1]], ...points, [first[0] + 360, first[1]]] as [number, number][];
  const at = azimuth > around[around.length - 1][0] ? azimuth - 360 : azimuth;
  for (let i = 1; i < around.length; i++) {
    const [a, b] = [around[i - 1], around[i]];
    if (side > 0 ? at >= a[0] && at < b[0] : at > a[0] && at <= b[0])
      return a[1] + ((b[1] - a[1]) * (at - a[0])) / (b[0] - a[0]);
  }
  throw new Error(`no profile at ${azimuth}`);
}
