import { describe, expect, it } from 'vitest';
import { surveyEvidence } from '../../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../../src/core/irradiance/clear-sky-climate.ts';
import type { Photo, Station, Survey, Trace } from '../../../src/core/survey/survey.ts';
import type { PhotoImage } from '../../../src/report/contents/report-contents.ts';
import { htmlPage } from '../../../src/report/painters/html.ts';
import { reportContents } from '../../../src/report/report-contents.ts';
import { CHOICES } from '../report-of.ts';
import { sampleSurvey } from '../sample-shades.ts';

const SAMPLE = 'two-trees-one-behind-the-other.json';

async function pageOf(survey: Survey, photos: ReadonlyMap<string, PhotoImage> = new Map()): Promise<string> {
  const evidence = await surveyEvidence(survey, clearSkyClimate('ineichen'), { stepMinutes: 15 });
  const contents = reportContents({
    ...evidence,
    survey,
    fingerprint: 'f'.repeat(64),
    madeOn: '2026-06-02',
    version: '0.1.0',
    photos,
    firm: { name: '', lines: [], colour: null },
    compared: null,
    choices: CHOICES,
  });
  return htmlPage(contents);
}

function changed(change: (survey: Survey) => void): Survey {
  const survey = sampleSurvey(SAMPLE);
  change(survey);
  return survey;
}

/** A wall all around, up to a height that leaves next to nothing of the sky. */
const wallAround = (obstruction: string): Trace => ({
  id: 'wall',
  obstruction,
  shape: 'skyline',
  edge: 'drawn',
  fullCircle: true,
  sightings: Array.from({ length: 12 }, (_, i) => ({ id: `w${i}`, azimuth: i * 30, elevation: 89.5 })),
});

const twelve = (station: Station): Station[] =>
  Array.from({ length: 12 }, (_, i) => ({
    ...structuredClone(station),
    id: `s${i}`,
    name: `Station ${i + 1}`,
    headingChecks: [],
    markSightings: [],
    traces: station.traces.map((trace) => ({ ...structuredClone(trace), id: `${trace.id}-${i}` })),
  }));

const SURVEYS: [string, () => Survey][] = [
  ['nothing blocked', () => changed((survey) => survey.stations.forEach((station) => (station.traces = [])))],
  [
    'everything blocked',
    () =>
      changed((survey) => {
        survey.obstructions[0] = { ...survey.obstructions[0], kind: 'building', transmittance: 0 };
        for (const station of survey.stations) station.traces = [wallAround(survey.obstructions[0].id)];
      }),
  ],
  ['one station', () => changed((survey) => void (survey.stations = survey.stations.slice(0, 1)))],
  ['twelve stations', () => changed((survey) => void (survey.stations = twelve(survey.stations[0])))],
  ['no station', () => changed((survey) => void (survey.stations = []))],
  [
    'nothing looked at',
    () =>
      changed((survey) =>
        survey.stations.forEach((station) => Object.assign(station, { traces: [], observedOpen: [] })),
      ),
  ],
  ['a polar site', () => sampleSurvey('polar-wall-and-steep-roof.json')],
];

describe('the page of a survey', () => {
  it.each(SURVEYS)('with %s has no gap in its words', async (_, survey) => {
    const page = await pageOf(survey());
    expect(/\b(NaN|undefined|null|Infinity|\[object)\b/.exec(page)?.[0]).toBeUndefined();
    expect(page.match(/<section /g)!.length).toBeGreaterThan(5);
    expect(page.match(/<h1>/g)).toHaveLength(1);
  });

  it('with six photos of 150 kB stays under 1.5 MB', async () => {
    const bytes = 150_000;
    const hashes = Array.from({ length: 6 }, (_, i) => String(i).repeat(64));
    const survey = changed((one) => {
      one.photos = hashes.map((sha256, i): Photo => ({
        id: `p${i}`,
        of: { kind: 'site' },
        takenAt: '2026-05-14T10:00:00Z',
        azimuth: i * 60,
        width: 1280,
        height: 960,
        bytes,
        sha256,
      }));
    });
    const image = { type: 'image/jpeg' as const, bytes: new Uint8Array(bytes), width: 1280, height: 960 };
    const page = await pageOf(survey, new Map(hashes.map((hash) => [hash, image])));
    expect(page.match(/<img /g)).toHaveLength(6);
    expect(Buffer.byteLength(page)).toBeLessThan(1_500_000);
  });
});
