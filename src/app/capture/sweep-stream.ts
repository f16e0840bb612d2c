import type { SightingAxis } from '../../core/survey/survey.ts';
import type { SensorSample } from './sensor-interfaces.ts';

/** A chunk is handed on when the next sample is this much younger [ms]: it is never longer than half a second. */
const CHUNK_MS = 450;

/** The stream of a sweep, cut into chunks as it comes. */
export class SweepStream {
  readonly samples: SensorSample[] = [];
  private chunk: SensorSample[] = [];

  constructor(
    readonly sightingId: string,
    readonly axis: SightingAxis,
  ) {}

  /** Takes a sample; gives a chunk when one is full. A sample that comes late begins the next one. */
  push(sample: SensorSample): readonly SensorSample[] | null {
    const ageMs = this.chunk.length > 0 ? sample.timeMs - this.chunk[0].timeMs : 0;
    const full = ageMs >= CHUNK_MS ? this.cut() : null;
    this.samples.push(sample);
    this.chunk.push(sample);
    return full;
  }

  /** What is not handed on yet; null where nothing is. */
  cut(): readonly SensorSample[] | null {
    if (this.chunk.length === 0) return null;
    const full = this.chunk;
    this.chunk = [];
    return full;
  }

  /** Whether the platform told nothing of any movement since the sweep began. */
  get isFrozen(): boolean {
    const [first] = this.samples;
    return this.samples.every(
      ({ alpha, beta, gamma }) => alpha === first.alpha && beta === first.beta && gamma === first.gamma,
    );
  }
}
