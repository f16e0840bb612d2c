import type { ComponentChildren } from 'preact';
import { useRef } from 'preact/hooks';
import type { DraftState } from './use-draft.ts';
import './form.css';

/** A form with one main action; where it is refused, the first field with a fault takes the focus. */
export function Form(props: {
  label: string;
  action: string;
  /** False where a field is at fault. */
  onSubmit: () => boolean | Promise<boolean>;
  onCancel?: () => void;
  /** What is typed into the form, where it is kept. */
  draft?: DraftState;
  children: ComponentChildren;
}) {
  const form = useRef<HTMLFormElement>(null);
  const submit = async () => {
    if (await props.onSubmit()) return props.draft?.finish();
    // After the faults are on screen.
    requestAnimationFrame(() => form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
  };
  const cancel = () => {
    props.draft?.finish();
    props.onCancel?.();
  };
  return (
    <form
      ref={form}
      class="form"
      aria-label={props.label}
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      {props.draft && <FoundDraft draft={props.draft} />}
      {props.children}
      <div class="form-actions">
        <button type="submit" class="main">
          {props.action}
        </button>
        {props.onCancel && (
          <button type="button" onClick={cancel}>
            Cancel
          </button>
        )}
      </div>
    </form>
  );
}

/** Says that the form holds what was typed earlier. The region is there from the start, so that it is read out. */
function FoundDraft({ draft: { found, startAnew } }: { draft: DraftState }) {
  return (
    <div role="status">
      {found !== 'nothing' && (
        <div class="found-draft">
          <p class="small">
            What was typed here before, and not saved, is back.{' '}
            {found === 'changed' && 'Since then what is stored was changed: look it over before you save.'}
          </p>
          <button type="button" onClick={startAnew}>
            Start anew
          </button>
        </div>
      )}
    </div>
  );
}
