import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, inject, it } from 'vitest';
import { laidOn } from '../sensors/posed-phone.ts';
import { HeldPhone, PHONE_CONTEXT, phoneBrowser } from './capture-phone.ts';
import { bareSurvey, magneticLook, news, newStation, say, task, way } from './capture-steps.ts';
import { FileServer } from './file-server.ts';
import { imported } from './survey-files.ts';

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

async function open(context: Parameters<Browser['newContext']>[0]): Promise<Page> {
  const made = await browser.newContext(context);
  made.setDefaultTimeout(20_000);
  const page = await made.newPage();
  await page.goto(server.address);
  await page.getByRole('main').waitFor();
  return page;
}

/** Nothing that axe finds, nothing past the edge, nothing too small for a glove. */
async function expectGood(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)).toEqual(
    [],
  );
  const found = await page.evaluate(() => {
    const screen = document.querySelector('.full-screen');
    const touched = [...(screen?.querySelectorAll('button, input') ?? [])].filter((element) =>
      element.checkVisibility(),
    );
    return {
      past: document.documentElement.scrollWidth - innerWidth,
      pastScreen: screen ? screen.scrollWidth - screen.clientWidth : 0,
      small: touched
        .filter((element) => {
          const { width, height } = element.getBoundingClientRect();
          return width < 56 || height < 56;
        })
        .map((element) => element.outerHTML),
      thumbs: [...(screen?.querySelectorAll('.thumb.main') ?? [])].map(
        (thumb) => thumb.getBoundingClientRect().height,
      ),
    };
  });
  expect(found).toMatchObject({ past: 0, pastScreen: 0, small: [] });
  for (const height of found.thumbs) expect(height).toBeGreaterThanOrEqual(72);
}

const DESK = { viewport: { width: 1280, height: 800 }, hasTouch: true, locale: 'en-GB' };
const LOOKS = [
  { name: 'a phone in light', context: { ...PHONE_CONTEXT, colorScheme: 'light' } },
  { name: 'a phone in dark', context: { ...PHONE_CONTEXT, colorScheme: 'dark' } },
  { name: 'a desk', context: DESK },
  { name: 'a small phone', context: { ...PHONE_CONTEXT, viewport: { width: 360, height: 640 } } },
  { name: 'a phone on its side', context: { ...PHONE_CONTEXT, viewport: { width: 844, height: 390 } } },
] as const;

describe.each(LOOKS)('sighting on $name', ({ context }) => {
  it('is good to look at and to touch at every step', async () => {
    const page = await open(context);
    phone = await HeldPhone.of(page, 'absolute');
    await imported(page, bareSurvey());
    await page.getByRole('link', { name: 'Bare house' }).first().tap();
    phone.point(magneticLook(150, 20));
    await newStation(page);
    await expectGood(page);
    await page.getByRole('button', { name: 'With the camera' }).tap();
    await page.locator('.sight video').waitFor();
    await page.getByText(/^Unseen: /).waitFor();
    await expect.poll(() => page.locator('.huge').first().innerText()).toMatch(/^15[23]\.\d°$/);
    await expectGood(page);
    await way(page, 'Straight edge');
    await page.getByRole('button', { name: 'One end' }).tap();
    await news(page).getByText('Point 1 stored').waitFor();
    phone.point(magneticLook(200, 20));
    await expect.poll(() => page.locator('.huge').first().innerText()).toMatch(/^20[23]\.\d°$/);
    await page.getByRole('button', { name: 'Other end' }).tap();
    await page.getByRole('dialog', { name: 'What is it?' }).waitFor();
    await expectGood(page);
    await say(page, 'Building');
    for (const name of ['Open', 'Mark', 'Heading'] as const) {
      await task(page, name);
      await expectGood(page);
    }
    await page.getByRole('button', { name: 'Done' }).tap();
    await page.getByText('Has 1 trace').waitFor();
    await expectGood(page);
    await page.getByRole('link', { name: 'All stations' }).tap();
    await page.locator('.station-row', { hasText: 'Tilt' }).tap();
    phone.point(laidOn(28, 170));
    await page.getByRole('button', { name: 'With the camera' }).tap();
    await page.getByRole('button', { name: 'Take the placing' }).tap();
    await news(page).getByText('Placing on South roof stored').waitFor();
    await page.getByText('28.0°').or(page.getByText('28.1°')).or(page.getByText('27.9°')).first().waitFor();
    await expectGood(page);
  });
});

describe('a desk without sensors', () => {
  it('practises: a recording is played through the same screens, and marked as such', async () => {
    const page = await open(DESK);
    await imported(page, bareSurvey());
    await page.getByRole('link', { name: 'Bare house' }).first().tap();
    await page.getByRole('link', { name: 'Stations' }).tap();
    await page.getByRole('button', { name: 'Practise with a recording' }).tap();
    await page.getByRole('heading', { level: 1, name: /^Practice/ }).waitFor();
    await page.locator('.station-row', { hasText: 'Station A' }).tap();
    await page.getByRole('link', { name: 'Sight from here' }).tap();
    await page.getByRole('button', { name: 'Play the recording' }).tap();
    await page.locator('.practice-mark').waitFor();
    const goOn = page.getByRole('button', { name: 'Go on' });
    const cue = (number: number) => page.getByText(`Recording, ${number} of 12:`).waitFor();
    await task(page, 'Heading');
    await goOn.and(page.locator(':enabled')).waitFor();
    await page.getByRole('button', { name: 'Take the shadow' }).tap();
    await page.getByText(/north found ±\s\d/).waitFor();
    for (let place = 2; place <= 4; place++) {
      await goOn.tap();
      await cue(place);
      await goOn.and(page.locator(':enabled')).waitFor();
    }
    await task(page, 'Trace');
    await way(page, 'Straight edge');
    await page.getByRole('button', { name: 'One end' }).tap();
    await news(page).getByText('Point 1 stored').waitFor();
    await goOn.tap();
    await goOn.and(page.locator(':enabled')).waitFor();
    await page.getByRole('button', { name: 'Other end' }).tap();
    await say(page, 'Building');
    await expectGood(page);
    await page.getByRole('button', { name: 'Done' }).tap();
    await page.getByText('Has 1 trace, 1 heading check.').waitFor();
    await page.getByText('Practice recording (simulated phone)').waitFor();
    const azimuths = page.getByRole('region', { name: /Sightings from/ });
    // the ridge of the recording runs from 118 to 152 degrees
    await expect.poll(() => azimuths.innerText()).toMatch(/11[78]\.\d°[\s\S]*15[12]\.\d°/);
  });
});
