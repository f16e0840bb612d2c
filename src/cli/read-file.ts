import { readFileSync, statSync } from 'node:fs';
import { weatherFileText } from '../core/irradiance/weather-file-text.ts';
import type { Parsed } from '../core/survey/problem.ts';

/** No file that any reader takes is larger: 20 million characters of up to 4 bytes. */
const LARGEST = 80_000_000;

export interface FileText {
  bytes: Uint8Array;
  text: string;
}

const refused = (message: string): Parsed<FileText> => ({ ok: false, problems: [{ path: 'file', message }] });

/** Text of a survey file, which is UTF-8; a problem where it cannot be had. */
export function readSurveyText(file: string): Parsed<FileText> {
  return readFile(file, (bytes) => utf8(bytes));
}

/** Text of a weather file: UTF-8 where it is, else byte by byte (ISO 8859-1), as old ones are written. */
export function readWeatherText(file: string): Parsed<FileText> {
  return readFile(file, (bytes) => weatherFileText(bytes, TextDecoder));
}

function readFile(file: string, decoded: (bytes: Uint8Array) => string | null): Parsed<FileText> {
  try {
    const found = statSync(file);
    if (!found.isFile()) return refused(`${file} is not a file.`);
    if (found.size > LARGEST)
      return refused(`${file} has ${Math.round(found.size / 1e6)} MB; the limit is ${LARGEST / 1e6} MB.`);
    const bytes = readFileSync(file);
    const text = decoded(bytes);
    if (text === null)
      return refused(`${file} is not UTF-8 text: it is damaged or of another kind. Export it again.`);
    return { ok: true, value: { bytes, text }, warnings: [] };
  } catch (error) {
    return refused(reasonOf(error as NodeJS.ErrnoException, file));
  }
}

function utf8(bytes: Uint8Array): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

function reasonOf({ code, message }: NodeJS.ErrnoException, file: string): string {
  if (code === 'ENOENT' || code === 'ENOTDIR') return `There is no file ${file}. Check its name and folder.`;
  if (code === 'EACCES' || code === 'EPERM')
    return `The file ${file} may not be read. Check its permissions.`;
  return `The file ${file} cannot be read: ${message}`;
}
