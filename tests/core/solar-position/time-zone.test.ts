import { describe, expect, it } from 'vitest';
import {
  clockTime,
  isTimeZone,
  standardOffsetMinutes,
  utcOffsetMinutes,
} from '../../../src/core/solar-position/time-zone.ts';

// Offsets as in the IANA tz database.
describe('time zones', () => {
  it.each([
    ['Asia/Kolkata', 330, 330],
    ['America/St_Johns', -210, -150],
    ['Australia/Lord_Howe', 660, 630],
    ['Pacific/Apia', 780, 780],
    ['Europe/Dublin', 0, 60],
    ['Africa/Casablanca', 60, 60],
    ['Etc/GMT+6', -360, -360],
    ['America/New_York', -300, -240],
    ['Australia/Sydney', 660, 600],
  ])('%s is %d minutes ahead in January 2026 and %d in July', (timeZone, january, july) => {
    expect(utcOffsetMinutes(Date.UTC(2026, 0, 15), timeZone)).toBe(january);
    expect(utcOffsetMinutes(Date.UTC(2026, 6, 15), timeZone)).toBe(july);
    expect(standardOffsetMinutes(timeZone)).toBe(Math.min(january, july));
  });

  it('shows the clocks of a zone, seconds and years included', () => {
    const newYear = Date.UTC(2026, 0, 1, 0, 30, 15);
    expect(clockTime(newYear, 'America/St_Johns')).toEqual({
      year: 2025,
      month: 12,
      day: 31,
      hour: 21,
      minute: 0,
      second: 15,
    });
  });

  it('moves at the instant of the change, in both directions', () => {
    const forward = Date.UTC(2026, 2, 29, 1);
    expect(utcOffsetMinutes(forward - 1000, 'Europe/Dublin')).toBe(0);
    expect(utcOffsetMinutes(forward, 'Europe/Dublin')).toBe(60);
    const back = Date.UTC(2026, 9, 25, 1);
    expect(utcOffsetMinutes(back - 1, 'Europe/Dublin')).toBe(60);
    expect(utcOffsetMinutes(back, 'Europe/Dublin')).toBe(0);
  });

  it('knows which names are zones', () => {
    expect(isTimeZone('Europe/Lisbon')).toBe(true);
    for (const name of ['', 'Moon/Crater', 'EST5EDT4,M3', 'local']) expect(isTimeZone(name)).toBe(false);
    expect(() => clockTime(0, 'Moon/Crater')).toThrow(/Moon\/Crater/);
  });
});
