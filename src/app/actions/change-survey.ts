import { changesBetween } from '../../core/survey/field-changes.ts';
import type { Survey } from '../../core/survey/survey.ts';
import type { AppServices } from '../app-services.ts';
import type { Notice } from '../app-state.ts';
import { openSurvey } from './open-survey.ts';
import { refreshList } from './refresh-list.ts';

type Needs = Pick<AppServices, 'state' | 'store'>;

async function step(services: Needs, from: Survey, to: Survey): Promise<void> {
  await services.store.applyChanges(to.id, changesBetween(from, to));
  await refreshList(services);
  if (services.state.open.value?.id === to.id) await openSurvey(services, to.id);
}

/** Stores the difference of two states of a survey as field changes, and offers to take it back. */
export async function changeSurvey(
  services: Needs,
  before: Survey,
  after: Survey,
  code: Notice['code'] = 'survey-changed',
): Promise<void> {
  await step(services, before, after);
  services.state.notice.value = { code, title: after.title, undo: () => step(services, after, before) };
}
