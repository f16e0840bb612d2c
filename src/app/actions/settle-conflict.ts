import { changesBetween } from '../../core/survey/field-changes.ts';
import type { Survey } from '../../core/survey/survey.ts';
import { AppError, asAppError } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';
import type { ImportConflict, ImportResult } from '../app-state.ts';
import { copyTitle } from './duplicate-survey.ts';
import { refreshList } from './refresh-list.ts';

type Needs = Pick<AppServices, 'state' | 'store' | 'newId'>;
export type Decision = 'keep-both' | 'replace' | 'leave-out';

async function keepBoth({ store, newId }: Needs, survey: Survey): Promise<Survey> {
  const taken = (await store.list()).map(({ title }) => title);
  const title = taken.includes(survey.title) ? copyTitle(survey.title, taken) : survey.title;
  const copy = { ...survey, id: newId(), title };
  await store.create(copy);
  return copy;
}

async function replace(services: Needs, survey: Survey): Promise<Survey> {
  const { state, store } = services;
  const stored = await store.load(survey.id);
  if (stored === null) throw new AppError('survey-missing');
  if (stored.state === 'unreadable') throw new AppError('survey-unreadable');
  const before = stored.survey;
  const number = await store.applyChanges(survey.id, changesBetween(before, survey), {
    back: changesBetween(survey, before),
    code: 'survey-replaced',
    title: survey.title,
  });
  if (stored.deletedAt !== null) await store.restore(survey.id);
  state.notice.value = {
    code: 'survey-replaced',
    title: survey.title,
    undo: async () => {
      await store.undo(survey.id, number ?? undefined);
      if (stored.deletedAt !== null) await store.remove(survey.id);
      await refreshList(services);
    },
  };
  return survey;
}

async function settled(services: Needs, conflict: ImportConflict, decision: Decision): Promise<ImportResult> {
  const { file, survey, warnings } = conflict;
  if (decision === 'leave-out') return { file, outcome: 'left-out', title: survey.title };
  try {
    const stored = await (decision === 'replace' ? replace : keepBoth)(services, survey);
    return { file, outcome: 'stored', id: stored.id, title: stored.title, warnings };
  } catch (error) {
    return { file, outcome: 'failed', code: asAppError(error).code };
  }
}

/** Carries out a person's decision on a file whose survey is on this device already. */
export async function settleConflict(
  services: Needs,
  conflict: ImportConflict,
  decision: Decision,
): Promise<void> {
  const { state } = services;
  state.conflicts.value = state.conflicts.value.filter((other) => other !== conflict);
  const result = await settled(services, conflict, decision);
  state.imports.value = [...state.imports.value, result];
  await refreshList(services);
}
