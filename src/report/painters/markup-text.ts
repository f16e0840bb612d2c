const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Controls, which no page may hold, marks that turn the writing direction, and halves of a letter. */
const UNFIT =
  /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069\ufeff\ufffe\uffff]|[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g;

/** Plain text as text of HTML or SVG, in an attribute too. */
export const plainMarkup = (text: string): string =>
  text.replace(UNFIT, '').replace(/[&<>"']/g, (letter) => ENTITIES[letter]);

/** Letters of the scripts that run from right to left. */
const LEFTWARD =
  '[\\p{Script=Hebrew}\\p{Script=Arabic}\\p{Script=Syriac}\\p{Script=Thaana}\\p{Script=Nko}\\p{Script=Adlam}]';
const LEFTWARD_WORDS = new RegExp(`${LEFTWARD}(?:[\\p{L}\\p{M}\\s'’״׳-]*[\\p{L}\\p{M}])?`, 'gu');

/**
 * Plain text as words of the page. A name that runs from right to left stands apart, so that the number after it stays
 * after it.
 */
export const wordsMarkup = (text: string): string =>
  plainMarkup(text).replace(LEFTWARD_WORDS, (name) => `<bdi>${name}</bdi>`);

/** Plain text as a string of a style sheet: whatever could end it is written as a number. */
export const styleString = (text: string): string =>
  `"${text.replace(UNFIT, '').replace(/[^\p{L}\p{N} .,:;%/()·–—-]/gu, (letter) => `\\${letter.codePointAt(0)!.toString(16)} `)}"`;
