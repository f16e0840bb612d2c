import { signal } from '@preact/signals';

interface InstallEvent extends Event {
  prompt(): Promise<unknown>;
}

/** The browser's own offer to install, once it has made one. */
export const installOffer = signal<InstallEvent | null>(null);

/** Listens for the offer; called once, by main, since it comes early. */
export function startInstallOffer(): void {
  addEventListener('beforeinstallprompt', (event) => {
    event.preventDefault();
    installOffer.value = event as InstallEvent;
  });
  addEventListener('appinstalled', () => (installOffer.value = null));
}

/** Whether it runs from the home screen already. */
export function isInstalled(): boolean {
  return matchMedia('(display-mode: standalone)').matches;
}
