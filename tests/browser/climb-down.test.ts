import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openPoints } from '../../src/core/completeness/open-points.ts';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../src/core/irradiance/world-grid.ts';
import { assessSurvey } from '../../src/core/assessment/assess-survey.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { completeSurvey } from '../core/completeness/complete-survey.ts';
import { sampleSurvey, worldGridBytes } from '../report/sample-shades.ts';
import { DESK, NARROW_PHONE, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const rows = (page: Page) => page.locator('.open-point');

async function open(page: Page, survey: Survey): Promise<void> {
  await imported(page, survey);
  await page.locator('.ledger-title', { hasText: survey.title }).click();
  await page.getByRole('link', { name: 'To do', exact: true }).click();
  await page.getByRole('heading', { name: 'Before you climb down' }).waitFor();
}

/** The figures of the command line. */
function computed(survey: Survey) {
  const grid = decodeWorldGrid(worldGridBytes());
  if (!grid.ok) throw new Error('the grid does not decode');
  return assessSurvey(survey, worldClimate(grid.value, survey.site));
}

/** A sample with a station that has lost its place and a plane that nobody stood on. */
function weakened(): Survey {
  const survey = sampleSurvey('terrace-chimneys-mast-balcony.json');
  survey.planes.push({ id: 'shed', name: 'Shed', surfaceTilt: 10, surfaceAzimuth: 180 });
  delete survey.stations[0].position;
  return survey;
}

describe('before you climb down', () => {
  it('lists what the core finds, in its order, and leads to each cure', async () => {
    const survey = weakened();
    expect(survey.climate.source).toBe('world');
    const points = openPoints(survey, await computed(survey));
    const page = await app.openPage(PHONE);
    await open(page, survey);
    await rows(page).first().waitFor();
    expect(await rows(page).locator('.open-point-words > .small').allTextContents()).toEqual(
      points.map(({ sentence }) => sentence),
    );
    expect(await rows(page).locator('b').allTextContents()).toEqual(
      points.flatMap(({ effect }) => (effect === null ? [] : [effect.toFixed(1)])),
    );
    await rows(page).first().tap();
    await page.getByRole('heading', { name: 'New station' }).waitFor();
    await page.goBack();
    await rows(page).last().tap();
    await page.getByLabel('Place').waitFor();
    await page.goBack();
    await rows(page).filter({ hasText: 'Nobody looked there' }).first().tap();
    await page.getByRole('button', { name: 'With the camera' }).waitFor();
  });

  it('says so where nothing is missing', async () => {
    const page = await app.openPage(PHONE);
    await open(page, completeSurvey());
    await page.getByText('Nothing is missing.').waitFor();
    expect(await rows(page).count()).toBe(0);
  });

  it('tells what it can where the figures cannot be had, and tries again', async () => {
    const page = await app.openPage(PHONE, 'light', { context: { serviceWorkers: 'block' } });
    await page.context().route('**/world-climate.bin', (route) => route.abort());
    await open(page, weakened());
    await page.getByRole('button', { name: 'Try again' }).waitFor();
    await rows(page).first().waitFor();
    expect(await rows(page).locator('b').count()).toBe(0);
    await page.context().unroute('**/world-climate.bin');
    await page.getByRole('button', { name: 'Try again' }).tap();
    await rows(page).locator('b').first().waitFor();
  });

  it('stands beside a headline that says how sure it is, and what would shrink that', async () => {
    const survey = weakened();
    const { planes } = await computed(survey);
    const { low, high, sources } = planes[0].stations[0].solarAccess.interval!;
    expect(sources[0].cure).not.toBeNull();
    const page = await app.openPage(NARROW_PHONE);
    await open(page, survey);
    await page.getByRole('link', { name: 'Shade', exact: true }).tap();
    const range = `${(low * 100).toFixed(1)} to ${(high * 100).toFixed(1)}\u00a0%, 95 times in 100`;
    await page.getByText(range).waitFor();
    const sure = page.locator('.shade-facts > div', { hasText: 'How sure' });
    expect(await sure.textContent()).toMatch(
      /points from end to end, mostly for .* would bring it to \d+\.\d points\.$/,
    );
  });

  it('goes by keyboard', async () => {
    const page = await app.openPage(DESK);
    await open(page, weakened());
    await rows(page).first().waitFor();
    await rows(page).first().focus();
    await page.keyboard.press('Tab');
    expect(
      await rows(page)
        .nth(1)
        .evaluate((row) => row === document.activeElement),
    ).toBe(true);
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'With the camera' }).waitFor();
  });

  it.each(
    [PHONE, NARROW_PHONE, DESK].flatMap((viewport) =>
      (['light', 'dark'] as const).map((scheme) => [viewport, scheme] as const),
    ),
  )('has nothing that axe finds at %o, %s; tabs in one row', async (viewport, scheme) => {
    const page = await app.openPage(viewport, scheme);
    await open(page, weakened());
    await rows(page).first().waitFor();
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)).toEqual(
      [],
    );
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(
      0,
    );
    const tops = await page
      .locator('.sections a')
      .evaluateAll((links) => links.map((link) => link.getBoundingClientRect().top));
    expect(new Set(tops).size).toBe(1);
  });
});
