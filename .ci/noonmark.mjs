// npm run -s noonmark -- COMMAND ARGS...: the command line, on a fresh clone too. Paths are read from where the person
// stands (npm itself moves to the project's folder and leaves that in INIT_CWD).
import { ensurePackages, root } from './packages.mjs';
import { passThrough } from './pass-through.mjs';

ensurePackages();
const loader = import.meta.resolve('tsx');
passThrough(process.execPath, ['--import', loader, `${root}src/cli/main.ts`, ...process.argv.slice(2)], {
  cwd: process.env.INIT_CWD ?? process.cwd(),
});
