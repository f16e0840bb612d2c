import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { fullCircle } from '../../src/core/angles/angles.ts';
import { assessSurvey } from '../../src/core/assessment/assess-survey.ts';
import { openPoints } from '../../src/core/completeness/open-points.ts';
import { isGrave } from '../../src/core/completeness/point-kinds.ts';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../src/core/irradiance/world-grid.ts';
import { magneticDeclination } from '../../src/core/pointing/declination.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { worldGridBytes } from '../report/sample-shades.ts';
import { cameraAt } from '../sensors/posed-phone.ts';
import { assessed } from './assessed-file.ts';
import { HeldPhone, PHONE_CONTEXT, phoneBrowser } from './capture-phone.ts';
import { COMPASS_OFF, news } from './capture-steps.ts';
import { CountingHand } from './counting-hand.ts';
import { FileServer } from './file-server.ts';
import { precached } from './harness.ts';
import { exported } from './survey-files.ts';

const PLACE = { latitude: 48.1, longitude: 11.6 };
const MARK_BEARING = 150;
/** Another tap is a choice, not an accident: change this with it. */
const MOST_TAPS = 63;

let server: FileServer;
let browser: Browser;
beforeAll(async () => {
  server = new FileServer(inject('builtApp'));
  await server.start();
  browser = await phoneBrowser();
});
afterAll(async () => {
  await browser.close();
  await server.kill();
});

const { declination } = magneticDeclination({ ...PLACE, timeMs: Date.now() });
/** A phone whose compass is some degrees off, looking there. */
const look = (azimuth: number, elevation: number) =>
  cameraAt(fullCircle(azimuth - declination + COMPASS_OFF), elevation);

/** A phone that never saw the app, standing on the site; the app is then on it, and the network gone. */
async function offlinePhone(): Promise<Page> {
  const context = await browser.newContext({
    ...PHONE_CONTEXT,
    geolocation: { ...PLACE, accuracy: 6 },
    permissions: ['geolocation', 'camera', 'accelerometer', 'gyroscope', 'magnetometer'],
    timezoneId: 'Europe/Berlin',
  });
  context.setDefaultTimeout(20_000);
  const page = await context.newPage();
  await page.goto(server.address);
  await precached(page);
  await context.setOffline(true);
  return page;
}

interface Spot {
  plane: string;
  place: string;
  /** How high the houses opposite stand from here, degrees. */
  houses: number;
}

const SPOTS: Spot[] = [
  { plane: 'South roof', place: 'lower left corner', houses: 14 },
  { plane: 'South roof', place: 'centre', houses: 11 },
  { plane: 'West roof', place: 'centre', houses: 17 },
];

describe('a whole survey by one hand, offline', () => {
  it('goes from nothing to a checked result that equals the exported file’s', async () => {
    const page = await offlinePhone();
    const phone = await HeldPhone.of(page, 'absolute');
    const hand = new CountingHand(page);
    await start(page, hand);
    hand.lap('start');
    await addPlane(page, hand, { tilt: '35', bearing: '180', width: '9.2', slopeLength: '4.8' });
    await addPlane(page, hand, { tilt: '35', bearing: '270', width: '6', slopeLength: '4.8' });
    hand.lap('two planes');
    await hand.link('Stations');
    await hand.link('Add a station');
    for (const [place, spot] of SPOTS.entries()) {
      const before = SPOTS[place - 1];
      await addStation(page, hand, spot, before);
      await sightFrom(page, hand, phone, spot, before);
      if (place < SPOTS.length - 1) await hand.button('Next station');
      hand.lap(`station ${place + 1}`);
    }
    await hand.button('Done');
    await page.getByText('Has 1 trace').waitFor();
    phone.put();
    await hand.link('To do');
    await page.getByRole('heading', { name: 'Before you climb down' }).waitFor();
    await page.locator('.open-point').first().or(page.getByText('Nothing is missing.')).waitFor();
    const shown = await page.locator('.open-point .open-point-words > .small').allTextContents();
    await hand.link('Shade');
    await page.locator('.shade-figure strong').waitFor();
    hand.lap('looking');
    expect(hand.taps).toBeLessThanOrEqual(MOST_TAPS);
    process.stdout.write(`\nA survey of three stations: ${hand.account}\n`);

    const figures = await accesses(page);
    await page.getByRole('link', { name: 'Noonmark' }).tap();
    const title = await page.locator('.ledger-title strong').innerText();
    const survey = (await exported(page, title)).survey as Survey;
    const assessment = await assessSurvey(survey, climateAt(survey));
    const points = openPoints(survey, assessment);
    expect(points.filter(({ kind }) => isGrave(kind)).map(({ sentence }) => sentence)).toEqual([]);
    expect(points.map(({ kind }) => kind)).not.toContain('no-heading-check');
    expect(shown).toEqual(points.map(({ sentence }) => sentence));
    process.stdout.write(`Still to do: ${points.map(({ sentence }) => sentence).join(' | ')}\n`);
    const stations = assessment.planes.flatMap((plane) => plane.stations);
    expect(figures).toEqual(stations.map(({ solarAccess }) => percent(solarAccess.annual)));
    expect(figures[0]).toBe(percent((await assessed(survey)).solarAccess.annual));
  });
});

