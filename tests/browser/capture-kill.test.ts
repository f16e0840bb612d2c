import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { HeldPhone } from './capture-phone.ts';
import { bareSurvey, magneticLook, storedCount } from './capture-steps.ts';
import { FileServer } from './file-server.ts';
import { doomedBrowser } from './killed-browser.ts';
import { imported } from './survey-files.ts';

const KILLS = 24;

let server: FileServer;
let folder: string;
beforeAll(async () => {
  server = new FileServer(inject('builtApp'));
  await server.start();
  folder = mkdtempSync(join(tmpdir(), 'noonmark-killed-'));
});
afterAll(async () => {
  await server.kill();
  rmSync(folder, { recursive: true, force: true });
});

/** Raw readings in the database, past the app. */
const readingsStored = (page: Page): Promise<number> =>
  page.evaluate(
    () =>
      new Promise<number>((resolve, reject) => {
        const opening = indexedDB.open('noonmark');
        opening.onerror = () => reject(new Error('not opened'));
        opening.onsuccess = () => {
          const asked = opening.result.transaction('readings').objectStore('readings').count();
          asked.onsuccess = () => {
            opening.result.close();
            resolve(asked.result);
          };
        };
      }),
  );

const surveyAddress = () => `${server.address}/survey/bare/stations`;

/** Imports a survey with one station, in a browser that ends in peace. */
async function prepared(): Promise<void> {
  const { page, kill } = await doomedBrowser(folder);
  await page.goto(server.address);
  const station = { id: 'A', name: 'Station A', serves: ['south'], traces: [] };
  await imported(page, { ...bareSurvey(), stations: [station] });
  await kill();
}

/** Captures until the moment comes: sweeps and single points by turns. */
async function captureFor(page: Page, phone: HeldPhone, round: number, ms: number): Promise<void> {
  await page.getByRole('button', { name: 'Along the top edge' }).click();
  await page.locator('.huge').first().waitFor();
  const leaveOut = page.getByRole('button', { name: 'Leave the sweep out' });
  if (await leaveOut.isVisible()) await leaveOut.click();
  const end = page.getByRole('button', { name: 'End trace' });
  if (await end.isVisible()) await end.click();
  void phone.move((at) => magneticLook(120 + 90 * at, 5 + 10 * at), ms + 5000);
  if (round % 3 !== 2) await page.getByRole('button', { name: 'Start sweep' }).click();
  else {
    await page.getByRole('button', { name: 'Points', exact: true }).click();
    phone.point(magneticLook(120 + round, 20));
    await page.getByRole('button', { name: /First point|Next point/ }).click();
  }
  await new Promise((resolve) => setTimeout(resolve, ms));
}

describe('a browser killed in the middle of a capture', () => {
  it(`has every reading that the screen confirmed, at ${KILLS} moments`, async () => {
    await prepared();
    let before = 0;
    let confirmedInAll = 0;
    for (let round = 0; round < KILLS; round++) {
      const { page, kill } = await doomedBrowser(folder);
      await page.goto(`${surveyAddress()}/at/A/capture`);
      await page.getByRole('button', { name: 'Along the top edge' }).waitFor();
      const found = await readingsStored(page);
      expect(found).toBeGreaterThanOrEqual(before);
      const phone = await HeldPhone.of(page, 'absolute');
      phone.point(magneticLook(120, 5));
      // moments spread over the half second of a chunk and the hold, the same each time
      await captureFor(page, phone, round, 600 + ((round * 373) % 1400));
      const confirmed = await storedCount(page);
      await kill();
      phone.put();
      confirmedInAll += confirmed;
      before = found + confirmed;
    }
    const { page, kill } = await doomedBrowser(folder);
    await page.goto(surveyAddress());
    await page.getByRole('heading', { name: 'Stations' }).waitFor();
    expect(await readingsStored(page)).toBeGreaterThanOrEqual(before);
    expect(confirmedInAll).toBeGreaterThan(KILLS);
    await kill();
  }, 400_000);
});
