// node .ci/with-packages.mjs COMMAND ARGS...: installs what is missing, then runs the command.
import { ensurePackages, root } from './packages.mjs';
import { passThrough } from './pass-through.mjs';

const [command, ...args] = process.argv.slice(2);
if (!command) {
  process.stderr.write('usage: node .ci/with-packages.mjs COMMAND [ARGS...]\n');
  process.exit(2);
}
ensurePackages();
passThrough(command === 'node' ? process.execPath : command, args, { cwd: root });
