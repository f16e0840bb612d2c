import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, inject, it } from 'vitest';
import type { Survey } from '../../src/core/survey/survey.ts';
import { HeldPhone, PHONE_CONTEXT, phoneBrowser } from './capture-phone.ts';
import { bareSurvey, magneticLook, news, say, storedCount, task, way } from './capture-steps.ts';
import { FileServer } from './file-server.ts';
import { readingsStored } from './stored-readings.ts';
import { exported, imported } from './survey-files.ts';

let server: FileServer;
let browser: Browser;
const phones: HeldPhone[] = [];
beforeAll(async () => {
  server = new FileServer(inject('builtApp'));
  await server.start();
  browser = await phoneBrowser();
});
afterEach(() => phones.splice(0).forEach((phone) => phone.put()));
afterAll(async () => {
  await browser.close();
  await server.kill();
});

const STATION = { id: 'A', name: 'Station A', serves: ['south'], traces: [] };

/** A device that has the bare house with one station. */
async function device(): Promise<BrowserContext> {
  const context = await browser.newContext(PHONE_CONTEXT);
  context.setDefaultTimeout(20_000);
  const page = await context.newPage();
  await page.goto(server.address);
  await imported(page, { ...bareSurvey(), stations: [STATION] });
  await page.close();
  return context;
}

/** A tab of it that sights from the station. */
async function sighting(context: BrowserContext): Promise<[Page, HeldPhone]> {
  const page = await context.newPage();
  const phone = await HeldPhone.at(page, `${server.address}/survey/bare/stations/at/A/capture`);
  phones.push(phone);
  phone.point(magneticLook(150, 20));
  await page.getByRole('button', { name: 'With the camera' }).tap();
  await page.locator('.huge').first().waitFor();
  return [page, phone];
}

async function onDevice(page: Page): Promise<Survey> {
  await page.goto(server.address);
  return (await exported(page, 'Bare house')).survey as Survey;
}

async function point(page: Page, name: 'First point' | 'Next point', count: number): Promise<void> {
  await page.getByRole('button', { name }).tap();
  await news(page).getByText(`Point ${count} stored`).waitFor();
}

describe('a device that gets full in the middle of a capture', () => {
  it('is told; nothing confirmed is lost, and the capture goes on once there is room', async () => {
    const context = await device();
    const keeper = await context.newPage();
    await keeper.goto(`${server.address}/icon.svg`);
    const cdp = await context.newCDPSession(keeper);
    const origin = server.address;
    const used = await keeper.evaluate(async () => (await navigator.storage.estimate()).usage ?? 0);
    // Room for a few points. The browser counts it now and then only, at the latest after half a minute.
    await cdp.send('Storage.overrideQuotaForOrigin', { origin, quotaSize: used + 12_000 });
    const [page, phone] = await sighting(context);
    await way(page, 'Points');
    await point(page, 'First point', 1);
    const refused = news(page).getByText('Not stored');
    for (let count = 2; !(await refused.isVisible()); count++) {
      await page.getByRole('button', { name: 'Next point' }).tap();
      await news(page).getByText(`Point ${count} stored`).or(refused).waitFor();
    }
    const told = page.getByText('There is no room left on this device').filter({ visible: true });
    const alert = page.getByRole('alert').filter({ has: told });
    await alert.waitFor();
    expect(await told.count()).toBe(1);
    const confirmed = await storedCount(page);
    expect(await readingsStored(page)).toBeGreaterThanOrEqual(confirmed);

    await cdp.send('Storage.overrideQuotaForOrigin', { origin });
    phone.point(magneticLook(170, 22));
    await page.getByRole('button', { name: 'Next point' }).tap();
    await expect.poll(() => storedCount(page)).toBe(confirmed + 1);
    await alert.waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'End trace' }).tap();
    await say(page, 'Building');
    const { readings, stations } = await onDevice(page);
    expect(readings.length).toBe(confirmed + 1);
    expect(stations[0].traces[0].sightings.length).toBe(confirmed + 1);
  });
});

