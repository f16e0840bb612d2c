import { describe, expect, it } from 'vitest';
import type { CheckResult } from '../../../src/core/pointing/pointed-survey.ts';
import { checkWords } from '../../../src/ui/screens/stations/heading-words.ts';

const found = (againstCompass: number | null): CheckResult => ({
  check: 'c',
  station: 'a',
  path: 'stations[0].headingChecks[0]',
  method: 'sun-shadow',
  run: 'r',
  takenAtMs: 0,
  offset: 2,
  standardDeviation: 0.8,
  againstCompass,
  refused: null,
});

describe('what a heading check says of the compass', () => {
  it('is which way it is off: where the check turns azimuths back, the compass was too far clockwise', () => {
    expect(checkWords(found(-4.1))).toMatch(/, compass 4\.1° too far clockwise\.$/);
    expect(checkWords(found(4.1))).toMatch(/, compass 4\.1° too far anticlockwise\.$/);
    expect(checkWords(found(0.02))).toMatch(/, the compass agrees\.$/);
    expect(checkWords(found(null))).not.toMatch(/compass/);
  });
});
