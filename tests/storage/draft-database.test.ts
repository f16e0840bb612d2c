import { openDB } from 'idb';
import { beforeEach, expect, it } from 'vitest';
import { DATABASE_NAME } from '../../src/storage/schema.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

beforeEach(emptyBrowser);

const PLANE = {
  survey: 'a',
  form: 'plane/new',
  label: 'New roof plane',
  typed: { tilt: '6/' },
  over: { tilt: '' },
};

it('a draft is read by another tab as it was typed, and is gone once dropped', async () => {
  await tab().drafts.keep(PLANE);
  const { drafts } = tab();
  expect(await drafts.read('a', 'plane/new')).toEqual(PLANE);
  await drafts.keep({ ...PLANE, typed: { tilt: '6/12' } });
  expect((await drafts.read('a', 'plane/new'))?.typed).toEqual({ tilt: '6/12' });
  await drafts.drop('a', 'plane/new');
  expect(await drafts.read('a', 'plane/new')).toBeNull();
});

it('the drafts of a survey are listed apart from those of another', async () => {
  const { drafts } = tab();
  await drafts.keep(PLANE);
  await drafts.keep({ ...PLANE, survey: 'ab', form: 'site' });
  await drafts.keep({ ...PLANE, survey: '', form: 'new-survey' });
  expect(await drafts.list('a')).toEqual([{ form: 'plane/new', label: 'New roof plane' }]);
  expect((await drafts.list('')).map(({ form }) => form)).toEqual(['new-survey']);
});

it('erasing a survey erases what was typed about it', async () => {
  const { drafts, surveys } = tab();
  const survey = inventedSurvey();
  await surveys.create(survey);
  await drafts.keep({ ...PLANE, survey: survey.id });
  await drafts.keep(PLANE);
  await surveys.erase(survey.id);
  expect(await drafts.list(survey.id)).toEqual([]);
  expect(await drafts.list('a')).toHaveLength(1);
});

it('a database from before there were drafts is brought up with its surveys', async () => {
  const { surveys, connection } = tab();
  await surveys.create(inventedSurvey());
  await connection.close();
  const now = await openDB(DATABASE_NAME);
  const stores = [...now.objectStoreNames].filter((name) => name !== 'drafts');
  const kept = await Promise.all(
    stores.map(async (name) => ({
      name,
      keyPath: now.transaction(name).store.keyPath,
      rows: await now.getAll(name),
    })),
  );
  now.close();
  emptyBrowser();
  const old = await openDB(DATABASE_NAME, 2, {
    upgrade: (database) =>
      kept.forEach(({ name, keyPath }) => database.createObjectStore(name, { keyPath: keyPath as string })),
  });
  for (const { name, rows } of kept) for (const row of rows) await old.put(name, row);
  old.close();
  const after = tab();
  expect((await after.surveys.list()).map(({ id }) => id)).toEqual([inventedSurvey().id]);
  await after.drafts.keep(PLANE);
  expect(await after.drafts.list('a')).toHaveLength(1);
});
