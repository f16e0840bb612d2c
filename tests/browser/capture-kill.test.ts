import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { HeldPhone } from './capture-phone.ts';
import { bareSurvey, magneticLook } from './capture-steps.ts';
import { FileServer } from './file-server.ts';
import { doomedBrowser } from './killed-browser.ts';
import { readingsStored } from './stored-readings.ts';
import { imported } from './survey-files.ts';

const KILLS = 50;
/** Devices that are captured with at a time, each with a folder of its own. */
const DEVICES = 2;
/** A chunk of a sweep is full after half a second: the moments spread over the first two. */
const MOMENT = { from: 200, spread: 1000 };

let server: FileServer;
let folder: string;
beforeAll(async () => {
  server = new FileServer(inject('builtApp'));
  await server.start();
  folder = mkdtempSync(join(tmpdir(), 'noonmark-killed-'));
});
afterAll(async () => {
  await server.kill();
  rmSync(folder, { recursive: true, force: true, maxRetries: 5 });
});

/** Imports a survey with one station, in a browser that ends in peace. */
async function prepare(device: string): Promise<void> {
  const { page, close } = await doomedBrowser(device);
  await page.goto(server.address);
  const station = { id: 'A', name: 'Station A', serves: ['south'], traces: [] };
  await imported(page, { ...bareSurvey(), stations: [station] });
  await close();
}

/** What the screen says is stored, told to this process as it is drawn: nothing is asked of the doomed page. */
async function confirmations(page: Page): Promise<() => number> {
  let last = 0;
  await page.exposeFunction('confirmed', (count: number) => void (last = count));
  await page.addInitScript(() => {
    const tell = () => {
      const shown = document.querySelector('.stored-count')?.textContent;
      if (shown) (window as unknown as { confirmed: (count: number) => void }).confirmed(Number(shown));
    };
    const watch = new MutationObserver(tell);
    watch.observe(document, { subtree: true, childList: true, characterData: true });
  });
  return () => last;
}

/** Begins a sweep, or a single point each third time, over whatever the last kill left behind. */
async function capture(page: Page, phone: HeldPhone, kill: number): Promise<void> {
  await page.getByRole('button', { name: 'Along the top edge' }).click();
  await page.locator('.huge').first().waitFor();
  const leaveOut = page.getByRole('button', { name: 'Leave the sweep out' });
  if (await leaveOut.isVisible()) await leaveOut.click();
  const end = page.getByRole('button', { name: 'End trace' });
  if (await end.isVisible()) await end.click();
  if (kill % 3 !== 2) {
    void phone.move((at) => magneticLook(120 + 90 * at, 5 + 10 * at), 6000);
    await page.getByRole('button', { name: 'Start sweep' }).click();
    return;
  }
  phone.point(magneticLook(120 + kill, 20));
  await page.getByRole('button', { name: 'Points', exact: true }).click();
  await page.getByRole('button', { name: /First point|Next point/ }).click();
}

/** Starts the browser, looks that all is there, captures, and kills it; gives what must be there next time. */
async function killedOnce(
  device: string,
  kill: number,
  before: number,
): Promise<[least: number, told: number]> {
  const browser = await doomedBrowser(device);
  const { page } = browser;
  let phone: HeldPhone | null = null;
  try {
    const confirmed = await confirmations(page);
    phone = await HeldPhone.at(page, `${server.address}/survey/bare/stations/at/A/capture`);
    phone.point(magneticLook(120, 5));
    const found = await readingsStored(page);
    expect(found, `readings after kill ${kill - DEVICES}`).toBeGreaterThanOrEqual(before);
    await capture(page, phone, kill);
    const moment = MOMENT.from + MOMENT.spread * ((kill * 0.618034) % 1);
    await new Promise((resolve) => setTimeout(resolve, moment));
    const told = confirmed();
    return [found + told, told];
  } finally {
    await browser.kill();
    phone?.put();
  }
}

/** One device through its share of the kills; gives how many readings were confirmed in all. */
async function device(number: number): Promise<number> {
  const data = join(folder, String(number));
  await prepare(data);
  let least = 0;
  let confirmed = 0;
  for (let kill = number; kill < KILLS; kill += DEVICES) {
    const [now, told] = await killedOnce(data, kill, least);
    least = now;
    confirmed += told;
  }
  const { page, close } = await doomedBrowser(data);
  await page.goto(`${server.address}/survey/bare/stations`);
  await page.getByRole('heading', { name: 'Stations' }).waitFor();
  expect(await readingsStored(page), 'readings after the last kill').toBeGreaterThanOrEqual(least);
  await close();
  return confirmed;
}

describe('a browser killed in the middle of a capture', () => {
  it(`has every reading that the screen confirmed, at ${KILLS} moments`, async () => {
    const devices = Array.from({ length: DEVICES }, (_, number) => device(number));
    await Promise.allSettled(devices); // so that none is at work any more where another one fails
    const confirmed = await Promise.all(devices);
    // most kills come after something was confirmed, else this would prove nothing
    expect(confirmed.reduce((sum, count) => sum + count, 0)).toBeGreaterThan(KILLS / 2);
  }, 900_000);
});
