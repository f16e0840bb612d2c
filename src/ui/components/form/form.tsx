import type { ComponentChildren } from 'preact';
import { useRef } from 'preact/hooks';
import './form.css';

/** A form with one main action; where it is refused, the first field with a fault takes the focus. */
export function Form(props: {
  label: string;
  action: string;
  /** False where a field is at fault. */
  onSubmit: () => boolean | Promise<boolean>;
  onCancel?: () => void;
  children: ComponentChildren;
}) {
  const form = useRef<HTMLFormElement>(null);
  const submit = async () => {
    if (await props.onSubmit()) return;
    // After the faults are on screen.
    requestAnimationFrame(() => form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus());
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
      {props.children}
      <div class="form-actions">
        <button type="submit" class="main">
          {props.action}
        </button>
        {props.onCancel && (
          <button type="button" onClick={props.onCancel}>
            Cancel
          </button>
        )}
      </div>
    </form>
  );
}
