import type { Page } from 'playwright-core';
import type { Sighting, Survey } from '../../src/core/survey/survey.ts';
import { inventedSurvey } from '../app/invented-survey.ts';

export const surveyFile = (name: string, survey: unknown) => ({
  name,
  mimeType: 'application/json',
  buffer: Buffer.from(typeof survey === 'string' ? survey : JSON.stringify(survey)),
});

type File = ReturnType<typeof surveyFile>;

/** Gives files to the picker of the list. */
export async function importFiles(page: Page, ...files: File[]): Promise<void> {
  await page.locator('#survey-files').setInputFiles(files);
}

/** Imports a survey and waits until it is told to be stored. */
export async function imported(page: Page, survey: Survey = inventedSurvey()): Promise<void> {
  await importFiles(page, surveyFile(`${survey.id}.json`, survey));
  await page.getByText('Imported:').waitFor();
}

/** Opens the acts of a survey in the list and does one. */
export async function act(page: Page, title: string, name: string): Promise<void> {
  const more = page.getByRole('button', { name: `More for ${title}`, exact: true });
  if ((await more.getAttribute('aria-expanded')) !== 'true') await more.click();
  await page.getByRole('group', { name: title, exact: true }).getByRole('button', { name }).click();
}

/** The survey that "Export" gives. */
export async function exported(
  page: Page,
  title: string,
  name = 'Export',
): Promise<{ fileName: string; survey: unknown }> {
  const [download] = await Promise.all([page.waitForEvent('download'), act(page, title, name)]);
  const chunks: Buffer[] = [];
  for await (const chunk of await download.createReadStream()) chunks.push(chunk as Buffer);
  return {
    fileName: download.suggestedFilename(),
    survey: JSON.parse(Buffer.concat(chunks).toString('utf8')),
  };
}

/** Titles in the list, from the top. */
export const titles = (page: Page): Promise<string[]> =>
  page.locator('.ledger-title strong').allTextContents();

/** A survey with as many sightings as wanted, along one ridge. */
export function longSurvey(count: number): Survey {
  const base = inventedSurvey('long', { title: 'Long sweep' });
  const sightings: Sighting[] = Array.from({ length: count }, (_, place) => ({
    id: `s${place}`,
    order: place,
    azimuth: 90 + (180 * place) / count,
    elevation: 10 + 5 * Math.sin(place / 50),
  }));
  const station = base.stations[0];
  return { ...base, stations: [{ ...station, traces: [{ ...station.traces[0], sightings }] }] };
}
