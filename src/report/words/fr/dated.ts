/** A day in French: the first of a month is `1er`, which number formats do not write. */
export const dated = (day: string): string => day.replace(/^1(?=\s)/, '1er');
