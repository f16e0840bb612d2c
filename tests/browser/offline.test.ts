import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openFirstSample, precached, startApp, type AppUnderTest } from './harness.ts';

let app: AppUnderTest;
beforeEach(async () => void (app = await startApp()));
afterEach(() => app.close());

describe('without a network', () => {
  it('starts cold after the first visit, at the list and at a deep link, and opens every sample', async () => {
    const first = await app.openPage();
    await first.getByText('All of Noonmark is on this device').waitFor();
    await app.server.kill();
    const context = first.context();
    await first.close();

    const page = await context.newPage();
    await page.goto(app.server.address);
    await page.getByRole('heading', { name: 'Surveys' }).waitFor();
    const title = await openFirstSample(page);
    const address = page.url();
    expect(address).toMatch(/\/survey\/.+/);
    await page.close();

    const linked = await context.newPage();
    await linked.goto(address);
    await linked.getByRole('heading', { level: 1, name: title }).waitFor();
    await linked.getByRole('list', { name: 'Obstructions' }).waitFor();

    await linked.goto(app.server.address);
    const count = await linked.locator('.ledger-button').count();
    expect(count).toBeGreaterThanOrEqual(7);
    for (let place = 0; place < count; place++) {
      const samples = linked.locator('details', { hasText: 'Sample surveys' });
      if ((await samples.getAttribute('open')) === null) await samples.locator('summary').click();
      await samples.getByRole('button').nth(place).click();
      await linked.getByRole('heading', { name: 'Obstructions' }).waitFor();
      await linked.getByRole('link', { name: 'Noonmark' }).click();
      await linked.getByRole('heading', { name: 'Surveys' }).waitFor();
    }
    expect(await linked.locator('.ledger-title').count()).toBe(count);
  });

  it('loads parts not yet used within the very first session', async () => {
    const page = await app.openPage();
    await precached(page);
    await page.waitForFunction(() => navigator.serviceWorker.controller !== null);
    await app.server.kill();
    await openFirstSample(page);
  });
});
