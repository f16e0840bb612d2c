import { text } from 'node:stream/consumers';
import type { Terminal } from './command.ts';
import { runCommandLine } from './run-command-line.ts';

const terminal: Terminal = {
  out: (words) => void process.stdout.write(words),
  err: (words) => void process.stderr.write(words),
  input: async () => (process.stdin.isTTY ? null : text(process.stdin)),
};

// a reader that has seen enough (`| head`) is no fault
process.stdout.on('error', (error: NodeJS.ErrnoException) => process.exit(error.code === 'EPIPE' ? 0 : 1));

try {
  process.exitCode = await runCommandLine(process.argv.slice(2), terminal);
} catch (error) {
  terminal.err(`Noonmark could not finish: ${(error as Error).stack ?? String(error)}\n`);
  process.exitCode = 1;
}