async function start(page: Page, hand: CountingHand): Promise<void> {
  await hand.link('New survey');
  await hand.button('Use this device’s position');
  await page.getByText('to within 6 m').waitFor();
  await hand.button('Start the survey');
  await page.getByRole('heading', { name: 'Roof planes' }).waitFor();
}

async function addPlane(
  page: Page,
  hand: CountingHand,
  typed: Record<'tilt' | 'bearing' | 'width' | 'slopeLength', string>,
) {
  await hand.button('Add a plane');
  await hand.type('Tilt', typed.tilt);
  await hand.type('Bearing (degrees)', typed.bearing);
  await hand.type('Width along the eave (metres)', typed.width);
  await hand.type('Length up the slope (metres)', typed.slopeLength);
  await hand.button('Add the plane');
  await page.getByRole('button', { name: 'Add a plane' }).waitFor();
}

/** Stands a station on a corner or the centre of its plane; the plane of the station before is chosen already. */
async function addStation(page: Page, hand: CountingHand, spot: Spot, before?: Spot): Promise<void> {
  await page.getByLabel('Place', { exact: true }).waitFor();
  if (before?.plane !== spot.plane) await hand.choose('Place', `On ${spot.plane}`);
  await hand.button(spot.place);
  await hand.button('Add, and sight from it');
}

/** Checks the heading by a mark, sweeps along the houses opposite, and calls the rest open. */
async function sightFrom(page: Page, hand: CountingHand, phone: HeldPhone, spot: Spot, before?: Spot) {
  phone.point(look(MARK_BEARING, spot.houses));
  if (!before) await hand.button('With the camera');
  await page.locator('.huge').first().waitFor();
  await checkHeading(page, hand, before === undefined);

  phone.point(look(70, 1));
  await nearAzimuth(page, 70);
  await hand.button('Start sweep');
  await phone.move((at) => look(70 + 220 * at, 1 + spot.houses * Math.sin(Math.PI * at)), 5000);
  await hand.button('End sweep');
  await page.getByRole('dialog', { name: 'What is it?' }).waitFor();
  await hand.tap(
    before
      ? page.getByRole('button', { name: 'Same as last: Building' })
      : page.getByRole('button', { name: 'Building' }).first(),
  );
  await news(page).getByText('traced').waitFor();

  await hand.button('Open');
  phone.point(look(288, 1));
  await nearAzimuth(page, 288);
  await hand.button('Open from here on');
  await phone.move((at) => look(288 + 144 * at, 1), 3000);
  await nearAzimuth(page, 72);
  await hand.button('Open up to here');
  await news(page).getByText('Looked, and open').waitFor();
}

/** By the church: at the first station it is named, at the others the screen opens with it and goes on by itself. */
async function checkHeading(page: Page, hand: CountingHand, isFirst: boolean): Promise<void> {
  if (isFirst) {
    await hand.button('Heading');
    await hand.tap(
      page.getByRole('group', { name: 'Way of checking' }).getByRole('button', { name: 'Mark' }),
    );
    await hand.type('Mark', 'church');
  } else {
    await hand.tap(page.getByRole('group', { name: 'Named before' }).getByRole('button', { name: 'church' }));
    expect(await page.getByLabel('Bearing, degrees').inputValue()).toBe('');
  }
  await hand.type('Bearing, degrees', String(MARK_BEARING));
  await hand.button('Sight the mark');
  await news(page).getByText('Heading check stored').waitFor();
  if (isFirst) await hand.button('Trace');
}

const nearAzimuth = (page: Page, azimuth: number) =>
  expect
    .poll(async () => {
      const shown = parseFloat(await page.locator('.huge').first().innerText());
      return Math.abs(((shown - azimuth + 540) % 360) - 180);
    })
    .toBeLessThan(1);

const percent = (share: number) => `${(share * 100).toFixed(1)}\u00a0%`;

/** The figure of each station of each plane on the Shade page. */
async function accesses(page: Page): Promise<string[]> {
  const figures: string[] = [];
  for (const { plane } of SPOTS.filter((spot, place) => SPOTS[place - 1]?.plane !== spot.plane)) {
    await page.getByRole('combobox', { name: 'Roof plane' }).selectOption({ label: plane });
    const stations = page.getByRole('combobox', { name: 'Station' });
    for (const name of await stations.locator('option').allTextContents()) {
      await stations.selectOption({ label: name });
      await page.locator('.shade-figure span', { hasText: `reaches ${name}` }).waitFor();
      figures.push(await page.locator('.shade-figure strong').innerText());
    }
  }
  return figures;
}

function climateAt(survey: Survey) {
  const grid = decodeWorldGrid(worldGridBytes());
  if (!grid.ok) throw new Error('the grid does not decode');
  return worldClimate(grid.value, survey.site);
}
