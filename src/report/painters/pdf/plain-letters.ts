/** Letters and signs that nothing is to be done to; most texts have no others. */
const FIT = /^[\u0020-\u007e\u00a0-\u00ac\u00ae-\u024f\u2012-\u2027]*$/;

/**
 * Text made fit for setting: composed letters, no control marks, one kind of space that breaks and one that does not, and
 * no half of a letter.
 */
export function plainLetters(text: string): string {
  if (FIT.test(text)) return text;
  return text
    .replace(/[\t\n\v\f\r]/g, ' ')
    .replace(/[\u0000-\u001f\u007f-\u009f\u00ad\u200b\u200e\u200f\u2028-\u202e\u2060-\u2069\ufeff]/g, '')
    .replace(/[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g, '\ufffd')
    .replace(/[\u2000-\u200a\u205f\u3000]/g, ' ')
    .replace(/[\u202f\u2007]/g, '\u00a0')
    .replace(/[\u2010\u2011]/g, '-')
    .normalize('NFC');
}

const RIGHT_TO_LEFT = /[\u0590-\u08ff\ufb1d-\ufdff\ufe70-\ufefc]|[\ud802\ud803\ud83a\ud83b][\udc00-\udfff]/g;

/**
 * From the first to behind the last letter that is written from right to left, what stands between them included: its
 * order on the line is not the order of its letters. Both are 0 where there is none.
 */
export function rightToLeft(text: string): [from: number, to: number] {
  const found = [...text.matchAll(RIGHT_TO_LEFT)];
  return found.length > 0 ? [found[0].index, found.at(-1)!.index + found.at(-1)![0].length] : [0, 0];
}
