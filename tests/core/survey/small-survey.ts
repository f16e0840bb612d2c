import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import type { Problem } from '../../../src/core/survey/problem.ts';

export const plane = { id: 'south', name: 'South', surfaceTilt: 30, surfaceAzimuth: 180 };
export const obstruction = { id: 'wall', name: 'Wall', kind: 'building' };
export const run = { id: 'r1', frame: 'magnetic', startedAt: '2026-05-14T09:30:00Z' };
export const reading = {
  id: 'q1',
  run: 'r1',
  takenAt: '2026-05-14T09:31:00.250Z',
  alpha: 10,
  beta: 80,
  gamma: 0,
};
export const headingCheck = { id: 'h1', method: 'sun-shadow', reading: 'q1' };
export const sightings = [
  { id: 's1', azimuth: 120, elevation: 10 },
  { id: 's2', azimuth: 150, elevation: 25 },
  { id: 's3', azimuth: 190, elevation: 12, reading: 'q1' },
];
export const trace = { id: 't1', obstruction: 'wall', shape: 'skyline', sightings };
export const station = {
  id: 'A',
  name: 'A',
  position: { on: 'south', x: 1, y: 1 },
  serves: ['south'],
  headingChecks: [headingCheck],
  traces: [trace],
};

const sound = {
  format: 'noonmark-survey',
  version: 1,
  id: 'small',
  title: 'Small',
  site: { latitude: 44, longitude: -72, timeZone: 'America/New_York' },
  climate: { source: 'world' },
  planes: [plane],
  obstructions: [obstruction],
  runs: [run],
  readings: [reading],
  stations: [station],
};

/** New values by path, such as `stations[0].traces[0].shape`; undefined takes the field away. */
export type Changes = Record<string, unknown>;

/** A smallest sound survey (one plane, a wall seen from one station, one reading with its run), with changes. */
export function smallSurvey(changes: Changes = {}): Record<string, unknown> {
  const survey: Record<string, unknown> = structuredClone(sound);
  for (const [path, value] of Object.entries(changes)) {
    const keys = path.match(/[^.[\]]+/g)!;
    const last = keys.pop()!;
    const at = keys.reduce((object, key) => object[key] as Record<string, unknown>, survey);
    if (value === undefined) delete at[last];
    else Object.defineProperty(at, last, { value, enumerable: true, configurable: true, writable: true });
  }
  return survey;
}

/** The problems of the small survey with changes. */
export function problemsAfter(changes: Changes): Problem[] {
  const parsed = surveyFromJson(smallSurvey(changes));
  return parsed.ok ? [] : parsed.problems;
}
