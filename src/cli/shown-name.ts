/** Longest name in a table or a sentence for a person, characters. */
const LONGEST = 40;

/** Tabs and ends of lines, which would break a table's row. */
const BREAKS = /[\t\n\v\f\r\u0085\u2028\u2029]+/g;
/** Controls (C0, DEL, C1), by which a text could steer the terminal, and marks that turn the writing direction. */
const CONTROLS = /[\u0000-\u001f\u007f-\u009f\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069]/g;

/** Words out of a file, fit for a terminal: on one line, without controls. */
export const shownWords = (words: string): string => words.replace(BREAKS, ' ').replace(CONTROLS, '');

/** A name out of a file, fit for a terminal and for a column: without controls, at most 40 characters. */
export function shownName(name: string): string {
  const letters = [...shownWords(name)]; // whole characters, not halves of a pair
  return letters.length > LONGEST ? `${letters.slice(0, LONGEST - 1).join('')}…` : letters.join('');
}
