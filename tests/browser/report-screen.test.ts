import { readFileSync } from 'node:fs';
import { AxeBuilder } from '@axe-core/playwright';
import type { Download, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../src/core/irradiance/world-grid.ts';
import { assessSurvey } from '../../src/core/assessment/assess-survey.ts';
import { sampleSurvey, worldGridBytes } from '../report/sample-shades.ts';
import { DESK, openFirstSample, PHONE, precached, startApp, type AppUnderTest } from './harness.ts';
import { imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const letter = (page: Page) => page.frameLocator('iframe.report-page');

async function open(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Report', exact: true }).click();
  await letter(page).getByRole('heading', { level: 1 }).waitFor({ timeout: 60_000 });
}

async function saved(page: Page, button: string): Promise<{ name: string; text: Buffer }> {
  const download = new Promise<Download>((resolve) => page.once('download', resolve));
  await page.getByRole('button', { name: button, exact: true }).click();
  const file = await download;
  return { name: file.suggestedFilename(), text: readFileSync(await file.path()) };
}

describe('the report', () => {
  it('is written on the phone without a network, with the figures of assess', async () => {
    const survey = sampleSurvey('suburban-maple-and-gable.json');
    const grid = decodeWorldGrid(worldGridBytes());
    if (!grid.ok) throw new Error('the grid does not decode');
    const { planes } = await assessSurvey(survey, worldClimate(grid.value, survey.site));
    const page = await app.openPage(PHONE);
    await imported(page, survey);
    await precached(page);
    await page.context().setOffline(true);
    await page.locator('.ledger-title', { hasText: survey.title }).click();
    await open(page);
    const text = await letter(page).locator('body').innerText();
    for (const { name, solarAccess } of planes)
      expect(text).toContain(`${name}: ${Math.round(100 * solarAccess!.annual)}% of its sunlight arrives`);
    const json = await saved(page, 'Figures as JSON');
    const figures = JSON.parse(json.text.toString()) as {
      figures: { quantity: string; plane_id: string; station: string; period: string; value: number }[];
    };
    const annual = figures.figures.filter(
      ({ quantity, station, period }) => quantity === 'solar-access' && !station && period === 'year',
    );
    expect(annual.map(({ value }) => value)).toEqual(planes.map(({ solarAccess }) => solarAccess!.annual));
    const pdf = await saved(page, 'Save as PDF');
    expect(pdf.text.subarray(0, 5).toString()).toBe('%PDF-');
    expect(pdf.name).toMatch(/\.pdf$/);
    const html = await saved(page, 'Save as web page');
    expect(html.text.toString()).toMatch(/^<!doctype html>/);
    expect((await saved(page, 'Figures as CSV')).text.toString()).toMatch(/^quantity,/);
  });

  it('keeps the letterhead and the language on the device', async () => {
    const page = await app.openPage(DESK);
    await openFirstSample(page);
    await open(page);
    await page.getByText('Language, letterhead, comparison').click();
    await page.getByRole('textbox', { name: 'Firm' }).fill('Larkfield Roofs');
    await page.getByRole('button', { name: 'Keep the letterhead' }).click();
    await page.getByText('Kept on this device.').waitFor();
    await letter(page).getByText('Larkfield Roofs').first().waitFor();
    await page.getByLabel('Lengths in').selectOption('us');
    await letter(page).getByText('kWh/ft²').first().waitFor();
    await page.reload();
    await open(page);
    await letter(page).getByText('Larkfield Roofs').first().waitFor();
    await letter(page).getByText('kWh/ft²').first().waitFor();
  });

  it('sets the survey beside itself without an obstruction, and says what is asked and met', async () => {
    const page = await app.openPage(DESK);
    await openFirstSample(page);
    await open(page);
    await page.getByText('Language, letterhead, comparison').click();
    const without = page.getByLabel('Set beside').locator('option').nth(1);
    await page.getByLabel('Set beside').selectOption((await without.getAttribute('value')) ?? '');
    await letter(page).getByRole('heading', { name: 'What is different?' }).waitFor({ timeout: 60_000 });
    await page.getByLabel('Solar access, at least').fill('140');
    await page.getByRole('button', { name: 'Keep what is asked' }).click();
    await page.getByText('A number from 0 to 100%').waitFor();
    await page.getByLabel('Solar access, at least').fill('10');
    await page.getByRole('button', { name: 'Keep what is asked' }).click();
    await letter(page).getByText(', met').first().waitFor();
  });

  it.each([
    ['a phone', PHONE],
    ['a desk', DESK],
  ])('has nothing that axe finds and nothing past the edge on %s', async (_, viewport) => {
    const page = await app.openPage(viewport);
    await openFirstSample(page);
    await open(page);
    await page.getByText('Language, letterhead, comparison').click();
    // the page inside has landmarks of its own; it is looked at by itself
    const { violations } = await new AxeBuilder({ page }).exclude('iframe').analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)).toEqual(
      [],
    );
    expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(
      0,
    );
    const inside = letter(page).locator('body');
    expect(await inside.evaluate((body) => body.scrollWidth - body.clientWidth)).toBeLessThanOrEqual(0);
  });
});
