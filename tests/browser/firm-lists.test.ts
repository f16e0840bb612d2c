import { AxeBuilder } from '@axe-core/playwright';
import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { parseFactLists } from '../../src/core/survey/parse-fact-lists.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { DESK, NARROW_PHONE, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { exported, imported } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const shown = (page: Page) => page.locator('.firm-choice strong').allTextContents();
const busbar = (page: Page) => page.getByRole('button', { name: 'Rating of the busbar, United States' });

/** The list of the busbar's ratings in the United States, on screen. */
async function openList(viewport = PHONE): Promise<Page> {
  const page = await app.openPage(viewport, 'light', { path: '/firm-lists' });
  await page.getByLabel('Asked is').selectOption('busbar');
  await page.getByLabel('Country').selectOption('US');
  return page;
}

async function add(page: Page, answer: string): Promise<void> {
  await page.getByRole('textbox', { name: 'New answer' }).fill(answer);
  await page.getByRole('button', { name: 'Add the answer' }).click();
}

async function exportLists(page: Page): Promise<string> {
  const waiting = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export the lists' }).click();
  return readFileSync(await (await waiting).path(), 'utf8');
}

const importLists = (page: Page, name: string, text: string) =>
  page.locator('#list-file').setInputFiles({ name, mimeType: 'application/json', buffer: Buffer.from(text) });

async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
  expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0);
}

describe('the firm’s lists', () => {
  it('are changed, kept, taken back and reset', async () => {
    const page = await openList();
    await page.getByText('No list is changed').waitFor();
    const before = await shown(page);
    await add(page, ' ');
    await page.getByText('must not be empty').waitFor();
    await add(page, '100 A');
    await page.getByText('The list has it already').waitFor();
    await add(page, '320 A');
    await page.getByRole('button', { name: 'Move 320 A down' }).click();
    await page.getByRole('button', { name: 'Rename 125 A' }).click();
    await page.getByLabel('Shown as').fill('200 A');
    await page.getByText('Another answer of the list is shown so').waitFor();
    await page.getByLabel('Shown as').fill('125 A, small');
    await page.getByRole('button', { name: 'Save the name' }).click();
    await page.getByRole('button', { name: 'Hide 150 A' }).click();
    const changed = ['100 A', '320 A', '125 A, small', ...before.slice(2)];
    expect(await shown(page)).toEqual(changed);
    await page.reload();
    await busbar(page).click();
    expect(await shown(page)).toEqual(changed);
    await page.getByText('recorded as 125 A').waitFor();
    await page.getByRole('button', { name: 'Reset this list' }).click();
    await page.getByText('No list is changed').waitFor();
    expect(await shown(page)).toEqual(before);
    await page.getByRole('button', { name: 'Take back' }).click();
    expect(await shown(page)).toEqual(changed);
    expect(await page.getByRole('button', { name: 'Take back' }).isDisabled()).toBe(true);
  });

  it('go by file to another phone, and a survey keeps its answer when the list is gone', async () => {
    const office = await openList(DESK);
    await add(office, '320 A');
    await office.getByRole('button', { name: 'Rename 200 A' }).click();
    await office.getByLabel('Shown as').fill('Two hundred');
    await office.getByRole('button', { name: 'Save the name' }).click();
    await office.getByRole('button', { name: 'Hide 100 A' }).click();
    const file = await exportLists(office);
    expect(parseFactLists(file)).toMatchObject({ ok: true, warnings: [] });

    const page = await app.openPage(PHONE, 'light', { path: '/firm-lists' });
    await importLists(page, 'lists.json', file);
    await page.getByText('The lists of lists.json are in use.').waitFor();
    await page.getByRole('link', { name: 'Noonmark' }).click();
    const survey = inventedSurvey();
    survey.site.country = 'US';
    await imported(page, survey);
    await page.locator('.ledger-title').click();
    const group = page.getByText('Electrical service (');
    await group.click();
    await page.getByRole('button', { name: 'Answer: Electrical service' }).click();
    const field = page.getByLabel('Rating of the busbar');
    const options = await field.locator('option').allTextContents();
    expect(options[1]).toBe('320 A');
    expect(options).toContain('Two hundred');
    expect(options).not.toContain('100 A');
    await field.selectOption('320 A');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await group.click();
    await page.getByText('320 A').waitFor();

    await page.getByRole('link', { name: 'Firm’s lists' }).click();
    await page.getByRole('button', { name: 'Reset all lists' }).click();
    await page.getByText('No list is changed').waitFor();
    await page.goBack();
    await group.click();
    await page.getByText('320 A').waitFor();
    await page.getByRole('button', { name: 'Answer: Electrical service' }).click();
    expect(await field.inputValue()).toBe('320 A');
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByRole('link', { name: 'Noonmark' }).click();
    expect((await exported(page, survey.title)).survey).toMatchObject({
      facts: [{ id: 'busbar', value: '320 A' }],
    });
  });

  it.each<[string, string, RegExp]>([
    ['cut.json', '{"format": "noonmark-fact-lists",', /line 1, column 34/],
    ['survey.json', JSON.stringify(inventedSurvey()), /holds no lists/],
    ['later.json', '{"format": "noonmark-fact-lists", "version": 9, "lists": []}', /Update Noonmark/],
    [
      'wrong.json',
      '{"format": "noonmark-fact-lists", "version": 1, "lists": [{"fact": "meter", "choices": [{"value": 3}]}]}',
      /lists\[0\]\.choices\[0\]\.value/,
    ],
  ])('are left as they are by a bad file: %s', async (name, text, words) => {
    const page = await openList();
    await add(page, '320 A');
    await importLists(page, name, text);
    await page.getByText(`${name} was not taken; nothing was changed.`).waitFor();
    await page.getByText(words).waitFor();
    await busbar(page).waitFor();
  });

  it.each([PHONE, NARROW_PHONE, DESK])('have nothing that axe finds, at %o', async (viewport) => {
    const page = await openList(viewport);
    await expectAccessible(page);
    await add(page, '320 A');
    await page.getByRole('button', { name: 'Rename 320 A' }).click();
    await importLists(page, 'cut.json', '{');
    await page.getByText('was not taken').waitFor();
    await expectAccessible(page);
  });
});
