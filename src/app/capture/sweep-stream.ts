import type { SightingAxis } from '../../core/survey/survey.ts';
import type { SensorSample } from './sensor-interfaces.ts';

/** A chunk is handed on before it is this old [ms]: at most half a second is lost whatever happens. */
const CHUNK_MS = 450;

/** The stream of a sweep, cut into chunks as it comes. */
export class SweepStream {
  readonly samples: SensorSample[] = [];
  private chunk: SensorSample[] = [];

  constructor(
    readonly sightingId: string,
    readonly axis: SightingAxis,
  ) {}

  /** Takes a sample; gives a chunk when one is full. */
  push(sample: SensorSample): readonly SensorSample[] | null {
    this.samples.push(sample);
    this.chunk.push(sample);
    return sample.timeMs - this.chunk[0].timeMs >= CHUNK_MS ? this.cut() : null;
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
