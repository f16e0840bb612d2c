import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inventedSurvey } from '../app/invented-survey.ts';
import { DESK, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { doomedBrowser } from './killed-browser.ts';
import { imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const isBack = (page: Page) =>
  page.getByText('What was typed here before, and not saved, is back.').waitFor();
const offer = (page: Page, what: string) => page.getByRole('button', { name: `Go on with: ${what}` });

/** Waits until a form's draft is in the database. */
async function kept(page: Page, part: string): Promise<void> {
  const drafts = () =>
    page.evaluate(
      () =>
        new Promise<string>((resolve, reject) => {
          const opening = indexedDB.open('noonmark');
          opening.onerror = () => reject(new Error('the database does not open'));
          opening.onsuccess = () => {
            const database = opening.result;
            const asked = database.transaction('drafts').objectStore('drafts').getAll();
            asked.onsuccess = () => {
              resolve(JSON.stringify(asked.result));
              database.close();
            };
          };
        }),
    );
  await expect.poll(drafts).toContain(part);
}

async function openedAt(section: string, viewport = PHONE): Promise<Page> {
  const page = await app.openPage(viewport);
  await imported(page, inventedSurvey());
  await page.locator('.ledger-title').click();
  await page.getByRole('link', { name: section, exact: true }).click();
  return page;
}

describe('a form that was not saved', () => {
  it('is offered after a reload, gone on with, and gone once saved', async () => {
    const page = await openedAt('Roof');
    await page.getByRole('button', { name: 'Add a plane' }).click();
    await page.getByLabel('Tilt').fill('6/12');
    await page.getByLabel('Bearing (degrees)').fill('95');
    await kept(page, '"bearing":"95"');
    await page.reload();
    await offer(page, 'New roof plane').click();
    await isBack(page);
    expect(await page.getByLabel('Tilt').inputValue()).toBe('6/12');
    await page.getByRole('button', { name: 'Add the plane' }).click();
    await page.getByText('“East roof” is added.').waitFor();
    await page.reload();
    await page.getByRole('heading', { name: 'East roof' }).waitFor();
    expect(await offer(page, 'New roof plane').count()).toBe(0);
  });

  it('is kept when somebody goes elsewhere without a word, and gone once cancelled', async () => {
    const page = await openedAt('Site', DESK);
    await page.getByRole('button', { name: 'Change Maple in the street' }).click();
    await page.getByLabel('Distance from the stations').fill('17.5');
    await page.getByRole('link', { name: 'Stations', exact: true }).click();
    await page.getByRole('link', { name: 'Site', exact: true }).click();
    await offer(page, 'Change Maple in the street').click();
    await isBack(page);
    expect(await page.getByLabel('Distance from the stations').inputValue()).toBe('17.5');
    await page.getByRole('button', { name: 'Start anew' }).click();
    expect(await page.getByLabel('Distance from the stations').inputValue()).not.toBe('17.5');
    await page.getByLabel('Distance from the stations').fill('18');
    await page.getByRole('button', { name: 'Cancel' }).click();
    await page.getByRole('heading', { name: 'Obstructions' }).waitFor();
    await page.reload();
    await page.getByRole('heading', { name: 'Obstructions' }).waitFor();
    expect(await offer(page, 'Change Maple in the street').count()).toBe(0);
  });

  it('says so where what it changes was changed meanwhile', async () => {
    const page = await openedAt('Roof');
    const change = page.getByRole('button', { name: 'Change South roof' });
    await change.click();
    await page.getByLabel('Tilt').fill('41');
    await kept(page, '"tilt":"41"');
    const other = await page.context().newPage();
    await other.goto(page.url());
    await other.getByRole('button', { name: 'Throw away: Change South roof' }).waitFor();
    await other.getByRole('button', { name: 'Duplicate South roof' }).click();
    await other.getByRole('button', { name: 'Change South roof', exact: true }).click();
    await other.getByLabel('Name').fill('Front');
    await other.getByRole('button', { name: 'Save the plane' }).click();
    await other.getByRole('heading', { name: 'Front' }).waitFor();
    await page.getByLabel('Tilt').fill('42');
    await kept(page, '"tilt":"42"');
    await page.reload();
    await offer(page, 'Change South roof').click();
    await page.getByText('Since then what is stored was changed').waitFor();
  });
});

describe('a trace half typed', () => {
  it('is there again when the form of its station is opened again', async () => {
    const page = await openedAt('Stations');
    const dialog = page.getByRole('dialog');
    await page.getByRole('button', { name: 'Type a trace' }).click();
    await dialog.getByLabel('Sighting 1, azimuth').fill('60');
    await dialog.getByLabel('Sighting 1, elevation').fill('20');
    await kept(page, '"elevation":"20"');
    await page.reload();
    await page.getByRole('button', { name: 'Type a trace' }).click();
    await isBack(page);
    expect(await dialog.getByLabel('Sighting 1, azimuth').inputValue()).toBe('60');
    await dialog.getByLabel('Sighting 2, azimuth').fill('80');
    await dialog.getByLabel('Sighting 2, elevation').fill('25');
    await dialog.getByRole('button', { name: 'Add the trace' }).click();
    await page.getByText('“Trace of Maple in the street” is added.').waitFor();
    await page.getByRole('button', { name: 'Type a trace' }).click();
    expect(await dialog.getByLabel('Sighting 1, azimuth').inputValue()).toBe('');
  });
});

describe('a browser that is killed', () => {
  it('has what was typed into the new-survey and the station form', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'noonmark-drafts-'));
    const first = await doomedBrowser(folder);
    await first.page.goto(`${app.server.address}/new-survey`);
    await first.page.getByLabel('Coordinates').fill('18T 721028 4976767');
    await first.page.getByLabel('Address').fill('Mill lane 4, Nowhere');
    await kept(first.page, 'Mill lane 4, Nowhere');
    await first.kill();

    const second = await doomedBrowser(folder);
    await second.page.goto(`${app.server.address}/new-survey`);
    await isBack(second.page);
    expect(await second.page.getByLabel('Address').inputValue()).toBe('Mill lane 4, Nowhere');
    await second.page.getByText('44.9100° N, 72.2000° W').waitFor();
    await expect.poll(() => second.page.getByLabel('Time zone').inputValue()).toBe('America/New_York');
    await second.page.getByRole('button', { name: 'Start the survey' }).click();
    await second.page.getByRole('link', { name: 'Stations', exact: true }).click();
    await second.page.getByRole('link', { name: 'Add a station' }).click();
    await second.page.getByLabel('Name').fill('By the chimney');
    await kept(second.page, 'By the chimney');
    const address = second.page.url();
    await second.kill();

    const third = await doomedBrowser(folder);
    await third.page.goto(address);
    await isBack(third.page);
    expect(await third.page.getByLabel('Name').inputValue()).toBe('By the chimney');
    await third.kill();
    rmSync(folder, { recursive: true, force: true });
  });
});
