import type { AppServices } from '../app-services.ts';
import { undoStep } from '../actions/undo-step.ts';
import type { CaptureSession } from './capture-session.ts';

/** Takes the last act of this sitting back, never an earlier one; raw readings stay on the device. */
export async function undoLast(
  services: Pick<AppServices, 'state' | 'store'>,
  session: CaptureSession,
): Promise<void> {
  await session.record.settled();
  const last = services.state.steps.value.undo;
  if (!last || !session.record.isOfSitting(last.number)) {
    session.refuse('nothing-to-undo');
    return;
  }
  await undoStep(services, session.record.surveyId, last.number);
  // told on the capture screen itself
  services.state.notice.value = null;
  session.refresh();
  session.tell({ what: 'undone', name: last.title });
}
