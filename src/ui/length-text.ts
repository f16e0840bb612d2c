import type { LengthUnit } from '../core/pointing/tape-length.ts';
import { parseLength, parseOffset } from '../core/pointing/tape-length.ts';
import type { Typed } from './typed.ts';

const INCH = 0.0254;
/** Inches are written to an eighth. */
const PARTS = 8;

function inchesText(eighths: number): string {
  const whole = Math.floor(eighths / PARTS);
  let [part, of] = [eighths % PARTS, PARTS];
  while (part > 0 && part % 2 === 0) [part, of] = [part / 2, of / 2];
  if (part === 0) return `${whole}"`;
  return whole === 0 ? `${part}/${of}"` : `${whole} ${part}/${of}"`;
}

function feetText(metres: number): string {
  const eighths = Math.round((metres / INCH) * PARTS);
  const feet = Math.floor(eighths / (12 * PARTS));
  const rest = eighths - feet * 12 * PARTS;
  if (feet === 0) return inchesText(rest);
  return rest === 0 ? `${feet}'` : `${feet}' ${inchesText(rest)}`;
}

/** A length as it is typed: metres to the millimetre without the unit, or feet and inches. */
export function lengthInput(metres: number | undefined, unit: LengthUnit): string {
  if (metres === undefined) return '';
  return unit === 'feet' ? feetText(metres) : String(Math.round(metres * 1000) / 1000);
}

/** A place along an axis as it is typed: a length with its sign; 0 where it starts. */
export function offsetInput(metres: number | undefined, unit: LengthUnit): string {
  if (metres === undefined) return '';
  const size = lengthInput(Math.abs(metres), unit);
  return metres < 0 && Number.parseFloat(size) !== 0 ? `-${size}` : size;
}

/** A length with its unit. */
export function lengthText(metres: number, unit: LengthUnit): string {
  return unit === 'feet' ? feetText(metres) : `${Math.round(metres * 1000) / 1000} m`;
}

/**
 * A typed length in metres. A text that still shows a stored length stands for that length, however it was rounded for
 * showing.
 */
export function typedLength(text: string, unit: LengthUnit, stored?: number): Typed<number | undefined> {
  if (text.trim() === '') return { value: undefined };
  if (stored !== undefined && text === lengthInput(stored, unit)) return { value: stored };
  const parsed = parseLength(text, unit);
  return parsed.ok ? { value: parsed.value } : { fault: parsed.problems[0].message };
}

/** A typed place along an axis in metres; a text that still shows a stored one stands for that. */
export function typedOffset(text: string, unit: LengthUnit, stored?: number): Typed<number | undefined> {
  if (text.trim() === '') return { value: undefined };
  if (stored !== undefined && text === offsetInput(stored, unit)) return { value: stored };
  const parsed = parseOffset(text, unit);
  return parsed.ok ? { value: parsed.value } : { fault: parsed.problems[0].message };
}

/** The same length or place, written in another unit; a text that is not understood stays as it is. */
export function inUnit(text: string, from: LengthUnit, to: LengthUnit, stored?: number): string {
  const typed = typedOffset(text, from, stored);
  return 'value' in typed && typed.value !== undefined ? offsetInput(typed.value, to) : text;
}
