import { describe, expect, it } from 'vitest';
import {
  electricalList,
  factGroups,
  factText,
  withFacts,
} from '../../../src/core/survey/site-fact-groups.ts';
import { ELECTRICAL_LISTS } from '../../../src/core/survey/site-facts-electrical.ts';
import { isTimeZone } from '../../../src/core/solar-position/time-zone.ts';

const site = (timeZone: string, country?: string) => ({ timeZone, country });

describe('the lists of facts', () => {
  it.each([
    ['Europe/Lisbon', undefined, 'PT'],
    ['America/Indiana/Knox', undefined, 'US'],
    ['Asia/Kathmandu', undefined, 'ZZ'],
    ['Europe/Lisbon', 'DE', 'DE'],
    ['Europe/Lisbon', 'ZZ', 'ZZ'],
    ['Europe/Lisbon', 'XX', 'PT'],
  ])('of %s, country %s, are those of %s', (timeZone, country, expected) => {
    expect(electricalList(site(timeZone, country)).country).toBe(expected);
  });

  it('ask each thing once, with answers that are no two the same', () => {
    for (const { country } of ELECTRICAL_LISTS) {
      const rows = factGroups(site('Etc/UTC', country)).flatMap((group) => group.rows);
      const ids = rows.map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
      for (const { id, choices } of rows) {
        expect(choices.length, id).toBeGreaterThan(0);
        expect(new Set(choices).size, id).toBe(choices.length);
      }
    }
  });

  it('know their countries and time zones', () => {
    const codes = ELECTRICAL_LISTS.map(({ country }) => country);
    expect(new Set(codes).size).toBe(codes.length);
    for (const code of codes) expect(code).toMatch(/^[A-Z]{2}$/);
    for (const zone of ELECTRICAL_LISTS.flatMap(({ zones }) => zones).filter((name) => !name.endsWith('/')))
      expect(isTimeZone(zone), zone).toBe(true);
  });
});

describe('answers', () => {
  it('are put over the old ones, and empty ones take a fact away', () => {
    const first = withFacts(undefined, [
      { id: 'meter', value: 'Smart meter' },
      { id: 'hazards', value: ['Dog', 'Slippery'] },
      { id: 'busbar', value: '' },
    ]);
    expect(factText(first, 'hazards')).toBe('Dog, Slippery');
    expect(factText(first, 'busbar')).toBe('');
    const second = withFacts(first, [{ id: 'hazards', value: [] }]);
    expect(second).toEqual([{ id: 'meter', value: 'Smart meter' }]);
    expect(withFacts(second, [{ id: 'meter', value: '' }])).toBeUndefined();
  });
});
