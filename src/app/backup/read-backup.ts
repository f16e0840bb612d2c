import type { Parsed } from '../../core/survey/problem.ts';
import type { AppServices } from '../app-services.ts';
import type { SurveyRows } from './backup-store.ts';
import { archiver } from './make-backup.ts';
import { MANIFEST, MANIFEST_HASH, parseManifest, type BackupManifest } from './manifest.ts';
import { parseRows } from './parse-rows.ts';

/** An archive whose every file has been held against its hash. */
export interface CheckedBackup {
  manifest: BackupManifest;
  surveys: { title: string; rows: SurveyRows }[];
  /** The bytes of a file that the manifest names. */
  contents: (path: string) => Uint8Array;
}

/** More bytes than any survey or photo of this app has; a larger entry is another thing. */
const LARGEST_ENTRY = 300_000_000;

const refused = (path: string, message: string): Parsed<never> => ({
  ok: false,
  problems: [{ path, message }],
});

/**
 * Reads an archive and holds every file against its hash, before anything of it is used. What is damaged is named.
 */
export async function readBackup(
  { hash }: Pick<AppServices, 'hash'>,
  archive: Uint8Array,
): Promise<Parsed<CheckedBackup>> {
  const { unzipSync, strFromU8 } = await archiver();
  const entry = (path: string): Uint8Array | null => {
    const found = unzipSync(archive, {
      filter: ({ name, originalSize }) => name === path && originalSize <= LARGEST_ENTRY,
    });
    return found[path] ?? null;
  };
  try {
    const listing = entry(MANIFEST);
    const listingHash = entry(MANIFEST_HASH);
    if (!listing || !listingHash)
      return refused(MANIFEST, 'The archive has no list of contents: it is no backup of Noonmark.');
    if ((await hash(listing)) !== strFromU8(listingHash).trim())
      return refused(MANIFEST, 'The list of contents is damaged: it does not have the hash it should.');
    const parsed = parseManifest(strFromU8(listing));
    if (!parsed.ok) return parsed;
    const manifest = parsed.value;
    for (const file of manifest.files) {
      const contents = entry(file.path);
      if (!contents) return refused(file.path, 'This file is missing from the archive.');
      if (contents.byteLength !== file.bytes || (await hash(contents)) !== file.sha256)
        return refused(file.path, 'This file is damaged: it does not have the hash it should.');
    }
    const contents = (path: string) => entry(path) ?? new Uint8Array();
    const surveys: CheckedBackup['surveys'] = [];
    for (const { id, title, rows } of manifest.surveys) {
      const read = parseRows(strFromU8(contents(rows)), rows, id);
      if (!read.ok) return read;
      surveys.push({ title, rows: read.value });
    }
    return { ok: true, value: { manifest, surveys, contents }, warnings: [] };
  } catch {
    // The library throws on an archive that is cut short or is none.
    return refused('file', 'The archive is cut short or damaged, or it is no archive at all.');
  }
}
