import { readFileSync, readdirSync } from 'node:fs';
import type { StationShade } from '../../src/core/shading/station-shade.ts';
import { stationsOf } from '../../src/core/survey/served-planes.ts';
import { parseSurvey } from '../../src/core/survey/parse-survey.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { ClimateSource } from '../../src/workers/climate-source.ts';
import { ShadeEngine } from '../../src/workers/shade-engine.ts';

const root = new URL('../../', import.meta.url);

export const SAMPLE_FILES = readdirSync(new URL('survey-samples/', root)).filter((name) =>
  name.endsWith('.json'),
);

export function sampleSurvey(file: string): Survey {
  const parsed = parseSurvey(readFileSync(new URL(`survey-samples/${file}`, root), 'utf8'));
  if (!parsed.ok) throw new Error(`${file}: ${parsed.problems[0].message}`);
  return parsed.value;
}

export function worldGridBytes(): ArrayBuffer {
  const bytes = readFileSync(new URL('public/world-climate.bin', root));
  return bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength);
}

/** The survey in a clear sky, which needs no file beside it. */
export const underClearSky = (survey: Survey): Survey => ({
  ...survey,
  climate: { source: 'clear-sky', model: 'ineichen' },
});

export const engineFor = (gridBytes = () => Promise.resolve(worldGridBytes())) =>
  new ShadeEngine(new ClimateSource(gridBytes), () => Promise.resolve());

/** The shade of a sample's first plane that has a station, from that station. */
export async function sampleShade(file: string): Promise<{ survey: Survey; shade: StationShade }> {
  const survey = underClearSky(sampleSurvey(file));
  const plane = survey.planes.find((roof) => stationsOf(survey, roof).length > 0)!;
  const station = stationsOf(survey, plane)[0];
  const engine = engineFor();
  engine.hold({ survey, stepMinutes: 15 });
  const outcome = await engine.shade(0, { plane: plane.id, station: station.id, changes: [] });
  if (!outcome.ok) throw new Error(outcome.fault.detail ?? outcome.fault.code);
  return { survey, shade: outcome.value };
}
