import { useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { eraseSurvey, restoreSurvey } from '../../../app/actions/delete-survey.ts';
import type { SurveySummary } from '../../../app/survey-store.ts';
import { useApp } from '../../app-context.ts';
import { Dialog } from '../../components/dialog.tsx';
import { focusHeading } from '../../components/screen-heading.tsx';

function EraseQuestion({ summary, onDone }: { summary: SurveySummary; onDone: () => void }) {
  const services = useApp();
  const erase = async () => {
    await attempt(services.state, () => eraseSurvey(services, summary.id));
    onDone();
    focusHeading();
  };
  return (
    <Dialog title="Erase for good?" onCancel={onDone}>
      <p>
        <strong>{summary.title}</strong> and its raw readings go from this device. This cannot be taken back;
        export the survey first if anyone may need it.
      </p>
      <div class="row">
        <button type="button" class="main" onClick={onDone}>
          Keep it
        </button>
        <button type="button" onClick={() => void erase()}>
          Erase for good
        </button>
      </div>
    </Dialog>
  );
}

/** Deleted surveys stay until somebody erases them. */
export function DeletedSurveys({ surveys }: { surveys: SurveySummary[] }) {
  const services = useApp();
  const [asked, setAsked] = useState<SurveySummary | null>(null);
  const bringBack = async (summary: SurveySummary) => {
    await restoreSurvey(services, summary);
    focusHeading();
  };
  return (
    <details class="fold">
      <summary>Deleted surveys ({surveys.length})</summary>
      <ul class="ledger">
        {surveys.map((summary) => (
          <li key={summary.id} class="ledger-line">
            <strong class="grow">{summary.title}</strong>
            <button
              type="button"
              aria-label={`Restore ${summary.title}`}
              onClick={() => void attempt(services.state, () => bringBack(summary))}
            >
              Restore
            </button>
            <button
              type="button"
              aria-label={`Erase ${summary.title} for good`}
              onClick={() => setAsked(summary)}
            >
              Erase for good
            </button>
          </li>
        ))}
      </ul>
      {asked && <EraseQuestion summary={asked} onDone={() => setAsked(null)} />}
    </details>
  );
}
