import type { AppServices } from '../app-services.ts';
import { openSurvey } from './open-survey.ts';
import { refreshList } from './refresh-list.ts';

/** Shows what another tab stored of a survey. */
export async function seeChange(services: Pick<AppServices, 'state' | 'store'>, id: string): Promise<void> {
  const { state } = services;
  if (state.surveys.value !== null) await refreshList(services);
  if (state.open.value?.id === id) await openSurvey(services, id);
}
