import type { ComponentChildren } from 'preact';
import { useId, useLayoutEffect, useRef } from 'preact/hooks';

/** A question that must be answered first. The browser's own dialog keeps the focus in it; Escape is `onCancel`. */
export function Dialog(props: { title: string; onCancel: () => void; children: ComponentChildren }) {
  const dialog = useRef<HTMLDialogElement>(null);
  const asking = useRef(true);
  const titleId = useId();
  useLayoutEffect(() => {
    const element = dialog.current;
    asking.current = true;
    element?.showModal();
    return () => {
      asking.current = false;
      element?.close();
    };
  }, []);
  // The browser may close it without asking (Escape pressed twice); an answered question is not cancelled after.
  const closed = () => asking.current && props.onCancel();
  return (
    <dialog ref={dialog} class="dialog" aria-labelledby={titleId} onClose={closed}>
      <h2 id={titleId}>{props.title}</h2>
      {props.children}
    </dialog>
  );
}
