import { parseArgs } from 'node:util';
import type { Command, CommandCall } from './command.ts';
import { UsageError } from './command.ts';

/** Options and files as typed for a command. Throws UsageError for an option it has not, and for a value too few or too many. */
export function typedOptions(command: Command, typed: string[]) {
  const options: Command['options'] = { ...command.options, help: { type: 'boolean', short: 'h' } };
  const { values, positionals, tokens } = parseArgs({
    args: withNegativeNumbers(typed),
    options,
    allowPositionals: true,
    strict: false, // what is wrong is said in our own words
    tokens: true,
  });
  for (const token of tokens) if (token.kind === 'option') checkOption(command, options, token);
  return { values: values as CommandCall['values'], positionals };
}

function checkOption(
  command: Command,
  options: Command['options'],
  {
    name,
    rawName,
    value,
    inlineValue,
  }: { name: string; rawName: string; value?: string; inlineValue?: boolean },
): void {
  if (!Object.hasOwn(options, name)) {
    const known = Object.keys(options).map((option) => `--${option}`);
    throw new UsageError(`"${command.name}" has no option ${rawName}. It has ${known.join(', ')}.`);
  }
  const takesValue = options[name].type === 'string';
  if (!takesValue && value !== undefined) throw new UsageError(`${rawName} takes no value, got "${value}".`);
  if (takesValue && (value === undefined || value === '' || (!inlineValue && value.startsWith('-'))))
    throw new UsageError(`${rawName} needs a value.`);
}

/** `--longitude -72.2` as `--longitude=-72.2`: a number is no option. */
function withNegativeNumbers(typed: string[]): string[] {
  const joined: string[] = [];
  for (const word of typed) {
    const before = joined.at(-1);
    if (/^-[.\d]/.test(word) && before?.startsWith('--') && before.length > 2 && !before.includes('='))
      joined[joined.length - 1] = `${before}=${word}`;
    else joined.push(word);
  }
  return joined;
}
