import { AppError, asAppError } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';
import type { ImportConflict, ImportResult } from '../app-state.ts';
import { refreshList } from './refresh-list.ts';

/** A picked file, as far as importing needs it. */
export interface PickedFile {
  name: string;
  size: number;
  text(): Promise<string>;
}

/** A survey file of a whole day's sweeps is a few megabytes; past this it is another thing. */
export const LARGEST_SURVEY_FILE = 20_000_000;

type Needs = Pick<AppServices, 'state' | 'store' | 'parse' | 'keepStorage'>;

function tooLarge({ name, size }: PickedFile): ImportResult {
  const message =
    `The file has ${Math.ceil(size / 1e6)} MB; a survey file may have ${LARGEST_SURVEY_FILE / 1e6} MB. ` +
    'Check that this is a survey and not a photo archive or a weather file.';
  return { file: name, outcome: 'refused', problems: [{ path: '', message }] };
}

async function textOf(file: PickedFile): Promise<string | null> {
  try {
    return await file.text();
  } catch {
    return null;
  }
}

async function importFile({ store, parse }: Needs, file: PickedFile): Promise<ImportResult | ImportConflict> {
  if (file.size > LARGEST_SURVEY_FILE) return tooLarge(file);
  const text = await textOf(file);
  if (text === null) return { file: file.name, outcome: 'failed', code: 'file-unreadable' };
  const parsed = await parse(text);
  if (!parsed.ok) return { file: file.name, outcome: 'refused', problems: parsed.problems };
  const { value: survey, warnings } = parsed;
  const stored = (await store.list()).find(({ id }) => id === survey.id);
  if (stored) {
    const storedIsDeleted = stored.deletedAt !== null;
    return { file: file.name, survey, warnings, storedTitle: stored.title, storedIsDeleted };
  }
  await store.create(survey);
  return { file: file.name, outcome: 'stored', id: survey.id, title: survey.title, warnings };
}

/**
 * Stores the surveys of the picked files, each whole or not at all; a bad file does not stop the others. Files whose
 * survey is on this device already wait in `conflicts` for a decision.
 */
export async function importSurveys(services: Needs, files: readonly PickedFile[]): Promise<void> {
  const { state, keepStorage } = services;
  if (state.busy.value) throw new AppError('import-running');
  state.busy.value = true;
  state.imports.value = [];
  state.conflicts.value = [];
  for (const file of files) {
    const result = await importFile(services, file).catch((error: unknown): ImportResult => ({
      file: file.name,
      outcome: 'failed',
      code: asAppError(error).code,
    }));
    if ('survey' in result) state.conflicts.value = [...state.conflicts.value, result];
    else state.imports.value = [...state.imports.value, result];
  }
  state.busy.value = false;
  await refreshList(services);
  await keepStorage();
}
