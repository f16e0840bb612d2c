import type { Parsed } from '../survey/problem.ts';

export type LengthUnit = 'metres' | 'feet';

/** Metres in each unit that may stand behind a number; foot and inch are exact by the agreement of 1959. */
const UNITS: readonly [RegExp, number][] = [
  [/^(?:m|metres?|meters?)$/, 1],
  [/^(?:cm|centimetres?|centimeters?)$/, 0.01],
  [/^(?:mm|millimetres?|millimeters?)$/, 0.001],
  [/^(?:'|ft|feet|foot)$/, 0.3048],
  [/^(?:"|in|inch|inches)$/, 0.0254],
];
const FOOT = 0.3048;
const INCH = 0.0254;

const PART =
  /^\s*(\d+(?:[.,]\d+)?)(?:(?:\s+|-)(\d+)\s*\/\s*(\d+)|\s*\/\s*(\d+))?\s*('|"|[a-z]+)?\.?\s*(?:,|and|-)?\s*/;

interface LengthPart {
  value: number;
  /** Metres in its unit; null where none is given. */
  unit: number | null;
}

/**
 * Reads a length by tape, in metres: `12.5`, `12,5 m`, `350 cm`, `41'`, `41' 6"`, `41 ft 6 1/2 in`. A number without a
 * unit is in `unit`; after feet it is inches. Over 0, at most 10000 m.
 */
export function parseLength(text: string, unit: LengthUnit): Parsed<number> {
  const read = metresOf(text, unit);
  if (!read.ok || (read.value > 0 && read.value <= 10_000)) return read;
  return refused('A length is over 0 and at most 10000 m. Correct the number or its unit.');
}

/**
 * Reads a place along an axis, in metres, written as a length is but with a sign where it lies the other way: `-1.2`,
 * `-3' 6"`, `0`. A number without a unit is in `unit`. From -1000 to 1000 m.
 */
export function parseOffset(text: string, unit: LengthUnit): Parsed<number> {
  const [, sign, size] = /^\s*([-−–+]?)\s*(.*)$/s.exec(text)!;
  const read = metresOf(size, unit);
  if (!read.ok) return read;
  if (read.value > 1000)
    return refused('A place lies within 1000 m of its starting point. Correct the number or its unit.');
  const value = sign === '' || sign === '+' ? read.value : -read.value || 0;
  return { ok: true, value, warnings: [] };
}

/** The metres of a length, to the micrometre. */
function metresOf(text: string, unit: LengthUnit): Parsed<number> {
  const parts = partsOf(text);
  if (!parts) return refused(`“${text.trim()}” is not understood. Write a length as 12.5 m, or as 41' 6".`);
  const [first, second] = parts;
  const firstUnit = first.unit ?? (unit === 'feet' ? FOOT : 1);
  if (second && (firstUnit !== FOOT || (second.unit ?? INCH) !== INCH))
    return refused('Only feet and inches are written as two numbers. Give one number with its unit.');
  if (second && second.value >= 12) return refused('Inches after feet go up to 12. Correct them.');
  const metres = first.value * firstUnit + (second ? second.value * INCH : 0);
  return { ok: true, value: Math.round(metres * 1e6) / 1e6, warnings: [] };
}

const refused = (message: string): Parsed<never> => ({ ok: false, problems: [{ path: '', message }] });

/** One or two numbers with their units; null where there is anything else. */
function partsOf(text: string): LengthPart[] | null {
  let rest = text
    .trim()
    .toLowerCase()
    .replace(/''|′′|’’|[″”“]/g, '"')
    .replace(/[′’‘`´]/g, "'")
    .replace(/½/g, ' 1/2')
    .replace(/¼/g, ' 1/4')
    .replace(/¾/g, ' 3/4');
  if (rest.endsWith('-')) return null;
  const parts: LengthPart[] = [];
  while (rest !== '' && parts.length < 3) {
    const match = PART.exec(rest);
    const part = match && partOf(match);
    if (!match || !part) return null;
    parts.push(part);
    rest = rest.slice(match[0].length);
  }
  return parts.length === 1 || parts.length === 2 ? parts : null;
}

function partOf([, whole, numerator, denominator, under, word]: RegExpExecArray): LengthPart | null {
  const number = Number(whole.replace(',', '.'));
  const value = under
    ? number / Number(under)
    : number + (denominator ? Number(numerator) / Number(denominator) : 0);
  const unit = word === undefined ? null : UNITS.find(([name]) => name.test(word))?.[1];
  return Number.isFinite(value) && unit !== undefined ? { value, unit } : null;
}

/**
 * Whether a length given in one unit was likely meant in the other: it is over `most`, the greatest usual one [m], and
 * in feet it would not be. The sentence to ask with; null where there is no doubt.
 */
export function feetDoubt(metres: number, most: number): string | null {
  const asFeet = metres * FOOT;
  if (!(metres > most && asFeet <= most)) return null;
  return `${metres.toFixed(1)} m is more than usual. Were feet meant? If that was ${metres.toFixed(1)} feet, it is ${asFeet.toFixed(1)} m.`;
}
