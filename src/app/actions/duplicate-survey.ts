import type { Survey } from '../../core/survey/survey.ts';
import { AppError } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';
import { refreshList } from './refresh-list.ts';

/** First title of the form "Title, copy", "Title, copy 2" … that is not taken. */
export function copyTitle(title: string, taken: readonly string[]): string {
  const stem = title.replace(/, copy( \d+)?$/, '');
  for (let count = 1; ; count++) {
    const candidate = count === 1 ? `${stem}, copy` : `${stem}, copy ${count}`;
    if (!taken.includes(candidate)) return candidate;
  }
}

/** Stores a copy under a new id and offers to take it back. */
export async function duplicateSurvey(
  services: Pick<AppServices, 'state' | 'store' | 'newId'>,
  id: string,
): Promise<void> {
  const { state, store, newId } = services;
  const stored = await store.load(id);
  if (stored === null) throw new AppError('survey-missing');
  if (stored.state === 'unreadable') throw new AppError('survey-unreadable');
  const taken = (await store.list()).map(({ title }) => title);
  const copy: Survey = { ...stored.survey, id: newId(), title: copyTitle(stored.survey.title, taken) };
  await store.create(copy);
  state.notice.value = {
    code: 'survey-duplicated',
    title: copy.title,
    undo: async () => {
      await store.remove(copy.id);
      await refreshList(services);
    },
  };
  await refreshList(services);
}
