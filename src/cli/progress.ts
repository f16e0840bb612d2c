import type { Terminal } from './command.ts';
import { shownName, shownWords } from './shown-name.ts';

const QUIET_MS = 1000;

/** Tells on standard error how far long work has come: nothing in the first second, then a line a second. */
export function progressTeller(terminal: Terminal, subject: string, now: () => number = Date.now) {
  let toldAt = now();
  return (share: number, stage: string): void => {
    if (now() - toldAt < QUIET_MS) return;
    toldAt = now();
    terminal.err(`${shownWords(subject)}: ${Math.round(share * 100)} %, ${shownName(stage)}\n`);
  };
}
