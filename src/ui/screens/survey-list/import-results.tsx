import type { ImportResult } from '../../../app/app-state.ts';
import { useApp } from '../../app-context.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { surveyPath } from '../../survey-path.ts';
import { FileReport } from './file-report.tsx';
import { NotDone } from './not-done.tsx';

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
    case 'failed':
      return <NotDone what="Not imported." code={result.code} />;
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
