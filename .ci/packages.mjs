// Sees that the packages of package-lock.json are installed. Everything it says goes to stderr, so that a command's
// own output on stdout stays pure.
import { spawnSync } from 'node:child_process';
import { statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('..', import.meta.url));

const changedAt = (path) => statSync(`${root}${path}`, { throwIfNoEntry: false })?.mtimeMs ?? 0;

/** Runs `npm ci` where packages are missing or older than the lock file; ends the process where that fails. */
export function ensurePackages() {
  const installed = changedAt('node_modules/.package-lock.json');
  if (installed > 0 && installed >= changedAt('package-lock.json')) return;
  process.stderr.write('Installing packages (npm ci) ...\n');
  const { status } = spawnSync('npm', ['ci', '--include=dev'], {
    cwd: root,
    stdio: ['ignore', process.stderr.fd, process.stderr.fd],
    shell: process.platform === 'win32', // npm is a .cmd file there
  });
  if (status === 0) return;
  process.stderr.write('npm ci failed; the packages could not be installed.\n');
  process.exit(1);
}
