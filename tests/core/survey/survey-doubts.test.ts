import { describe, expect, test } from 'vitest';
import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import { sampleDocument, sampleTexts } from './sample-surveys.ts';

type Bend = (survey: Record<string, unknown>) => void;
const site =
  (more: object): Bend =>
  (survey) =>
    Object.assign(survey.site as object, more);

function read(bend: Bend) {
  const document = sampleDocument() as Record<string, unknown>;
  bend(document);
  return surveyFromJson(document);
}

const trace =
  (shape: string, ...at: [number, number][]): Bend =>
  (survey) => {
    const [station] = survey.stations as { traces: object[] }[];
    station.traces.push({
      id: 'odd',
      obstruction: (survey.obstructions as { id: string }[])[0].id,
      shape,
      angularWidth: 1,
      sightings: at.map(([azimuth, elevation], i) => ({ id: `odd-${i}`, azimuth, elevation })),
    });
  };

describe('slips that a survey may hold', () => {
  test('the samples hold none', () => {
    for (const { text } of sampleTexts) {
      const parsed = surveyFromJson(JSON.parse(text));
      expect(parsed.ok && parsed.warnings).toEqual([]);
    }
  });

  test.each([
    [
      'a longitude of the wrong sign',
      site({ longitude: 72.2 }),
      'site.longitude',
      'check the sign of the longitude',
    ],
    ['a mast as a skyline', trace('skyline', [140, 5], [140, 30]), '.traces[', 'Trace a mast as a line'],
    ['a wire between one point', trace('line', [140, 5], [140, 5]), '.traces[', 'Sight its ends apart'],
    [
      'an outline at one azimuth',
      trace('outline', [140, 5], [140, 9], [140, 30]),
      '.traces[',
      'Sight its ends apart',
    ],
    ['a skyline in the ground', trace('skyline', [140, -5], [160, -3]), '.traces[', 'below the horizontal'],
  ] as [string, Bend, string, string][])('%s is told', (_, bend, path, words) => {
    const parsed = read(bend);
    expect(parsed.ok).toBe(true);
    const warnings = parsed.ok ? parsed.warnings : [];
    expect(warnings).toHaveLength(1);
    expect(warnings[0].path).toContain(path);
    expect(warnings[0].message).toContain(words);
  });

  test.each([
    ['near the date line', site({ longitude: -179.9, latitude: -16.5, timeZone: 'Pacific/Fiji' })],
    ['a zone far from the sun', site({ longitude: 75.9, latitude: 39.5, timeZone: 'Asia/Shanghai' })],
    ['at a pole', site({ longitude: 140, latitude: -90, timeZone: 'Antarctica/McMurdo' })],
  ] as [string, Bend][])('%s nothing is told', (_, bend) => {
    const parsed = read(bend);
    expect(parsed.ok && parsed.warnings).toEqual([]);
  });
});

describe('work that is too much is refused with its limit', () => {
  test('201 obstructions traced from one station', () => {
    const parsed = read((survey) => {
      const many = Array.from({ length: 201 }, (_, i) => ({ id: `many-${i}`, name: 'One', kind: 'other' }));
      (survey.obstructions as object[]).push(...many);
      const [station] = survey.stations as { traces: object[] }[];
      station.traces = many.map(({ id }, i) => ({
        id: `t${i}`,
        obstruction: id,
        shape: 'skyline',
        sightings: [
          { id: `${i}a`, azimuth: 100, elevation: 5 },
          { id: `${i}b`, azimuth: 110, elevation: 5 },
        ],
      }));
    });
    expect(parsed.ok ? [] : parsed.problems).toMatchObject([{ path: 'stations[0].traces' }]);
    expect(JSON.stringify(parsed)).toContain('the limit is 200');
  });

  test('planes served 1,024 times', () => {
    const parsed = read((survey) => {
      const ids = Array.from({ length: 32 }, (_, i) => `plane-${i}`);
      survey.planes = ids.map((id) => ({ id, name: id, surfaceTilt: 20, surfaceAzimuth: 180 }));
      survey.stations = ids.map((id) => ({ id: `at ${id}`, name: id, serves: ids, traces: [] }));
    });
    expect(parsed.ok ? [] : parsed.problems).toMatchObject([{ path: 'stations' }]);
    expect(JSON.stringify(parsed)).toContain('the limit is 1000');
  });
});
