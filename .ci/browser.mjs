// The browser that the browser tests drive, and the tools they read PDF files with.
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

const BROWSER = process.env.CHROMIUM ?? '/usr/bin/chromium';
const PDF_READER = '/usr/bin/pdftotext';
const PACKAGES = ['chromium', 'fonts-dejavu-core', 'poppler-utils'];
const INSTALL = `apt-get update && apt-get install -y --no-install-recommends ${PACKAGES.join(' ')}`;

const mayInstall = () => process.getuid?.() === 0 && existsSync('/etc/debian_version');

const missing = () => [BROWSER, PDF_READER].filter((path) => !existsSync(path));

/** Whether browser and PDF tools are there; as root on Debian they are installed where one is missing. */
export function ensureBrowser() {
  if (missing().length === 0) return true;
  if (!mayInstall()) {
    process.stdout.write(`missing: ${missing().join(', ')}. Install with:\n  sudo sh -c '${INSTALL}'\n`);
    return false;
  }
  process.stdout.write(`Installing ${PACKAGES.join(', ')} ...\n`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  spawnSync('sh', ['-c', `${INSTALL} >&2`], { stdio: 'inherit', env });
  if (missing().length === 0) return true;
  process.stdout.write(`${missing().join(', ')} could not be installed with: ${INSTALL}\n`);
  return false;
}
