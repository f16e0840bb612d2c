import type { Problem } from '../core/survey/problem.ts';
import { shownWords } from './shown-name.ts';

/** Problems as lines: `file: path: message`. */
export function problemLines(file: string, problems: readonly Problem[]): string {
  return problems
    .map(({ path, message }) => `${shownWords([file, path, message].filter(Boolean).join(': '))}\n`)
    .join('');
}

/** The same for what is only a warning. */
export const warningLines = (file: string, warnings: readonly Problem[]): string =>
  problemLines(
    file,
    warnings.map(({ path, message }) => ({ path, message: `Warning: ${message}` })),
  );
