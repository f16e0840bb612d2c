import { describe, expect, it } from 'vitest';
import { clock, listed, percent, utcOffset } from '../../../src/ui/screens/shade/figures.ts';
import { standardTimeText } from '../../../src/ui/screens/shade/standard-time-text.ts';

describe('what standard time is at a site', () => {
  // Offsets and summer time of the zones: IANA time zone database.
  it.each([
    ['Europe/Berlin', 'UTC+1 all year: in summer time the clock is an hour ahead'],
    ['America/St_Johns', 'UTC−3:30 all year: in summer time the clock is an hour ahead'],
    ['Australia/Lord_Howe', 'UTC+10:30 all year: in summer time the clock is 30 minutes ahead'],
    ['Asia/Kathmandu', 'UTC+5:45, as the clock shows'],
    ['America/Phoenix', 'UTC−7, as the clock shows'],
  ])('%s', (timeZone, text) => expect(standardTimeText(timeZone)).toBe(text));
});

describe('figures', () => {
  it('hold the number and its sign together', () => expect(percent(0.82449)).toBe('82.4\u00a0%'));
  it('show a clock in 24 hours', () => expect(clock(9, 5)).toBe('9:05'));
  it('show an offset of none', () => expect(utcOffset(0)).toBe('UTC+0'));
  it('list names as a sentence does', () => {
    expect(listed(['Maple'])).toBe('Maple');
    expect(listed(['Maple', 'Spruce', 'Mast'])).toBe('Maple, Spruce and Mast');
  });
});
