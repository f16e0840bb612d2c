import { existsSync } from 'node:fs';
import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import { inject } from 'vitest';
import { FileServer } from './file-server.ts';

export const PHONE = { width: 390, height: 844 };
export const NARROW_PHONE = { width: 360, height: 740 };
export const DESK = { width: 1280, height: 800 };

type Viewport = typeof PHONE;
type ColourScheme = 'light' | 'dark';

const ARGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export interface AppUnderTest {
  server: FileServer;
  browser: Browser;
  /**
   * A new device that has never seen the app, with the list of surveys on screen. Phones are touched, desks have a
   * mouse. A second tab of the same device: `page.context().newPage()`.
   */
  openPage(viewport?: Viewport, colourScheme?: ColourScheme, options?: OpenOptions): Promise<Page>;
  close(): Promise<void>;
}

export interface OpenOptions {
  path?: string;
  /** Runs in the page before any of the app's code. */
  before?: string | (() => void);
  context?: BrowserContextOptions;
}

function contextOptions(viewport: Viewport, colorScheme: ColourScheme): BrowserContextOptions {
  const isPhone = viewport.width < 500;
  return {
    viewport,
    colorScheme,
    locale: 'en-GB',
    ...(isPhone && { hasTouch: true, isMobile: true, deviceScaleFactor: 2 }),
  };
}

/** The built app on a server of its own, and a browser to look at it. */
export async function startApp(): Promise<AppUnderTest> {
  const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium';
  if (!existsSync(executablePath))
    throw new Error(`no browser at ${executablePath}; set CHROMIUM to its path`);
  const server = new FileServer(inject('builtApp'));
  await server.start();
  const browser = await chromium.launch({ executablePath, args: ARGS });

  async function openPage(
    viewport: Viewport = PHONE,
    colourScheme: ColourScheme = 'light',
    { path = '/', before, context: more }: OpenOptions = {},
  ): Promise<Page> {
    const context = await browser.newContext({ ...contextOptions(viewport, colourScheme), ...more });
    context.setDefaultTimeout(20_000);
    if (before !== undefined) await context.addInitScript(before);
    const page = await context.newPage();
    await page.goto(server.address + path);
    await page.getByRole('main').waitFor();
    return page;
  }

  return {
    server,
    browser,
    openPage,
    close: async () => {
      await browser.close();
      await server.kill();
    },
  };
}

/** Waits until everything the app has is on the device. */
export async function precached(page: Page): Promise<void> {
  await page.evaluate(async () => void (await navigator.serviceWorker.ready));
}

/** A sample survey opened from the list, by touch where the page has it; waits for its heading. */
export async function openFirstSample(page: Page): Promise<string> {
  const sample = page
    .getByRole('group', { name: 'Sample surveys' })
    .or(page.locator('details.fold'))
    .getByRole('button')
    .first();
  const title = (await sample.textContent()) ?? '';
  await sample.click();
  await page.getByRole('heading', { level: 1, name: title }).waitFor();
  return title;
}
