import type { SurveyState } from './merge.ts';
import { stateOf } from './merge.ts';
import { joinVersions, versionsOf, type FieldVersions, type Version } from './field-versions.ts';
import type { Row } from './rows.ts';
import { compareStamps, nextStamp, stampDevice, stampTime, withTime, type Stamp } from './stamp.ts';

/** A request and its answer, Unix times [ms]: sent (device's clock), got and answered (server's), received (device's). */
export interface Contact {
  sent: number;
  got: number;
  answered: number;
  received: number;
}

/**
 * How far the server's clock stands ahead of the device's [ms], to within half the round trip: the mean of what the way
 * there and the way back show, taken as equally long. Of several contacts, the one with the shortest round trip. Null
 * where there is none or a clock was set in between (a round trip below 0).
 * Ref: RFC 5905, section 8: theta = ((T2 - T1) + (T3 - T4)) / 2, delta = (T4 - T1) - (T3 - T2).
 */
export function clockSkew(contacts: readonly Contact[]): { skewMs: number; roundTripMs: number } | null {
  const measured = contacts
    .map(({ sent, got, answered, received }) => ({
      skewMs: (got - sent + (answered - received)) / 2,
      roundTripMs: received - sent - (answered - got),
    }))
    .filter(({ roundTripMs }) => roundTripMs >= 0);
  return measured.sort((a, b) => a.roundTripMs - b.roundTripMs)[0] ?? null;
}

/** Clocks closer than this are left alone [ms]: who of two wrote later within a minute is chance anyhow. */
export const TOLERATED_SKEW_MS = 60_000;

/** What a device knows when it meets the server. */
export interface Rebase {
  device: string;
  /** See `clockSkew` [ms]. */
  skewMs: number;
  /** The server's time at contact, Unix time [ms]. */
  contactMs: number;
  /** The newest stamp this device made or saw, from which it makes the next; null where there is none. */
  last: Stamp | null;
  /** The newest stamp of this device at its last sending, or null: only later ones may move. */
  sentUpTo: Stamp | null;
}

/**
 * New stamps for those that a device made by a wrong clock and never sent. Each moves by the skew (none within
 * `TOLERATED_SKEW_MS`), at most to the time of the contact, since nothing was written after it; their order stays, and
 * each stays later than what was sent before and than the versions its writer had seen (`over`). Gives only stamps that move, `last` with them.
 */
export function rebasedStamps(rows: readonly Row[], rebase: Rebase): Map<Stamp, Stamp> {
  const { skewMs, contactMs } = rebase;
  const floors = ownStamps(rows, rebase);
  const shift = Math.abs(skewMs) > TOLERATED_SKEW_MS ? skewMs : 0;
  const moved = new Map<Stamp, Stamp>();
  let last = rebase.sentUpTo;
  for (const [stamp, seen] of [...floors].sort(([a], [b]) => compareStamps(a, b))) {
    const shifted = stampTime(stamp) + shift;
    const time = shifted > contactMs + (shift === 0 ? TOLERATED_SKEW_MS : 0) ? contactMs : shifted;
    const floor: Stamp | null = seen.map((other) => moved.get(other) ?? other).reduce(newer, last);
    last = stampAfter(floor, withTime(stamp, Math.max(0, time)));
    if (last !== stamp) moved.set(stamp, last);
  }
  return moved;
}

/** The stamp itself, or where it is not after `floor` the next one that is. */
const stampAfter = (floor: Stamp | null, stamp: Stamp): Stamp =>
  floor === null || compareStamps(stamp, floor) > 0
    ? stamp
    : nextStamp(floor, stampTime(stamp), stampDevice(stamp));

const newer = (a: Stamp | null, b: Stamp): Stamp => (a === null || compareStamps(b, a) > 0 ? b : a);

/** The unsent stamps of the device in rows, each with what its writers had seen. */
function ownStamps(rows: readonly Row[], { device, last, sentUpTo }: Rebase): Map<Stamp, Stamp[]> {
  const own = new Map<Stamp, Stamp[]>();
  const add = (stamp: Stamp | null | undefined, seen: readonly Stamp[] = []) => {
    if (!stamp || stampDevice(stamp) !== device) return;
    if (sentUpTo === null || compareStamps(stamp, sentUpTo) > 0)
      own.set(stamp, [...(own.get(stamp) ?? []), ...seen.filter((other) => other !== stamp)]);
  };
  add(last);
  for (const row of rows)
    if (row.kind === 'reading') [row.removed, row.returned].forEach((stamp) => add(stamp));
    else if (row.kind !== 'field') add(row.stamp);
    else
      for (const { stamp, over, since } of versionsOf(row)) {
        add(stamp, over);
        // Also such as are only named: of versions that were carried on since.
        for (const named of [since, ...(over ?? [])]) add(named);
      }
  return own;
}

/**
 * Rows with their stamps moved (see `rebasedStamps`). A version keeps the stamp it had by the device's own clock as
 * `made`; the contents of raw readings, their times among them, are never touched.
 * A device takes all changes from the start after this: what a stamp too late had pushed off a field comes back so.
 */
export const rebased = (state: SurveyState, moved: ReadonlyMap<Stamp, Stamp>): SurveyState =>
  stateOf([...state.values()].map((row) => rebasedRow(row, moved)));

function rebasedRow(row: Row, moved: ReadonlyMap<Stamp, Stamp>): Row {
  const at = (stamp: Stamp): Stamp => moved.get(stamp) ?? stamp;
  if (row.kind === 'reading') {
    const { removed, returned } = row;
    return { ...row, removed: removed && at(removed), ...(returned && { returned: at(returned) }) };
  }
  if (row.kind !== 'field') return { ...row, stamp: at(row.stamp) };
  const version = <V extends Version>(given: V): V => ({
    ...given,
    stamp: at(given.stamp),
    ...(given.since && { since: at(given.since) }),
    ...(given.over && { over: given.over.map(at) }),
    ...(moved.has(given.stamp) && { made: given.made ?? given.stamp }),
  });
  const field: FieldVersions = {
    ...version(row),
    ...(row.replaced && { replaced: row.replaced.map(version) }),
  };
  return { kind: row.kind, key: row.key, ...joinVersions(field, field) };
}
