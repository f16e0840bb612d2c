import { attempt } from '../../../app/attempt.ts';
import { redoStep, undoStep } from '../../../app/actions/undo-step.ts';
import type { Step } from '../../../app/survey-store.ts';
import { useApp } from '../../app-context.ts';
import { noticeText } from '../../messages.ts';

function StepButton({ label, step, act }: { label: string; step: Step | null; act: () => Promise<void> }) {
  const { state } = useApp();
  return (
    <button
      type="button"
      disabled={step === null}
      aria-label={step ? `${label}: ${noticeText(step)}` : label}
      title={step ? noticeText(step) : undefined}
      onClick={() => void attempt(state, act)}
    >
      {label}
    </button>
  );
}

/** Goes back and forth through what was done to the survey; nothing is shown where nothing was done. */
export function HistoryButtons({ surveyId }: { surveyId: string }) {
  const services = useApp();
  const { undo, redo } = services.state.steps.value;
  if (!undo && !redo) return null;
  return (
    <div class="row" role="group" aria-label="What was done">
      <StepButton label="Take back" step={undo} act={() => undoStep(services, surveyId)} />
      <StepButton label="Do again" step={redo} act={() => redoStep(services, surveyId)} />
    </div>
  );
}
