import { changesBetween } from '../../core/survey/field-changes.ts';
import type { Survey } from '../../core/survey/survey.ts';
import type { AppServices } from '../app-services.ts';
import type { StepCode } from '../survey-store.ts';
import { openSurvey } from './open-survey.ts';
import { refreshList } from './refresh-list.ts';
import { undoStep } from './undo-step.ts';

/**
 * Stores the difference of two states of a survey as field changes, as one step of its history: it can be taken back
 * at once or later, after a restart too. `subject` names what was acted on.
 */
export async function changeSurvey(
  services: Pick<AppServices, 'state' | 'store'>,
  before: Survey,
  after: Survey,
  code: StepCode = 'survey-changed',
  subject = after.title,
): Promise<void> {
  const { state, store } = services;
  const changes = changesBetween(before, after);
  if (changes.length === 0) return;
  const back = changesBetween(after, before);
  const number = await store.applyChanges(after.id, changes, { back, code, title: subject });
  await refreshList(services);
  if (state.open.value?.id === after.id) await openSurvey(services, after.id);
  state.notice.value = {
    code,
    title: subject,
    undo: () => undoStep(services, after.id, number ?? undefined),
    ...(number !== null && { of: { survey: after.id, step: number } }),
  };
}
