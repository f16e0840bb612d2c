import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PHONE, precached, startApp, type AppUnderTest } from './harness.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const LISBON = { latitude: 38.7223, longitude: -9.1393, accuracy: 12 };
const located = { geolocation: LISBON, permissions: ['geolocation'], timezoneId: 'Europe/Madrid' };
const coordinates = (page: Page) => page.getByLabel('Coordinates');

describe('a new survey', () => {
  it('is started offline in three taps with the position of the phone', async () => {
    const page = await app.openPage(PHONE, 'light', { context: located });
    await precached(page);
    await page.context().setOffline(true);
    await page.getByRole('link', { name: 'New survey' }).tap();
    await page.getByRole('button', { name: 'Use this device’s position' }).tap();
    await page.getByText('to within 12 m').waitFor();
    await expect.poll(() => page.getByLabel('Time zone').inputValue()).toBe('Europe/Lisbon');
    expect(await page.getByText(/Magnetic declination/).innerText()).toMatch(/\d\.\d° west ± 0\.\d°.*2025/);
    await page.getByRole('button', { name: 'Start the survey' }).tap();
    await page.getByRole('heading', { name: 'Roof planes' }).waitFor();
    await page.goBack(); // to the list, not to a form for yet another one
    await page.getByRole('heading', { level: 1, name: 'Surveys' }).waitFor();
    await page.goForward();
    await page.getByRole('heading', { level: 1, name: /^Survey of 20\d\d-\d\d-\d\d$/ }).waitFor();
    await page.reload();
    await page.getByRole('link', { name: 'Site', exact: true }).tap();
    await page.getByText('38.7223° N, 9.1393° W').waitFor();
    await page.getByText('Europe/Lisbon').first().waitFor();
  });

  it('takes pasted coordinates, another zone, an address as title and notes', async () => {
    const page = await app.openPage(PHONE, 'dark', { path: '/new-survey' });
    await coordinates(page).fill("44° 54' 36\" N, 72° 12' W");
    await page.getByText('44.9100° N, 72.2000° W').waitFor();
    const zone = page.getByLabel('Time zone');
    await expect.poll(() => zone.inputValue()).toBe('America/New_York');
    await zone.fill('Nowhere');
    await page.getByText('Type a part of the zone’s name').waitFor();
    await zone.fill('America/Toronto');
    await page.getByLabel('Address').fill('Mill lane 4, Nowhere');
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id }) => id)).toEqual([]);
    await page.getByRole('button', { name: 'Start the survey' }).tap();
    await page.getByRole('heading', { level: 1, name: 'Mill lane 4, Nowhere' }).waitFor();
    await page.getByRole('link', { name: 'Site', exact: true }).tap();
    await page.getByText('America/Toronto').first().waitFor();
  });

  it('says what is wrong with what is typed, and starts nothing', async () => {
    const page = await app.openPage(PHONE, 'light', { path: '/new-survey' });
    await page.getByRole('button', { name: 'Start the survey' }).tap();
    await page.getByText('The place is needed').waitFor();
    await coordinates(page).fill('121.5, 25');
    await page.getByText('change the two round').waitFor();
    await page.getByRole('button', { name: 'Start the survey' }).tap();
    // the focus moves once the fault is on screen
    await page.waitForFunction(() => document.activeElement?.getAttribute('aria-invalid') === 'true');
    await page.getByRole('heading', { level: 1, name: 'New survey' }).waitFor();
  });

  it.each<[number, RegExp]>([
    [1, /may not tell Noonmark where it is/],
    [2, /Switch location on/],
    [3, /No fix within half a minute/],
  ])('says what to do where the device gives no position (fault %i)', async (code, words) => {
    const page = await app.openPage(PHONE, 'light', {
      path: '/new-survey',
      before: `navigator.geolocation.getCurrentPosition = (_, fail) => fail({ code: ${code} });`,
    });
    await page.getByRole('button', { name: 'Use this device’s position' }).tap();
    await page.getByText(words).waitFor();
    await coordinates(page).fill('38.7 N 9.1 W');
    await page.getByText('38.7000° N, 9.1000° W').waitFor();
  });

  it.each<[string, object, RegExp]>([
    ['zero', { latitude: 0, longitude: 0, accuracy: 5 }, /a position that cannot be/],
    ['NaN', { latitude: NaN, longitude: 9, accuracy: 5 }, /a position that cannot be/],
    ['five kilometres off', { latitude: 38.7, longitude: -9.1, accuracy: 5000 }, /only to within 5\.0 km/],
    ['another continent', { latitude: 38.7, longitude: 139.1, accuracy: 5 }, /hours from this device’s/],
  ])('does not trust a position that is %s', async (_, coords, words) => {
    const given = JSON.stringify(coords).replace('null', 'NaN');
    const page = await app.openPage(PHONE, 'light', {
      path: '/new-survey',
      before: `navigator.geolocation.getCurrentPosition = (done) => done({ coords: { altitude: null, ...${given} } });`,
      context: { timezoneId: 'Europe/Lisbon' },
    });
    await page.getByRole('button', { name: 'Use this device’s position' }).tap();
    await page.getByText(words).waitFor();
  });
});
