import { fc, test } from '@fast-check/vitest';
import { expect } from 'vitest';
import { parseSurvey, surveyFromJson } from '../../../src/core/survey/parse-survey.ts';
import type { Parsed } from '../../../src/core/survey/problem.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { bent, bends } from './bent-document.ts';
import { sampleTexts } from './sample-surveys.ts';

/** Read, or refused with places and sentences; at most a hundred, and one that counts the rest. */
function expectAnAnswer(parsed: Parsed<Survey>): void {
  const notes = parsed.ok ? parsed.warnings : parsed.problems;
  if (!parsed.ok) expect(notes.length).toBeGreaterThan(0);
  expect(notes.length).toBeLessThanOrEqual(101);
  for (const { path, message } of notes) {
    expect(path).not.toBe('');
    expect(message).toMatch(/^\S.{8,}\.$/su);
    expect(message).not.toMatch(/undefined|\[object/);
  }
}

const sample = fc.constantFrom(...sampleTexts.map(({ text }) => text));

test.prop([fc.json()], { numRuns: 300 })('any JSON text is answered', (text) => {
  expectAnAnswer(parseSurvey(text));
});

test.prop([fc.string()], { numRuns: 300 })('any text is answered', (text) => {
  expectAnAnswer(parseSurvey(text));
});

test.prop([fc.dictionary(fc.string(), fc.jsonValue())], { numRuns: 300 })(
  'any fields in a survey are answered',
  (fields) => {
    expectAnAnswer(surveyFromJson({ ...fields, format: 'noonmark-survey', version: 1 }));
  },
);

test.prop([sample, bends], { numRuns: 1500 })(
  'a sample with fields deleted or replaced is answered',
  (text, changes) => {
    expectAnAnswer(surveyFromJson(bent(JSON.parse(text), changes)));
  },
);

test.prop([sample, fc.double({ min: 0, max: 1, noNaN: true })], { numRuns: 150 })(
  'a sample cut short is answered',
  (text, share) => {
    const cut = parseSurvey(text.slice(0, Math.floor(share * (text.trimEnd().length - 1))));
    expect(cut.ok).toBe(false);
    expectAnAnswer(cut);
  },
);
