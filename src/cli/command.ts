import type { ParseArgsConfig } from 'node:util';

/** 0 done; 1 bad input, told with a path; 2 wrong usage. */
export type ExitCode = 0 | 1 | 2;

/** Streams of a command: results go to `out`, all else to `err`. */
export interface Terminal {
  out(text: string): void;
  err(text: string): void;
  /** All of standard input; null where a person sits at it. */
  input(): Promise<string | null>;
  /** Whether rows surely wait on standard input; false where that cannot be known without waiting for them. */
  rowsWait(): boolean;
}

export interface CommandCall {
  values: Record<string, string | boolean | undefined>;
  files: string[];
  terminal: Terminal;
}

/** One command: a row in `command-table.ts`. */
export interface Command {
  name: string;
  /** What comes after the name, such as `FILE... [options]`. */
  usage: string;
  /** What it does, in a line. */
  summary: string;
  /** The rest of its help. */
  help: string;
  options: NonNullable<ParseArgsConfig['options']>;
  run(call: CommandCall): Promise<ExitCode> | ExitCode;
}

/** The call itself is wrong: exit code 2. */
export class UsageError extends Error {}

/** Text of an option, or undefined where it was not given. */
export function textOption({ values }: CommandCall, name: string): string | undefined {
  const value = values[name];
  return typeof value === 'string' ? value : undefined;
}

/** Number of an option within its bounds, or undefined where it was not given. */
export function numberOption(call: CommandCall, name: string, low: number, high: number): number | undefined {
  const text = textOption(call, name);
  if (text === undefined) return undefined;
  const value = plainNumber(text);
  if (value !== null && value >= low && value <= high) return value;
  throw new UsageError(`--${name} must be a number from ${low} to ${high}, got "${text}"`);
}

/** One of a list of words, or undefined where the option was not given. */
export function wordOption<T extends string>(
  call: CommandCall,
  name: string,
  words: readonly T[],
): T | undefined {
  const text = textOption(call, name);
  if (text === undefined) return undefined;
  const found = words.find((word) => word === text);
  if (found) return found;
  throw new UsageError(`--${name} must be one of ${words.join(', ')}, got "${text}"`);
}

/** A decimal number as people write it; null for anything else, an empty text too. */
export function plainNumber(text: string): number | null {
  return /^[+-]?(\d+([.]\d*)?|[.]\d+)(e[+-]?\d+)?$/i.test(text.trim()) ? Number(text) : null;
}
