import { signal } from '@preact/signals';

/** Whether every part of the app is on this device; `unknown` where the browser cannot keep it. */
export const offlineReadiness = signal<'unknown' | 'fetching' | 'ready'>('unknown');

/** Watches until the service worker has fetched everything; called once, by main. */
export function watchOfflineReadiness(): void {
  if (!('serviceWorker' in navigator)) return;
  offlineReadiness.value = 'fetching';
  void navigator.serviceWorker.ready.then(() => (offlineReadiness.value = 'ready'));
}
