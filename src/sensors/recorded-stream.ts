import type { ReadingSample } from '../core/survey/survey.ts';

/** A recorded movement of a phone: poses to rest in and ways between them. */
export interface RecordedStream {
  title: string;
  device: string;
  kind: 'magnetic' | 'carried' | 'relative';
  /** Instant of the first row, UTC. */
  startedAt: string;
  parts: RecordedPart[];
}

/** The recordings that come with the app. */
export interface Recordings {
  sighting: RecordedStream;
  plane: RecordedStream;
}

export interface RecordedPart {
  /** What it shows, and what to do. */
  cue: string;
  /** The way there, then the rest: rows from `restFrom` on are played over and over until a person goes on. */
  rows: ReadingSample[];
  restFrom: number;
}

/** Milliseconds of a part from its first row to its last. */
const lengthOf = ({ rows }: RecordedPart): number => rows[rows.length - 1][0] - rows[0][0];

/** The row of a part at a time after its start; the rest goes to and fro, so that it never jumps. */
export function rowAt(part: RecordedPart, ms: number): ReadingSample {
  const { rows, restFrom } = part;
  const start = rows[0][0];
  const restStart = rows[restFrom][0] - start;
  const rest = lengthOf(part) - restStart;
  const over = ms - restStart;
  if (over <= 0) return nearestRow(rows, start + ms);
  const turned = rest > 0 ? over % (2 * rest) : 0;
  return nearestRow(rows, start + restStart + (turned > rest ? 2 * rest - turned : turned));
}

/** Whether a part has come to its rest. */
export const rests = ({ rows, restFrom }: RecordedPart, ms: number): boolean =>
  ms >= rows[restFrom][0] - rows[0][0];

function nearestRow(rows: readonly ReadingSample[], ms: number): ReadingSample {
  let [low, high] = [0, rows.length - 1];
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (rows[middle][0] <= ms) low = middle;
    else high = middle - 1;
  }
  return rows[low];
}
