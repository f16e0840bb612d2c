import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Survey } from '../../src/core/survey/survey.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { DESK, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { exported, imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const TITLE = inventedSurvey().title;

async function openedAt(section: string, viewport = PHONE, survey = inventedSurvey()): Promise<Page> {
  const page = await app.openPage(viewport);
  await imported(page, survey);
  await page.locator('.ledger-title').click();
  await page.getByRole('link', { name: section, exact: true }).click();
  return page;
}

async function stored(page: Page): Promise<Survey> {
  await page.getByRole('link', { name: 'Noonmark' }).click();
  return (await exported(page, TITLE)).survey as Survey;
}

async function expectNoViolations(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
}

const addPlane = (page: Page) => page.getByRole('button', { name: 'Add a plane' }).click();
const bearing = (page: Page) => page.getByLabel('Bearing (degrees)');
const isStored = (page: Page) => page.getByRole('button', { name: 'Add a plane' }).waitFor();

describe('the roof', () => {
  it('takes a pitch as rise over run, an eave’s bearing, and feet and inches', async () => {
    const page = await openedAt('Roof');
    await addPlane(page);
    await page.getByLabel('Tilt').fill('6/12');
    await page.getByText('= 26.6° from the horizontal').waitFor();
    await page.getByLabel('What you know of it').selectOption('eave');
    await bearing(page).fill('95');
    await page.getByLabel('Square to the eave, it faces').selectOption('right');
    await page.getByText('The plane then faces 185.0°.').waitFor();
    await page.getByLabel('Lengths are typed in').selectOption('feet');
    await page.getByLabel('Width along the eave').fill(`30' 6"`);
    await page.getByLabel('Length up the slope').fill('16');
    await expectNoViolations(page);
    await page.getByRole('button', { name: 'Add the plane' }).click();
    await page.getByText('“South roof 2” is added.').or(page.getByText('“South roof” is added.')).waitFor();
    const { planes } = await stored(page);
    expect(planes).toHaveLength(2);
    expect(planes[1]).toMatchObject({ surfaceAzimuth: 185 });
    // 6 in 12: atan(0.5); the foot is 0.3048 m (international yard and pound agreement, 1959).
    expect(planes[1].surfaceTilt).toBeCloseTo((Math.atan(0.5) * 180) / Math.PI, 5);
    expect(planes[1].width).toBeCloseTo(30.5 * 0.3048, 5);
    expect(planes[1].slopeLength).toBeCloseTo(16 * 0.3048, 5);
  });

  it('takes a wall by its corners, and refuses an outline that crosses itself', async () => {
    const page = await openedAt('Roof', DESK);
    await addPlane(page);
    await page.getByLabel('It is a').selectOption('wall');
    await bearing(page).fill('250');
    await page.getByLabel('Outline').selectOption('polygon');
    const corners = [
      [0, 0],
      [5, 4],
      [5, 0],
      [0, 4],
    ];
    for (const [place, [x, y]] of corners.entries()) {
      await page.getByLabel(`Corner ${place + 1}, along the eave`).fill(String(x));
      await page.getByLabel(`Corner ${place + 1}, up the slope`).fill(String(y));
    }
    await page.getByRole('button', { name: 'Add the plane' }).click();
    await page.getByText('Put the corners in order around the edge').waitFor();
    await page.getByLabel('Corner 2, up the slope').fill('0');
    await page.getByLabel('Corner 3, up the slope').fill('4');
    await page.getByRole('button', { name: 'Add the plane' }).click();
    await isStored(page);
    const wall = (await stored(page)).planes.at(-1);
    expect(wall).toMatchObject({ name: 'West wall', surfaceTilt: 90, surfaceAzimuth: 250 });
    expect(wall?.outline).toEqual([
      { x: 0, y: 0 },
      { x: 5, y: 0 },
      { x: 5, y: 4 },
      { x: 0, y: 4 },
    ]);
  });

  it('asks whether feet were meant, and says what is missing', async () => {
    const page = await openedAt('Roof');
    await addPlane(page);
    await page.getByLabel('Width along the eave').fill('52');
    await page.getByText('If that was 52.0 feet, it is 15.8 m').waitFor();
    await page.getByLabel('Length up the slope').fill('500');
    await page.getByText('That is more than usual; check the number.').waitFor();
    await page.getByRole('button', { name: 'Add the plane' }).click();
    await page.getByText('The tilt is needed').waitFor();
    expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-invalid'))).toBe('true');
  });

  it('changes only what is changed, and takes acts back and does them again after a restart', async () => {
    const page = await openedAt('Roof');
    await page.getByRole('button', { name: 'Change South roof' }).click();
    await page.getByLabel('Tilt').fill('35');
    await page.getByRole('button', { name: 'Save the plane' }).click();
    await page.getByText('35.0°').waitFor();
    await page.getByRole('button', { name: 'Duplicate South roof' }).click();
    await page.getByRole('heading', { name: 'South roof, copy' }).waitFor();
    await page.getByRole('button', { name: 'Delete South roof', exact: true }).click();
    await page.getByRole('heading', { name: 'South roof', exact: true }).waitFor({ state: 'detached' });
    await page.reload();
    const back = page.getByRole('button', { name: /^Take back/ });
    await back.click();
    await page.getByRole('heading', { name: 'South roof', exact: true }).waitFor();
    await back.click();
    await page.getByRole('heading', { name: 'South roof, copy' }).waitFor({ state: 'detached' });
    await back.click();
    await page.getByText('30.0°').waitFor();
    expect(await back.isDisabled()).toBe(true);
    await page.getByRole('button', { name: /^Do again/ }).click();
    await page.getByText('35.0°').waitFor();
    const [south] = inventedSurvey().planes;
    expect(await stored(page)).toEqual(
      inventedSurvey('invented-1', { planes: [{ ...south, surfaceTilt: 35 }] }),
    );
  });

  it('goes back from a form to the list, and keeps what was typed', async () => {
    const page = await openedAt('Roof');
    await page.getByRole('button', { name: 'Change South roof' }).click();
    await page.getByLabel('Tilt').fill('41');
    await page.goBack();
    await page.getByRole('heading', { name: 'Roof planes' }).waitFor();
    await page.getByText('Not saved yet').waitFor();
    await page.getByRole('button', { name: /^Go on/ }).click();
    expect(await page.getByLabel('Tilt').inputValue()).toBe('41');
    await page.getByRole('button', { name: 'Save the plane' }).click();
    await page.getByText('“South roof” is changed.').waitFor();
    await page.getByText('41.0°').waitFor();
  });

  it('offers the undo of an act only until another section is read or something else is done', async () => {
    const page = await openedAt('Roof');
    const copied = page.getByText('“South roof, copy” is added.');
    await page.getByRole('button', { name: 'Duplicate South roof' }).click();
    await copied.waitFor();
    await page.getByRole('link', { name: 'Site', exact: true }).click();
    await copied.waitFor({ state: 'detached' });
    await page.getByRole('link', { name: 'Roof', exact: true }).click();
    await page.getByRole('button', { name: /^Take back/ }).click();
    await page.getByRole('heading', { name: 'South roof, copy' }).waitFor({ state: 'detached' });
    await page.getByText('Taken back: “South roof, copy”.').waitFor();

    await page.getByRole('button', { name: 'Duplicate South roof' }).click();
    await copied.waitFor();
    const other = await page.context().newPage();
    await other.goto(page.url());
    await other.getByRole('button', { name: 'Delete South roof', exact: true }).click();
    await other.getByText('“South roof” is deleted.').waitFor();
    await copied.waitFor({ state: 'detached' }); // its undo would do nothing any more
  });

  it('brings a plane back that another tab deleted while it was being changed here', async () => {
    const page = await openedAt('Roof');
    await page.getByRole('button', { name: 'Change South roof' }).click();
    await page.getByLabel('Name').fill('South roof, mended');
    const other = await page.context().newPage();
    await other.goto(page.url());
    await other.getByRole('button', { name: 'Delete South roof' }).click();
    await other.getByText('“South roof” is deleted.').waitFor();
    await other.close();
    await page.getByRole('button', { name: 'Save the plane' }).click();
    await page.getByRole('heading', { name: 'South roof, mended' }).waitFor();
  });
});

