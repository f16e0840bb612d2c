import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inventedSurvey } from '../app/invented-survey.ts';
import { PHONE, startApp, type AppUnderTest } from './harness.ts';
import { act, exported, imported, titles } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const TITLE = inventedSurvey().title;

/** The archive that an act hands to the browser. */
async function archiveOf(page: Page, start: () => Promise<void>): Promise<{ name: string; buffer: Buffer }> {
  const [download] = await Promise.all([page.waitForEvent('download'), start()]);
  const chunks: Buffer[] = [];
  for await (const chunk of await download.createReadStream()) chunks.push(chunk as Buffer);
  return { name: download.suggestedFilename(), buffer: Buffer.concat(chunks) };
}

async function restore(page: Page, name: string, buffer: Buffer): Promise<void> {
  await page.locator('#backup-files').setInputFiles({ name, mimeType: 'application/zip', buffer });
}

const tinyPicture = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);

/** A survey with one photo, and its list on screen. */
async function withPhoto(): Promise<Page> {
  const page = await app.openPage(PHONE);
  await imported(page);
  await page.locator('.ledger-title').tap();
  const strip = page.getByRole('group', { name: 'Photos of the site' });
  await strip
    .locator('input[type=file]')
    .setInputFiles({ name: 'dot.png', mimeType: 'image/png', buffer: tinyPicture });
  await page.getByRole('button', { name: 'Photo 1 of the site' }).waitFor();
  await page.getByRole('link', { name: 'Noonmark' }).tap();
  await page.locator('.ledger-title').waitFor();
  return page;
}

describe('a backup', () => {
  it('of all surveys is restored on another device, photos too, without a network', async () => {
    const page = await withPhoto();
    const before = (await exported(page, TITLE)).survey;
    const { name, buffer } = await archiveOf(page, () =>
      page.getByRole('button', { name: 'Back up all surveys' }).tap(),
    );
    expect(name).toMatch(/^noonmark-backup-\d{4}-\d\d-\d\d\.zip$/);

    const other = await app.openPage(PHONE);
    await other.evaluate(async () => void (await navigator.serviceWorker.ready));
    await other.context().setOffline(true);
    await restore(other, name, buffer);
    await other.getByText('is restored.').waitFor();
    expect(await titles(other)).toEqual([TITLE]);
    expect((await exported(other, TITLE)).survey).toEqual(before);
    await other.locator('.ledger-title').tap();
    const photo = other.getByRole('button', { name: 'Photo 1 of the site' });
    // Pictures are read once they come into view.
    await photo.scrollIntoViewIfNeeded();
    await photo.locator('img').waitFor();
  });

  it('of one survey leaves newer work alone', async () => {
    const page = await withPhoto();
    const { name, buffer } = await archiveOf(page, () => act(page, TITLE, 'Back up with photos'));
    await page.locator('.ledger-title').tap();
    await page.getByRole('button', { name: 'Rename' }).tap();
    await page.getByLabel('Title').fill('Newer title');
    await page.getByRole('button', { name: 'Save' }).tap();
    await page.getByRole('heading', { level: 1, name: 'Newer title' }).waitFor();
    await page.getByRole('link', { name: 'Noonmark' }).tap();
    await restore(page, name, buffer);
    await page.getByText('nothing in the backup is newer').waitFor();
    expect(await titles(page)).toEqual(['Newer title']);
  });

  it('that is damaged is refused with what and where, and nothing is changed', async () => {
    const page = await withPhoto();
    const { name, buffer } = await archiveOf(page, () => act(page, TITLE, 'Back up with photos'));
    const other = await app.openPage(PHONE);
    await restore(other, name, buffer.subarray(0, buffer.length - 400));
    await other.getByText('cut short or damaged').waitFor();
    const bent = Buffer.from(buffer);
    const place = bent.indexOf('photos/') + 90;
    bent[place] ^= 255;
    await restore(other, name, bent);
    await other.getByText('it does not have the hash it should').waitFor();
    expect(await other.locator('.import-results code').innerText()).toMatch(/^photos\//);
    expect(await titles(other)).toEqual([]);
  });

  it('for which there is no room is told, and what was here stays', async () => {
    const page = await withPhoto();
    const { name, buffer } = await archiveOf(page, () => act(page, TITLE, 'Back up with photos'));
    const other = await app.openPage(PHONE, 'light', {
      before: () => {
        IDBObjectStore.prototype.put = () => {
          throw new DOMException('no room', 'QuotaExceededError');
        };
      },
    });
    await restore(other, name, buffer);
    await other.getByText('There is no room left on this device').waitFor();
    expect(await titles(other)).toEqual([]);
  });
});
