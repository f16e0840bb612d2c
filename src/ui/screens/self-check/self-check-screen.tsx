import { useState } from 'preact/hooks';
import type { SelfCheckGroup } from '../../../core/self-check/check-row.ts';
import { runSelfCheck } from '../../../core/self-check/run-self-check.ts';
import { ScreenHeading } from '../../components/screen-heading.tsx';
import { CheckGroup } from './check-group.tsx';
import './self-check.css';

interface Run {
  groups: SelfCheckGroup[];
  at: Date;
}

const newRun = (): Run => ({ groups: runSelfCheck(), at: new Date() });

/** Published values recomputed on this very device, each with its source and the difference. */
export function SelfCheckScreen() {
  const [run, setRun] = useState(newRun);
  return (
    <div class="stack self-check">
      <ScreenHeading title="Self-check" />
      <Verdict run={run} />
      <p class="row no-print">
        <button type="button" onClick={() => setRun(newRun())}>
          Compute again
        </button>
        <button type="button" onClick={() => print()}>
          Print
        </button>
      </p>
      {run.groups.map((group) => (
        <CheckGroup key={group.id} group={group} />
      ))}
    </div>
  );
}

function Verdict({ run: { groups, at } }: { run: Run }) {
  const rows = groups.flatMap((group) => group.rows);
  const wrong = rows.filter(({ ok }) => !ok).length;
  const when = at.toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'medium' });
  return (
    <div role="status" class="verdict stack">
      <p class="verdict-line">
        <strong>
          {wrong === 0
            ? `This device computes right: all ${rows.length} published values are met.`
            : `This device does NOT compute right: ${wrong} of ${rows.length} published values are not met.`}
        </strong>
      </p>
      {wrong > 0 && (
        <p>
          Do not use its results. Restart the browser, or use another one; if the difference stays, report the
          rows marked “not met” below.
        </p>
      )}
      <p class="faint small">
        Computed here, without any connection, on {when}. The printed values come from the sources named;
        nothing is fetched.
      </p>
    </div>
  );
}
