import { useId, useState } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { deleteSurvey } from '../../../app/actions/delete-survey.ts';
import { duplicateSurvey } from '../../../app/actions/duplicate-survey.ts';
import { exportSurvey } from '../../../app/actions/export-survey.ts';
import type { SurveySummary } from '../../../app/survey-store.ts';
import { useApp } from '../../app-context.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { focusHeading } from '../../components/screen-heading.tsx';
import { saveFile } from '../../device/save-file.ts';
import { surveyPath } from '../../survey-path.ts';
import { saveBackup } from './save-backup.ts';
import { summaryLine } from './summary-line.ts';

function RowActions({ summary, unreadable }: { summary: SurveySummary; unreadable: boolean }) {
  const services = useApp();
  const run = (act: () => Promise<void>) => () => void attempt(services.state, act);
  const save = async () => {
    const { fileName, text } = await exportSurvey(services, summary.id);
    saveFile(fileName, text);
  };
  const discard = async () => {
    await deleteSurvey(services, summary);
    focusHeading();
  };
  return (
    <>
      <button type="button" onClick={run(save)}>
        {unreadable ? 'Export as stored' : 'Export'}
      </button>
      <button type="button" onClick={run(() => saveBackup(services, [summary.id], 'survey'))}>
        Back up with photos
      </button>
      {!unreadable && (
        <button type="button" onClick={run(() => duplicateSurvey(services, summary.id))}>
          Duplicate
        </button>
      )}
      <button type="button" onClick={run(discard)}>
        Delete
      </button>
    </>
  );
}

/** A line of the list: the survey as one large target, and its acts behind "More". */
export function SurveyRow({ summary }: { summary: SurveySummary }) {
  const { state } = useApp();
  const [open, setOpen] = useState(false);
  const actionsId = useId();
  const problems = state.unreadable.value.get(summary.id);
  return (
    <li>
      <div class="ledger-line">
        <a class="ledger-title" href={surveyPath(summary.id)}>
          <strong>{summary.title}</strong>
          <span class="faint small">{problems ? 'Cannot be read' : summaryLine(summary)}</span>
        </a>
        <button
          type="button"
          class="more"
          aria-expanded={open}
          aria-controls={actionsId}
          aria-label={`More for ${summary.title}`}
          onClick={() => setOpen(!open)}
        >
          More
        </button>
      </div>
      {problems && <ProblemList problems={problems} />}
      <div id={actionsId} class="row" role="group" aria-label={summary.title} hidden={!open}>
        {open && <RowActions summary={summary} unreadable={problems !== undefined} />}
      </div>
    </li>
  );
}
