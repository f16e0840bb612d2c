import { readFileSync } from 'node:fs';
import { Ajv } from 'ajv';
import type * as v from 'valibot';
import { fc, test } from '@fast-check/vitest';
import { expect, expectTypeOf } from 'vitest';
import { surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import type { surveySchema } from '../../../src/core/survey/survey-schema.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { bent, bends } from './bent-document.ts';
import { sampleDocument, sampleTexts } from './sample-surveys.ts';
import { PUBLISHED, surveyJsonSchema } from './survey-json-schema.ts';

/** A type without the room for unknown fields, intersections laid flat, so that two can be held against each other. */
type Named<T> = T extends readonly unknown[]
  ? { [I in keyof T]: Named<T[I]> }
  : T extends object
    ? { [K in keyof T as string extends K ? never : K]: Named<T[K]> }
    : T;

test('the schema and the types say the same, to the compiler', () => {
  expectTypeOf<Named<v.InferOutput<typeof surveySchema>>>().toEqualTypeOf<Named<Survey>>();
});

const published = JSON.parse(readFileSync(PUBLISHED, 'utf8')) as Record<string, unknown>;
const isValid = new Ajv({ strict: false }).compile(published);

test('the published JSON Schema is the one made from the parser’s schema', () => {
  expect(published).toEqual(surveyJsonSchema());
});

test.each(sampleTexts)('$file is valid by the published JSON Schema', ({ text }) => {
  isValid(JSON.parse(text));
  expect(isValid.errors).toBe(null);
});

test('the published JSON Schema refuses a survey without planes, and a latitude of 91', () => {
  const survey = sampleDocument() as Survey;
  expect(isValid({ ...survey, planes: undefined })).toBe(false);
  expect(isValid({ ...survey, site: { ...survey.site, latitude: 91 } })).toBe(false);
});

test.prop([fc.constantFrom(...sampleTexts), bends], { numRuns: 300 })(
  'whatever the parser reads is valid by the published JSON Schema',
  ({ text }, changes) => {
    const document = bent(JSON.parse(text), changes);
    if (surveyFromJson(document).ok) expect(isValid(document)).toBe(true);
  },
);
