import { fc, test } from '@fast-check/vitest';
import { expect } from 'vitest';
import { compareStamps, isStamp, nextStamp, stampTime } from '../../../src/core/sync-protocol/stamp.ts';
import type { Stamp } from '../../../src/core/sync-protocol/stamp.ts';

const LATEST_MS = Date.parse('9999-12-31T23:59:59.999Z');
const clock = fc.oneof(fc.integer({ min: 0, max: LATEST_MS - 1_000_000 }), fc.integer({ min: 0, max: 50 }));
const device = fc.stringMatching(/^[A-Za-z0-9_-]{1,12}$/);

/** The stamps a device makes as its clock shows these times. */
function stampsAt(times: number[], by: string): Stamp[] {
  const stamps: Stamp[] = [];
  for (const time of times) stamps.push(nextStamp(stamps.at(-1) ?? null, time, by));
  return stamps;
}

test('a stamp shows its time, count and device', () => {
  const first = nextStamp(null, Date.UTC(2026, 4, 14, 9, 30), 'phone7');
  expect(first).toBe('2026-05-14T09:30:00.000Z-0000-phone7');
  expect(nextStamp(first, Date.UTC(2026, 4, 14, 9, 30), 'tablet')).toBe(
    '2026-05-14T09:30:00.000Z-0001-tablet',
  );
});

test.prop([fc.array(clock, { minLength: 2 }), device])(
  'each stamp is later than the last, even if the clock goes back',
  (times, by) => {
    const stamps = stampsAt(times, by);
    for (let i = 1; i < stamps.length; i++) expect(compareStamps(stamps[i - 1], stamps[i])).toBeLessThan(0);
  },
);

test.prop([clock, clock, device, device])(
  'a stamp made after seeing another’s is later than that',
  (a, b, one, other) => {
    const seen = nextStamp(null, a, one);
    expect(compareStamps(seen, nextStamp(seen, b, other))).toBeLessThan(0);
  },
);

test.prop([fc.array(fc.tuple(clock, device), { minLength: 1 })])(
  'text order is the order of the stamps, by time first',
  (made) => {
    const stamps = made.map(([time, by]) => nextStamp(null, time, by));
    const asText = [...stamps].sort();
    expect([...stamps].sort(compareStamps)).toEqual(asText);
    const times = asText.map(stampTime);
    expect(times).toEqual([...times].sort((a, b) => a - b));
  },
);

test.prop([clock, device, clock, device])(
  'two stamps are equal only if they are the same',
  (a, one, b, other) => {
    const [x, y] = [nextStamp(null, a, one), nextStamp(null, b, other)];
    expect(compareStamps(x, y) === 0).toBe(a === b && one === other);
    expect(compareStamps(x, y)).toBe(0 - compareStamps(y, x));
  },
);

test.prop([fc.double({ min: 0, max: LATEST_MS, noNaN: true }), device])(
  'the time is had back, in whole milliseconds',
  (time, by) => {
    const stamp = nextStamp(null, time, by);
    expect(isStamp(stamp)).toBe(true);
    expect(stampTime(stamp)).toBe(Math.floor(time));
  },
);

test('when a millisecond’s counts are used up the next millisecond is taken', () => {
  const full = '2026-05-14T09:30:00.000Z-zzzz-a' as Stamp;
  expect(nextStamp(full, 0, 'a')).toBe('2026-05-14T09:30:00.001Z-0000-a');
});

test.each([
  [() => nextStamp(null, -1, 'a'), /nowMs must be 0 to .* got -1/],
  [() => nextStamp(null, NaN, 'a'), /got NaN/],
  [() => nextStamp(null, 0, ''), /device must be 1 to 64/],
  [() => nextStamp(null, 0, 'a b'), /got "a b"/],
  [() => nextStamp('yesterday' as Stamp, 0, 'a'), /stamp must be a stamp, got "yesterday"/],
  [() => stampTime('2026-13-14T09:30:00.000Z-0000-a' as Stamp), /stamp must be a stamp/],
])('an impossible argument is refused', (call, message) => {
  expect(call).toThrow(message);
});

test('a text that is no stamp is told from one', () => {
  expect(isStamp('2026-13-14T09:30:00.000Z-0000-a')).toBe(false);
  expect(isStamp('2026-05-14T09:30:00Z-0000-a')).toBe(false);
});
