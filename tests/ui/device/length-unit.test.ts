import { describe, expect, it } from 'vitest';
import { usualUnit } from '../../../src/ui/device/length-unit.ts';

describe('the unit of tapes before one was chosen', () => {
  it.each(['en-US', 'es-US', 'en-us'])('is feet for %s', (language) => {
    expect(usualUnit(language)).toBe('feet');
  });
  it.each(['en-GB', 'de-DE', 'en', 'fr-CA', ''])('is metres for “%s”', (language) => {
    expect(usualUnit(language)).toBe('metres');
  });
});
