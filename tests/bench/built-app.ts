import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Builds the app as it ships, does something with its folder, and removes it. */
export async function withBuiltApp<T>(work: (folder: string) => T | Promise<T>): Promise<T> {
  const folder = mkdtempSync(join(tmpdir(), 'noonmark-built-'));
  try {
    execFileSync('npx', ['vite', 'build', '--outDir', folder, '--emptyOutDir', '--logLevel', 'silent'], {
      env: { ...process.env, NODE_ENV: 'production' },
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    return await work(folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
