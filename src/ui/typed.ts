/** What came of a typed text: its value, or what is wrong with it as a sentence. */
export type Typed<T> = { value: T } | { fault: string };

export const faultOf = (typed: Typed<unknown>): string | null => ('fault' in typed ? typed.fault : null);
export const valueOf = <T>(typed: Typed<T>): T | undefined => ('value' in typed ? typed.value : undefined);

/** A number as people type it: decimal point or comma, a typographic minus, a degree or percent sign after it. */
export function numberOf(text: string): number | null {
  const plain = text
    .trim()
    .replace(/[−–]/g, '-')
    .replace(/\s*[°%]$/, '')
    .replace(',', '.');
  return /^[-+]?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : null;
}

/** A number within a range; undefined where nothing is typed and nothing need be. */
export function typedNumber(
  text: string,
  { least, most, unit = '', optional = false }: NumberRange,
): Typed<number | undefined> {
  if (text.trim() === '')
    return optional ? { value: undefined } : { fault: `Give a number from ${least} to ${most}${unit}.` };
  const value = numberOf(text);
  return value !== null && value >= least && value <= most
    ? { value }
    : { fault: `A number from ${least} to ${most}${unit} is needed.` };
}

export interface NumberRange {
  least: number;
  most: number;
  /** Written right after the number, such as `°` or ` m`. */
  unit?: string;
  optional?: boolean;
}
