import type { Problem } from '../core/survey/problem.ts';

/** Problems as lines: `file: path: message`. */
export function problemLines(file: string, problems: readonly Problem[]): string {
  return problems
    .map(({ path, message }) => `${[file, path].filter(Boolean).join(': ')}: ${message}\n`)
    .join('');
}
