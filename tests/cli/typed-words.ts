import type { ExitCode, Terminal } from '../../src/cli/command.ts';
import { runCommandLine } from '../../src/cli/run-command-line.ts';

/** Runs something at a terminal that only remembers, in this process. */
export async function typedWith(
  run: (terminal: Terminal) => Promise<ExitCode>,
  input: { rows: string | null; wait: boolean } = { rows: null, wait: false },
) {
  const said = { out: '', err: '' };
  const terminal: Terminal = {
    out: (text) => void (said.out += text),
    err: (text) => void (said.err += text),
    input: () => Promise.resolve(input.rows),
    rowsWait: () => input.wait,
  };
  return { code: await run(terminal), ...said };
}

/** The command line in this process, for the many cases that need no process of their own. */
export const typed = (...words: string[]) => typedWith((terminal) => runCommandLine(words, terminal));
