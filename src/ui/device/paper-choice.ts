import { signal } from '@preact/signals';

export type Paper = 'day' | 'dusk';
const KEY = 'noonmark-paper';

function stored(): Paper | null {
  try {
    const value = localStorage.getItem(KEY);
    return value === 'day' || value === 'dusk' ? value : null;
  } catch {
    // Storage is refused: the system's own choice stands.
    return null;
  }
}

const dark = matchMedia('(prefers-color-scheme: dark)');
const systemDark = signal(dark.matches);
const choice = signal<Paper | null>(stored());

/** Marks the page for the style sheet, and tints the frame of the phone's screen alike. */
function mark(paper: Paper | null): void {
  if (!paper) return;
  document.documentElement.dataset.paper = paper;
  const colour = getComputedStyle(document.documentElement).getPropertyValue('--paper');
  document
    .querySelectorAll<HTMLMetaElement>('meta[name="theme-color"]')
    .forEach((tint) => (tint.content = colour));
}

/** Follows the system until somebody chooses. Called once, by main, before the first screen. */
export function startPaper(): void {
  dark.addEventListener('change', (event) => (systemDark.value = event.matches));
  mark(choice.value);
}

/** The paper shown now. */
export function paperShown(): Paper {
  return choice.value ?? (systemDark.value ? 'dusk' : 'day');
}

export function choosePaper(paper: Paper): void {
  choice.value = paper;
  mark(paper);
  try {
    localStorage.setItem(KEY, paper);
  } catch {
    // Not kept for the next time; it holds for this one.
  }
}
