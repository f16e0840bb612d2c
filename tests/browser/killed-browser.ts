import { execFileSync } from 'node:child_process';
import type { Page } from 'playwright-core';
import { phoneWithFolder } from './capture-phone.ts';

/** A browser with its data in a folder, that can be killed in the middle of anything. */
export interface DoomedBrowser {
  page: Page;
  /** Ends all its processes at once, without a word to any of them. */
  kill: () => Promise<void>;
  /** Ends it in peace. */
  close: () => Promise<void>;
}

/** Processes of the browser on a folder, the first one first. */
function processesOn(folder: string): number[] {
  const lines = execFileSync('ps', ['-eo', 'pid=,args='], { encoding: 'utf8', maxBuffer: 50_000_000 });
  return lines
    .split('\n')
    .filter((line) => line.includes(`--user-data-dir=${folder}`))
    .map((line) => Number.parseInt(line, 10));
}

/** Starts a browser on a folder. */
export async function doomedBrowser(folder: string): Promise<DoomedBrowser> {
  const context = await phoneWithFolder(folder);
  context.setDefaultTimeout(20_000);
  const ended = new Promise<void>((resolve) => context.once('close', () => resolve()));
  return {
    close: () => context.close(),
    page: context.pages()[0] ?? (await context.newPage()),
    kill: async () => {
      for (const id of processesOn(folder)) {
        try {
          process.kill(id, 'SIGKILL');
        } catch {
          // It went with another one.
        }
      }
      await ended;
    },
  };
}
