import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inventedSurvey } from '../app/invented-survey.ts';
import { PHONE, startApp, type AppUnderTest } from './harness.ts';
import { exported, imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

interface PickedPicture {
  name: string;
  mimeType: string;
  buffer: Buffer;
}

/** A picture drawn in the page, as its camera would give it. */
async function picture(page: Page, width: number, height: number, name = 'roof.png'): Promise<PickedPicture> {
  const bytes = await page.evaluate(
    async ([w, h]) => {
      const canvas = new OffscreenCanvas(w, h);
      const context = canvas.getContext('2d')!;
      context.fillStyle = '#864';
      context.fillRect(0, 0, w, h);
      context.fillStyle = '#248';
      context.fillRect(0, 0, w, h / 3);
      return [...new Uint8Array(await (await canvas.convertToBlob()).arrayBuffer())];
    },
    [width, height],
  );
  return { name, mimeType: 'image/png', buffer: Buffer.from(bytes) };
}

async function addPhoto(page: Page, of: string, ...files: PickedPicture[]): Promise<void> {
  const strip = page.getByRole('group', { name: `Photos of ${of}` });
  await strip.locator('input[type=file]').setInputFiles(files);
}

async function openSection(page: Page, name: string): Promise<void> {
  await page.getByRole('link', { name, exact: true }).click();
}

async function opened(app_: AppUnderTest): Promise<Page> {
  const page = await app_.openPage(PHONE);
  await imported(page);
  await page.locator('.ledger-title').tap();
  await page.getByRole('heading', { name: 'Photos of the site' }).waitFor();
  return page;
}

describe('photos', () => {
  it('are kept small, shown, counted, and noted in the record with their hash', async () => {
    const page = await opened(app);
    await openSection(page, 'Roof');
    await addPhoto(page, 'South roof', await picture(page, 4000, 3000));
    const photo = page.getByRole('button', { name: 'Photo 1 of South roof' });
    await photo.locator('img').waitFor();
    await photo.tap();
    await page.getByText('1600 × 1200 dots').waitFor();
    expect((await new AxeBuilder({ page }).analyze()).violations.map(({ id }) => id)).toEqual([]);
    await page.getByLabel('The camera looked towards').fill('172.5');
    await page.getByRole('button', { name: 'Done' }).tap();
    await page.getByRole('dialog').waitFor({ state: 'detached' });
    await page.reload();
    await photo.locator('img').waitFor();
    await openSection(page, 'Site');
    await page.getByText(/This survey has 1 photo, [\d.]+ kB/).waitFor();

    await page.getByRole('link', { name: 'Noonmark' }).tap();
    const { survey } = await exported(page, inventedSurvey().title);
    expect((survey as { photos: unknown[] }).photos).toEqual([
      expect.objectContaining({
        of: { kind: 'plane', id: 'south' },
        azimuth: 172.5,
        width: 1600,
        height: 1200,
        sha256: expect.stringMatching(/^[0-9a-f]{64}$/) as string,
      }),
    ]);
  });

  it('of a station, an obstruction and a fact are told apart', async () => {
    const page = await opened(app);
    const small = await picture(page, 64, 48);
    await addPhoto(page, 'Maple in the street', small);
    await page.getByRole('button', { name: 'Photo 1 of Maple in the street' }).waitFor();
    await page.getByText('Electrical service (').click();
    await addPhoto(page, 'Meter', small, small);
    await page.getByRole('button', { name: 'Photo 2 of Meter', exact: true }).waitFor();
    expect(await page.getByRole('button', { name: 'Photo 1 of the site' }).count()).toBe(0);
    await page.getByText('This survey has 3 photos').waitFor();
  });

  it('are deleted with a way back', async () => {
    const page = await opened(app);
    await addPhoto(page, 'the site', await picture(page, 640, 480));
    const photo = page.getByRole('button', { name: 'Photo 1 of the site' });
    await photo.tap();
    await page.getByRole('button', { name: 'Delete this photo' }).tap();
    await photo.waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'Undo' }).tap();
    await photo.locator('img').waitFor();
  });

  it('that are none are told in words, beside those that are kept', async () => {
    const page = await opened(app);
    await addPhoto(
      page,
      'the site',
      { name: 'list.pdf', mimeType: 'application/pdf', buffer: Buffer.from('%PDF-1.4') },
      { name: 'odd.heic', mimeType: 'image/heic', buffer: Buffer.from('ftypheic') },
      { name: 'empty.jpg', mimeType: 'image/jpeg', buffer: Buffer.alloc(0) },
      await picture(page, 640, 480),
    );
    await page.getByText('list.pdf is no picture').waitFor();
    await page.getByText(/odd\.heic is damaged, or a sort of picture/).waitFor();
    await page.getByText(/empty\.jpg is damaged/).waitFor();
    await page.getByRole('button', { name: 'Photo 1 of the site' }).waitFor();
    await page.getByText('This survey has 1 photo').waitFor();
  });

  it('of 40 MB are made small', async () => {
    const page = await opened(app);
    const base = await picture(page, 3000, 2000, 'huge.png');
    // What follows the end of a picture is let be by every reader.
    const buffer = Buffer.concat([base.buffer, Buffer.alloc(40_000_000)]);
    const strip = page.getByRole('group', { name: 'Photos of the site' });
    await strip.locator('input[type=file]').setInputFiles({ ...base, buffer });
    // 40 MB take their time through the browser's debugging port
    await page.getByRole('button', { name: 'Photo 1 of the site' }).tap({ timeout: 120_000 });
    await page.getByText('1600 × 1067 dots').waitFor();
  });

  it('for which there is no room are told, and the survey stays', async () => {
    const page = await app.openPage(PHONE, 'light', {
      before: () => {
        const put = Reflect.get(IDBObjectStore.prototype, 'put') as (
          ...given: unknown[]
        ) => IDBRequest<IDBValidKey>;
        IDBObjectStore.prototype.put = function (this: IDBObjectStore, ...given) {
          if (this.name === 'photos') throw new DOMException('no room', 'QuotaExceededError');
          return put.apply(this, given);
        };
      },
    });
    await imported(page);
    await page.locator('.ledger-title').tap();
    await page.getByRole('heading', { name: 'Photos of the site' }).waitFor();
    await addPhoto(page, 'the site', await picture(page, 640, 480));
    await page.getByRole('alert').getByText('There is no room left on this device').waitFor();
    await page.getByText('No photo yet.').waitFor();
  });
});
