import type { RestoredSurvey, RestoreResult } from '../../../app/app-state.ts';
import { useApp } from '../../app-context.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { ERROR_MESSAGES } from '../../messages.ts';
import { surveyPath } from '../../survey-path.ts';
import { FileReport } from './file-report.tsx';
import { NotDone } from './not-done.tsx';

const OUTCOMES = {
  added: 'is restored.',
  merged: 'is merged: what was newer here stayed, the rest is taken from the backup.',
  same: 'is as it was: nothing in the backup is newer.',
};

function SurveyOutcome({ survey }: { survey: RestoredSurvey }) {
  if (survey.outcome === 'refused') {
    const { what, remedy } = ERROR_MESSAGES[survey.code];
    return (
      <li>
        “{survey.title}” is left as it was. {what} {survey.detail ?? remedy}
      </li>
    );
  }
  return (
    <li>
      <a href={surveyPath(survey.id)}>{survey.title}</a> {OUTCOMES[survey.outcome]}
      {survey.isDeleted &&
        ' It is among the deleted surveys below, where it was put after the backup was made.'}
    </li>
  );
}

function Outcome({ result }: { result: RestoreResult }) {
  switch (result.outcome) {
    case 'restored':
      return (
        <ul class="problems">
          {result.surveys.map((survey) => (
            <SurveyOutcome key={survey.id} survey={survey} />
          ))}
        </ul>
      );
    case 'damaged':
      return (
        <>
          <p>Not restored; nothing was changed. Take another copy of the backup.</p>
          <ProblemList problems={result.problems} />
        </>
      );
    case 'failed':
      return <NotDone what="Not restored." code={result.code} />;
  }
}

/** What came of each archive of the last restore. */
export function RestoreResults() {
  const { state } = useApp();
  return (
    <FileReport
      results={state.restores.value}
      outcome={(result) => <Outcome result={result} />}
      onClose={() => (state.restores.value = [])}
    />
  );
}
