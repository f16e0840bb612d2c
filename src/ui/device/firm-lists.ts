import { signal } from '@preact/signals';
import { noFactLists, type FactLists } from '../../core/survey/fact-lists.ts';
import { parseFactLists } from '../../core/survey/parse-fact-lists.ts';

const KEY = 'noonmark-fact-lists';

function stored(): FactLists {
  try {
    const parsed = parseFactLists(localStorage.getItem(KEY) ?? JSON.stringify(noFactLists()));
    return parsed.ok ? parsed.value : noFactLists();
  } catch {
    // Storage is refused: the app's own lists stand.
    return noFactLists();
  }
}

/** What the firm has changed of the lists, on this device. */
export const firmLists = signal<FactLists>(stored());

/** Takes lists into use and keeps them; false where they are not kept for the next time. */
export function keepFirmLists(lists: FactLists): boolean {
  firmLists.value = lists;
  try {
    if (lists.lists.length === 0) localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, JSON.stringify(lists));
    return true;
  } catch {
    return false;
  }
}

// Another tab of the app may have changed them.
addEventListener('storage', ({ key }) => {
  if (key === KEY || key === null) firmLists.value = stored();
});
