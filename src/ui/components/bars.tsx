import type { AppState, Notice } from '../../app/app-state.ts';
import { attempt } from '../../app/attempt.ts';
import { useApp } from '../app-context.ts';
import { ERROR_MESSAGES, noticeText } from '../messages.ts';

function TroubleBar() {
  const { state } = useApp();
  const code = state.database.value ?? state.trouble.value?.code;
  if (!code) return null;
  const { what, remedy } = ERROR_MESSAGES[code];
  const tellsWhy = code === 'unexpected' || code === 'change-refused';
  const detail = tellsWhy ? state.trouble.value?.detail : undefined;
  return (
    <div class="bar bar-trouble">
      <p>
        <strong>{what}</strong> {remedy} {detail && <code>{detail}</code>}
      </p>
      {code === 'storage-taken-over' || code === 'part-missing' ? (
        <button type="button" onClick={() => location.reload()}>
          Reload
        </button>
      ) : (
        state.database.value === null && (
          <button type="button" onClick={() => (state.trouble.value = null)}>
            Close
          </button>
        )
      )}
    </div>
  );
}

function UpdateBar() {
  const services = useApp();
  const { state } = services;
  const update = state.update.value;
  if (update === 'none') return null;
  const elsewhere = update === 'elsewhere';
  return (
    <div class="bar">
      <p>
        {elsewhere
          ? 'A new version is in use in another tab. Reload this one when nothing is half-typed.'
          : 'A new version is ready.'}
      </p>
      <button type="button" disabled={update === 'changing'} onClick={() => services.useNewVersion()}>
        {elsewhere ? 'Reload' : 'Use it now'}
      </button>
    </div>
  );
}

/** Whether the survey on screen has gone on since: another step would be the one taken back. */
function isPast({ of }: Notice, { open, steps }: AppState): boolean {
  return of !== undefined && open.value?.id === of.survey && steps.value.undo?.number !== of.step;
}

function NoticeBar() {
  const { state } = useApp();
  const notice = state.notice.value;
  if (!notice || isPast(notice, state)) return null;
  const takeBack = async () => {
    state.notice.value = null;
    if (notice.undo) await attempt(state, notice.undo);
  };
  return (
    <div class="bar">
      <p>{noticeText(notice)}</p>
      <div class="row">
        {notice.undo && (
          <button type="button" onClick={() => void takeBack()}>
            Undo
          </button>
        )}
        <button type="button" class="plain" onClick={() => (state.notice.value = null)}>
          Close
        </button>
      </div>
    </div>
  );
}

/** What must be told whatever screen is open. The live regions stand from the start, so that changes are read out. */
export function Bars() {
  return (
    <div class="bars">
      <div role="alert">
        <TroubleBar />
      </div>
      <div role="status">
        <UpdateBar />
        <NoticeBar />
      </div>
    </div>
  );
}
