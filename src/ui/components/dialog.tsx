import type { ComponentChildren } from 'preact';
import { useEffect, useId, useRef } from 'preact/hooks';

/** A question that must be answered first. The browser's own dialog keeps the focus in it; Escape is `onCancel`. */
export function Dialog(props: { title: string; onCancel: () => void; children: ComponentChildren }) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    element?.showModal();
    return () => element?.close();
  }, []);
  return (
    <dialog
      ref={dialog}
      class="dialog"
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        props.onCancel();
      }}
    >
      <h2 id={titleId}>{props.title}</h2>
      {props.children}
    </dialog>
  );
}
