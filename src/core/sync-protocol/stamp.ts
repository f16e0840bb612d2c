import type { Brand } from '../angles/angles.ts';

/**
 * When a change was made, by a hybrid logical clock: the device's time, a counter for changes in the same millisecond
 * (or while a clock stands behind what it has seen), and the device. Written so that text order is the order of the
 * stamps: `2026-05-14T09:30:00.000Z-0000-phone7`.
 * Ref: Kulkarni et al., Logical Physical Clocks (2014), section 3; the counter is held to four base-36 digits.
 */
export type Stamp = Brand<string, 'Stamp'>;

const FORM = /^(\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}\.\d{3}Z)-([0-9a-z]{4})-([A-Za-z0-9_-]{1,64})$/;
const LARGEST_COUNT = 36 ** 4 - 1;
/** The last instant whose text has a four-digit year. */
const LATEST_MS = Date.parse('9999-12-31T23:59:59.999Z');

/**
 * A stamp after `last` (the newest this device has made or seen; null for none) at the device's time `nowMs`, Unix
 * time [ms], 0 to the end of the year 9999. Time never runs backwards in stamps, even if the clock does. Throws
 * RangeError for a time outside, a device that is not 1 to 64 letters, digits, `_` or `-`, or a stamp that is none.
 */
export function nextStamp(last: Stamp | null, nowMs: number, device: string): Stamp {
  if (!(nowMs >= 0 && nowMs <= LATEST_MS))
    throw new RangeError(`nowMs must be 0 to ${LATEST_MS}, got ${nowMs}`);
  const now = Math.floor(nowMs);
  if (last === null) return written(now, 0, device);
  const { timeMs, count } = read(last);
  if (now > timeMs) return written(now, 0, device);
  return count < LARGEST_COUNT ? written(timeMs, count + 1, device) : written(timeMs + 1, 0, device);
}

/** Below 0 where `a` is the earlier, above 0 where `b` is, 0 where they are the same. Text order. */
export const compareStamps = (a: Stamp, b: Stamp): number => (a < b ? -1 : a > b ? 1 : 0);

/** The time in a stamp, Unix time [ms]. Throws RangeError for a text that is no stamp. */
export const stampTime = (stamp: Stamp): number => read(stamp).timeMs;

/** A stamp at another time, Unix time [ms], with the count and device it has. Throws RangeError like `nextStamp`. */
export function withTime(stamp: Stamp, timeMs: number): Stamp {
  const { count, device } = read(stamp);
  return written(Math.floor(timeMs), count, device);
}

/** The device in a stamp. Throws RangeError for a text that is no stamp. */
export const stampDevice = (stamp: Stamp): string => read(stamp).device;

/** Whether a text from outside is a stamp. */
export function isStamp(text: string): text is Stamp {
  const match = FORM.exec(text);
  return match !== null && !Number.isNaN(Date.parse(match[1]));
}

function read(stamp: Stamp): { timeMs: number; count: number; device: string } {
  const match = FORM.exec(stamp);
  const timeMs = Date.parse(match?.[1] ?? '');
  if (!match || Number.isNaN(timeMs))
    throw new RangeError(`stamp must be a stamp, got ${JSON.stringify(stamp)}`);
  return { timeMs, count: Number.parseInt(match[2], 36), device: match[3] };
}

function written(timeMs: number, count: number, device: string): Stamp {
  if (timeMs > LATEST_MS) throw new RangeError(`stamp time must be at most ${LATEST_MS}, got ${timeMs}`);
  const stamp = `${new Date(timeMs).toISOString()}-${count.toString(36).padStart(4, '0')}-${device}`;
  if (!FORM.test(stamp))
    throw new RangeError(`device must be 1 to 64 letters, digits, _ or -, got ${JSON.stringify(device)}`);
  return stamp as Stamp;
}
