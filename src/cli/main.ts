import { fstatSync, readFileSync } from 'node:fs';
import { text } from 'node:stream/consumers';
import type { Terminal } from './command.ts';
import { runCommandLine } from './run-command-line.ts';

const terminal: Terminal = {
  out: (words) => void process.stdout.write(words),
  err: (words) => void process.stderr.write(words),
  input: async () => (process.stdin.isTTY ? null : text(process.stdin)),
  rowsWait: unreadFileOnInput,
};

// a reader that has seen enough (`| head`) is no fault
process.stdout.on('error', (error: NodeJS.ErrnoException) => process.exit(error.code === 'EPIPE' ? 0 : 1));

try {
  process.exitCode = await runCommandLine(process.argv.slice(2), terminal);
} catch (error) {
  terminal.err(`Noonmark could not finish: ${(error as Error).stack ?? String(error)}\n`);
  process.exitCode = 1;
}

/**
 * Whether standard input is a file (`< rows.csv`) that nobody has read from. In a shell's loop over a file its lines
 * are being read by the loop, and are no rows for this command; only Linux tells how far a file was read.
 */
function unreadFileOnInput(): boolean {
  try {
    const input = fstatSync(0);
    return (
      input.isFile() && input.size > 0 && /^pos:\s*0$/m.test(readFileSync('/proc/self/fdinfo/0', 'utf8'))
    );
  } catch {
    return false;
  }
}
