import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inventedSurvey } from '../app/invented-survey.ts';
import { DESK, openFirstSample, PHONE, startApp, type AppUnderTest } from './harness.ts';
import { act, exported, imported, importFiles, longSurvey, surveyFile, titles } from './survey-files.ts';

let app: AppUnderTest;
beforeAll(async () => void (app = await startApp()));
afterAll(() => app.close());

const TITLE = inventedSurvey().title;

describe('the list of surveys', () => {
  it('opens a sample in one tap, and keeps it', async () => {
    const page = await app.openPage(PHONE);
    const sample = page.locator('.ledger-button').first();
    const title = (await sample.textContent()) ?? '';
    await sample.tap();
    await page.getByRole('heading', { level: 1, name: title }).waitFor();
    await page.reload();
    await page.getByRole('heading', { level: 1, name: title }).waitFor();
    await page.getByRole('link', { name: 'Noonmark' }).tap();
    await page.locator('.ledger-title').waitFor();
    expect(await titles(page)).toEqual([title]);
  });

  it('imports good files and says of bad ones what is wrong where', async () => {
    const page = await app.openPage(PHONE);
    const steep = inventedSurvey('steep', { planes: [{ ...inventedSurvey().planes[0], surfaceTilt: 300 }] });
    await importFiles(
      page,
      surveyFile('cut-short.json', JSON.stringify(inventedSurvey()).slice(0, 300)),
      surveyFile('steep.json', steep),
      surveyFile('newer.json', { ...inventedSurvey(), version: 7 }),
      surveyFile('good.json', inventedSurvey()),
    );
    await page.getByText('Imported:').waitFor();
    const report = await page.locator('.import-results').innerText();
    expect(report).toMatch(/cut-short\.json[\s\S]*line 1, column \d+[\s\S]*not JSON/);
    expect(report).toMatch(/steep\.json[\s\S]*planes\[0\]\.surfaceTilt/);
    expect(report).toMatch(/newer\.json[\s\S]*version 7[\s\S]*Update/);
    expect(await titles(page)).toEqual([TITLE]);
  });

  it('takes files dropped anywhere on it', async () => {
    const page = await app.openPage(DESK);
    await page.evaluate((text) => {
      const dataTransfer = new DataTransfer();
      dataTransfer.items.add(new File([text], 'dropped.json', { type: 'application/json' }));
      document.body.dispatchEvent(
        new DragEvent('dragover', { dataTransfer, bubbles: true, cancelable: true }),
      );
      document.body.dispatchEvent(new DragEvent('drop', { dataTransfer, bubbles: true, cancelable: true }));
    }, JSON.stringify(inventedSurvey()));
    await page.getByText('Imported:').waitFor();
    expect(await titles(page)).toEqual([TITLE]);
    expect(await page.locator('.drop-here').count()).toBe(0);
  });

  it('exports what was imported, equal, under a name from its title', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    expect(await exported(page, TITLE)).toEqual({
      fileName: 'mill-lane-4-nowhere.json',
      survey: inventedSurvey(),
    });
  });

  it('asks before it puts a file over a survey of the same id', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    const changed = inventedSurvey('invented-1', { title: 'Changed elsewhere' });

    await importFiles(page, surveyFile('again.json', changed));
    const question = page.getByRole('dialog', { name: 'This survey is here already' });
    await question.getByRole('button', { name: 'Keep both' }).click();
    await page.getByRole('link', { name: 'Changed elsewhere' }).first().waitFor();
    expect((await titles(page)).sort()).toEqual(['Changed elsewhere', TITLE]);

    await importFiles(page, surveyFile('again.json', { ...changed, title: 'Replaced' }));
    await question.getByRole('button', { name: 'Replace' }).click();
    await page.getByText('“Replaced” is replaced by the file.').waitFor();
    expect((await titles(page)).sort()).toEqual(['Changed elsewhere', 'Replaced']);
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.locator('.ledger-title', { hasText: TITLE }).waitFor();
    expect((await exported(page, TITLE)).survey).toEqual(inventedSurvey());
  });

  it('duplicates', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    await act(page, TITLE, 'Duplicate');
    await page.getByText(`Copied to “${TITLE}, copy”.`).waitFor();
    const copy = (await exported(page, `${TITLE}, copy`)).survey as { id: string };
    expect(copy).toEqual({ ...inventedSurvey(copy.id), title: `${TITLE}, copy` });
    expect(copy.id).not.toBe('invented-1');
  });

  it('deletes with a way back, now and later, and erases only after a question', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    await act(page, TITLE, 'Delete');
    await page.getByText('No surveys on this device yet').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.locator('.ledger-title').waitFor();
    expect((await exported(page, TITLE)).survey).toEqual(inventedSurvey());

    await act(page, TITLE, 'Delete');
    await page.getByText('No surveys on this device yet').waitFor();
    await page.reload();
    await page.getByText('Deleted surveys (1)').click();
    await page.getByRole('button', { name: `Restore ${TITLE}` }).click();
    await page.locator('.ledger-title').waitFor();
    await act(page, TITLE, 'Delete');
    await page.getByText('Deleted surveys (1)').click();
    const erase = page.getByRole('button', { name: `Erase ${TITLE} for good` });
    await erase.click();
    const question = page.getByRole('dialog', { name: 'Erase for good?' });
    await question.waitFor();
    await page.keyboard.press('Escape');
    await question.waitFor({ state: 'detached' });
    expect(await page.getByText('Deleted surveys (1)').count()).toBe(1);
    await erase.click();
    await question.getByRole('button', { name: 'Erase for good' }).click();
    await page.getByText('Deleted surveys').waitFor({ state: 'detached' });
    await page.reload();
    await page.getByText('No surveys on this device yet').waitFor();
  });
});

