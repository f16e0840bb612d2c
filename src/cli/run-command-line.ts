import { commands } from './command-table.ts';
import type { Command, ExitCode, Terminal } from './command.ts';
import { UsageError } from './command.ts';
import { programVersion } from './program-version.ts';
import { shownWords } from './shown-name.ts';
import { typedOptions } from './typed-options.ts';

/** Runs what was typed after `noonmark`. */
export async function runCommandLine(typed: string[], terminal: Terminal): Promise<ExitCode> {
  const [name, ...rest] = typed;
  if (name === '--help' || name === '-h' || name === 'help') {
    terminal.out(overview());
    return 0;
  }
  if (name === '--version' || name === '-v') {
    terminal.out(`${programVersion()}\n`);
    return 0;
  }
  const command = commands.find((row) => row.name === name);
  if (!command) {
    terminal.err(
      name === undefined ? overview() : `There is no command "${shownWords(name)}".\n\n${overview()}`,
    );
    return 2;
  }
  try {
    return await runCommand(command, rest, terminal);
  } catch (error) {
    if (!(error instanceof UsageError)) throw error;
    terminal.err(
      `${shownWords(error.message)}\n\nUsage: ${usageOf(command)}\nHelp:  noonmark ${command.name} --help\n`,
    );
    return 2;
  }
}

async function runCommand(command: Command, typed: string[], terminal: Terminal): Promise<ExitCode> {
  const { values, positionals } = typedOptions(command, typed);
  if (values.help) {
    terminal.out(
      `${command.summary}\n\nUsage: ${usageOf(command)}\n\n${command.help.replace(/^\n+|\n+$/g, '')}\n`,
    );
    return 0;
  }
  if (positionals.length > 0 && !command.usage.includes('FILE'))
    throw new UsageError(`"${command.name}" takes no file, got "${positionals[0]}".`);
  if (positionals.length === 0 && command.usage.startsWith('FILE'))
    throw new UsageError('A FILE is missing.');
  if (positionals.length > 1 && !command.usage.startsWith('FILE...'))
    throw new UsageError(`"${command.name}" takes one FILE, got ${positionals.length}.`);
  return command.run({ values, files: positionals, terminal });
}

const usageOf = ({ name, usage }: Command) => `noonmark ${name} ${usage}`;

function overview(): string {
  const width = Math.max(...commands.map(({ name }) => name.length));
  const lines = commands.map(({ name, summary }) => `  ${name.padEnd(width)}  ${summary}`);
  return [
    'Noonmark: solar site surveys. What blocks the sun, and what it costs.',
    '',
    'Usage: noonmark COMMAND [options]',
    '',
    ...lines,
    '',
    'Help on a command: noonmark COMMAND --help',
    'Version: noonmark --version',
    'With --json a command writes its result for machines on standard output; all else goes to standard error.',
    'Exit code: 0 done, 1 bad input, 2 wrong usage.',
    '',
  ].join('\n');
}
