import type { ReadingSample, SightingAxis } from '../survey/survey.ts';
import type { Vector } from '../angles/vectors.ts';
import { angleBetween } from '../angles/vectors.ts';
import { sightVector } from './attitude.ts';
import type { AveragedDirection } from './average-direction.ts';
import { meanDirection } from './average-direction.ts';

/** Angles of an event as a platform may give them: without a sensor all are null. */
export type EventSample = readonly [
  ms: number,
  alpha: number | null,
  beta: number | null,
  gamma: number | null,
];

/** Whether a hold may be averaged, and if not, why. Angles in degrees. */
export type Steadiness =
  | { steady: true; direction: AveragedDirection; rows: ReadingSample[] }
  /** Not one event had angles: no sensor, or no leave to use it. */
  | { steady: false; reason: 'no-angles' }
  /** Too few events to tell. */
  | { steady: false; reason: 'too-few'; count: number }
  /** The phone moved: it turned so far from the first part of the hold to the last, or shook so much. */
  | { steady: false; reason: 'moving'; turned: number; scatter: number }
  /** The angles have stood still longer than a hand can hold: the sensor has stopped. */
  | { steady: false; reason: 'frozen'; forMs: number };

/** What a hold must keep to; degrees and milliseconds. Common practice, no source. */
export const STEADY = {
  /** Most scatter about the mean, root mean square, of a hand-held phone: about twice an ordinary tremor. */
  scatter: 1,
  /** Most turn between the means of the first and last thirds. */
  turn: 1,
  /** Fewest events with angles. */
  fewest: 3,
  /** Angles alike for so long are frozen; in the hand they change at every tenth of a degree. */
  frozenMs: 1500,
} as const;

export interface HoldKind {
  axis?: SightingAxis;
  /** A phone laid on something may well stand still. */
  handHeld?: boolean;
}

/**
 * Judges the rows of a hold. Rows with missing or not finite angles are left out. Give rows since the last change of
 * the angles, even from before the hold, for a frozen sensor to be told.
 */
export function steadiness(samples: readonly EventSample[], kind: HoldKind = {}): Steadiness {
  const { axis = 'camera', handHeld = true } = kind;
  const rows = samples.filter(isWhole);
  if (rows.length === 0) return { steady: false, reason: 'no-angles' };
  const forMs = rows[rows.length - 1][0] - rows[0][0];
  if (handHeld && forMs >= STEADY.frozenMs && rows.every((row) => isAlike(row, rows[0])))
    return { steady: false, reason: 'frozen', forMs };
  if (rows.length < STEADY.fewest) return { steady: false, reason: 'too-few', count: rows.length };
  const vectors = rows.map(([, alpha, beta, gamma]) => sightVector({ alpha, beta, gamma }, axis));
  const direction = meanDirection(vectors);
  const turned = turnOver(vectors);
  if (!direction || turned > STEADY.turn || direction.scatter > STEADY.scatter)
    return { steady: false, reason: 'moving', turned, scatter: direction?.scatter ?? 180 };
  return { steady: true, direction, rows };
}

function isWhole(sample: EventSample): sample is ReadingSample {
  return sample.every((value) => value !== null && Number.isFinite(value));
}

const isAlike = (a: ReadingSample, b: ReadingSample) => a[1] === b[1] && a[2] === b[2] && a[3] === b[3];

/** Angle between the means of the first and the last third, degrees. */
function turnOver(vectors: readonly Vector[]): number {
  const third = Math.max(1, Math.floor(vectors.length / 3));
  const [first, last] = [meanDirection(vectors.slice(0, third)), meanDirection(vectors.slice(-third))];
  return first && last ? angleBetween(first.vector, last.vector) : 180;
}
