import { isRecord, shown } from '../../core/survey/json-value.ts';
import type { Parsed, Problem } from '../../core/survey/problem.ts';

export const BACKUP_FORMAT = 'noonmark-backup';
export const BACKUP_VERSION = 1;
export const MANIFEST = 'manifest.json';
/** Hash of the manifest itself, hexadecimal. */
export const MANIFEST_HASH = 'manifest.sha256';

/** One file of the archive. */
export interface ArchiveFile {
  path: string;
  bytes: number;
  sha256: string;
}

/** What an archive holds, as its `manifest.json` says. */
export interface BackupManifest {
  format: typeof BACKUP_FORMAT;
  version: typeof BACKUP_VERSION;
  madeAt: string;
  surveys: {
    id: string;
    title: string;
    /** The survey as anyone can read it. */
    survey: string;
    /** Its fields and readings with their stamps. */
    rows: string;
  }[];
  photos: { sha256: string; type: string; path: string }[];
  files: ArchiveFile[];
}

const isText = (value: unknown): value is string => typeof value === 'string' && value.length > 0;
const HASH = /^[0-9a-f]{64}$/;

function isFile(value: unknown): value is ArchiveFile {
  return (
    isRecord(value) &&
    isText(value.path) &&
    Number.isSafeInteger(value.bytes) &&
    (value.bytes as number) >= 0 &&
    typeof value.sha256 === 'string' &&
    HASH.test(value.sha256)
  );
}

const hasTexts = (value: unknown, keys: readonly string[]): boolean =>
  isRecord(value) && keys.every((key) => isText(value[key]));

function listFaults(value: Record<string, unknown>): Problem[] {
  const lists: [key: string, isRow: (row: unknown) => boolean][] = [
    [
      'surveys',
      (row) => hasTexts(row, ['id', 'survey', 'rows']) && isRecord(row) && typeof row.title === 'string',
    ],
    ['photos', (row) => hasTexts(row, ['sha256', 'type', 'path'])],
    ['files', isFile],
  ];
  return lists.flatMap(([key, isRow]) => {
    const list = value[key];
    if (!Array.isArray(list)) return [{ path: key, message: `${key} must be a list; it is ${shown(list)}.` }];
    return list.flatMap((row: unknown, place) =>
      isRow(row) ? [] : [{ path: `${key}[${place}]`, message: 'This entry lacks a part.' }],
    );
  });
}

/** Reads a manifest. Every file that a survey or photo names must be among its files. */
export function parseManifest(text: string): Parsed<BackupManifest> {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return refused(MANIFEST, 'The list of contents is damaged: it is not JSON.');
  }
  if (!isRecord(value) || value.format !== BACKUP_FORMAT)
    return refused(MANIFEST, `This is no backup of Noonmark: its format is not "${BACKUP_FORMAT}".`);
  if (value.version !== BACKUP_VERSION)
    return refused(
      MANIFEST,
      `The backup is of version ${shown(value.version)}; this Noonmark reads version ${BACKUP_VERSION}. Update Noonmark.`,
    );
  const faults = listFaults(value);
  if (faults.length > 0) return { ok: false, problems: faults };
  const manifest = value as unknown as BackupManifest;
  const listed = new Set(manifest.files.map(({ path }) => path));
  const named = [
    ...manifest.surveys.flatMap(({ survey, rows }) => [survey, rows]),
    ...manifest.photos.map(({ path }) => path),
  ];
  const lost = named.find((path) => !listed.has(path));
  return lost === undefined
    ? { ok: true, value: manifest, warnings: [] }
    : refused(lost, 'The list of contents names this file but gives no hash of it.');
}

const refused = (path: string, message: string): Parsed<never> => ({
  ok: false,
  problems: [{ path, message }],
});
