import { spawn } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const project = fileURLToPath(new URL('../..', import.meta.url));

export interface Outcome {
  code: number | null;
  out: string;
  err: string;
}

/** Runs the command line as a person does, from a folder, with text on standard input. */
export function noonmark(typed: string[], options: { input?: string; from?: string } = {}): Promise<Outcome> {
  const child = spawn(process.execPath, [`${project}.ci/noonmark.mjs`, ...typed], {
    cwd: options.from ?? project,
    env: { ...process.env, INIT_CWD: options.from ?? project },
  });
  const outcome: Outcome = { code: null, out: '', err: '' };
  child.stdout.setEncoding('utf8').on('data', (text: string) => (outcome.out += text));
  child.stderr.setEncoding('utf8').on('data', (text: string) => (outcome.err += text));
  child.stdin.on('error', () => undefined); // a command that needs no input may end before it is given
  child.stdin.end(options.input ?? '');
  return new Promise((resolve, reject) => {
    child.on('error', reject);
    child.on('close', (code) => resolve({ ...outcome, code }));
  });
}

/** A folder of its own for files that a test writes. */
export const newFolder = (): string => mkdtempSync(join(tmpdir(), 'noonmark-cli-'));
