import { attempt } from '../../../app/attempt.ts';
import { settleConflict, type Decision } from '../../../app/actions/settle-conflict.ts';
import type { ImportConflict } from '../../../app/app-state.ts';
import { useApp } from '../../app-context.ts';
import { Dialog } from '../../components/dialog.tsx';

/** Asks what to do with a file whose survey is on this device already. */
export function ConflictDialog({ conflict }: { conflict: ImportConflict }) {
  const services = useApp();
  const decide = (decision: Decision) => () =>
    void attempt(services.state, () => settleConflict(services, conflict, decision));
  const { file, storedTitle, storedIsDeleted } = conflict;
  return (
    <Dialog title="This survey is here already" onCancel={decide('leave-out')}>
      <p>
        The file <strong>{file}</strong> holds the same survey as <strong>{storedTitle}</strong>
        {storedIsDeleted ? ', which is among the deleted surveys.' : ' on this device.'}
      </p>
      <p>
        Keep both makes a second survey of the file. Replace puts the file’s contents over the stored survey.
      </p>
      <div class="row">
        <button type="button" class="main" onClick={decide('keep-both')}>
          Keep both
        </button>
        <button type="button" onClick={decide('replace')}>
          Replace
        </button>
        <button type="button" class="plain" onClick={decide('leave-out')}>
          Leave the file out
        </button>
      </div>
    </Dialog>
  );
}
