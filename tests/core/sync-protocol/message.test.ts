import { fc, test } from '@fast-check/vitest';
import { describe, expect, it } from 'vitest';
import {
  changesSince,
  emptyReplica,
  received,
  allRows,
  stateIn,
} from '../../../src/core/sync-protocol/changes-since.ts';
import { stateOf } from '../../../src/core/sync-protocol/merge.ts';
import { parseSyncMessage, syncMessage } from '../../../src/core/sync-protocol/message.ts';
import { SYNC_LIMITS } from '../../../src/core/sync-protocol/row-schema.ts';
import { surveyOf } from '../../../src/core/survey/field-changes.ts';
import { standingIn } from '../../../src/core/sync-protocol/needs-a-look.ts';
import { inventedSurvey } from '../../app/invented-survey.ts';
import { state } from './arbitrary-rows.ts';
import { acted, created } from './two-copies.ts';

const stamp = '2026-05-14T10:00:00.000Z-0000-phone';
const carrying = (...rows: unknown[]) => ({
  ...syncMessage({ cursor: null, hasMore: false, surveys: [] }),
  surveys: [{ id: 's1', rows }],
});
const field = { kind: 'field', key: 'title', stamp, value: 'A' };

describe('a message', () => {
  test.prop([state])('comes over the wire as it was sent', (sent) => {
    const rows = [...sent.values()];
    const parsed = parseSyncMessage(JSON.parse(JSON.stringify(carrying(...rows))));
    expect(parsed).toMatchObject({ ok: true });
    expect(parsed.ok && stateOf(parsed.value.surveys[0].rows)).toEqual(sent);
  });

  test.prop([fc.anything()], { numRuns: 300 })('of any other kind is refused, not thrown at', (value) => {
    expect(parseSyncMessage(value).ok).toBe(false);
    expect(parseSyncMessage(carrying(value)).ok).toBe(false);
  });

  it.each<[string, unknown, string, RegExp]>([
    [
      'a stamp that is none',
      { ...field, stamp: 'yesterday' },
      'surveys[0].rows[0].stamp',
      /must be a stamp .* "yesterday"/,
    ],
    ['a field without path', { ...field, key: '' }, 'surveys[0].rows[0].key', /1 to 2000 characters/],
    [
      'a reading among the fields',
      { ...field, key: 'readings/r1' },
      'surveys[0].rows[0].key',
      /not of a reading/,
    ],
    [
      'a reading that is a text',
      { kind: 'reading', key: 'readings/r1', reading: 'x', removed: null },
      'surveys[0].rows[0].reading',
      /a raw reading/,
    ],
    [
      'a path without end',
      { ...field, key: 'x'.repeat(SYNC_LIMITS.keyLength + 1) },
      'surveys[0].rows[0].key',
      /characters/,
    ],
    [
      'versions without end',
      { ...field, replaced: Array(13).fill({ stamp }) },
      'surveys[0].rows[0].replaced',
      /at most 12/,
    ],
    [
      'a bad version',
      { ...field, replaced: [{ stamp, over: [1] }] },
      'surveys[0].rows[0].replaced[0].over[0]',
      /a stamp/,
    ],
    ['two erasures', { kind: 'erasure', key: 'x', stamp }, 'surveys[0].rows[0].key', /empty/],
    ['a kind that is no later one', { ...field, kind: 'reeding' }, 'surveys[0].rows[0].kind', /x-…/],
    [
      'a value too deep',
      { ...field, value: JSON.parse('['.repeat(70) + ']'.repeat(70)) as unknown },
      'surveys[0].rows[0].value',
      /64 deep/,
    ],
  ])('with %s is refused with what and where', (_, row, path, message) => {
    expect(parseSyncMessage(carrying(row))).toEqual({
      ok: false,
      problems: [{ path, message: expect.stringMatching(message) as string }],
    });
  });

  it('with more rows than the limit is refused', () => {
    const rows = Array.from({ length: SYNC_LIMITS.rows + 1 }, () => field);
    expect(parseSyncMessage(carrying(...rows))).toMatchObject({ ok: false, problems: [{ path: 'surveys' }] });
  });

  it('of a newer version is read where that says so, and else refused by name', () => {
    const newer = { ...carrying(field), version: 7, mood: 'new' };
    expect(parseSyncMessage(newer)).toMatchObject({ ok: true, value: { version: 7, mood: 'new' } });
    expect(parseSyncMessage({ ...newer, readableFrom: 2 })).toMatchObject({
      ok: false,
      problems: [{ path: 'readableFrom', message: expect.stringContaining('Update Noonmark') as string }],
    });
  });
});

describe('an older app between a newer app and the office', () => {
  const news = [
    { kind: 'field', key: 'planes/south/glare/limit', stamp, value: { lux: 3 }, sealed: true },
    { kind: 'x-comment', key: 'c1', stamp, text: 'Look at this', on: ['title'] },
  ];
  const parsed = parseSyncMessage(carrying(...news));
  const rows = parsed.ok ? parsed.value.surveys[0].rows : [];

  it('passes on paths and kinds of rows it does not know, unchanged, also after its own edits', () => {
    let old = received(emptyReplica, 's1', created(inventedSurvey()).values());
    old = received(old, 's1', rows);
    old = received(
      old,
      's1',
      acted(stateIn(old, 's1'), 'phone', '11:00', [{ path: 'title', value: 'B' }]).values(),
    );
    const sent = changesSince(allRows(old), 0, 1000).rows.map(({ row }) => row);
    for (const one of news) expect(sent).toContainEqual(one);
    expect(surveyOf(standingIn(stateIn(old, 's1')).fields)).toMatchObject({ title: 'B' });
  });
});

describe('changes since a cursor', () => {
  test.prop([fc.array(state, { minLength: 1, maxLength: 4 }), fc.integer({ min: 1, max: 7 })])(
    'page by page are all there is, each row once, and nothing after that',
    (states, limit) => {
      let replica = emptyReplica;
      states.forEach((part, i) => (replica = received(replica, `s${i % 2}`, part.values())));
      const got = [];
      let cursor = 0;
      for (let isLast = false; !isLast;) {
        const page = changesSince(allRows(replica), cursor, limit);
        expect(page.rows.length).toBeLessThanOrEqual(limit);
        got.push(...page.rows);
        ({ cursor, isLast } = page);
      }
      expect(got).toHaveLength(allRows(replica).length);
      expect(new Set(got)).toEqual(new Set(allRows(replica)));
      expect(cursor).toBe(replica.last);
      const back = received(replica, 's0', stateIn(replica, 's0').values());
      expect(changesSince(allRows(back), cursor, limit).rows).toEqual([]);
    },
  );

  it('wants a limit', () => {
    expect(() => changesSince([], 0, 0)).toThrow(/limit must be 1 or more, got 0/);
  });
});
