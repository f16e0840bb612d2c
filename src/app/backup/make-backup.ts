import { surveyOf } from '../../core/survey/field-changes.ts';
import { isRecord } from '../../core/survey/json-value.ts';
import { standingFields } from '../../core/sync-protocol/standing-fields.ts';
import { fileNameOf } from '../actions/export-survey.ts';
import { AppError } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';
import type { SurveyRows } from './backup-store.ts';
import { BACKUP_FORMAT, BACKUP_VERSION, MANIFEST, MANIFEST_HASH, type BackupManifest } from './manifest.ts';

type Needs = Pick<AppServices, 'backup' | 'photos' | 'hash' | 'now'>;

/** Loads what packs and unpacks archives. */
export const archiver = () =>
  import('fflate').catch((cause: unknown) => {
    throw new AppError('part-missing', cause);
  });

/** The document that stored rows make. */
function documentOf({ fields, readings }: SurveyRows): unknown {
  const standing = standingFields(
    fields.map((row) => [row.path, row] as const),
    readings.map((row) => [row.id, row] as const),
  );
  return surveyOf(standing.fields);
}

/** Hashes of the photos that a document shows. */
function photoHashes(document: unknown): string[] {
  const photos: unknown = isRecord(document) ? document.photos : [];
  return Array.isArray(photos)
    ? photos.flatMap((photo: unknown) =>
        isRecord(photo) && typeof photo.sha256 === 'string' ? [photo.sha256] : [],
      )
    : [];
}

const EXTENSIONS: Record<string, string> = { 'image/jpeg': 'jpg', 'image/png': 'png', 'image/webp': 'webp' };

/**
 * Packs surveys with their photos into one archive, given out piece by piece through `sink`: surveys and their rows
 * packed, pictures as they are. Pictures that are not on this device are left out.
 */
export async function makeBackup(
  { backup, photos, hash, now }: Needs,
  ids: readonly string[],
  sink: (piece: Uint8Array) => void,
): Promise<BackupManifest> {
  const { strToU8, Zip, ZipDeflate, ZipPassThrough } = await archiver();
  let failure: Error | null = null;
  const zip = new Zip((error, piece) => {
    if (error) failure = error;
    else sink(piece);
  });
  const manifest: BackupManifest = {
    format: BACKUP_FORMAT,
    version: BACKUP_VERSION,
    madeAt: new Date(now()).toISOString(),
    surveys: [],
    photos: [],
    files: [],
  };
  const add = async (path: string, contents: Uint8Array, packed: boolean) => {
    const entry = packed ? new ZipDeflate(path, { level: 6 }) : new ZipPassThrough(path);
    zip.add(entry);
    const sha256 = await hash(contents);
    entry.push(contents, true);
    if (failure) throw new AppError('unexpected', failure);
    return { path, bytes: contents.byteLength, sha256 };
  };
  const json = (value: unknown) => strToU8(`${JSON.stringify(value, null, 1)}\n`);

  for (const [place, id] of ids.entries()) {
    const rows = await backup.rows(id);
    if (!rows) throw new AppError('survey-missing', id);
    const document = documentOf(rows);
    const title = isRecord(document) && typeof document.title === 'string' ? document.title : id;
    const folder = `surveys/${place + 1}-${fileNameOf(title).replace(/[.]json$/, '')}`;
    const files = { survey: `${folder}/survey.json`, rows: `${folder}/rows.json` };
    manifest.files.push(
      await add(files.survey, json(document), true),
      await add(files.rows, json(rows), true),
    );
    manifest.surveys.push({ id, title, ...files });
    for (const sha256 of photoHashes(document)) {
      if (manifest.photos.some((photo) => photo.sha256 === sha256)) continue;
      const picture = await photos.picture(sha256);
      if (!picture) continue;
      const path = `photos/${sha256}.${EXTENSIONS[picture.type] ?? 'bin'}`;
      manifest.files.push(await add(path, new Uint8Array(picture.contents), false));
      manifest.photos.push({ sha256, type: picture.type, path });
    }
  }
  const contents = json(manifest);
  await add(MANIFEST, contents, true);
  await add(MANIFEST_HASH, strToU8(await hash(contents)), false);
  zip.end();
  return manifest;
}
