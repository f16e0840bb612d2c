import { AxeBuilder } from '@axe-core/playwright';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DESK, NARROW_PHONE, precached, startApp } from './harness.ts';
import type { AppUnderTest } from './harness.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

describe('the self-check page', () => {
  it.each([
    { viewport: NARROW_PHONE, scheme: 'light' as const },
    { viewport: NARROW_PHONE, scheme: 'dark' as const },
    { viewport: DESK, scheme: 'light' as const },
  ])(
    'meets every published value at $viewport.width, $scheme, and axe finds nothing',
    async ({ viewport, scheme }) => {
      const page = await app.openPage(viewport, scheme, { path: '/self-check' });
      const verdict = page
        .getByRole('main')
        .getByText(/This device computes right: all \d+ published values are met/);
      await verdict.waitFor();
      const results = await page.getByRole('main').locator('tbody td:last-child').allTextContents();
      expect(results.length).toBeGreaterThan(50);
      expect(new Set(results)).toEqual(new Set(['met']));
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`),
      ).toEqual([]);
      expect(
        await page.evaluate(() => document.documentElement.scrollWidth - innerWidth),
      ).toBeLessThanOrEqual(0);
    },
  );

  it('is reached from the list and computes with the server gone', async () => {
    const page = await app.openPage(NARROW_PHONE);
    await precached(page);
    await page.waitForFunction(() => navigator.serviceWorker.controller !== null);
    await app.server.kill();
    await page.getByRole('link', { name: 'Self-check' }).click();
    await page.getByRole('heading', { level: 1, name: 'Self-check' }).waitFor();
    await page.getByText('This device computes right').waitFor();
    await page.getByRole('button', { name: 'Compute again' }).click();
    await page.getByText('This device computes right').waitFor();
  });
});
