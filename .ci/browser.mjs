// The browser that the browser tests drive.
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

const BROWSER = process.env.CHROMIUM ?? '/usr/bin/chromium';
const PACKAGES = ['chromium', 'fonts-dejavu-core'];
const INSTALL = `apt-get update && apt-get install -y --no-install-recommends ${PACKAGES.join(' ')}`;

const mayInstall = () => process.getuid?.() === 0 && existsSync('/etc/debian_version');

/** Whether the browser is there; as root on Debian it is installed where it is missing. */
export function ensureBrowser() {
  if (existsSync(BROWSER)) return true;
  if (!mayInstall()) {
    process.stdout.write(`chromium is missing at ${BROWSER}. Install it with:\n  sudo sh -c '${INSTALL}'\n`);
    return false;
  }
  process.stdout.write('Installing chromium ...\n');
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  spawnSync('sh', ['-c', `${INSTALL} >&2`], { stdio: 'inherit', env });
  if (existsSync(BROWSER)) return true;
  process.stdout.write(`chromium could not be installed with: ${INSTALL}\n`);
  return false;
}
