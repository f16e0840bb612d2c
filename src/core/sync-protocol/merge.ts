import { joinRows, rowName, type Row } from './rows.ts';

/** A survey's rows by their names, or some of them: a part is merged like the whole. */
export type SurveyState = ReadonlyMap<string, Row>;

export const stateOf = (rows: Iterable<Row>): SurveyState => merged(new Map(), rows);

/**
 * Two states of one survey as one, the same whatever the order, delay or repetition in which states meet: commutative,
 * associative, idempotent. Of each field the later value counts (equal stamps: the greater content) and those that lost
 * stay beside it; raw readings are joined by their ids; an erasure wins over everything and leaves itself alone.
 * Where nothing is new in a row of `b`, the row of `a` is given itself. Neither is changed.
 */
export const merge = (a: SurveyState, b: SurveyState): SurveyState => merged(a, b.values());

function merged(state: SurveyState, rows: Iterable<Row>): SurveyState {
  const joined = new Map(state);
  for (const row of rows) {
    const name = rowName(row);
    const known = joined.get(name);
    joined.set(name, known ? joinRows(known, row) : row);
  }
  const erasure = joined.get(ERASURE);
  return erasure ? new Map([[ERASURE, erasure]]) : joined;
}

/** The name of the row that says a survey was erased for good. */
export const ERASURE = rowName({ kind: 'erasure', key: '' });

/** The rows of `after` that are new or other than in `before`: what a store writes and passes on after a merge. */
export const changedRows = (before: SurveyState, after: SurveyState): Row[] =>
  [...after].filter(([name, row]) => before.get(name) !== row).map(([, row]) => row);
