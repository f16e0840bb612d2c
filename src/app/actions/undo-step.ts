import type { AppServices } from '../app-services.ts';
import type { Notice } from '../app-state.ts';
import type { Step } from '../survey-store.ts';
import { openSurvey } from './open-survey.ts';
import { refreshList } from './refresh-list.ts';

type Needs = Pick<AppServices, 'state' | 'store'>;

async function told(services: Needs, id: string, step: Step | null, code: Notice['code']): Promise<void> {
  const { state } = services;
  await refreshList(services);
  if (state.open.value?.id === id) await openSurvey(services, id);
  state.notice.value = step && { code, title: step.title };
}

/** Takes back the last act on a survey; with a number, only where it is still the last one. */
export async function undoStep(services: Needs, id: string, number?: number): Promise<void> {
  await told(services, id, await services.store.undo(id, number), 'step-undone');
}

/** Does the act again that was taken back last. */
export async function redoStep(services: Needs, id: string): Promise<void> {
  await told(services, id, await services.store.redo(id), 'step-redone');
}
