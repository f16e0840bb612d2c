import { fc, test } from '@fast-check/vitest';
import { describe, expect } from 'vitest';
import { changesBetween, fieldsOf, surveyOf } from '../../../src/core/survey/field-changes.ts';
import type { FieldChange } from '../../../src/core/survey/field-changes.ts';
import { keyOfStep, pathStep } from '../../../src/core/survey/field-layout.ts';
import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { arbitrarySurvey } from './arbitrary-survey.ts';
import { sampleSurvey, sampleTexts } from './sample-surveys.ts';

const sample = () => sampleSurvey('suburban-maple-and-gable.json');

/** What a store holds after changes: one value a path, in the order of the paths. */
function stored(changes: Iterable<FieldChange>, held: FieldChange[] = []): FieldChange[] {
  const fields = new Map(held.map(({ path, value }) => [path, value]));
  for (const { path, value } of changes)
    if (value === undefined) fields.delete(path);
    else fields.set(path, value);
  return [...fields].sort(([a], [b]) => (a < b ? -1 : 1)).map(([path, value]) => ({ path, value }));
}

describe('a survey comes back from its fields', () => {
  test.each(sampleTexts)('$file, in any order of the fields', ({ file }) => {
    const survey = sampleSurvey(file);
    expect(surveyOf(fieldsOf(survey))).toEqual(survey);
    expect(surveyOf(fieldsOf(survey).reverse())).toEqual(survey);
    expect(surveyFromJson(surveyOf(stored(fieldsOf(survey))))).toMatchObject({ ok: true, warnings: [] });
  });

  test.prop([arbitrarySurvey], { numRuns: 300 })('with unknown fields and ids of any text', (survey) => {
    expect(surveyOf(stored(fieldsOf(survey)))).toEqual(survey);
  });

  test.each(sampleTexts)('$file, as the very same text', ({ file, text }) => {
    const document = surveyOf(stored(fieldsOf(sampleSurvey(file))));
    expect(JSON.stringify(document)).toBe(JSON.stringify(JSON.parse(text)));
  });

  test.prop([arbitrarySurvey])('and each path is there once', (survey) => {
    const paths = fieldsOf(survey).map(({ path }) => path);
    expect(new Set(paths).size).toBe(paths.length);
  });
});

describe('changes between two surveys', () => {
  test.prop([arbitrarySurvey, arbitrarySurvey], { numRuns: 300 })(
    'turn the one’s fields into the other',
    (before, after) => {
      expect(surveyOf(stored(changesBetween(before, after), fieldsOf(before)))).toEqual(after);
    },
  );

  test.prop([fc.array(arbitrarySurvey, { minLength: 2, maxLength: 5 })], { numRuns: 150 })(
    'turn what was stored edit by edit into the last',
    (edits) => {
      let held = stored(fieldsOf(edits[0]));
      for (const edit of edits.slice(1)) held = stored(changesBetween(surveyOf(held) as Survey, edit), held);
      expect(surveyOf(held)).toEqual(edits.at(-1));
    },
  );

  // After two devices' edits were merged, the places may have gaps; only their order says something.
  test.prop([arbitrarySurvey, arbitrarySurvey], { numRuns: 300 })(
    'hold whatever places were stored',
    (before, after) => {
      const held = fieldsOf(before).map(({ path, value }) =>
        path.endsWith('/#') ? { path, value: (value as number) ** 2 + 2 } : { path, value },
      );
      expect(surveyOf(held)).toEqual(before);
      expect(surveyOf(stored(changesBetween(before, after), held))).toEqual(after);
    },
  );

  test.prop([arbitrarySurvey])('of a survey and itself are none', (survey) => {
    expect(changesBetween(survey, structuredClone(survey))).toEqual([]);
  });

  test('of one edit are one field', () => {
    const after = sample();
    after.stations[0].traces[0].sightings[1].azimuth = 161;
    expect(changesBetween(sample(), after)).toEqual([
      { path: 'stations/A/traces/t1/sightings/A-t1-2/azimuth', value: 161 },
    ]);
  });

  test('of a place moved are its two coordinates together', () => {
    const after = sample();
    after.site.latitude = 44;
    expect(changesBetween(sample(), after)).toEqual([
      { path: 'site/latitude+longitude', value: { latitude: 44, longitude: -72.412 } },
    ]);
  });

  test('of a row appended to a list with order keys touch no other row', () => {
    const after = sample();
    after.planes.push({ id: 'shed', name: 'Shed', order: 9, surfaceTilt: 5, surfaceAzimuth: 90 });
    const paths = changesBetween(sample(), after).map(({ path }) => path);
    expect(paths.every((path) => path.startsWith('planes/shed/'))).toBe(true);
  });

  test('of a row taken away are its fields taken away, all of them', () => {
    const after = sample();
    const [gone] = after.obstructions.splice(1, 1);
    const changes = changesBetween(sample(), after);
    expect(changes.map(({ path }) => path).sort()).toEqual(
      ['distance', 'id', 'kind', 'name', 'order'].map((field) => `obstructions/${gone.id}/${field}`),
    );
    expect(changes.every(({ value }) => value === undefined)).toBe(true);
  });
});

test.each(['corner', 'transmittance', 'position', 'observedOpen', 'serves', 'amendments', 'climate'])(
  '%s is one value',
  (name) => {
    const fields = fieldsOf(sample());
    expect(fields.some(({ path }) => path.split('/').at(-1) === name)).toBe(true);
    expect(fields.filter(({ path }) => path.split('/').slice(0, -1).includes(name))).toEqual([]);
  },
);

test('a raw reading is one value', () => {
  const [reading] = sample().readings;
  expect(fieldsOf(sample())).toContainEqual({ path: 'readings/q1', value: reading });
});

test('what is written in a row whose id was taken away does not bring it back', () => {
  const fields = stored([{ path: 'planes/south/id', value: undefined }], fieldsOf(sample()));
  expect((surveyOf(fields) as Survey).planes.map(({ id }) => id)).toEqual(['garage']);
});

test('no fields are a survey without anything', () => {
  expect(surveyOf([])).toEqual({ planes: [], obstructions: [], runs: [], readings: [], stations: [] });
});

test.prop([fc.string()])('any text as a step of a path is had back, and has no sign of its own', (text) => {
  expect(pathStep(text)).not.toMatch(/[/+#]/);
  expect(keyOfStep(pathStep(text))).toBe(text);
});
