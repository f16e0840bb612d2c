import { openDB } from 'idb';
import { beforeEach, describe, expect, it } from 'vitest';
import { changesBetween } from '../../src/core/survey/field-changes.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { DATABASE_NAME, type FieldRow, type NoonmarkSchema } from '../../src/storage/schema.ts';
import { inventedSurvey, rawReading } from '../app/invented-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

beforeEach(emptyBrowser);

async function readable(surveys: ReturnType<typeof tab>['surveys'], id = 'invented-1'): Promise<Survey> {
  const stored = await surveys.load(id);
  if (stored?.state !== 'readable') throw new Error(`not readable: ${JSON.stringify(stored)}`);
  return stored.survey;
}

/** All rows as they lie in the database, past the app's own reading. */
async function rawRows() {
  const database = await openDB<NoonmarkSchema>(DATABASE_NAME);
  const rows = {
    surveys: await database.getAll('surveys'),
    fields: await database.getAll('fields'),
    readings: await database.getAll('readings'),
    erased: await database.getAll('erased'),
  };
  database.close();
  return rows;
}

describe('a stored survey', () => {
  it('comes back equal, from a new connection too', async () => {
    await tab().surveys.create(inventedSurvey());
    expect(await readable(tab().surveys)).toEqual(inventedSurvey());
  });

  it('is one line of the list, last changed first', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey('a', { title: 'First' }));
    await surveys.create(inventedSurvey('b', { title: 'Second' }));
    await surveys.applyChanges('a', [{ path: 'title', value: 'First, changed' }]);
    const list = await surveys.list();
    expect(list.map(({ title }) => title)).toEqual(['First, changed', 'Second']);
    expect(list[0]).toMatchObject({
      id: 'a',
      address: 'Mill lane 4',
      surveyedOn: '2026-05-14',
      planes: 1,
      stations: 1,
      obstructions: 1,
      deletedAt: null,
    });
    expect(list[0]).not.toHaveProperty('deletionStamp');
  });

  it('is not put over by another of the same id', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await expect(surveys.create(inventedSurvey('invented-1', { title: 'Another' }))).rejects.toMatchObject({
      code: 'survey-exists',
    });
    expect((await readable(surveys)).title).toBe('Mill lane 4, Nowhere');
  });

  it('does not mix with a survey whose id begins alike', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey('a'));
    await surveys.create(inventedSurvey('a-2', { title: 'Neighbour' }));
    await surveys.remove('a-2');
    await surveys.erase('a-2');
    expect(await readable(surveys, 'a')).toEqual(inventedSurvey('a'));
  });

  it('is unknown where it was never stored', async () => {
    const { surveys } = tab();
    expect(await surveys.load('nowhere')).toBeNull();
    await expect(surveys.applyChanges('nowhere', [])).rejects.toMatchObject({ code: 'survey-missing' });
    await expect(surveys.remove('nowhere')).rejects.toMatchObject({ code: 'survey-missing' });
  });
});

describe('changes', () => {
  it('turn one state into another and back', async () => {
    const { surveys } = tab();
    const before = inventedSurvey();
    const after = inventedSurvey('invented-1', {
      title: 'Renamed',
      obstructions: [],
      stations: [{ ...before.stations[0], traces: [] }],
    });
    await surveys.create(before);
    await surveys.applyChanges(before.id, changesBetween(before, after));
    expect(await readable(surveys)).toEqual(after);
    await surveys.applyChanges(before.id, changesBetween(after, before));
    expect(await readable(surveys)).toEqual(before);
  });

  it('carry stamps that only grow, also when the clock is set back', async () => {
    const { surveys, setClock } = tab();
    await surveys.create(inventedSurvey());
    setClock(Date.UTC(2020, 0, 1));
    await surveys.applyChanges('invented-1', [{ path: 'title', value: 'Later' }]);
    const { fields } = await rawRows();
    const title = fields.find(({ path }) => path === 'title')!;
    const others = fields.filter(({ path }) => path !== 'title').map(({ stamp }) => stamp);
    expect(new Set(others).size).toBe(1);
    expect(title.stamp > others[0]).toBe(true);
  });

  it('leave a stamped row where a field was cleared', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await surveys.applyChanges('invented-1', [{ path: 'surveyedOn', value: undefined }]);
    expect(await readable(surveys)).not.toHaveProperty('surveyedOn');
    const row = (await rawRows()).fields.find(({ path }) => path === 'surveyedOn')!;
    expect(row).not.toHaveProperty('value');
    expect(row.stamp).toMatch(/-device-1$/);
  });
});

