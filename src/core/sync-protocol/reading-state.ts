import { canonicalText } from '../survey/canonical-text.ts';
import type { JsonValue } from '../survey/json-value.ts';
import { compareStamps, type Stamp } from './stamp.ts';

/** A raw reading: its contents are written once; only whether it stands may change. */
export interface ReadingState {
  reading: JsonValue;
  /** Other contents that came under the same id: something is wrong with a device, and both are kept. */
  others?: JsonValue[];
  /** When it was last taken out of the survey. */
  removed: Stamp | null;
  /** When it was last put back. */
  returned?: Stamp;
}

const READING_PATH = /^readings\/[^/]+$/;

/** Whether a path is that of a raw reading, which has a row of its own and is never put over. */
export const isReadingPath = (path: string): boolean => READING_PATH.test(path);

/** Contents kept under one id. */
const MOST_CONTENTS = 4;

/** Whether a reading is in the survey: the later of being taken out and put back counts. */
export const isStanding = ({ removed, returned }: Omit<ReadingState, 'reading'>): boolean =>
  removed === null || (returned !== undefined && compareStamps(returned, removed) > 0);

/**
 * A raw reading of two copies as one. Of different contents all are kept (up to `MOST_CONTENTS`), in an order by
 * content that every device makes alike.
 */
export function joinReadings(a: ReadingState, b: ReadingState): ReadingState {
  const contents = new Map<string, JsonValue>();
  for (const { reading, others = [] } of [a, b])
    for (const content of [reading, ...others]) contents.set(canonicalText(content), content);
  const sorted = [...contents].sort(([x], [y]) => (x < y ? -1 : 1)).map(([, content]) => content);
  const [reading, ...others] = sorted.slice(0, MOST_CONTENTS);
  const returned = later(a.returned ?? null, b.returned ?? null);
  return {
    reading,
    ...(others.length > 0 && { others }),
    removed: later(a.removed, b.removed),
    ...(returned && { returned }),
  };
}

const later = (a: Stamp | null, b: Stamp | null): Stamp | null =>
  a !== null && (b === null || compareStamps(a, b) > 0) ? a : b;
