import type { SightingAxis } from '../../core/survey/survey.ts';
import type { SensorSample } from './sensor-interfaces.ts';

/** The tap itself shakes the phone; what comes this soon after it is not taken [ms]. */
const SETTLE_MS = 120;
/** What is averaged [ms]. */
export const HOLD_MS = 500;

/** Collects the samples of one hold. */
export class Hold {
  private readonly samples: SensorSample[] = [];
  private startMs: number | null = null;

  constructor(readonly axis: SightingAxis) {}

  /** Takes a sample; gives all of them once the hold is over. */
  push(sample: SensorSample): readonly SensorSample[] | null {
    this.startMs ??= sample.timeMs;
    const sinceMs = sample.timeMs - this.startMs;
    if (sinceMs < SETTLE_MS) return null;
    this.samples.push(sample);
    return sinceMs >= SETTLE_MS + HOLD_MS ? this.samples : null;
  }
}