describe('obstructions and the field book', () => {
  it('take a tree’s own values month by month, a distance in feet, and the deletion back', async () => {
    const page = await openedAt('Site');
    await page.getByRole('button', { name: 'Change Maple in the street' }).click();
    await page.getByText('In leaf 15 % of the light passes').waitFor();
    await page.getByLabel('By', { exact: true }).selectOption('months');
    await page.getByLabel('Jan (%)').fill('70');
    await page.getByLabel('Distance from the stations').fill(`41' 6"`);
    await expectNoViolations(page);
    await page.getByRole('button', { name: 'Save the obstruction' }).click();
    await page.getByText('12.649 m off').waitFor();
    await page.getByRole('button', { name: 'Delete Maple in the street' }).click();
    await page.getByText('No obstruction yet').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('heading', { name: 'Maple in the street' }).waitFor();
    const { obstructions, stations } = await stored(page);
    expect(obstructions[0].transmittance).toHaveLength(12);
    expect((obstructions[0].transmittance as number[])[0]).toBe(0.7);
    expect(stations).toEqual(inventedSurvey().stations);
  });

  it('amend a reading with a reason, and type a sighting from height and distance', async () => {
    const page = await openedAt('Stations');
    const book = page.getByRole('region', { name: 'Sightings from Eave, left' });
    await page.getByText('Eave, left').last().waitFor();
    await book.getByRole('button', { name: 'Change sighting 1' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Elevation (degrees)').fill('26');
    await dialog.getByRole('button', { name: 'Save the sighting' }).click();
    await dialog.getByText('Say why').waitFor();
    await dialog.getByLabel('Reason for the change').fill('misread');
    await dialog.getByRole('button', { name: 'Save the sighting' }).click();
    await book.getByText('amended: misread').waitFor();

    await book.getByRole('button', { name: 'Add a sighting of Maple in the street' }).click();
    await dialog.getByLabel('Azimuth').fill('160');
    await dialog.getByText('Elevation from height and distance').click();
    await dialog.getByLabel('Height of its top').fill('10');
    await dialog.getByLabel('Distance').fill('10');
    await dialog.getByRole('button', { name: 'Use 45.0°' }).click();
    await dialog.getByRole('button', { name: 'Add the sighting' }).click();
    await book.getByText('160.0°').waitFor();

    const [trace] = (await stored(page)).stations[0].traces;
    expect(trace.sightings).toHaveLength(4);
    expect(trace.sightings[0]).toMatchObject({
      azimuth: 131.2,
      elevation: 24.6,
      reading: 'raw-1',
      amendments: [{ azimuth: 131.2, elevation: 26, reason: 'misread' }],
    });
    expect(trace.sightings[3]).toMatchObject({ azimuth: 160, elevation: 45 });
  });

  it('refuse a typed trace that makes no edge, with why, and keep what is typed', async () => {
    const page = await openedAt('Stations');
    await page.getByRole('button', { name: 'Type a trace' }).click();
    const dialog = page.getByRole('dialog');
    for (const [place, [azimuth, elevation]] of [
      [10, 20],
      [190, 20],
    ].entries()) {
      await dialog.getByLabel(`Sighting ${place + 1}, azimuth`).fill(String(azimuth));
      await dialog.getByLabel(`Sighting ${place + 1}, elevation`).fill(String(elevation));
    }
    await dialog.getByRole('button', { name: 'Add the trace' }).click();
    await dialog.getByText('180 degrees from its neighbour').waitFor();
    await expectNoViolations(page);
    await dialog.getByLabel('Sighting 2, azimuth').fill('60');
    await dialog.getByRole('button', { name: 'Add the trace' }).click();
    await page.getByText('“Trace of Maple in the street” is added.').waitFor();
    expect((await stored(page)).stations[0].traces).toHaveLength(2);
  });
});

describe('facts for the order', () => {
  it('are answered from the lists of the country or in own words, which are offered again', async () => {
    const page = await openedAt('Site');
    await page.getByText('Electrical service (0 of 11)').click();
    await page.getByRole('button', { name: 'Answer: Electrical service' }).click();
    await page.getByText('Covers of boards and meters come off only').waitFor();
    await page.getByLabel('Phases and voltage').selectOption('Single phase, 120/240 V');
    await page.getByLabel('Main fuse or breaker').selectOption({ label: 'Something else…' });
    await page.getByLabel('Main fuse or breaker, in your words').fill('320 A');
    await page.getByRole('checkbox', { name: 'Heat pump' }).check();
    await page.getByLabel('What it is').fill('Panel maker');
    await page.getByLabel('Answer', { exact: true }).fill('Unmarked');
    await expectNoViolations(page);
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByText('Electrical service (3 of 11)').click();
    await page.getByText('320 A').waitFor();
    await page.getByText('Panel maker').waitFor();
    await page.reload();
    await page.getByText('Electrical service (3 of 11)').click();
    await page.getByRole('button', { name: 'Answer: Electrical service' }).click();
    expect(await page.getByLabel('Main fuse or breaker', { exact: true }).inputValue()).toBe('320 A');
    const { facts } = await stored(page);
    expect(facts).toEqual(
      expect.arrayContaining([
        { id: 'phases', value: 'Single phase, 120/240 V' },
        { id: 'main-protection', value: '320 A' },
        { id: 'other-sources', value: ['Heat pump'] },
        expect.objectContaining({ label: 'Panel maker', value: 'Unmarked' }),
      ]),
    );
  });
});
