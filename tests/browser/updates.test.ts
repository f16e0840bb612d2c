import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterEach, beforeEach, describe, expect, inject, it } from 'vitest';
import { precached, startApp, type AppUnderTest } from './harness.ts';

let app: AppUnderTest;
let newer: string;

function change(file: string, from: string | RegExp, to: string): void {
  const path = join(newer, file);
  const before = readFileSync(path, 'utf8');
  const after = before.replace(from, to);
  if (after === before) throw new Error(`${file} has no ${String(from)}`);
  writeFileSync(path, after);
}

beforeEach(async () => {
  app = await startApp();
  newer = mkdtempSync(join(inject('builtApp'), '../noonmark-newer-'));
  cpSync(inject('builtApp'), newer, { recursive: true });
  change('index.html', '<head>', '<head><meta name="newer" content="yes">');
  // The worker knows each file by its revision.
  change(
    'service-worker.js',
    /"revision":"[0-9a-f]+","url":"index.html"/,
    '"revision":"a1b2c3","url":"index.html"',
  );
});

afterEach(async () => {
  await app.close();
  rmSync(newer, { recursive: true, force: true });
});

/** Marks the page, so that a reload shows. */
const mark = (page: Page) => page.evaluate(() => void Object.assign(window, { sameAsBefore: true }));
const isMarked = (page: Page) => page.evaluate(() => 'sameAsBefore' in window);
const isNewer = (page: Page) => page.locator('meta[name="newer"]').count();
const lookForUpdate = (page: Page) =>
  page.evaluate(async () => void (await (await navigator.serviceWorker.ready).update()));

describe('a new version', () => {
  it('is offered, waits for a word, and is then in use; a second tab is told and not reloaded', async () => {
    const page = await app.openPage();
    await precached(page);
    const second = await page.context().newPage();
    await second.goto(app.server.address);
    await second.getByRole('heading', { name: 'Surveys' }).waitFor();
    await mark(page);
    await mark(second);

    app.server.folder = newer;
    await lookForUpdate(page);
    const use = page.getByRole('button', { name: 'Use it now' });
    await use.waitFor();
    expect(await isMarked(page)).toBe(true);
    expect(await isNewer(page)).toBe(0);

    await use.click();
    await page.waitForFunction(() => document.querySelector('meta[name="newer"]') !== null);
    await page.getByRole('heading', { name: 'Surveys' }).waitFor();
    expect(await page.getByRole('button', { name: 'Use it now' }).count()).toBe(0);

    await second.getByText('in use in another tab').waitFor();
    expect(await isMarked(second)).toBe(true);
    await second.getByRole('button', { name: 'Reload' }).click();
    await second.waitForFunction(() => document.querySelector('meta[name="newer"]') !== null);
  });

  it('found on a later start is offered, with the old one still working', async () => {
    const page = await app.openPage();
    await precached(page);
    app.server.folder = newer;
    await page.reload();
    await page.getByRole('button', { name: 'Use it now' }).waitFor();
    expect(await isNewer(page)).toBe(0);
  });
});
