import type { FieldChange } from '../../../src/core/survey/field-changes.ts';
import {
  allRows,
  changesSince,
  emptyReplica,
  received,
  stateIn,
  type Replica,
} from '../../../src/core/sync-protocol/changes-since.ts';
import { clockSkew, rebased, rebasedStamps } from '../../../src/core/sync-protocol/clock-skew.ts';
import { versionsOf } from '../../../src/core/sync-protocol/field-versions.ts';
import { changedRows, type SurveyState } from '../../../src/core/sync-protocol/merge.ts';
import { parseSyncMessage, syncMessage, type SyncMessage } from '../../../src/core/sync-protocol/message.ts';
import { nameOfPath, writtenRow } from '../../../src/core/sync-protocol/rows.ts';
import type { FieldRow, ReadingRow, Row } from '../../../src/core/sync-protocol/rows.ts';
import { nextStamp, stampDevice, type Stamp } from '../../../src/core/sync-protocol/stamp.ts';

export const SURVEY = 's1';
const SERVER = 'server';

/** A phone or a desk: its rows, its clock, and how far it has come with the server. */
export interface Device {
  id: string;
  replica: Replica;
  /** How far its clock stands before the true time [ms]. */
  clockErrorMs: number;
  /** What it adds to its clock since a contact [ms]. */
  correctionMs: number;
  last: Stamp | null;
  sentUpTo: Stamp | null;
  pushed: number;
  pulled: number;
}

/** One message on its way; nothing says when it comes, or how often. */
export interface Letter {
  to: Device | null;
  from: Device | null;
  text: string;
  /** The cursor it was asked from. */
  since: number;
}

/** What a write of a field was. Its name goes along in the version, as a part that no version of the app knows. */
export interface Write {
  path: string;
  value: FieldChange['value'];
  trueMs: number;
  /** The write whose value its writer saw. */
  saw: string | null;
}

const LIMIT = 7;

/** Five devices and a server, with letters that may be lost, late, doubled or in another order. */
export class World {
  trueMs = Date.UTC(2026, 4, 14, 9);
  server: Replica = emptyReplica;
  readonly devices: Device[];
  readonly writes = new Map<string, Write>();
  readonly readings = new Map<string, number>();
  readonly letters: Letter[] = [];

  constructor(clockErrors: readonly number[]) {
    this.devices = clockErrors.map((clockErrorMs, i) => ({
      id: `device-${i}`,
      replica: emptyReplica,
      clockErrorMs,
      correctionMs: 0,
      last: null,
      sentUpTo: null,
      pushed: 0,
      pulled: 0,
    }));
  }

  clockOf = ({ clockErrorMs, correctionMs }: Device): number => this.trueMs + clockErrorMs + correctionMs;

  stateOn = (device: Device): SurveyState => stateIn(device.replica, SURVEY);

  write(device: Device, changes: readonly FieldChange[], settles = false): Stamp {
    const stamp = (device.last = nextStamp(device.last, this.clockOf(device), device.id));
    for (const change of changes) {
      const known = this.stateOn(device).get(nameOfPath(change.path)) as FieldRow | ReadingRow | undefined;
      const row = writtenRow(known, change, stamp, settles);
      if (!row) continue;
      const name = `write-${this.writes.size}`;
      device.replica = received(device.replica, SURVEY, [
        row.kind === 'field' ? ({ ...row, name } as FieldRow) : row,
      ]);
      if (row.kind === 'reading') this.readings.set(row.key, (row.reading as { alpha: number }).alpha);
      else this.writes.set(name, { ...change, trueMs: this.trueMs, saw: known ? nameIn(known) : null });
    }
    return stamp;
  }

  /** The device meets the server: measures its clock, moves what it never sent, sends and asks. */
  contact(device: Device): void {
    const half = 40;
    const sent = this.clockOf(device);
    const server = this.trueMs + half;
    const measured = clockSkew([{ sent, got: server, answered: server, received: sent + 2 * half }])!;
    this.#moveStamps(device, measured.skewMs);
    const page = changesSince(allRows(device.replica), device.pushed, LIMIT);
    device.sentUpTo = device.last;
    this.#send(device, null, page, device.pushed);
    this.letters.push({ to: null, from: device, text: '', since: device.pulled });
  }

