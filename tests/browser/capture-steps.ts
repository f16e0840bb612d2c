import type { Page } from 'playwright-core';
import { fullCircle } from '../../src/core/angles/angles.ts';
import { magneticDeclination } from '../../src/core/pointing/declination.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { inventedSurvey } from '../app/invented-survey.ts';
import { cameraAt } from '../sensors/posed-phone.ts';

/** A site with one plane and nothing else. */
export const bareSurvey = (): Survey =>
  inventedSurvey('bare', { title: 'Bare house', obstructions: [], runs: [], readings: [], stations: [] });

const { site } = bareSurvey();
const { declination } = magneticDeclination({ ...site, timeMs: Date.now() });
/** The compass of the phone under test is off by this much, degrees. */
export const COMPASS_OFF = 3;

/** Angles of a phone whose camera looks there, as a magnetic sensor gives them. */
export const magneticLook = (azimuth: number, elevation: number) =>
  cameraAt(fullCircle(azimuth - declination + COMPASS_OFF), elevation);

export const news = (page: Page) => page.locator('.news-text');

/** Readings that the screen says are safe. */
export const storedCount = async (page: Page): Promise<number> =>
  Number(await page.locator('.stored-count').innerText());

/** From the survey's stations to the first tap of a capture. */
export async function newStation(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Stations' }).tap();
  await page.getByRole('link', { name: 'Add a station' }).tap();
  await page.getByLabel('Place').selectOption({ label: 'On South roof' });
  await page.getByLabel('Along the eave').fill('4.6');
  await page.getByLabel('Up the slope').fill('2.4');
  await page.getByRole('button', { name: 'Add, and sight from it' }).tap();
  await page.getByRole('button', { name: 'With the camera' }).waitFor();
}

export const task = (page: Page, name: 'Trace' | 'Open' | 'Mark' | 'Heading') =>
  page.getByRole('group', { name: 'Task' }).getByRole('button', { name }).tap();

export const way = (page: Page, name: string) =>
  page.getByRole('group', { name: 'How it is traced' }).getByRole('button', { name, exact: true }).tap();

/** Answers what was traced. */
export async function say(page: Page, kind: string): Promise<void> {
  await page.getByRole('dialog', { name: 'What is it?' }).waitFor();
  await page.getByRole('button', { name: kind }).first().tap();
  await page.getByText(`${kind} traced`).waitFor();
}
