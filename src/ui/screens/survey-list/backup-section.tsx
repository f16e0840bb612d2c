import { useRef, useState } from 'preact/hooks';
import { restoreBackup } from '../../../app/actions/restore-backup.ts';
import { attempt } from '../../../app/attempt.ts';
import type { SurveySummary } from '../../../app/survey-store.ts';
import { useApp } from '../../app-context.ts';
import { RestoreResults } from './restore-results.tsx';
import { saveBackup } from './save-backup.ts';

/** All surveys with their photos into one file, and back from it. */
export function BackupSection({ surveys }: { surveys: readonly SurveySummary[] }) {
  const services = useApp();
  const { state } = services;
  const input = useRef<HTMLInputElement>(null);
  const [packing, setPacking] = useState(false);
  const busy = state.busy.value || packing;
  const pack = async () => {
    setPacking(true);
    await attempt(state, () =>
      saveBackup(
        services,
        surveys.map(({ id }) => id),
        'backup',
      ),
    );
    setPacking(false);
  };
  return (
    <section class="stack" aria-label="Backup">
      <div class="row">
        {surveys.length > 0 && (
          <button type="button" disabled={busy} onClick={() => void pack()}>
            {packing ? 'Packing…' : 'Back up all surveys'}
          </button>
        )}
        <input
          ref={input}
          type="file"
          id="backup-files"
          accept=".zip,application/zip"
          multiple
          hidden
          onChange={({ currentTarget }) => {
            const files = [...(currentTarget.files ?? [])];
            // So that picking the same file again is a change too.
            currentTarget.value = '';
            if (files.length > 0) void attempt(state, () => restoreBackup(services, files));
          }}
        />
        <button type="button" disabled={busy} onClick={() => input.current?.click()}>
          {state.busy.value ? 'Reading…' : 'Restore from a backup'}
        </button>
      </div>
      <RestoreResults />
    </section>
  );
}
