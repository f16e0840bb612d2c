// npm start: installs what is missing, builds the app, serves it on this machine and prints the address.
import { spawnSync } from 'node:child_process';
import { appServer, listenFrom } from './app-server.mjs';
import { ensurePackages, root } from './packages.mjs';

const DEFAULT_PORT = 8470;

function wantedPort() {
  const given = process.env.PORT;
  if (given === undefined || given === '') return DEFAULT_PORT;
  const port = Number(given);
  if (Number.isInteger(port) && port >= 1 && port <= 65535) return port;
  process.stderr.write(`PORT must be a whole number from 1 to 65535, got ${given}\n`);
  process.exit(2);
}

function build() {
  const vite = `${root}node_modules/vite/bin/vite.js`;
  const env = { ...process.env, NODE_ENV: 'production' };
  const { status } = spawnSync(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: root,
    stdio: 'inherit',
    env,
  });
  if (status !== 0) process.exit(status ?? 1);
}

const port = wantedPort();
ensurePackages();
process.stdout.write('Building Noonmark ...\n');
build();
const server = appServer(`${root}dist`);
const listening = await listenFrom(server, port);
process.stdout.write(`Noonmark is at http://localhost:${listening}/  (Ctrl+C stops it)\n`);

for (const signal of ['SIGINT', 'SIGTERM'])
  process.on(signal, () => {
    server.close(() => process.exit(0));
    server.closeAllConnections();
  });
