import type { AppServices } from '../app-services.ts';
import { refreshList } from './refresh-list.ts';

type Needs = Pick<AppServices, 'state' | 'store'>;
interface Named {
  id: string;
  title: string;
}

/** Brings a deleted survey back. */
export async function restoreSurvey(services: Needs, { id, title }: Named): Promise<void> {
  await services.store.restore(id);
  services.state.notice.value = { code: 'survey-restored', title };
  await refreshList(services);
}

/** Moves a survey among the deleted ones, and offers to take that back. */
export async function deleteSurvey(services: Needs, { id, title }: Named): Promise<void> {
  await services.store.remove(id);
  services.state.notice.value = {
    code: 'survey-deleted',
    title,
    undo: async () => {
      await services.store.restore(id);
      await refreshList(services);
    },
  };
  await refreshList(services);
}

/** Removes a deleted survey for good. */
export async function eraseSurvey(services: Needs, id: string): Promise<void> {
  await services.store.erase(id);
  services.state.notice.value = null;
  await refreshList(services);
}
