import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import type { TestProject } from 'vitest/node';

declare module 'vitest' {
  interface ProvidedContext {
    /** Folder of the built app. */
    builtApp: string;
  }
}

const root = resolve(import.meta.dirname, '../..');

/** Builds the app as it ships, once for all browser tests. */
export default function buildOnce(project: TestProject): () => void {
  const cache = join(root, 'node_modules/.cache');
  mkdirSync(cache, { recursive: true });
  const folder = mkdtempSync(join(cache, 'noonmark-built-'));
  const vite = join(root, 'node_modules/vite/bin/vite.js');
  // Vitest sets NODE_ENV to test, under which the build would leave out the service worker.
  const env = { ...process.env, NODE_ENV: 'production' };
  const built = spawnSync(process.execPath, [vite, 'build', '--outDir', folder, '--emptyOutDir'], {
    cwd: root,
    env,
    encoding: 'utf8',
  });
  if (built.status !== 0) throw new Error(`the app does not build:\n${built.stdout}\n${built.stderr}`);
  project.provide('builtApp', folder);
  return () => rmSync(folder, { recursive: true, force: true });
}
