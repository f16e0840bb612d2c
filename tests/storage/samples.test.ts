import { readdirSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { beforeEach, describe, expect, it } from 'vitest';
import { parseSurvey } from '../../src/core/survey/parse-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

const folder = resolve(import.meta.dirname, '../../survey-samples');
const files = readdirSync(folder).filter((file) => file.endsWith('.json'));

beforeEach(emptyBrowser);

describe('the sample surveys', () => {
  it('are there', () => expect(files.length).toBeGreaterThanOrEqual(7));

  it.each(files)('come back from the database as they were read: %s', async (file) => {
    const parsed = parseSurvey(readFileSync(join(folder, file), 'utf8'));
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
    await tab().surveys.create(parsed.value);
    expect(await tab().surveys.load(parsed.value.id)).toMatchObject({
      state: 'readable',
      survey: parsed.value,
    });
  });
});
