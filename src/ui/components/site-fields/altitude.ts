import { feetDoubt } from '../../../core/pointing/tape-length.ts';
import { numberOf, type Typed } from '../../typed.ts';

const FOOT = 0.3048;
const LEAST = -430;
const MOST = 9000;
/** Higher up hardly anybody lives, metres: feet may have been typed. */
const USUAL = 4000;

const WITH_UNIT = /^(.*?)\s*(m|metres?|meters?|ft|feet|foot|')\.?$/i;

/** A height above the sea in metres, typed in metres or with `ft` behind it; undefined where nothing is typed. */
export function typedAltitude(text: string): Typed<number | undefined> {
  if (text.trim() === '') return { value: undefined };
  const [, size, unit] = WITH_UNIT.exec(text.trim()) ?? [undefined, text, 'm'];
  const number = numberOf(size);
  const metres = number === null ? NaN : number * (/^m/i.test(unit) ? 1 : FOOT);
  return metres >= LEAST && metres <= MOST
    ? { value: Math.round(metres * 10) / 10 }
    : { fault: `A number from ${LEAST} to ${MOST} is needed, or nothing.` };
}

/** What a typed height comes to, or the question whether feet were meant; undefined where it says itself. */
export function altitudeHint(text: string): string | undefined {
  const typed = typedAltitude(text);
  if (!('value' in typed) || typed.value === undefined) return undefined;
  const doubt = feetDoubt(typed.value, USUAL);
  if (doubt) return `${doubt} Write ft behind it, if so.`;
  return numberOf(text) === null ? `= ${typed.value} m` : undefined;
}
