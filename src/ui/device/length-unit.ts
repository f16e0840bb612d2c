import { signal } from '@preact/signals';
import type { LengthUnit } from '../../core/pointing/tape-length.ts';

const KEY = 'noonmark-lengths';

/** What tapes show where this device is set up for: feet in the United States. */
export const usualUnit = (language: string): LengthUnit => (/-US\b/i.test(language) ? 'feet' : 'metres');

function stored(): LengthUnit {
  try {
    const kept = localStorage.getItem(KEY);
    return kept === 'feet' || kept === 'metres' ? kept : usualUnit(navigator.language);
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
