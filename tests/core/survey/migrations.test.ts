import { expect, test } from 'vitest';
import { migrated, migrations, unusedMigrations } from '../../../src/core/survey/migrations.ts';
import type { Migration } from '../../../src/core/survey/migrations.ts';
import { SURVEY_VERSION } from '../../../src/core/survey/survey.ts';
import { sampleTexts } from './sample-surveys.ts';

const documents = sampleTexts.map(({ text }) => JSON.parse(text) as { version: number });

test('every released version but the newest has its migration', () => {
  expect(migrations.map(({ from }) => from)).toEqual(
    Array.from({ length: SURVEY_VERSION - 1 }, (_, i) => i + 1),
  );
  expect(new Set(migrations.map(({ name }) => name)).size).toBe(migrations.length);
});

test('every migration was used by a sample, and every sample comes to the newest version', () => {
  const results = documents.map((document) => migrated({ ...document }, document.version));
  const used = new Set(results.flatMap((result) => result.used));
  expect(unusedMigrations(migrations, used)).toEqual([]);
  expect(results.every(({ document }) => document.version === SURVEY_VERSION)).toBe(true);
});

const steps: Migration[] = [
  { from: 1, name: 'first', migrate: (document) => ({ ...document, version: 2, a: 1 }) },
  { from: 2, name: 'second', migrate: (document) => ({ ...document, version: 3, b: document.a }) },
];

test('steps run in order from the document’s version, and say so', () => {
  expect(migrated({ version: 1 }, 1, steps, 3)).toEqual({
    document: { version: 3, a: 1, b: 1 },
    used: ['first', 'second'],
  });
  expect(migrated({ version: 2, a: 7 }, 2, steps, 3).used).toEqual(['second']);
  expect(migrated({ version: 3 }, 3, steps, 3)).toEqual({ document: { version: 3 }, used: [] });
});

test('a migration that no sample needed is named', () => {
  expect(unusedMigrations(steps, new Set(['second']))).toEqual(['first']);
});

test('a missing step is told', () => {
  expect(() => migrated({ version: 1 }, 1, steps.slice(1), 3)).toThrow(/no migration, got 1/);
});
