import type { AppState } from './app-state.ts';

/** The events of a service worker's life that the flow needs; workbox-window gives them. */
export interface UpdateSource {
  onWaiting(listener: () => void): void;
  onControlling(listener: () => void): void;
  takeOver(): void;
}

export interface UpdatePage {
  /** False on the very first visit, when a worker takes control without anything being replaced. */
  wasControlled: boolean;
  reload(): void;
  after(timeMs: number, act: () => void): void;
}

/** Some browsers never tell that the new worker took over; then the page reloads anyway. */
const TAKEOVER_WAIT_MS = 3000;

/**
 * Offers a new version and never reloads by itself: only the tab in which somebody agreed does. A worker that takes
 * over without this tab's word was let in by another tab, and is told. Gives the function to call on "Use it now".
 */
export function offerUpdates(state: AppState, source: UpdateSource, page: UpdatePage): () => void {
  let accepted = false;
  let replaced = page.wasControlled;
  let reloaded = false;
  const reloadOnce = () => {
    if (reloaded) return;
    reloaded = true;
    page.reload();
  };
  source.onWaiting(() => {
    replaced = true;
    state.update.value = 'ready';
  });
  source.onControlling(() => {
    if (accepted) reloadOnce();
    else if (replaced) state.update.value = 'elsewhere';
    // From the first take-over on, the next one replaces something.
    replaced = true;
  });
  return () => {
    if (state.update.value === 'elsewhere') return reloadOnce();
    accepted = true;
    state.update.value = 'changing';
    source.takeOver();
    page.after(TAKEOVER_WAIT_MS, reloadOnce);
  };
}
