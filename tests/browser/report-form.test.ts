import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { reportContents } from '../../src/report/report-contents.ts';
import { htmlPage } from '../../src/report/painters/html.ts';
import { fullContents } from '../report/painters/full-contents.ts';
import { reportOf } from '../report/report-of.ts';
import { sampleSurvey, underClearSky } from '../report/sample-shades.ts';
import { DESK, PHONE, startApp } from './harness.ts';
import type { AppUnderTest } from './harness.ts';

let app: AppUnderTest;
let report: string;
beforeAll(async () => {
  app = await startApp();
  report = htmlPage(
    reportContents(await reportOf(underClearSky(sampleSurvey('two-trees-one-behind-the-other.json')))),
  );
});
afterAll(() => app.close());

/** A report's page opened as a file is, with everything that it asks of the network. */
async function opened(html: string, viewport = PHONE, colorScheme: 'light' | 'dark' = 'light') {
  const context = await app.browser.newContext({ viewport, colorScheme });
  const page = await context.newPage();
  const asked: string[] = [];
  const said: string[] = [];
  await page.route('**/*', (route) => {
    asked.push(route.request().url());
    return route.request().url() === 'http://report.invalid/'
      ? route.fulfill({ body: html, contentType: 'text/html; charset=utf-8' })
      : route.abort();
  });
  page.on('console', (message) => said.push(message.text()));
  page.on('dialog', (dialog) => void dialog.dismiss().then(() => said.push('dialog')));
  await page.goto('http://report.invalid/');
  return { page, asked, said };
}

const overhang = (page: Page) => page.evaluate(() => document.documentElement.scrollWidth - innerWidth);

describe('the page of a report in a browser', () => {
  it.each([
    { viewport: PHONE, scheme: 'light' as const },
    { viewport: PHONE, scheme: 'dark' as const },
    { viewport: DESK, scheme: 'light' as const },
    { viewport: DESK, scheme: 'dark' as const },
  ])(
    'fits $viewport.width, $scheme, asks for nothing, and axe finds nothing',
    async ({ viewport, scheme }) => {
      const { page, asked, said } = await opened(report, viewport, scheme);
      // axe itself needs a page that lets scripts run
      const { page: loose } = await opened(report.replace(/<meta http-equiv[^>]+>/, ''), viewport, scheme);
      const { violations } = await new AxeBuilder({ page: loose }).analyze();
      expect(
        violations.map(
          ({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 200)).join(' | ')}`,
        ),
      ).toEqual([]);
      expect(await overhang(page)).toBeLessThanOrEqual(0);
      expect(asked.filter((url) => !url.endsWith('favicon.ico'))).toEqual(['http://report.invalid/']);
      expect(said).toEqual([]);
      const paper = await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
      expect(paper).toBe(scheme === 'dark' ? 'rgb(20, 18, 13)' : 'rgb(251, 248, 240)');
      await page.context().close();
      await loose.context().close();
    },
  );

  it('prints ink on white from a dark screen, without the list of contents', async () => {
    const { page } = await opened(report, DESK, 'dark');
    await page.emulateMedia({ media: 'print', colorScheme: 'dark' });
    const look = await page.evaluate(() => ({
      paper: getComputedStyle(document.documentElement).backgroundColor,
      ink: getComputedStyle(document.querySelector('h1')!).color,
      list: getComputedStyle(document.querySelector('nav')!).display,
    }));
    expect(look).toEqual({ paper: 'rgb(255, 255, 255)', ink: 'rgb(0, 0, 0)', list: 'none' });
  });

  it.each([
    [
      'markup',
      '"\'></style></title></textarea><script>document.title="ran"</script><img src=x onerror="alert(1)"><svg onload=alert(1)>',
    ],
    ['ten thousand letters', 'Wort'.repeat(2500)],
    ['marks of direction', '\u202e\u2066roof\u061c בית \u200f 94 %'],
    ['emoji', '🌳👩‍🌾🏠'.repeat(40)],
    ['script of a style sheet', '}*{display:none}/*</style><style>@import url(http://evil.invalid/x.css);'],
  ])('shows %s in every place as words, runs nothing and keeps its elements', async (_, text) => {
    const { page, asked, said } = await opened(htmlPage(fullContents(text)));
    const { page: plain } = await opened(htmlPage(fullContents('x')));
    const elements = (of: Page) =>
      of.evaluate(() => [...document.querySelectorAll('*:not(bdi)')].map(({ tagName }) => tagName).join(' '));
    expect(await elements(page)).toBe(await elements(plain));
    expect(asked.filter((url) => !url.endsWith('favicon.ico'))).toEqual(['http://report.invalid/']);
    expect(said).toEqual([]);
    expect(await overhang(page)).toBeLessThanOrEqual(0);
    const visible = await page.locator('h1').innerText();
    const marks = /[\u202a-\u202e\u2066-\u2069\u061c\u200e\u200f]/g;
    expect(visible.replace(/\s+/g, ' ')).toBe(text.replace(marks, '').replace(/\s+/g, ' ').trim());
    await page.context().close();
    await plain.context().close();
  });
});
