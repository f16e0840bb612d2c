import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, inject, it } from 'vitest';
import type { Survey } from '../../src/core/survey/survey.ts';
import { cameraAt, topEdgeAt } from '../sensors/posed-phone.ts';
import { HeldPhone, PHONE_CONTEXT, phoneBrowser, type Sensor } from './capture-phone.ts';
import { bareSurvey, magneticLook, newStation, news, say, storedCount, task, way } from './capture-steps.ts';
import { FileServer } from './file-server.ts';
import { precached } from './harness.ts';
import { assessed } from './assessed-file.ts';
import { exported, imported } from './survey-files.ts';

let server: FileServer;
let browser: Browser;
let phone: HeldPhone | null = null;
beforeAll(async () => {
  server = new FileServer(inject('builtApp'));
  await server.start();
  browser = await phoneBrowser();
});
afterEach(() => phone?.put());
afterAll(async () => {
  await browser.close();
  await server.kill();
});

async function openPhone(sensor: Sensor, from: Browser = browser, compassTurn = 0): Promise<Page> {
  const context = await from.newContext(PHONE_CONTEXT);
  context.setDefaultTimeout(20_000);
  const page = await context.newPage();
  await page.goto(server.address);
  await page.getByRole('main').waitFor();
  phone = await HeldPhone.of(page, sensor, compassTurn);
  await imported(page, bareSurvey());
  await page.getByRole('link', { name: 'Bare house' }).first().tap();
  await page.getByRole('heading', { level: 1, name: 'Bare house' }).waitFor();
  return page;
}

async function begin(page: Page, how: 'With the camera' | 'Along the top edge'): Promise<void> {
  await newStation(page);
  await page.getByRole('button', { name: how }).tap();
}

async function figures(page: Page): Promise<[string, string]> {
  const [azimuth, elevation] = await page.locator('.huge').allInnerTexts();
  return [azimuth, elevation];
}

/** The figures once they stand near to what is looked for. */
async function pointsNear(page: Page, azimuth: number, elevation: number): Promise<void> {
  await expect
    .poll(async () => (await figures(page)).map((text) => Math.round(parseFloat(text.replace('−', '-')))))
    .toEqual([azimuth, elevation]);
}

describe('a phone whose angles are tied to magnetic north', () => {
  it('traces, calls open and checks the heading offline; the file gives the same figures', async () => {
    const page = await openPhone('absolute');
    await precached(page);
    await page.context().setOffline(true);
    phone!.point(magneticLook(150, 20));
    await begin(page, 'With the camera');
    await page.locator('.sight video').waitFor();
    await pointsNear(page, 153, 20);

    await task(page, 'Heading');
    await page.getByRole('button', { name: 'Mark', exact: true }).last().tap();
    await page.getByLabel('Mark').fill('church');
    await page.getByLabel('Bearing, degrees').fill('150');
    await page.getByRole('button', { name: 'Sight the mark' }).tap();
    await news(page).getByText('Heading check stored').waitFor();
    await pointsNear(page, 150, 20);

    await task(page, 'Trace');
    await way(page, 'Straight edge');
    phone!.point(magneticLook(110, 15));
    await pointsNear(page, 110, 15);
    await page.getByRole('button', { name: 'One end' }).tap();
    await news(page).getByText('Point 1 stored').waitFor();
    phone!.point(magneticLook(160, 15));
    await pointsNear(page, 160, 15);
    await page.getByRole('button', { name: 'Other end' }).tap();
    await say(page, 'Building');

    await way(page, 'Sweep');
    phone!.point(magneticLook(200, 4));
    await pointsNear(page, 200, 4);
    await page.getByRole('button', { name: 'Start sweep' }).tap();
    await phone!.move((at) => magneticLook(200 + 30 * at, 4 + 20 * Math.sin(Math.PI * at)), 3000);
    await page.getByRole('button', { name: 'End sweep' }).tap();
    await say(page, 'Deciduous tree');

    await task(page, 'Open');
    phone!.point(magneticLook(230, 3));
    await pointsNear(page, 230, 3);
    await page.getByRole('button', { name: 'Open from here on' }).tap();
    await phone!.move((at) => magneticLook(230 + 60 * at, 3), 1500);
    await pointsNear(page, 290, 3);
    await page.getByRole('button', { name: 'Open up to here' }).tap();
    await news(page).getByText('Looked, and open').waitFor();
    await expect.poll(() => storedCount(page)).toBeGreaterThan(8);
    const strip = page.locator('.live-access dd');
    await expect.poll(async () => (await strip.allInnerTexts())[2]).toMatch(/^[5-9]\d\s%$/);
    await expect.poll(() => page.locator('.live-access.is-stale').count()).toBe(0);
    const live = await strip.allInnerTexts();

    await page.getByRole('button', { name: 'Done' }).tap();
    await page.getByRole('link', { name: 'Noonmark' }).tap();
    const { survey } = (await exported(page, 'Bare house')) as { survey: Survey };
    const [station] = survey.stations;
    expect(station.traces.map(({ shape, edge }) => [shape, edge])).toEqual([
      ['skyline', 'straight'],
      ['skyline', 'drawn'],
    ]);
    expect(station.traces[1].sightings.length).toBeGreaterThan(4);
    expect(station.traces[1].sightings.length).toBeLessThan(40);
    expect(station.headingChecks).toMatchObject([{ method: 'known-mark', bearing: 150, mark: 'church' }]);
    expect(station.markSightings).toBeUndefined();
    const file = await assessed(survey);
    const percent = (share: number) => `${Math.round(share * 100)}\u00a0%`;
    const { annual, interval } = file.solarAccess;
    const [low, high] = [Math.floor(interval!.low * 100), Math.ceil(interval!.high * 100)];
    expect(live).toEqual([percent(annual), `${low} to ${high}\u00a0%`, percent(file.coverage)]);
  });

  it('refuses a hold while it moves, and says so', async () => {
    const page = await openPhone('absolute');
    phone!.point(magneticLook(180, 20));
    await begin(page, 'Along the top edge');
    await way(page, 'Points');
    const moving = phone!.move((at) => magneticLook(180 + 96 * at, 20), 6000);
    await page.getByRole('button', { name: 'First point' }).tap();
    await news(page)
      .getByText(/Not taken: the phone moved by \d+\.\d°/)
      .waitFor();
    expect(await storedCount(page)).toBe(0);
    await moving;
    await page.getByRole('button', { name: 'First point' }).tap();
    await news(page).getByText('Point 1 stored').waitFor();
    expect(await storedCount(page)).toBe(1);
  });

  it('takes the last act back', async () => {
    const page = await openPhone('absolute');
    phone!.point(magneticLook(180, 20));
    await begin(page, 'With the camera');
    await task(page, 'Mark');
    await page.getByLabel('Name of the mark').fill('gable tip');
    await page.getByRole('button', { name: 'Sight the mark' }).tap();
    await news(page).getByText('Mark gable tip stored').waitFor();
    await page.getByRole('button', { name: 'Undo the last' }).tap();
    await news(page).getByText('Taken back: gable tip').waitFor();
    await page.getByRole('button', { name: 'Done' }).tap();
    await page.getByText('Nothing sighted from here yet').waitFor();
  });
});

