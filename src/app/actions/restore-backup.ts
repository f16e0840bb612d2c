import { AppError, asAppError, type AppErrorCode } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';
import type { RestoreResult, RestoredSurvey } from '../app-state.ts';
import { readBackup, type CheckedBackup } from '../backup/read-backup.ts';
import { openSurvey } from './open-survey.ts';
import { refreshList } from './refresh-list.ts';

/** A picked archive, as far as restoring needs it. */
export interface PickedArchive {
  name: string;
  size: number;
  arrayBuffer(): Promise<ArrayBuffer>;
}

/** Phones have no memory for more at once. */
export const LARGEST_ARCHIVE = 1_500_000_000;

type Needs = Pick<AppServices, 'state' | 'store' | 'backup' | 'photos' | 'hash' | 'keepStorage'>;

async function restoreSurveys(services: Needs, { surveys }: CheckedBackup): Promise<RestoredSurvey[]> {
  const results: RestoredSurvey[] = [];
  for (const { title, rows } of surveys) {
    try {
      results.push({ id: rows.id, title, ...(await services.backup.merge(rows)) });
    } catch (error) {
      const { code, cause } = asAppError(error);
      results.push({
        id: rows.id,
        title,
        outcome: 'refused',
        code,
        ...(typeof cause === 'string' && { detail: cause }),
      });
    }
  }
  return results;
}

async function restored(services: Needs, archive: PickedArchive): Promise<RestoreResult> {
  const { name } = archive;
  const failed = (code: AppErrorCode): RestoreResult => ({ file: name, outcome: 'failed', code });
  if (archive.size > LARGEST_ARCHIVE) {
    const message = `The archive has ${Math.ceil(archive.size / 1e6)} MB; up to ${LARGEST_ARCHIVE / 1e6} MB can be restored at once. Back the surveys up one by one.`;
    return { file: name, outcome: 'damaged', problems: [{ path: 'file', message }] };
  }
  const bytes = await archive.arrayBuffer().catch(() => null);
  if (bytes === null) return failed('file-unreadable');
  const read = await readBackup(services, new Uint8Array(bytes));
  if (!read.ok) return { file: name, outcome: 'damaged', problems: read.problems };
  const { manifest, contents } = read.value;
  // Pictures first: a survey never shows one that is not there. They change nothing until a survey shows them.
  for (const { path, type } of manifest.photos)
    await services.photos.keep({ type, contents: Uint8Array.from(contents(path)).buffer });
  const surveys = await restoreSurveys(services, read.value);
  return { file: name, outcome: 'restored', surveys, photos: manifest.photos.length };
}

/**
 * Brings the surveys and photos of archives in, merged with what is here: of each field the later one stays. A damaged
 * archive is refused whole.
 */
export async function restoreBackup(services: Needs, archives: readonly PickedArchive[]): Promise<void> {
  const { state } = services;
  if (state.busy.value) throw new AppError('import-running');
  state.busy.value = true;
  state.restores.value = [];
  try {
    for (const archive of archives) {
      const result = await restored(services, archive).catch((error: unknown): RestoreResult => ({
        file: archive.name,
        outcome: 'failed',
        code: asAppError(error).code,
      }));
      state.restores.value = [...state.restores.value, result];
    }
  } finally {
    state.busy.value = false;
  }
  await refreshList(services);
  if (state.open.value) await openSurvey(services, state.open.value.id);
  await services.keepStorage();
}
