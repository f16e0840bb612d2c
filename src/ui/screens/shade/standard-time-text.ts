import { standardOffsetMinutes, utcOffsetMinutes } from '../../../core/solar-position/time-zone.ts';
import { utcOffset } from './figures.ts';

/** What standard time is at a site and how the clock differs from it. */
export function standardTimeText(timeZone: string, year = 2025): string {
  const standard = standardOffsetMinutes(timeZone, year);
  const ahead = [0, 6].map((month) => utcOffsetMinutes(Date.UTC(year, month, 15), timeZone) - standard);
  const most = Math.max(...ahead);
  if (most === 0) return `${utcOffset(standard)}, as the clock shows`;
  return `${utcOffset(standard)} all year: in summer time the clock is ${most === 60 ? 'an hour' : `${most} minutes`} ahead`;
}