  #moveStamps(device: Device, skewMs: number): void {
    const state = this.stateOn(device);
    const moved = rebasedStamps([...state.values()], {
      device: device.id,
      skewMs,
      contactMs: this.trueMs,
      last: device.last,
      sentUpTo: device.sentUpTo,
    });
    device.correctionMs += skewMs;
    if (moved.size > 0) device.pulled = 0;
    const after = rebased(state, moved);
    const changed = changedRows(state, after).filter((row) => mentions(row, moved));
    const numbered = new Map(device.replica.surveys.get(SURVEY));
    let { last } = device.replica;
    for (const row of changed)
      numbered.set(nameOfPath(row.key), {
        survey: SURVEY,
        number: ++last,
        row: after.get(nameOfPath(row.key))!,
      });
    device.replica = { surveys: new Map([[SURVEY, numbered]]), last };
    if (device.last) device.last = moved.get(device.last) ?? device.last;
  }

  #send(from: Device | null, to: Device | null, page: ReturnType<typeof changesSince>, since: number): void {
    const message = syncMessage({
      cursor: { store: from?.id ?? SERVER, number: page.cursor },
      hasMore: !page.isLast,
      surveys: [{ id: SURVEY, rows: page.rows.map(({ row }) => row) }],
    });
    this.letters.push({ from, to, text: JSON.stringify(message), since });
  }

  /** A letter comes; it stays on its way where it comes twice. */
  deliver(place: number, isKept: boolean): void {
    const letter = this.letters[place];
    if (!isKept) this.letters.splice(place, 1);
    const { from, to, since } = letter;
    if (letter.text === '')
      return this.#send(null, from, changesSince(allRows(this.server), since, LIMIT), since);
    const message = readMessage(letter.text);
    if (to) this.#take(to, message, since);
    else if (message.surveys.length > 0) {
      for (const { id, rows } of message.surveys) this.server = received(this.server, id, rows);
      // The answer of an act that was taken in: acknowledged.
      const cursor = message.cursor!.number;
      this.letters.push({
        from: null,
        to: from,
        text: JSON.stringify(
          syncMessage({ cursor: { store: 'ack', number: cursor }, hasMore: false, surveys: [] }),
        ),
        since: 0,
      });
    }
  }

  #take(device: Device, { cursor, surveys }: SyncMessage, since: number): void {
    if (cursor!.store === 'ack') {
      device.pushed = Math.max(device.pushed, cursor!.number);
      return;
    }
    for (const { id, rows } of surveys) {
      device.replica = received(device.replica, id, rows);
      for (const row of rows)
        for (const stamp of stampsOf(row)) if (!device.last || stamp > device.last) device.last = stamp;
    }
    if (since <= device.pulled) device.pulled = Math.max(device.pulled, cursor!.number);
  }

  /** Signal for all until nothing moves any more. */
  settle(): void {
    for (const device of this.devices) {
      for (let round = 0; round < 1000; round++) {
        const before = [device.pushed, device.pulled].join();
        this.contact(device);
        while (this.letters.length > 0) this.deliver(0, false);
        if (before === [device.pushed, device.pulled].join()) break;
      }
    }
  }
}

/** The write that a row's value is of. */
export const nameIn = (row: Row): string => (row as unknown as { name: string }).name;

function readMessage(text: string): SyncMessage {
  const parsed = parseSyncMessage(JSON.parse(text));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return parsed.value;
}

export const stampsOf = (row: Row): Stamp[] =>
  row.kind === 'field'
    ? versionsOf(row).map(({ stamp }) => stamp)
    : row.kind === 'reading'
      ? [row.removed, row.returned].filter((stamp) => stamp !== null && stamp !== undefined)
      : [row.stamp];

const mentions = (row: Row, moved: ReadonlyMap<Stamp, Stamp>): boolean => {
  const now = new Set(moved.values());
  return stampsOf(row).some((stamp) => now.has(stamp) && stampDevice(stamp) !== '');
};