describe('a phone without a compass', () => {
  it('keeps its sightings, and one check gives all of them their north', async () => {
    const page = await openPhone('relative');
    phone!.point(cameraAt(10, 12));
    await begin(page, 'With the camera');
    await page.getByText('This phone has no compass.').waitFor();
    expect((await figures(page))[0]).toBe('–');
    await way(page, 'Straight edge');
    await page.getByRole('button', { name: 'One end' }).tap();
    await news(page).getByText('Point 1 stored').waitFor();
    phone!.point(cameraAt(40, 12));
    await expect.poll(() => page.locator('.news-text').innerText()).toContain('Point 1');
    await new Promise((resolve) => setTimeout(resolve, 300));
    await page.getByRole('button', { name: 'Other end' }).tap();
    await say(page, 'Chimney');
    await page.getByRole('button', { name: 'Heading check' }).tap();
    await page.getByRole('button', { name: 'Mark', exact: true }).last().tap();
    await page.getByLabel('Mark').fill('church');
    await page.getByLabel('Bearing, degrees').fill('190');
    await page.getByRole('button', { name: 'Sight the mark' }).tap();
    await news(page).getByText('Heading check stored').waitFor();
    await page.getByRole('button', { name: 'Done' }).tap();
    const rows = page.getByRole('region', { name: /Sightings from/ }).getByRole('row');
    await expect
      .poll(async () => (await rows.allInnerTexts()).join(' '))
      .toMatch(/160\.\d°.*\n?.*190\.\d°|159\.\d°/s);
  });
});

describe('a phone with a compass heading beside its angles', () => {
  it('reads the compass flat and carries it into the upright pose', async () => {
    const page = await openPhone('with-compass', browser, 90);
    phone!.point(cameraAt(20, 10));
    await begin(page, 'With the camera');
    await page.getByText('No north yet.').waitFor();
    await page.getByRole('button', { name: 'Read the compass' }).tap();
    await news(page).getByText('lay the phone flat').waitFor();
    phone!.point(topEdgeAt(20, 2));
    await new Promise((resolve) => setTimeout(resolve, 300));
    await page.getByRole('button', { name: 'Read the compass' }).tap();
    await news(page).getByText('Compass read').waitFor();
    phone!.point(cameraAt(20, 10));
    await expect.poll(async () => (await figures(page))[0]).toMatch(/^\d+\.\d°$/);
    // 110 from magnetic north, and the declination of Vermont, some 14 degrees west
    await expect.poll(async () => Math.abs(parseFloat((await figures(page))[0]) - 96)).toBeLessThan(2);
  });
});

describe('what a device refuses', () => {
  it('no sensor: told, with the way to practise', async () => {
    const page = await openPhone('none');
    await begin(page, 'Along the top edge');
    await page.getByText(/tells nothing of how it is held|gives no angles/).waitFor();
    await page.getByRole('button', { name: 'Practise with a recording' }).tap();
    await page.getByRole('heading', { level: 1, name: /^Practice/ }).waitFor();
  });

  it('motion sensors not allowed: told, and tried again', async () => {
    const page = await openPhone('none');
    await page.evaluate(() => {
      Object.defineProperty(DeviceOrientationEvent, 'requestPermission', {
        value: () => Promise.resolve('denied'),
      });
    });
    await begin(page, 'Along the top edge');
    await page.getByText('was not allowed to use the motion sensors').waitFor();
    await page.getByRole('button', { name: 'Try again' }).tap();
    await page.getByRole('button', { name: 'With the camera' }).waitFor();
  });

  it('camera not allowed: sighting goes on along the top edge', async () => {
    const strict = await phoneBrowser('refuse');
    const page = await openPhone('absolute', strict);
    phone!.point(topEdgeAt(180, 5));
    await begin(page, 'With the camera');
    await page.getByText('The camera was not allowed.').waitFor();
    await way(page, 'Points');
    await page.getByRole('button', { name: 'First point' }).tap();
    await news(page).getByText('Point 1 stored').waitFor();
    await strict.close();
  });
});
