import { changedRows, merge, stateOf, type SurveyState } from './merge.ts';
import { rowName, type Row } from './rows.ts';

/** A row with its number in the store: each change of a row gets the next one, so that no page ever splits a number. */
export interface NumberedRow {
  survey: string;
  number: number;
  row: Row;
}

/** Rows to send, and how far they reach. */
export interface Page {
  rows: NumberedRow[];
  /** Where the next page begins. */
  cursor: number;
  isLast: boolean;
}

/** The rows numbered after `cursor` (0 for all), at most `limit` (1 or more) of them, lowest number first. */
export function changesSince(rows: Iterable<NumberedRow>, cursor: number, limit: number): Page {
  if (!(limit >= 1)) throw new RangeError(`limit must be 1 or more, got ${limit}`);
  const later = [...rows].filter(({ number }) => number > cursor).sort((a, b) => a.number - b.number);
  const page = later.slice(0, limit);
  return { rows: page, cursor: page.at(-1)?.number ?? cursor, isLast: later.length <= limit };
}

/** A store's surveys, as plain data: what the stores of phone and server do, said once. */
export interface Replica {
  surveys: ReadonlyMap<string, ReadonlyMap<string, NumberedRow>>;
  /** The last number given. */
  last: number;
}

export const emptyReplica: Replica = { surveys: new Map(), last: 0 };

/** What a replica has of a survey. */
export const stateIn = ({ surveys }: Replica, survey: string): SurveyState =>
  new Map([...(surveys.get(survey) ?? [])].map(([name, { row }]) => [name, row]));

/**
 * The replica after rows of a survey came in. Rows that bring nothing new get no new number, so what is sent back to
 * where it came from comes to rest.
 */
export function received(replica: Replica, survey: string, rows: Iterable<Row>): Replica {
  const before = stateIn(replica, survey);
  const after = merge(before, stateOf(rows));
  const known = replica.surveys.get(survey);
  let { last } = replica;
  const numbered = new Map(
    [...after.keys()].flatMap((name) => (known?.has(name) ? [[name, known.get(name)!]] : [])),
  );
  for (const row of changedRows(before, after)) numbered.set(rowName(row), { survey, number: ++last, row });
  return { surveys: new Map(replica.surveys).set(survey, numbered), last };
}

/** All rows of a replica, in no order. */
export const allRows = ({ surveys }: Replica): NumberedRow[] =>
  [...surveys.values()].flatMap((rows) => [...rows.values()]);
