import { readFileSync } from 'node:fs';
import { gunzipSync } from 'node:zlib';
import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { clearSkyClimate } from '../../src/core/irradiance/clear-sky-climate.ts';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../src/core/irradiance/world-grid.ts';
import { assessSurvey } from '../../src/core/assessment/assess-survey.ts';
import type { Assessment } from '../../src/core/shading/assessment.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { SAMPLE_FILES, sampleSurvey, worldGridBytes } from '../report/sample-shades.ts';
import { DESK, NARROW_PHONE, PHONE, precached, startApp, type AppUnderTest } from './harness.ts';
import { imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const MAPLE = 'suburban-maple-and-gable.json';
const WEATHER = 'USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw';
const weatherFile = () => ({
  name: WEATHER,
  mimeType: 'text/csv',
  buffer: gunzipSync(readFileSync(new URL(`../reference-values/weather/${WEATHER}.gz`, import.meta.url))),
});

/** What the command line computes for a survey. */
async function computed(survey: Survey): Promise<Assessment> {
  const { climate } = survey;
  if (climate.source === 'clear-sky')
    return assessSurvey(survey, clearSkyClimate(climate.model, climate.linkeTurbidity));
  const grid = decodeWorldGrid(worldGridBytes());
  if (!grid.ok) throw new Error('the grid does not decode');
  return assessSurvey(survey, worldClimate(grid.value, survey.site));
}

const percent = (share: number) => `${(share * 100).toFixed(1)}\u00a0%`;

async function openShade(page: Page, title: string): Promise<void> {
  const samples = page.locator('details.fold', { hasText: 'Sample surveys' });
  if (!(await samples.evaluate((details: HTMLDetailsElement) => details.open)))
    await samples.locator('summary').click();
  await page.getByRole('button', { name: title }).click();
  await page.getByRole('link', { name: 'Shade' }).click();
  await page.locator('.shade-figure').waitFor();
}

async function openMaple(page: Page): Promise<Survey> {
  const survey = sampleSurvey(MAPLE);
  await openShade(page, survey.title);
  return survey;
}

/** Figures of the station on screen once they are those of this plane and station. */
const figure = (page: Page) => page.locator('.shade-figure strong');

async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)).toEqual(
    [],
  );
  expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0);
}

/** What is to be touched and smaller than a fingertip. */
const smallTargets = (page: Page): Promise<string[]> =>
  page
    .locator('.shade button, .shade summary, .shade select, .shade label.button')
    .evaluateAll((elements) =>
      elements
        .filter(
          (element) =>
            element.getBoundingClientRect().height < 44 || element.getBoundingClientRect().width < 44,
        )
        .map((element) => element.outerHTML),
    );

