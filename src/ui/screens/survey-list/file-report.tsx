import type { ComponentChildren } from 'preact';

interface Props<Result extends { file: string }> {
  results: readonly Result[];
  outcome: (result: Result) => ComponentChildren;
  onClose: () => void;
}

/** What came of each of several files, until it is closed. */
export function FileReport<Result extends { file: string }>({ results, outcome, onClose }: Props<Result>) {
  return (
    <div role="status">
      {results.length > 0 && (
        <div class="import-results stack">
          <ul class="ledger">
            {results.map((result, place) => (
              <li key={place} class="stack">
                <h2 class="file-name">{result.file}</h2>
                {outcome(result)}
              </li>
            ))}
          </ul>
          <div>
            <button type="button" onClick={onClose}>
              Close this report
            </button>
          </div>
        </div>
      )}
    </div>
  );
}