describe('raw readings', () => {
  it('have rows of their own, not among the fields', async () => {
    await tab().surveys.create(inventedSurvey());
    const { fields, readings } = await rawRows();
    expect(readings).toHaveLength(1);
    expect(readings[0]).toMatchObject({ survey: 'invented-1', reading: rawReading('raw-1'), removed: null });
    expect(fields.filter(({ path }) => path.startsWith('readings/'))).toEqual([]);
  });

  it('are never put over, and the whole act is refused', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    const forged = inventedSurvey('invented-1', { title: 'Forged', readings: [rawReading('raw-1', 99)] });
    await expect(
      surveys.applyChanges('invented-1', changesBetween(inventedSurvey(), forged)),
    ).rejects.toMatchObject({ code: 'reading-conflict' });
    expect(await readable(surveys)).toEqual(inventedSurvey());
  });

  it('stay in the database when they are taken out of the survey, and can come back', async () => {
    const { surveys } = tab();
    const before = inventedSurvey();
    const station = before.stations[0];
    const without = inventedSurvey('invented-1', { readings: [], stations: [{ ...station, traces: [] }] });
    await surveys.create(before);
    await surveys.applyChanges('invented-1', changesBetween(before, without));
    expect((await readable(surveys)).readings).toEqual([]);
    expect((await rawRows()).readings[0]).toMatchObject({ reading: rawReading('raw-1') });
    await surveys.applyChanges('invented-1', changesBetween(without, before));
    expect(await readable(surveys)).toEqual(before);
  });
});

describe('deleting', () => {
  it('marks, restores, and loses nothing', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await surveys.remove('invented-1');
    expect((await surveys.list())[0].deletedAt).toBeTypeOf('number');
    expect(await readable(surveys)).toEqual(inventedSurvey());
    await surveys.restore('invented-1');
    expect((await surveys.list())[0].deletedAt).toBeNull();
  });

  it('stays in force while fields change', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await surveys.remove('invented-1');
    await surveys.applyChanges('invented-1', [{ path: 'title', value: 'Changed while deleted' }]);
    expect((await surveys.list())[0]).toMatchObject({
      title: 'Changed while deleted',
      deletedAt: expect.any(Number) as unknown,
    });
  });

  it('for good keeps the id alone', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await surveys.remove('invented-1');
    await surveys.erase('invented-1');
    const rows = await rawRows();
    expect(rows.surveys).toEqual([]);
    expect(rows.fields).toEqual([]);
    expect(rows.readings).toEqual([]);
    expect(rows.erased).toEqual([{ id: 'invented-1', stamp: expect.any(String) as unknown }]);
    expect(await surveys.load('invented-1')).toBeNull();
    await surveys.create(inventedSurvey());
    expect((await rawRows()).erased).toEqual([]);
  });
});

describe('a survey that this version cannot read', () => {
  async function storeField(row: Pick<FieldRow, 'path' | 'value'>): Promise<void> {
    const database = await openDB<NoonmarkSchema>(DATABASE_NAME);
    const stamp = (await database.getAll('fields'))[0].stamp;
    await database.put('fields', { survey: 'invented-1', stamp, ...row });
    database.close();
  }

  it('is listed, and gives its document whole: a newer version', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await storeField({ path: 'version', value: 99 });
    await storeField({ path: 'moonlight', value: { phase: 0.5 } });
    const stored = await surveys.load('invented-1');
    expect(stored).toMatchObject({ state: 'unreadable', problems: [{ path: 'version' }] });
    expect(stored).toHaveProperty('document', {
      ...inventedSurvey(),
      version: 99,
      moonlight: { phase: 0.5 },
    });
    expect(await surveys.list()).toHaveLength(1);
  });

  it('says where it is damaged', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    await storeField({ path: 'planes/south/surfaceTilt', value: 'steep' });
    expect(await surveys.load('invented-1')).toMatchObject({
      state: 'unreadable',
      problems: [{ path: 'planes[0].surfaceTilt' }],
    });
  });
});
