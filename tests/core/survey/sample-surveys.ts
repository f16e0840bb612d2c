import { readFileSync, readdirSync } from 'node:fs';
import { parseSurvey } from '../../../src/core/survey/parse-survey.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';

const folder = new URL('../../../survey-samples/', import.meta.url);

/** Every sample file's name and text. */
export const sampleTexts = readdirSync(folder)
  .filter((file) => file.endsWith('.json'))
  .map((file) => ({ file, text: readFileSync(new URL(file, folder), 'utf8') }));

/** A sample's document, fresh each time, as JSON.parse gives it. */
export function sampleDocument(file = 'suburban-maple-and-gable.json'): unknown {
  return JSON.parse(sampleTexts.find((sample) => sample.file === file)!.text);
}

/** A sample as the parser reads it. */
export function sampleSurvey(file?: string): Survey {
  const parsed = parseSurvey(JSON.stringify(sampleDocument(file)));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return parsed.value;
}
