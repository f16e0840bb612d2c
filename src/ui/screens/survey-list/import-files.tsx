import { useRef } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { restoreBackup } from '../../../app/actions/restore-backup.ts';
import { importSurveys } from '../../../app/actions/import-surveys.ts';
import { useApp } from '../../app-context.ts';
import { ConflictDialog } from './conflict-dialog.tsx';
import { ImportResults } from './import-results.tsx';
import { useFileDrop } from './use-file-drop.ts';

/** Import by the file picker, or by dropping files anywhere on the page. */
export function ImportFiles() {
  const services = useApp();
  const { state } = services;
  const input = useRef<HTMLInputElement>(null);
  const take = (files: readonly File[]) => {
    const archives = files.filter(({ name }) => /[.]zip$/i.test(name));
    const surveys = files.filter((file) => !archives.includes(file));
    void attempt(state, async () => {
      if (archives.length > 0) await restoreBackup(services, archives);
      if (surveys.length > 0) await importSurveys(services, surveys);
    });
  };
  const dropping = useFileDrop(take);
  const conflict = state.conflicts.value[0];
  const busy = state.busy.value;
  return (
    <section class="stack" aria-label="Import">
      <div>
        <input
          ref={input}
          type="file"
          id="survey-files"
          accept=".json,application/json"
          multiple
          hidden
          onChange={({ currentTarget }) => {
            take([...(currentTarget.files ?? [])]);
            // So that picking the same file again is a change too.
            currentTarget.value = '';
          }}
        />
        <button type="button" disabled={busy} onClick={() => input.current?.click()}>
          {busy ? 'Reading…' : 'Import survey files'}
        </button>
      </div>
      {dropping && <div class="drop-here">Drop survey files here to import them</div>}
      <ImportResults />
      {conflict && <ConflictDialog key={conflict.file} conflict={conflict} />}
    </section>
  );
}
