import { useRef, useState } from 'preact/hooks';
import { noFactLists } from '../../../core/survey/fact-lists.ts';
import { FACT_LIST_LIMITS, parseFactLists } from '../../../core/survey/parse-fact-lists.ts';
import type { Problem } from '../../../core/survey/problem.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { saveFile } from '../../device/save-file.ts';
import type { ListsEditing } from './use-lists.ts';

interface Report {
  file: string;
  isRefused: boolean;
  problems: Problem[];
}

const UNREADABLE: Problem = {
  path: '',
  message: 'The file could not be read. Copy it to this device first, then choose it again.',
};
const TOO_LARGE: Problem = {
  path: '',
  message: 'The file is far larger than lists are. Choose a file of lists.',
};

/** The lists to a file and from one: one person edits, all phones take the file in. */
export function ListFiles({ editing }: { editing: ListsEditing }) {
  const { lists, change } = editing;
  const input = useRef<HTMLInputElement>(null);
  const [report, setReport] = useState<Report | null>(null);
  const isEmpty = lists.lists.length === 0;
  const take = async (file: File) => {
    const refuse = (problem: Problem) => setReport({ file: file.name, isRefused: true, problems: [problem] });
    if (file.size > 4 * FACT_LIST_LIMITS.textLength) return refuse(TOO_LARGE);
    const text = await file.text().catch(() => null);
    if (text === null) return refuse(UNREADABLE);
    const parsed = parseFactLists(text);
    setReport({
      file: file.name,
      isRefused: !parsed.ok,
      problems: parsed.ok ? parsed.warnings : parsed.problems,
    });
    if (parsed.ok) change(parsed.value, `The lists of ${file.name} are in use.`);
  };
  return (
    <section class="stack" aria-label="File of the lists">
      <h2>To all phones of the firm</h2>
      <p class="small">
        One person edits the lists and exports them; everybody else imports the file. An import takes the
        place of what was changed on this phone.
      </p>
      <div class="form-actions">
        <button
          type="button"
          disabled={isEmpty}
          onClick={() => saveFile('fact-lists.noonmark.json', `${JSON.stringify(lists, null, 2)}\n`)}
        >
          Export the lists
        </button>
        <input
          ref={input}
          type="file"
          id="list-file"
          accept=".json,application/json"
          hidden
          onChange={({ currentTarget }) => {
            const file = currentTarget.files?.[0];
            // So that picking the same file again is a change too.
            if (file) void take(file).then(() => (currentTarget.value = ''));
          }}
        />
        <button type="button" onClick={() => input.current?.click()}>
          Import lists
        </button>
        <button
          type="button"
          disabled={isEmpty}
          onClick={() => change(noFactLists(), 'All lists are as they come with Noonmark.')}
        >
          Reset all lists
        </button>
      </div>
      <div role="status">
        {report && (report.isRefused || report.problems.length > 0) && (
          <div class="stack">
            <p class={report.isRefused ? 'field-fault' : undefined}>
              {report.isRefused
                ? `${report.file} was not taken; nothing was changed.`
                : `${report.file} was taken. To know:`}
            </p>
            <ProblemList problems={report.problems} />
          </div>
        )}
      </div>
    </section>
  );
}
