import type { Problem } from '../../core/survey/problem.ts';

const MOST_SHOWN = 20;

/** What is wrong with a file or a stored survey, and where. */
export function ProblemList({ problems }: { problems: readonly Problem[] }) {
  const more = problems.length - MOST_SHOWN;
  return (
    <ul class="problems">
      {problems.slice(0, MOST_SHOWN).map(({ path, message }) => (
        <li key={`${path} ${message}`}>
          {path && (
            <>
              <code>{path}</code>
              {': '}
            </>
          )}
          {message}
        </li>
      ))}
      {more > 0 && <li>and {more} more like these. Mend these first.</li>}
    </ul>
  );
}
