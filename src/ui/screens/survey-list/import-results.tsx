import type { ImportResult } from '../../../app/app-state.ts';
import { useApp } from '../../app-context.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { ERROR_MESSAGES } from '../../messages.ts';
import { surveyPath } from '../../survey-path.ts';
import { FileReport } from './file-report.tsx';

function Outcome({ result }: { result: ImportResult }) {
  switch (result.outcome) {
    case 'stored':
      return (
        <>
          <p>
            Imported: <a href={surveyPath(result.id)}>{result.title}</a>
          </p>
          {result.warnings.length > 0 && (
            <>
              <p>Worth knowing:</p>
              <ProblemList problems={result.warnings} />
            </>
          )}
        </>
      );
    case 'refused':
      return (
        <>
          <p>Not imported. Mend this in the file, then import it again:</p>
          <ProblemList problems={result.problems} />
        </>
      );
    case 'failed': {
      const { what, remedy } = ERROR_MESSAGES[result.code];
      return (
        <p>
          Not imported. {what} {remedy}
        </p>
      );
    }
    case 'left-out':
      return <p>Left out; the survey on this device is unchanged.</p>;
  }
}

/** What came of each file of the last import. */
export function ImportResults() {
  const { state } = useApp();
  return (
    <FileReport
      results={state.imports.value}
      outcome={(result) => <Outcome result={result} />}
      onClose={() => (state.imports.value = [])}
    />
  );
}
