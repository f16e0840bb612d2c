import type { ReadingSample, SightingAxis } from '../survey/survey.ts';
import type { FrameDirection, Vector } from '../angles/vectors.ts';
import { angleBetween, directionOf, scaled } from '../angles/vectors.ts';
import { sightVector } from './attitude.ts';

/** The mean of several pointings. */
export interface AveragedDirection extends FrameDirection {
  vector: Vector;
  /** Root mean square angle of the pointings from their mean, degrees. */
  scatter: number;
  count: number;
}

/**
 * Mean direction of unit vectors, on the sphere: over north, over the zenith and in every pose alike. Null for none,
 * and for vectors that cancel out.
 */
export function meanDirection(vectors: readonly Vector[]): AveragedDirection | null {
  const sum = [0, 1, 2].map((i) => vectors.reduce((total, vector) => total + vector[i], 0));
  const length = Math.hypot(...sum);
  if (!(length > 1e-9 * vectors.length)) return null;
  const vector = scaled(sum as unknown as Vector, 1 / length);
  const squares = vectors.reduce((total, one) => total + angleBetween(one, vector) ** 2, 0);
  return {
    ...directionOf(vector),
    vector,
    scatter: Math.sqrt(squares / vectors.length),
    count: vectors.length,
  };
}

/** Mean direction of the sighting axis over the rows of a reading; null for none. */
export const averageDirection = (
  samples: readonly ReadingSample[],
  axis: SightingAxis = 'camera',
  index = 0,
): AveragedDirection | null =>
  meanDirection(samples.map(([, alpha, beta, gamma]) => sightVector({ alpha, beta, gamma }, axis, index)));
