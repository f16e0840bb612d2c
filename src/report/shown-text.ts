/** What people typed, made fit for one line of a report: no control or direction marks, spaces joined, not endless. */
export function shownText(typed: string, longest = 120): string {
  const plain = typed
    .replace(/[\u0000-\u001f\u007f-\u009f\u200b-\u200f\u2028-\u202e\u2060-\u2069\ufeff]+/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();
  const letters = Array.from(plain);
  return letters.length > longest
    ? `${letters
        .slice(0, longest - 1)
        .join('')
        .trimEnd()}…`
    : plain;
}
