/**
 * School grade in which a text is read: 0.39 words a sentence + 11.8 syllables a word - 15.59. Ref: J. P. Kincaid,
 * R. P. Fishburne, R. L. Rogers, B. S. Chissom, "Derivation of new readability formulas for Navy enlisted personnel",
 * Research Branch Report 8-75, Naval Technical Training Command, 1975. Syllables are counted by their vowels, as programs
 * for the formula do; numbers and units count as one word of one syllable.
 */
export function readingGrade(sentences: readonly string[]): number {
  const words = sentences.flatMap(wordsOf);
  const syllables = words.reduce((sum, word) => sum + syllablesOf(word), 0);
  return (0.39 * words.length) / sentences.length + (11.8 * syllables) / words.length - 15.59;
}

/** Texts cut at the ends of sentences. */
export const sentencesOf = (texts: readonly string[]): string[] =>
  texts.flatMap((text) => text.split(/(?<=[.!?:])\s+/)).filter((sentence) => wordsOf(sentence).length > 0);

const wordsOf = (text: string): string[] => text.match(/[\p{L}\p{N}][\p{L}\p{N}.,:’'/²%°-]*/gu) ?? [];

export function syllablesOf(word: string): number {
  if (/\d/.test(word)) return 1;
  const letters = word.toLowerCase().replace(/[^a-z]/g, '');
  const silent = letters
    .replace(/(?<![^aeiouy]l)(?<=[a-z]{2})e$/, '')
    .replace(/(?<![sxzcg]|[cs]h)es$/, 's')
    .replace(/(?<![td])ed$/, 'd');
  return Math.max(1, silent.match(/[aeiouy]+/g)?.length ?? 0);
}
