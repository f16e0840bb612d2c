import { forceCloseDatabase } from 'fake-indexeddb';
import { openDB, unwrap } from 'idb';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { DATABASE_NAME, DATABASE_VERSION } from '../../src/storage/schema.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { emptyBrowser, tab } from './memory-database.ts';

beforeEach(emptyBrowser);
afterEach(() => vi.restoreAllMocks());

/** Makes the writes to one store fail as the browser would. */
function failPuts(store: string, error: () => DOMException, times = Infinity): void {
  const prototype = IDBObjectStore.prototype;
  const put = Reflect.get(prototype, 'put') as (...given: unknown[]) => IDBRequest<IDBValidKey>;
  let left = times;
  vi.spyOn(prototype, 'put').mockImplementation(function (this: IDBObjectStore, ...given) {
    if (this.name === store && left-- > 0) throw error();
    return put.apply(this, given);
  });
}

describe('two tabs during an upgrade', () => {
  it('the old tab closes its connection, says so, and stores no more', async () => {
    const told: unknown[] = [];
    const old = tab((state) => told.push(state));
    await old.surveys.create(inventedSurvey());
    const newer = await openDB(DATABASE_NAME, DATABASE_VERSION + 1);
    expect(told).toEqual([null, 'storage-taken-over']);
    await expect(old.surveys.remove('invented-1')).rejects.toMatchObject({ code: 'storage-taken-over' });
    await expect(old.surveys.list()).rejects.toMatchObject({ code: 'storage-taken-over' });
    expect(await newer.getAll('surveys')).toHaveLength(1);
    newer.close();
  });

  it('the new tab says that it waits, and goes on by itself when the other lets go', async () => {
    await tab().surveys.create(inventedSurvey());
    const holder = await openDB(DATABASE_NAME);
    const open = indexedDB.open.bind(indexedDB);
    vi.spyOn(indexedDB, 'open').mockImplementation((name, version) => open(name, version! + 1));
    const told: unknown[] = [];
    const list = tab((state) => told.push(state)).surveys.list();
    await vi.waitFor(() => expect(told).toEqual(['storage-waiting']));
    holder.close();
    expect((await list).map(({ id }) => id)).toEqual(['invented-1']);
    expect(told).toEqual(['storage-waiting', null]);
  });

  it('a database of a newer version is left alone', async () => {
    const newer = await openDB(DATABASE_NAME, DATABASE_VERSION + 1);
    newer.close();
    await expect(tab().surveys.list()).rejects.toMatchObject({ code: 'storage-newer' });
  });
});

describe('a lost connection', () => {
  it('is opened again once, and the act is carried out', async () => {
    const { surveys, connection } = tab();
    await surveys.create(inventedSurvey());
    await connection.run((database) => Promise.resolve(database.close()));
    await surveys.remove('invented-1');
    expect((await surveys.list())[0].deletedAt).not.toBeNull();
  });

  it('that the browser ended is opened again at the next act', async () => {
    const { surveys, connection } = tab();
    await surveys.create(inventedSurvey());
    await connection.run((database) => {
      forceCloseDatabase(unwrap(database) as unknown as Parameters<typeof forceCloseDatabase>[0]);
      return Promise.resolve();
    });
    expect((await surveys.list()).map(({ id }) => id)).toEqual(['invented-1']);
  });

  it('is told when it cannot be had again', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey());
    failPuts('surveys', () => new DOMException('Connection to Indexed Database server lost', 'UnknownError'));
    await expect(surveys.remove('invented-1')).rejects.toMatchObject({ code: 'storage-lost' });
    vi.restoreAllMocks();
    expect((await surveys.list())[0].deletedAt).toBeNull();
  });

  it('in the middle of an act leaves no half of it, and the second try stores all', async () => {
    const { surveys } = tab();
    failPuts('surveys', () => new DOMException('lost', 'UnknownError'), 1);
    await surveys.create(inventedSurvey());
    expect(await surveys.load('invented-1')).toMatchObject({ survey: inventedSurvey() });
  });
});

describe('a full device', () => {
  it('is told, with nothing half-stored', async () => {
    const { surveys } = tab();
    await surveys.create(inventedSurvey('kept'));
    failPuts('fields', () => new DOMException('no room', 'QuotaExceededError'));
    await expect(surveys.create(inventedSurvey('too-much'))).rejects.toMatchObject({ code: 'storage-full' });
    await expect(surveys.applyChanges('kept', [{ path: 'title', value: 'New' }])).rejects.toMatchObject({
      code: 'storage-full',
    });
    vi.restoreAllMocks();
    expect((await surveys.list()).map(({ id }) => id)).toEqual(['kept']);
    expect(await surveys.load('too-much')).toBeNull();
    expect(await surveys.load('kept')).toMatchObject({ survey: inventedSurvey('kept') });
  });
});

describe('refused storage', () => {
  it('is told when the browser throws on opening', async () => {
    vi.spyOn(indexedDB, 'open').mockImplementation(() => {
      throw new DOMException('The operation is insecure.', 'SecurityError');
    });
    await expect(tab().surveys.list()).rejects.toMatchObject({ code: 'storage-refused' });
  });

  it('is told when there is no database at all', async () => {
    vi.stubGlobal('indexedDB', undefined);
    await expect(tab().surveys.list()).rejects.toMatchObject({ code: 'storage-refused' });
    vi.unstubAllGlobals();
  });

  it('is asked again at the next act, since it may be allowed meanwhile', async () => {
    const { surveys } = tab();
    vi.spyOn(indexedDB, 'open').mockImplementationOnce(() => {
      throw new DOMException('no', 'SecurityError');
    });
    await expect(surveys.list()).rejects.toMatchObject({ code: 'storage-refused' });
    expect(await surveys.list()).toEqual([]);
  });
});