describe('the Shade screen', () => {
  it('shows the figures that the core computes, for every sample, plane and station', async () => {
    const page = await app.openPage(DESK);
    let compared = 0;
    for (const file of SAMPLE_FILES) {
      const survey = sampleSurvey(file);
      expect(survey.climate.source, `${file} needs no file beside it`).not.toBe('weather-file');
      const assessment = await computed(survey);
      await openShade(page, survey.title);
      for (const plane of assessment.planes) {
        if (plane.stations.length === 0) continue;
        await page.getByRole('combobox', { name: 'Roof plane' }).selectOption(plane.id);
        for (const station of plane.stations) {
          await page.getByRole('combobox', { name: 'Station' }).selectOption(station.id);
          await page.locator('.shade-figure span', { hasText: `reaches ${station.name}` }).waitFor();
          expect(await figure(page).textContent()).toBe(percent(station.solarAccess.annual));
          const facts = await page.locator('.shade-facts').innerText();
          expect(facts).toContain(`of ${plane.unshaded.annual.toFixed(0)} kWh/m²`);
          expect(facts).toContain(`${(station.coverage * 100).toFixed(0)}\u00a0% of the light`);
          const listed = await page.locator('.obstruction h3').allTextContents();
          expect(listed).toEqual(station.obstructions.map(({ name }) => name));
          compared++;
        }
      }
      await page.getByRole('link', { name: 'Noonmark' }).click();
      await page.locator('.ledger-title').first().waitFor();
    }
    expect(compared).toBeGreaterThan(20);
  });

  it('reads off a direction by touch, and by the arrow keys', async () => {
    const page = await app.openPage(PHONE);
    await openMaple(page);
    const sky = page.getByRole('application');
    const box = (await sky.boundingBox())!;
    await page.touchscreen.tap(box.x + box.width / 2, box.y + box.height * 0.35);
    const readout = page.locator('.readout');
    await readout.getByText(/^South, 1\d\d°/).waitFor();
    expect(await readout.innerText()).toMatch(
      /The sun stands there on \d+ \w+ at \d+:\d\d and \d+ \w+ at \d+:\d\d/,
    );
    const azimuth = async () => Number(/(\d+)°,/.exec(await readout.innerText())![1]);
    await sky.focus();
    const before = await azimuth();
    await page.keyboard.press('ArrowRight');
    await expect.poll(azimuth).toBe(before + 1);
    await page.keyboard.press('Shift+ArrowRight');
    await expect.poll(azimuth).toBe(before + 6);
    await page.keyboard.press('Escape');
    await readout.getByText('Touch the sky').waitFor();
  });

  it('shows beside the measured figure what it would be with an obstruction gone, and puts it back', async () => {
    const page = await app.openPage(PHONE);
    const survey = await openMaple(page);
    const [{ stations }] = (await computed(survey)).planes;
    const [station] = stations;
    const [first] = station.obstructions;
    const measured = (await figure(page).textContent())!;
    await page.getByRole('button', { name: `Imagine it gone: ${first.name}` }).tap();
    const imagined = page.locator('.imagined');
    await imagined.waitFor();
    expect(await imagined.innerText()).toContain(percent(station.solarAccess.annual + first.gainIfRemoved));
    expect(await imagined.innerText()).toContain('Imagined, not measured');
    expect(await figure(page).textContent()).toBe(measured);
    await page.getByRole('button', { name: 'Back to what was measured' }).tap();
    await imagined.waitFor({ state: 'detached' });
    expect(
      await page
        .getByRole('button', { name: /^Imagine it gone/ })
        .first()
        .getAttribute('aria-pressed'),
    ).toBe('false');
  });

  it('imagines a tree lower where its distance is known: less than gone gives back, and more than nothing', async () => {
    const page = await app.openPage(DESK);
    const survey = await openMaple(page);
    const [{ stations }] = (await computed(survey)).planes;
    const { name, gainIfRemoved } = stations[0].obstructions[0];
    const { annual } = stations[0].solarAccess;
    await page
      .getByRole('combobox', { name: `Imagine it otherwise: ${name}` })
      .selectOption({ label: '3 m lower' });
    await page.locator('.imagined', { hasText: `${name} 3 m lower` }).waitFor();
    const imagined = parseFloat(await page.locator('.imagined strong').innerText()) / 100;
    expect(imagined).toBeGreaterThan(annual + 0.002);
    expect(imagined).toBeLessThan(annual + gainIfRemoved - 0.002);
    const otherwise = async (label: string) => {
      await page.getByRole('combobox', { name: `Imagine it otherwise: ${name}` }).selectOption({ label });
      await page.locator('.imagined', { hasText: `${name} ${label}` }).waitFor();
      return parseFloat(await page.locator('.imagined strong').innerText()) / 100;
    };
    expect(await otherwise('4 m higher')).toBeLessThan(annual);
    expect(await otherwise('bare all year')).toBeGreaterThan(annual);
    await page.getByRole('combobox', { name: 'Station' }).selectOption(stations[1].id);
    await page.locator('.imagined').waitFor({ state: 'detached' });
  });

  it('can be stopped while it calculates, and started again', async () => {
    const page = await app.openPage(PHONE, 'light', { context: { serviceWorkers: 'block' } });
    let letThrough = () => undefined as void;
    const held = new Promise<void>((resolve) => (letThrough = resolve));
    await page.context().route('**/world-climate.bin', async (route) => {
      await held;
      await route.continue();
    });
    const survey = sampleSurvey(MAPLE);
    await page.getByRole('button', { name: survey.title }).click();
    await page.getByRole('link', { name: 'Shade' }).click();
    await page.getByRole('progressbar').waitFor();
    await page.getByRole('button', { name: 'Cancel' }).tap();
    await page.getByText('The calculation was stopped.').waitFor();
    letThrough();
    await page.getByRole('button', { name: 'Calculate' }).tap();
    await figure(page).waitFor();
    expect(await page.getByText('The calculation was stopped.').count()).toBe(0);
  });

  it('says what to do when the climate does not load, and goes on when it does', async () => {
    const page = await app.openPage(PHONE, 'light', { context: { serviceWorkers: 'block' } });
    await page.context().route('**/world-climate.bin', (route) => route.abort());
    await page.getByRole('button', { name: sampleSurvey(MAPLE).title }).click();
    await page.getByRole('link', { name: 'Shade' }).click();
    await page.getByRole('alert').getByText('did not load').waitFor();
    await page.context().unroute('**/world-climate.bin');
    await page.getByRole('button', { name: 'Try again' }).tap();
    await figure(page).waitFor();
  });

  it('keeps a weather file, and uses it again after a reload; refuses another kind of file', async () => {
    const page = await app.openPage(DESK);
    await openMaple(page);
    const world = (await figure(page).textContent())!;
    const picker = page.locator('input[type="file"]');
    await picker.setInputFiles({
      name: 'notes.csv',
      mimeType: 'text/csv',
      buffer: Buffer.from('a,b\n1,2\n'),
    });
    await page.getByRole('alert').getByText('line 1').waitFor();
    await picker.setInputFiles(weatherFile());
    await page.locator('.shade-light p', { hasText: 'Chicago' }).waitFor();
    await page.getByText(/km from the site/).waitFor();
    await expect.poll(() => figure(page).textContent()).not.toBe(world);
    const withFile = (await figure(page).textContent())!;
    await page.reload();
    await page.locator('.shade-light p', { hasText: 'Chicago' }).waitFor();
    await expect.poll(() => figure(page).textContent()).toBe(withFile);
    await page.getByRole('combobox', { name: 'Climate' }).selectOption('world');
    await expect.poll(() => figure(page).textContent()).toBe(world);
    await page.getByRole('combobox', { name: 'Climate' }).selectOption({ label: `Weather file ${WEATHER}` });
    await expect.poll(() => figure(page).textContent()).toBe(withFile);
  });

  it('takes another way of laying sky light on the plane, and a clear sky, to the figure', async () => {
    const page = await app.openPage(DESK);
    const survey = await openMaple(page);
    const grid = decodeWorldGrid(worldGridBytes());
    if (!grid.ok) throw new Error('the grid does not decode');
    const perez = await assessSurvey(survey, worldClimate(grid.value, survey.site), {
      transposition: 'perez',
    });
    await page.getByRole('combobox', { name: 'Sky light on the plane' }).selectOption('perez');
    const first = ({ planes: [{ stations }] }: Assessment) => percent(stations[0].solarAccess.annual);
    await expect.poll(() => figure(page).textContent()).toBe(first(perez));
    const clear = await assessSurvey(survey, clearSkyClimate('ineichen'), { transposition: 'perez' });
    await page.getByRole('combobox', { name: 'Climate' }).selectOption('clear-sky:ineichen');
    await expect.poll(() => figure(page).textContent()).toBe(first(clear));
    await page.locator('.shade-light li', { hasText: 'upper bound' }).waitFor();
  });

  it('computes without a network once the app is on the device', async () => {
    const page = await app.openPage(PHONE);
    await precached(page);
    await page.context().setOffline(true);
    await page.reload();
    const survey = await openMaple(page);
    const [{ stations }] = (await computed(survey)).planes;
    expect(await figure(page).textContent()).toBe(percent(stations[0].solarAccess.annual));
  });

  it('says what is missing where nothing can be shown', async () => {
    const page = await app.openPage(PHONE);
    await imported(page, inventedSurvey('no-plane', { title: 'No plane', planes: [], stations: [] }));
    await page.locator('.ledger-title', { hasText: 'No plane' }).click();
    await page.getByRole('link', { name: 'Shade' }).click();
    await page.getByRole('heading', { name: 'No roof plane yet' }).waitFor();
    await page.getByRole('link', { name: 'Noonmark' }).click();
    await imported(page, inventedSurvey('no-station', { title: 'No station', stations: [] }));
    await page.locator('.ledger-title', { hasText: 'No station' }).click();
    await page.getByRole('link', { name: 'Shade' }).click();
    await page.getByRole('heading', { name: 'No station for South roof' }).waitFor();
    await page.getByRole('link', { name: 'Noonmark' }).click();
    const [station] = inventedSurvey().stations;
    await imported(page, inventedSurvey('bare', { title: 'Bare', stations: [{ ...station, traces: [] }] }));
    await page.locator('.ledger-title', { hasText: 'Bare' }).click();
    await page.getByRole('link', { name: 'Shade' }).click();
    await page.getByText('Nothing is traced from here').waitFor();
    expect(await figure(page).textContent()).toBe(percent(1));
  });

  it.each([
    [NARROW_PHONE, 'light'],
    [NARROW_PHONE, 'dark'],
    [DESK, 'light'],
    [DESK, 'dark'],
  ] as const)('has nothing that axe finds at %o, %s, all folded out', async (viewport, scheme) => {
    const page = await app.openPage(viewport, scheme);
    await openMaple(page);
    await page
      .getByRole('button', { name: /^Imagine it gone/ })
      .first()
      .click();
    await page.locator('.imagined').waitFor();
    for (const summary of await page.locator('.shade summary').all()) await summary.click();
    await page.getByRole('application').click({ position: { x: 150, y: 120 } });
    await expectAccessible(page);
    expect(await smallTargets(page)).toEqual([]);
  });
});
