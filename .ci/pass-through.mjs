// Runs one command in the place of this process: same streams, same exit code, signals left to the child.
import { spawn } from 'node:child_process';

/** Runs the command and ends this process as it ended. */
export function passThrough(command, args, options = {}) {
  const child = spawn(command, args, { stdio: 'inherit', ...options });
  for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => child.kill(signal));
  child.on('error', (error) => {
    process.stderr.write(`${command}: ${error.message}\n`);
    process.exit(127);
  });
  child.on('exit', (code, signal) => process.exit(code ?? (signal === 'SIGINT' ? 130 : 143)));
}
