import type { ComponentChildren } from 'preact';
import { useLayoutEffect, useRef } from 'preact/hooks';
import { useApp } from '../../../app-context.ts';
import { ERROR_MESSAGES } from '../../../messages.ts';
import './capture.css';

/** Trouble is told here too: the bar at the foot of the page lies under this screen. */
function Trouble() {
  const { state } = useApp();
  const code = state.database.value ?? state.trouble.value?.code;
  if (!code) return null;
  const { what, remedy } = ERROR_MESSAGES[code];
  return (
    <p class="capture-trouble">
      <strong>{what}</strong> {remedy}
    </p>
  );
}

/** One thing on the whole screen, for one hand. Escape and the button lead back. */
export function FullScreen(props: {
  title: string;
  onLeave: () => void;
  mark?: string | null;
  /** One more thing to touch, at the end of the head. */
  action?: ComponentChildren;
  children: ComponentChildren;
}) {
  const dialog = useRef<HTMLDialogElement>(null);
  const leave = useRef(props.onLeave);
  leave.current = props.onLeave;
  useLayoutEffect(() => {
    const element = dialog.current;
    let open = true;
    element?.showModal();
    const closed = () => open && leave.current();
    element?.addEventListener('close', closed);
    return () => {
      open = false;
      element?.removeEventListener('close', closed);
      element?.close();
    };
  }, []);
  return (
    <dialog ref={dialog} class="full-screen" aria-label={props.title}>
      <header class="capture-head">
        <button type="button" onClick={props.onLeave}>
          Done
        </button>
        <h2>{props.title}</h2>
        {props.mark && <strong class="practice-mark">{props.mark}</strong>}
        {props.action}
      </header>
      <div role="alert">
        <Trouble />
      </div>
      {props.children}
    </dialog>
  );
}
