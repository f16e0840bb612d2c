import { describe, expect, it, test } from 'vitest';
import {
  TOLERATED_SKEW_MS,
  clockSkew,
  rebased,
  rebasedStamps,
} from '../../../src/core/sync-protocol/clock-skew.ts';
import { merge, stateOf } from '../../../src/core/sync-protocol/merge.ts';
import { standingIn } from '../../../src/core/sync-protocol/needs-a-look.ts';
import type { FieldRow } from '../../../src/core/sync-protocol/rows.ts';
import { nextStamp, stampTime, type Stamp } from '../../../src/core/sync-protocol/stamp.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';
import { acted, created } from './two-copies.ts';

const HOUR = 3_600_000;
const at = (text: string) => Date.parse(text);

describe('the skew of a clock', () => {
  test('is the mean of both ways: RFC 5905, section 8, with T1 to T4', () => {
    // T1 = 100, T2 = 1160, T3 = 1170, T4 = 210: ((1160 - 100) + (1170 - 210)) / 2 = 1010; (210 - 100) - (1170 - 1160) = 100.
    expect(clockSkew([{ sent: 100, got: 1160, answered: 1170, received: 210 }])).toEqual({
      skewMs: 1010,
      roundTripMs: 100,
    });
  });

  it('is taken from the shortest round trip', () => {
    const slow = { sent: 0, got: 5000, answered: 5000, received: 6000 };
    const quick = { sent: 7000, got: 7050, answered: 7050, received: 7100 };
    expect(clockSkew([slow, quick])).toEqual({ skewMs: 0, roundTripMs: 100 });
  });

  it('is unknown where a clock was set between question and answer', () => {
    expect(clockSkew([{ sent: 5000, got: 9000, answered: 9000, received: 1000 }])).toBeNull();
    expect(clockSkew([])).toBeNull();
  });
});

/** A phone whose clock stands before the true time by `error` has edited the title at 10:00 true time. */
function edited(error: number, office = created(inventedSurvey(), 'office', '09:00')) {
  const stamp = nextStamp(null, at('2026-05-14T10:00:00Z') + error, 'phone');
  const time = new Date(stampTime(stamp)).toISOString();
  return { state: actedAt(office, time), stamp };
}
const actedAt = (state: ReturnType<typeof created>, time: string) =>
  merge(
    state,
    stateOf([
      {
        kind: 'field',
        key: 'title',
        stamp: nextStamp(null, at(time), 'phone'),
        value: 'By the phone',
        over: ['2026-05-14T09:00:00.000Z-0000-office' as Stamp],
      },
    ]),
  );

const contact = { device: 'phone', contactMs: at('2026-05-14T12:00:00Z'), last: null, sentUpTo: null };

describe('an edit made by a clock that is 26 hours wrong', () => {
  it.each([26 * HOUR, -26 * HOUR])(
    '(%d ms) stands where it was made, with the device’s own stamp kept',
    (error) => {
      const { state, stamp } = edited(error);
      const moved = rebasedStamps([...state.values()], { ...contact, last: stamp, skewMs: -error });
      expect([...moved]).toEqual([[stamp, '2026-05-14T10:00:00.000Z-0000-phone']]);
      const after = rebased(state, moved);
      expect(after.get('field title')).toMatchObject({
        value: 'By the phone',
        stamp: '2026-05-14T10:00:00.000Z-0000-phone',
        made: stamp,
      });
      const office = acted(created(inventedSurvey(), 'office', '09:00'), 'office', '11:00', [
        { path: 'title', value: 'An hour later' },
      ]);
      const fields = new Map(standingIn(merge(after, office)).fields.map(({ path, value }) => [path, value]));
      expect(fields.get('title')).toBe('An hour later');
      // A raw reading is evidence: its time stays.
      expect(after.get('reading readings/raw-1')).toEqual(state.get('reading readings/raw-1'));
    },
  );

  it('never stands after the contact, also where its clock was right again by then', () => {
    const { state, stamp } = edited(26 * HOUR);
    const moved = rebasedStamps([...state.values()], { ...contact, last: stamp, skewMs: 0 });
    expect(moved.get(stamp)).toBe('2026-05-14T12:00:00.000Z-0000-phone');
  });

  it('stays after the value its writer saw, and after what was sent', () => {
    const { state, stamp } = edited(0);
    const all = [...state.values()];
    const early = rebasedStamps(all, { ...contact, last: stamp, skewMs: -3 * HOUR });
    expect(early.get(stamp)).toBe('2026-05-14T09:00:00.000Z-0001-phone');
    const sentUpTo = '2026-05-14T09:30:00.000Z-0000-phone' as Stamp;
    expect(rebasedStamps(all, { ...contact, last: stamp, skewMs: -3 * HOUR, sentUpTo }).get(stamp)).toBe(
      '2026-05-14T09:30:00.000Z-0001-phone',
    );
  });
});

it('a small skew, what was sent, and stamps of others move nothing', () => {
  const { state, stamp } = edited(0);
  const all = [...state.values()];
  expect(rebasedStamps(all, { ...contact, last: stamp, skewMs: TOLERATED_SKEW_MS }).size).toBe(0);
  expect(rebasedStamps(all, { ...contact, last: stamp, skewMs: HOUR, sentUpTo: stamp }).size).toBe(0);
  expect(rebasedStamps(all, { ...contact, last: stamp, skewMs: HOUR, device: 'tablet' }).size).toBe(0);
});

it('a stamp that is only named any more moves too, so that nothing is held in the future by it', () => {
  let state = created(inventedSurvey(), 'office', '09:00');
  const title = (value: string | undefined) => [{ path: 'title', value }];
  // Set, cleared and set again by a clock five hours ahead: the first value is carried on by the third.
  state = acted(state, 'phone', '15:00', title('A'));
  state = acted(state, 'phone', '15:10', title(undefined));
  state = acted(state, 'phone', '15:20', title('B'));
  const moved = rebasedStamps([...state.values()], { ...contact, skewMs: -5 * HOUR });
  const { stamp, replaced } = rebased(state, moved).get('field title') as FieldRow;
  expect(stamp).toBe('2026-05-14T10:20:00.000Z-0000-phone');
  expect(replaced?.[0]).toMatchObject({
    stamp: '2026-05-14T10:10:00.000Z-0000-phone',
    over: ['2026-05-14T10:00:00.000Z-0000-phone'],
  });
});
