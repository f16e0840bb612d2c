import { readFileSync, statSync } from 'node:fs';
import type { Parsed } from '../core/survey/problem.ts';

/** No file that any reader takes is larger: 20 million characters of up to 4 bytes. */
const LARGEST = 80_000_000;

export interface FileText {
  bytes: Uint8Array;
  text: string;
}

/** Text of a file; a problem where it cannot be had. `path` is where the problem is said to be. */
export function readText(file: string, path = 'file'): Parsed<FileText> {
  const refused = (message: string): Parsed<FileText> => ({ ok: false, problems: [{ path, message }] });
  try {
    const found = statSync(file);
    if (!found.isFile()) return refused(`${file} is not a file.`);
    if (found.size > LARGEST)
      return refused(`${file} has ${Math.round(found.size / 1e6)} MB; the limit is ${LARGEST / 1e6} MB.`);
    const bytes = readFileSync(file);
    return { ok: true, value: { bytes, text: decoded(bytes) }, warnings: [] };
  } catch (error) {
    return refused(reasonOf(error as NodeJS.ErrnoException, file));
  }
}

/** UTF-8 where it is; else byte by byte (ISO 8859-1), as old weather files are written. */
function decoded(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('latin1').decode(bytes);
  }
}

function reasonOf({ code, message }: NodeJS.ErrnoException, file: string): string {
  if (code === 'ENOENT' || code === 'ENOTDIR') return `There is no file ${file}. Check its name and folder.`;
  if (code === 'EACCES' || code === 'EPERM')
    return `The file ${file} may not be read. Check its permissions.`;
  return `The file ${file} cannot be read: ${message}`;
}
