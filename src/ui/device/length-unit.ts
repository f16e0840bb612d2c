import { signal } from '@preact/signals';
import type { LengthUnit } from '../../core/pointing/tape-length.ts';

const KEY = 'noonmark-lengths';

function stored(): LengthUnit {
  try {
    return localStorage.getItem(KEY) === 'feet' ? 'feet' : 'metres';
  } catch {
    // Storage is refused: metres stand.
    return 'metres';
  }
}

/** The unit in which lengths are typed and shown on this device. */
export const lengthUnit = signal<LengthUnit>(stored());

export function chooseLengthUnit(unit: LengthUnit): void {
  lengthUnit.value = unit;
  try {
    localStorage.setItem(KEY, unit);
  } catch {
    // Not kept for the next time; it holds for this one.
  }
}