describe('kept weather files', () => {
  /** Keeps a file as the app does when one is chosen, past its screens. */
  const keep = () =>
    new Promise<void>((resolve) => {
      const opening = indexedDB.open('noonmark');
      opening.onsuccess = () => {
        const transaction = opening.result.transaction(['weather-files', 'weather-bytes'], 'readwrite');
        const sha256 = 'invented';
        transaction
          .objectStore('weather-files')
          .put({ sha256, name: 'nowhere.epw', bytes: 1_500_000, keptAt: 0 });
        transaction.objectStore('weather-bytes').put({ sha256, contents: new ArrayBuffer(8) });
        transaction.oncomplete = () => {
          opening.result.close();
          resolve();
        };
      };
    });

  it('are listed with their size, and removed with a way back', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    await page.evaluate(keep);
    await page.reload();
    await page.getByText('Kept weather files (1)').click();
    await page.getByText('1.5 MB').waitFor();
    await page.getByRole('button', { name: 'Remove nowhere.epw' }).click();
    await page.getByText('The weather file nowhere.epw is no longer on this device.').waitFor();
    expect(await page.getByText('Kept weather files').count()).toBe(0);
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByText('Kept weather files (1)').waitFor();
  });
});

describe('a survey', () => {
  it('shows its site, planes, obstructions and the field book', async () => {
    const page = await app.openPage(PHONE);
    await imported(page);
    await page.locator('.ledger-title').tap();
    await page.getByRole('heading', { level: 1, name: TITLE }).waitFor();
    const main = page.getByRole('main');
    for (const part of ['44.9100° N, 72.2000° W', 'America/New_York', 'Maple in the street'])
      await main.getByText(part).first().waitFor();
    await page.getByRole('link', { name: 'Roof', exact: true }).tap();
    for (const part of ['South roof', '178.0°', '9.2 × 4.8 m']) await main.getByText(part).first().waitFor();
    await page.getByRole('link', { name: 'Stations' }).tap();
    const book = page.getByRole('region', { name: 'Sightings from Eave, left' });
    await book.waitFor();
    const rows = await book.getByRole('row').allInnerTexts();
    expect(rows.map((row) => row.replace(/\s+/g, ' ').trim())).toEqual([
      'No. Azimuth Elevation Remarks',
      'Maple in the street skyline',
      '1 131.2° 24.6° raw reading',
      '2 140.0° 31.0° mark: top',
      '3 151.5° 22.0°',
      'Add a sighting Delete the trace',
    ]);
  });

  it('with a long sweep shows the first sightings, and all on demand', async () => {
    const page = await app.openPage(DESK);
    await imported(page, longSurvey(450));
    await page.locator('.ledger-title').click();
    await page.getByRole('link', { name: 'Stations' }).click();
    const rows = page.getByRole('region', { name: 'Sightings from Eave, left' }).getByRole('row');
    const more = page.getByRole('button', { name: 'Show 350 more sightings' });
    await more.waitFor();
    // The head, the trace, the first hundred, and the rows of the buttons.
    expect(await rows.count()).toBe(104);
    await more.click();
    await more.waitFor({ state: 'detached' });
    expect(await rows.count()).toBe(453);
  });

  it('is renamed, with a way back', async () => {
    const page = await app.openPage(PHONE);
    await openFirstSample(page);
    const heading = page.getByRole('heading', { level: 1 });
    const before = await heading.textContent();
    await page.getByRole('button', { name: 'Rename' }).click();
    await page.getByLabel('Title').fill('Another name');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByRole('heading', { level: 1, name: 'Another name' }).waitFor();
    expect(await page.title()).toBe('Another name · Noonmark');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('heading', { level: 1, name: before ?? '' }).waitFor();
  });

  it('that is not on this device is told, with the way to the list', async () => {
    const page = await app.openPage(PHONE, 'light', { path: '/survey/not-here' });
    await page.getByRole('heading', { name: 'Not on this device' }).waitFor();
    await page.getByRole('link', { name: 'Go to the surveys.' }).click();
    await page.getByRole('heading', { name: 'Surveys' }).waitFor();
  });
});
