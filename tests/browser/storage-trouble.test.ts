import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inventedSurvey } from '../app/invented-survey.ts';
import { DESK, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { act, exported, imported, importFiles, longSurvey, surveyFile, titles } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const TITLE = inventedSurvey().title;

/** Puts a field into the database past the app. */
function storeField(page: Page, path: string, value: unknown): Promise<void> {
  return page.evaluate(
    ([fieldPath, fieldValue]) =>
      new Promise<void>((resolve, reject) => {
        const opening = indexedDB.open('noonmark');
        opening.onsuccess = () => {
          const transaction = opening.result.transaction('fields', 'readwrite');
          const stamp = '2026-05-14T09:30:00.000Z-0000-elsewhere';
          transaction
            .objectStore('fields')
            .put({ survey: 'invented-1', path: fieldPath, value: fieldValue, stamp });
          transaction.oncomplete = () => {
            opening.result.close();
            resolve();
          };
          transaction.onabort = () => reject(new Error('not stored'));
        };
      }),
    [path, value] as const,
  );
}

describe('killed in the middle of an import', () => {
  // Chromium ends the page's process: nothing of the app runs any more after that.
  const crash = async (page: Page) => {
    const session = await page.context().newCDPSession(page);
    const crashed = page.waitForEvent('crash');
    void session.send('Page.crash').catch(() => undefined);
    await crashed;
  };

  const tellsPuts = () => {
    const put = Reflect.get(IDBObjectStore.prototype, 'put') as (
      ...given: unknown[]
    ) => IDBRequest<IDBValidKey>;
    let count = 0;
    IDBObjectStore.prototype.put = function (this: IDBObjectStore, ...given) {
      if (this.name === 'fields' && ++count === 1000)
        (window as unknown as { reached: () => void }).reached();
      return put.apply(this, given);
    };
  };

  it('a survey is on the device whole or not at all', async () => {
    const page = await app.openPage(DESK);
    await imported(page);
    const context = page.context();
    const victim = await context.newPage();
    const reached = new Promise<void>((resolve) => void victim.exposeFunction('reached', resolve));
    await victim.addInitScript(tellsPuts);
    await victim.goto(app.server.address);
    await victim.locator('.ledger-title').waitFor();
    await importFiles(victim, surveyFile('long.json', longSurvey(12_000)));
    await reached;
    await crash(victim);

    await page.reload();
    await page.locator('.ledger-title').first().waitFor();
    const after = await titles(page);
    if (after.length === 2) expect((await exported(page, 'Long sweep')).survey).toEqual(longSurvey(12_000));
    else expect(after).toEqual([TITLE]);
    expect((await exported(page, TITLE)).survey).toEqual(inventedSurvey());
    expect(await page.evaluate(countsOfLong)).toBe(after.length === 2 ? 'rows' : 'no rows');
  });

  const countsOfLong = () =>
    new Promise<string>((resolve) => {
      const opening = indexedDB.open('noonmark');
      opening.onsuccess = () => {
        const range = IDBKeyRange.bound(['long'], ['long', []]);
        const counting = opening.result.transaction('fields').objectStore('fields').count(range);
        counting.onsuccess = () => {
          opening.result.close();
          resolve(counting.result > 0 ? 'rows' : 'no rows');
        };
      };
    });
});

describe('a full device', () => {
  it('by the browser’s own count is told, and what was stored stays', async () => {
    const page = await app.openPage(DESK, 'light', { path: '/self-check' });
    const session = await page.context().newCDPSession(page);
    const origin = app.server.address;
    // Room for the app and a survey, not for a long sweep.
    await session.send('Storage.overrideQuotaForOrigin', { origin, quotaSize: 3_000_000 });
    await page.goto(origin);
    await imported(page);
    await importFiles(page, surveyFile('long.json', longSurvey(8_000)));
    await page.locator('.import-results', { hasText: 'There is no room left on this device' }).waitFor();
    expect(await titles(page)).toEqual([TITLE]);
    await page.reload();
    expect((await exported(page, TITLE)).survey).toEqual(inventedSurvey());
    expect(await titles(page)).toEqual([TITLE]);
  });

  it('is told, and what was stored stays', async () => {
    const page = await app.openPage(PHONE, 'light', {
      before: () => {
        const put = Reflect.get(IDBObjectStore.prototype, 'put') as (
          ...given: unknown[]
        ) => IDBRequest<IDBValidKey>;
        IDBObjectStore.prototype.put = function (this: IDBObjectStore, ...given) {
          if ('deviceIsFull' in window) throw new DOMException('no room', 'QuotaExceededError');
          return put.apply(this, given);
        };
      },
    });
    await imported(page);
    await page.evaluate(() => void Object.assign(window, { deviceIsFull: true }));
    await importFiles(page, surveyFile('more.json', inventedSurvey('more')));
    await page.locator('.import-results', { hasText: 'There is no room left on this device' }).waitFor();
    await act(page, TITLE, 'Duplicate');
    await page.getByRole('alert').getByText('There is no room left on this device').waitFor();
    expect(await titles(page)).toEqual([TITLE]);
    expect((await exported(page, TITLE)).survey).toEqual(inventedSurvey());
  });
});

describe('a browser that refuses to store', () => {
  it('is told with what to do', async () => {
    const page = await app.openPage(PHONE, 'light', {
      before: () => {
        IDBFactory.prototype.open = () => {
          throw new DOMException('The operation is insecure.', 'SecurityError');
        };
      },
    });
    const alert = page.getByRole('alert');
    await alert.getByText('does not let Noonmark store anything').waitFor();
    expect(await alert.innerText()).toContain('Private windows');
    await page.getByRole('heading', { name: 'Surveys' }).waitFor();
  });
});

describe('two tabs during an upgrade', () => {
  it('the old one lets go and says reload', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    const other = await page.context().newPage();
    await other.goto(`${app.server.address}/icon.svg`);
    await other.evaluate(
      () =>
        new Promise<void>((resolve, reject) => {
          const opening = indexedDB.open('noonmark', 1000);
          opening.onsuccess = () => resolve();
          opening.onblocked = () => reject(new Error('blocked'));
        }),
    );
    const alert = page.getByRole('alert');
    await alert.getByText('A newer Noonmark is open in another tab').waitFor();
    await alert.getByRole('button', { name: 'Reload' }).waitFor();
    await act(page, TITLE, 'Delete');
    expect(await titles(page)).toEqual([TITLE]);
  });

  it('the new one says close the other, and goes on by itself', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    const context = page.context();
    const holder = await context.newPage();
    await holder.goto(`${app.server.address}/icon.svg`);
    // An old tab that does not listen.
    await holder.evaluate(
      () =>
        new Promise<void>((resolve) => {
          const opening = indexedDB.open('noonmark');
          opening.onsuccess = () => {
            Object.assign(window, { held: opening.result });
            resolve();
          };
        }),
    );
    await page.close();

    const newer = await context.newPage();
    await newer.addInitScript(() => {
      type Open = (this: IDBFactory, name: string, version?: number) => IDBOpenDBRequest;
      const open: Open = Reflect.get(IDBFactory.prototype, 'open');
      IDBFactory.prototype.open = function (name, version) {
        return open.call(this, name, (version ?? 0) + 1);
      };
    });
    await newer.goto(app.server.address);
    await newer.getByRole('alert').getByText('Close the other Noonmark tabs').waitFor();
    await holder.close();
    await newer.locator('.ledger-title').waitFor();
    expect(await newer.getByRole('alert').innerText()).toBe('');
    expect(await titles(newer)).toEqual([TITLE]);
  });
});

describe('a stored survey that cannot be read', () => {
  it('is listed with why, and can be exported as it is stored', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    await storeField(page, 'version', 7);
    await page.reload();
    await page.getByText('Cannot be read').waitFor();
    await page.getByText('The survey is of version 7').waitFor();
    const { survey } = await exported(page, TITLE, 'Export as stored');
    expect(survey).toEqual({ ...inventedSurvey(), version: 7 });
    await page.locator('.ledger-title').tap();
    await page.getByRole('heading', { level: 1, name: 'Cannot be read' }).waitFor();
  });
});