describe('two tabs at the same station', () => {
  it('lose nothing of each other, and each sees what the other stored', async () => {
    const context = await device();
    const [one, phone] = await sighting(context);
    const [other] = await sighting(context);
    phone.point(magneticLook(100, 15));
    await way(one, 'Sweep');
    await one.getByRole('button', { name: 'Start sweep' }).tap();
    const moving = phone.move((at) => magneticLook(100 + 40 * at, 15), 4000);
    await task(other, 'Mark');
    for (const mark of ['gable tip', 'mast']) {
      await other.getByLabel('Name of the mark').fill(mark);
      await other.getByRole('button', { name: 'Sight the mark' }).tap();
      await news(other).getByText(`Mark ${mark} stored`).waitFor();
    }
    await moving;
    await one.getByRole('button', { name: 'End sweep' }).tap();
    await say(one, 'Building');
    await task(one, 'Open');
    await one.getByRole('button', { name: 'Open from here on' }).tap();
    await phone.move((at) => magneticLook(140 + 30 * at, 5), 1000);
    await one.getByRole('button', { name: 'Open up to here' }).tap();
    await news(one).getByText('Looked, and open').waitFor();
    await task(other, 'Open');
    await other.getByRole('button', { name: 'Open from here on' }).tap();
    await new Promise((resolve) => setTimeout(resolve, 500));
    await other.getByRole('button', { name: 'Open up to here' }).tap();
    await news(other).getByText('Looked, and open').waitFor();
    const confirmed = (await storedCount(one)) + (await storedCount(other));

    await one.getByRole('button', { name: 'Done' }).tap();
    await one.getByText('Has 1 trace, 2 open ranges, 2 marks').waitFor();
    await other.getByRole('button', { name: 'Done' }).tap();
    await other.getByText('Has 1 trace, 2 open ranges, 2 marks').waitFor();
    const survey = await onDevice(one);
    expect(survey.readings.length).toBe(confirmed);
    const [{ traces, markSightings, openLooks }] = survey.stations;
    expect([traces.length, markSightings?.length, openLooks?.length]).toEqual([1, 2, 2]);
  });
});

describe('a phone turned on its side in the middle of a sweep', () => {
  it('reads the same directions, and everything stays in reach', async () => {
    const [page, phone] = await sighting(await device());
    const cdp = await page.context().newCDPSession(page);
    await way(page, 'Sweep');
    await page.getByRole('button', { name: 'Start sweep' }).tap();
    const moving = phone.move((at) => magneticLook(100 + 60 * at, 15), 5000);
    await new Promise((resolve) => setTimeout(resolve, 1500));
    await cdp.send('Emulation.setDeviceMetricsOverride', {
      ...{ width: 844, height: 390, deviceScaleFactor: 2, mobile: true },
      screenOrientation: { type: 'landscapePrimary', angle: 90 },
    });
    await expect.poll(() => page.evaluate(() => [innerWidth, screen.orientation.angle])).toEqual([844, 90]);
    await moving;
    await expectInReach(page, 'End sweep');
    await page.getByRole('button', { name: 'End sweep' }).tap();
    await say(page, 'Building');
    await expectInReach(page, 'Start sweep');
    // the compass of this phone is 3° off
    await expect
      .poll(async () =>
        (await page.locator('.huge').allInnerTexts()).map((text) => Math.round(parseFloat(text))),
      )
      .toEqual([163, 15]);
    const { readings, stations } = await onDevice(page);
    const angles = new Set(readings.flatMap(({ screenAngle }) => screenAngle));
    expect([...angles]).toEqual(expect.arrayContaining([0, 90]));
    const looked = stations[0].traces[0].sightings;
    expect(looked.length).toBeGreaterThan(1);
  });

  async function expectInReach(page: Page, name: string): Promise<void> {
    const found = await page.getByRole('button', { name }).evaluate((button) => {
      const { left, right, top, bottom } = button.getBoundingClientRect();
      const middle = document.elementFromPoint((left + right) / 2, (top + bottom) / 2);
      return {
        inside: left >= 0 && top >= 0 && right <= innerWidth && bottom <= innerHeight,
        onTop: middle !== null && button.contains(middle),
        past: document.documentElement.scrollWidth - innerWidth,
      };
    });
    expect(found).toEqual({ inside: true, onTop: true, past: 0 });
  }
});
