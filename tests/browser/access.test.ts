import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inventedSurvey } from '../app/invented-survey.ts';
import { DESK, NARROW_PHONE, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { act, imported, importFiles, surveyFile } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const TITLE = inventedSurvey().title;

/** What axe finds, in a form that tells where; and that nothing sticks out of the screen. */
async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)).toEqual(
    [],
  );
  expect(await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)).toBeLessThanOrEqual(0);
}

/** Everything to be touched on screen that is smaller than a fingertip; links within a sentence are let be. */
function smallTargets(page: Page): Promise<string[]> {
  return page.evaluate(() =>
    [...document.querySelectorAll('button, summary, select, input:not([type=file]), a:not(p a, li p a)')]
      .filter((element) => element.checkVisibility() && !element.classList.contains('visually-hidden'))
      .filter((element) => {
        const { width, height } = element.getBoundingClientRect();
        return width < 44 || height < 44;
      })
      .map((element) => element.outerHTML),
  );
}

const LOOKS = [PHONE, DESK, NARROW_PHONE].flatMap((viewport) =>
  (['light', 'dark'] as const).map((scheme) => ({
    viewport,
    scheme,
    name: `${viewport.width} × ${viewport.height}, ${scheme}`,
  })),
);

describe.each(LOOKS)('every screen at $name', ({ viewport, scheme }) => {
  it('has nothing that axe finds, nothing past the edge, nothing too small to touch', async () => {
    const page = await app.openPage(viewport, scheme);
    await expectAccessible(page);
    expect(await smallTargets(page)).toEqual([]);
    await imported(page);
    await importFiles(page, surveyFile('bad.json', '{'), surveyFile('again.json', inventedSurvey()));
    await page.getByRole('dialog').waitFor();
    await expectAccessible(page);
    expect(await smallTargets(page)).toEqual([]);
    await page.getByRole('button', { name: 'Keep both' }).click();
    await page.getByRole('button', { name: `More for ${TITLE}`, exact: true }).click();
    await act(page, `${TITLE}, copy`, 'Delete');
    await page.getByText('Deleted surveys (1)').click();
    await expectAccessible(page);
    expect(await smallTargets(page)).toEqual([]);
    await page.locator('.ledger-title', { hasText: TITLE }).click();
    for (const [section, heading] of [
      ['Site', 'Obstructions'],
      ['Roof', 'Roof planes'],
    ]) {
      await page.getByRole('link', { name: section, exact: true }).click();
      await page.getByRole('heading', { name: heading }).waitFor();
      await expectAccessible(page);
      expect(await smallTargets(page)).toEqual([]);
    }
    await page.getByRole('button', { name: 'Rename' }).click();
    await expectAccessible(page);
    expect(await smallTargets(page)).toEqual([]);
  });
});

describe('the paper', () => {
  const paperOf = (page: Page) =>
    page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);

  it('follows the system until somebody chooses, and the choice is kept', async () => {
    const page = await app.openPage(PHONE, 'dark');
    const dusk = await paperOf(page);
    await page.emulateMedia({ colorScheme: 'light' });
    const day = await paperOf(page);
    expect(day).not.toBe(dusk);
    await page.getByRole('button', { name: 'Dusk', pressed: false }).click();
    const pressed = page.getByRole('button', { name: 'Dusk', pressed: true });
    await pressed.waitFor();
    expect(await paperOf(page)).toBe(dusk);
    await page.reload();
    await pressed.waitFor();
    expect(await paperOf(page)).toBe(dusk);
  });
});

describe('by keyboard alone', () => {
  const focused = (page: Page) => page.evaluate(() => document.activeElement?.textContent?.trim() ?? '');

  /** Presses Tab until the wanted thing has the focus. */
  async function tabTo(page: Page, name: string | RegExp): Promise<void> {
    for (let presses = 0; presses < 60; presses++) {
      const label = await page.evaluate(
        () =>
          document.activeElement?.getAttribute('aria-label') ??
          document.activeElement?.textContent?.trim() ??
          '',
      );
      if (typeof name === 'string' ? label === name : name.test(label)) return;
      await page.keyboard.press('Tab');
    }
    throw new Error(`Tab does not come to ${String(name)}`);
  }

  it('opens a sample, renames it, takes that back, duplicates, deletes and restores', async () => {
    const page = await app.openPage(DESK);
    await page.locator('.ledger-button').first().waitFor();
    const title = (await page.locator('.ledger-button').first().textContent()) ?? '';
    await tabTo(page, title);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: title }).waitFor();
    expect(await focused(page)).toBe(title);

    await tabTo(page, 'Rename');
    await page.keyboard.press('Enter');
    await page.getByLabel('Title').waitFor();
    await page.keyboard.type('By keyboard');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: 'By keyboard' }).waitFor();
    expect(await focused(page)).toBe('Rename');
    await tabTo(page, 'Undo');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: title }).waitFor();

    await page.goBack();
    await page.getByRole('heading', { level: 1, name: 'Surveys' }).waitFor();
    expect(await focused(page)).toBe('Surveys');
    await tabTo(page, `More for ${title}`);
    await page.keyboard.press('Enter');
    await tabTo(page, 'Duplicate');
    await page.keyboard.press('Space');
    await page.getByText(`Copied to “${title}, copy”.`).waitFor();
    await tabTo(page, 'Delete');
    await page.keyboard.press('Enter');
    await tabTo(page, 'Deleted surveys (1)');
    await page.keyboard.press('Enter');
    await tabTo(page, `Restore ${title}`);
    await page.keyboard.press('Enter');
    await page.getByText(`“${title}” is back in the list.`).waitFor();
    expect(await page.locator('.ledger-title').count()).toBe(2);
  });

  it('skips the head of the page', async () => {
    const page = await app.openPage(DESK);
    await page.keyboard.press('Tab');
    expect(await focused(page)).toBe('Skip to the screen');
    await page.keyboard.press('Enter');
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('screen');
  });
});

describe('for a screen reader', () => {
  it('says the language, and has the regions where news is told from the start', async () => {
    const page = await app.openPage();
    expect(await page.evaluate(() => document.documentElement.lang)).toBe('en');
    expect(await page.getByRole('alert').count()).toBe(1);
    expect(await page.locator('.bars [role=status]').count()).toBe(1);
  });
});
