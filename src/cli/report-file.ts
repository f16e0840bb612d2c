import { closeSync, lstatSync, openSync, readSync, statSync, writeFileSync } from 'node:fs';
import { basename, dirname, extname, join } from 'node:path';
import type { Problem } from '../core/survey/problem.ts';
import type { ReportForm } from './report-forms.ts';

/** Where a form goes that no `--out` names: beside the survey. */
export const fileBeside = (survey: string, { ending }: ReportForm): string =>
  join(dirname(survey), basename(survey, extname(survey)) + ending);

/** Why a file must not be written; null where it may. */
export function refusedFile(file: string, form: ReportForm, replace: boolean): Problem | null {
  const refused = (message: string): Problem => ({ path: file, message });
  if (!statSync(dirname(file), { throwIfNoEntry: false })?.isDirectory())
    return refused('There is no such folder. Make it, or choose another.');
  const found = lstatSync(file, { throwIfNoEntry: false });
  if (!found) return null;
  if (!found.isFile()) return refused('There is something of this name that is no file. Choose another.');
  if (!replace) return refused('There is such a file already. Give --replace to write over it.');
  if (found.size > 0 && !beginsWith(file, form.begins))
    return refused(
      `There is a file of another kind, which is left as it is: only a former ${form.option} is replaced. Choose another name.`,
    );
  return null;
}

/** Writes a form; null where that went well. */
export function writeForm(file: string, contents: string | Uint8Array, replace: boolean): Problem | null {
  try {
    writeFileSync(file, contents, { flag: replace ? 'w' : 'wx' });
    return null;
  } catch (error) {
    return { path: file, message: `It cannot be written: ${(error as Error).message}` };
  }
}

function beginsWith(file: string, start: string): boolean {
  const wanted = Buffer.from(start);
  const bytes = Buffer.alloc(wanted.length);
  const handle = openSync(file, 'r');
  try {
    readSync(handle, bytes, 0, bytes.length, 0);
  } finally {
    closeSync(handle);
  }
  return bytes.equals(wanted);
}
