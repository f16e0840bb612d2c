import { DEGREES, turnBetween } from '../../core/angles/angles.ts';
import { attitude } from '../../core/pointing/attitude.ts';
import type { SensorSample } from './sensor-interfaces.ts';

/** Compass and gyroscope may drift apart by this much before it is a sign of steel, degrees. Common practice, no source. */
export const MOST_WANDER = 8;
/** The gyroscope's own drift is let be: the comparison starts anew after this long [ms]. */
const WINDOW_MS = 60_000;

/** Turn about the vertical from the gyroscope's frame to the compass's, degrees; it stays while neither is disturbed. */
export function frameTurn(sample: SensorSample): number | null {
  if (!sample.byGyroscope) return null;
  const [compass, gyroscope] = [attitude(sample), attitude(sample.byGyroscope)];
  let [sin, cos] = [0, 0];
  for (const axis of ['x', 'y', 'z'] as const) {
    const [a, b] = [gyroscope[axis], compass[axis]];
    sin += a[0] * b[1] - a[1] * b[0];
    cos += a[0] * b[0] + a[1] * b[1];
  }
  return Math.atan2(sin, cos) * DEGREES;
}

/** Watches compass and gyroscope for steel: what they say of a turn must agree. */
export class CompassWatch {
  private first: { turn: number; timeMs: number } | null = null;

  /** Degrees they have come apart by within the last minute; null without a gyroscope beside the compass. */
  apart(sample: SensorSample): number | null {
    const turn = frameTurn(sample);
    if (turn === null) return null;
    if (!this.first || sample.timeMs - this.first.timeMs > WINDOW_MS)
      this.first = { turn, timeMs: sample.timeMs };
    return Math.abs(turnBetween(this.first.turn, turn));
  }
}
