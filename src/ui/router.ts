import { signal } from '@preact/signals';

/** Path of the address shown. History paths: the service worker answers each of them with the one page. */
export const pathname = signal(location.pathname);

let arriving = false;

function show(path: string): void {
  arriving = true;
  pathname.value = path;
}

/** Goes to another place of the app; `instead` of the one shown, where Back must not come to that again. */
export function navigate(path: string, instead = false): void {
  if (path === location.pathname) return;
  if (instead) history.replaceState(null, '', path);
  else history.pushState(null, '', path);
  show(path);
  scrollTo(0, 0);
}

/** True once after each change of place, so that the new screen's heading takes the focus; false on the first screen. */
export function takeArrival(): boolean {
  const arrived = arriving;
  arriving = false;
  return arrived;
}

function linkOf(event: MouseEvent): HTMLAnchorElement | null {
  const plainClick =
    event.button === 0 && !event.metaKey && !event.ctrlKey && !event.shiftKey && !event.altKey;
  if (!plainClick || event.defaultPrevented || !(event.target instanceof Element)) return null;
  const link = event.target.closest('a');
  const inApp =
    link?.origin === location.origin && !link.hasAttribute('download') && !link.target && !link.hash;
  return inApp ? link : null;
}

/** Turns clicks on links within the app into changes of place. Called once, by main. */
export function startRouter(): void {
  addEventListener('popstate', () => show(location.pathname));
  document.addEventListener('click', (event) => {
    const link = linkOf(event);
    if (!link) return;
    event.preventDefault();
    navigate(link.pathname);
  });
}
