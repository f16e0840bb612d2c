import { existsSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { sampleSurvey } from '../report/sample-shades.ts';
import { PHONE_CONTEXT, phoneBrowser } from '../browser/capture-phone.ts';
import { FileServer } from '../browser/file-server.ts';
import { imported } from '../browser/survey-files.ts';

/** How long a press of "Save as PDF" takes until the file is there, ms, or why it could not be measured. */
export type PdfTimes =
  | { throttling: number; photos: number; bar: number; kB: number; firstMs: number; againMs: number }
  | { skipped: string };

/** The processor is made this many times slower, as of a cheap phone against a desk. */
const THROTTLING = 4;
const PHOTOS = 6;
const BAR_MS = 3_000;

/** Makes a PDF with six photos in a built app: the first, which has typeface and library to load, and one more. */
export async function pdfTimes(folder: string): Promise<PdfTimes> {
  const chromium = process.env.CHROMIUM ?? '/usr/bin/chromium';
  if (!existsSync(chromium)) return { skipped: `no Chromium at ${chromium}; set CHROMIUM to its path` };
  const server = new FileServer(folder);
  await server.start();
  const browser = await phoneBrowser();
  try {
    const page = await (await browser.newContext(PHONE_CONTEXT)).newPage();
    await page.goto(server.address);
    await page.getByRole('main').waitFor();
    return await timesOn(page);
  } finally {
    await browser.close();
    await server.kill();
  }
}

async function timesOn(page: Page): Promise<PdfTimes> {
  const survey = sampleSurvey('suburban-maple-and-gable.json');
  await imported(page, survey);
  await page.locator('.ledger-title', { hasText: survey.title }).tap();
  await page.getByRole('heading', { name: 'Photos of the site' }).waitFor();
  const strip = page.getByRole('group', { name: 'Photos of the site' });
  const files = [];
  for (let i = 0; i < PHOTOS; i++)
    files.push({ name: `${i}.jpg`, mimeType: 'image/jpeg', buffer: await grainy(page, i) });
  await strip.locator('input[type=file]').setInputFiles(files);
  await page.getByRole('button', { name: `Photo ${PHOTOS} of the site` }).waitFor();
  await page.getByRole('link', { name: 'Report', exact: true }).tap();
  const letter = page.frameLocator('iframe.report-page');
  await letter
    .locator('.photos img')
    .nth(PHOTOS - 1)
    .waitFor({ timeout: 120_000 });
  const cdp = await page.context().newCDPSession(page);
  await cdp.send('Emulation.setCPUThrottlingRate', { rate: THROTTLING });
  const [first, again] = [await savedPdf(page), await savedPdf(page)];
  return {
    throttling: THROTTLING,
    photos: PHOTOS,
    bar: BAR_MS,
    kB: first.kB,
    firstMs: first.ms,
    againMs: again.ms,
  };
}

/** A picture with grain as a photo has it, so that its file is as large as one of a roof. */
async function grainy(page: Page, seed: number): Promise<Buffer> {
  const bytes = await page.evaluate(async (start) => {
    const [width, height] = [1600, 1200];
    const canvas = new OffscreenCanvas(width, height);
    const context = canvas.getContext('2d')!;
    const image = context.createImageData(width, height);
    let state = start + 1;
    for (let i = 0; i < image.data.length; i += 4) {
      state = (state * 1_103_515_245 + 12_345) % 2_147_483_648;
      const light = 120 + 60 * Math.sin(i / 90_000) + (state % 17);
      image.data.set([light, light * 0.9, light * 0.7, 255], i);
    }
    context.putImageData(image, 0, 0);
    return [...new Uint8Array(await (await canvas.convertToBlob({ type: 'image/jpeg' })).arrayBuffer())];
  }, seed);
  return Buffer.from(bytes);
}

async function savedPdf(page: Page): Promise<{ ms: number; kB: number }> {
  const download = page.waitForEvent('download', { timeout: 60_000 });
  const start = performance.now();
  await page.getByRole('button', { name: 'Save as PDF', exact: true }).tap();
  const file = await download;
  const ms = performance.now() - start;
  let bytes = 0;
  for await (const chunk of await file.createReadStream()) bytes += (chunk as Buffer).length;
  return { ms, kB: bytes / 1000 };
}

/** What was measured, as a line to print. */
export function pdfWords(times: PdfTimes): string {
  if ('skipped' in times) return `PDF: not measured, ${times.skipped}`;
  const { throttling, photos, bar, kB, firstMs, againMs } = times;
  return `PDF with ${photos} photos, ${kB.toFixed(0)} kB, processor slowed ${throttling} times: ${firstMs.toFixed(0)} ms, again ${againMs.toFixed(0)} ms (bar ${bar})`;
}
