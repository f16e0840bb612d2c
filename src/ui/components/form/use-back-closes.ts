import { useEffect } from 'preact/hooks';

/** State of the history entry that stands for an open form. */
interface FormEntry {
  isForm: true;
}

const isFormEntry = (state: unknown): state is FormEntry =>
  typeof state === 'object' && state !== null && 'isForm' in state;

/**
 * While a form stands in place of its list, Back leads to the list and not out of the survey; what was typed is kept
 * as unfinished.
 */
export function useBackCloses(isOpen: boolean, close: () => void): void {
  useEffect(() => {
    if (!isOpen) return undefined;
    // After a form before, or a reload, the entry is there already. It is not taken off when the form is saved: going
    // back takes effect late, and could undo a tap on a link that came in between.
    if (!isFormEntry(history.state)) history.pushState({ isForm: true } satisfies FormEntry, '');
    addEventListener('popstate', close);
    return () => removeEventListener('popstate', close);
    // `close` is made anew with each drawing; the one of the opening does the same
  }, [isOpen]);
}
