/** Months in the reader's language, January to December. */
export function monthNames(style: 'short' | 'long' = 'short'): string[] {
  const format = new Intl.DateTimeFormat(undefined, { month: style, timeZone: 'UTC' });
  return Array.from({ length: 12 }, (_, month) => format.format(Date.UTC(2025, month, 15)));
}
