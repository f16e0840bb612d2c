import type {
  OrientationSensor,
  OrientationStart,
  Recording,
  SensorSample,
} from '../app/capture/sensor-interfaces.ts';
import type { RecordedStream } from './recorded-stream.ts';
import { rests, rowAt } from './recorded-stream.ts';
import { SampleClock } from './sample-clock.ts';

/** A recorded movement through the same interface as the sensor, so that every screen can be practised anywhere. */
export class ReplayedOrientation implements OrientationSensor {
  readonly device: string;
  readonly recording: Recording;
  private place = 0;
  /** When the part at work began, by the page's clock, and what has been played before it [ms]. */
  private partStart = 0;
  private playedBefore = 0;
  private wasResting = false;
  private readonly cueListeners = new Set<() => void>();
  private readonly clock = new SampleClock(() => this.sample());

  constructor(
    private readonly stream: RecordedStream,
    private readonly now: () => number = () => performance.now(),
  ) {
    this.device = stream.device;
    this.recording = {
      title: stream.title,
      cue: () => this.cue(),
      goOn: () => this.goOn(),
      onCue: (listener) => {
        this.cueListeners.add(listener);
        return () => this.cueListeners.delete(listener);
      },
    };
  }

  start(): Promise<OrientationStart> {
    this.partStart = this.now();
    return Promise.resolve({ ok: true, kind: this.stream.kind });
  }

  listen(listener: (sample: SensorSample) => void): () => void {
    return this.clock.listen(listener);
  }

  /** A recording does not break off. */
  onBreak(): () => void {
    return () => undefined;
  }

  stop(): void {
    this.cueListeners.clear();
  }

  private cue() {
    const { parts } = this.stream;
    return {
      text: parts[this.place].cue,
      place: this.place,
      count: parts.length,
      resting: rests(parts[this.place], this.now() - this.partStart),
    };
  }

  private goOn(): void {
    if (this.place + 1 >= this.stream.parts.length) return;
    this.playedBefore += this.now() - this.partStart;
    this.partStart = this.now();
    this.place++;
    this.wasResting = false;
    this.tellCue();
  }

  private sample(): SensorSample {
    const ms = this.now() - this.partStart;
    const part = this.stream.parts[this.place];
    const [, alpha, beta, gamma] = rowAt(part, ms);
    const resting = rests(part, ms);
    if (resting !== this.wasResting) {
      this.wasResting = resting;
      this.tellCue();
    }
    const timeMs = Date.parse(this.stream.startedAt) + this.playedBefore + ms;
    return {
      timeMs,
      eventMs: timeMs,
      alpha,
      beta,
      gamma,
      absolute: this.stream.kind === 'magnetic',
      compassHeading: null,
      compassAccuracy: null,
      byGyroscope: null,
      screenAngle: 0,
    };
  }

  private tellCue(): void {
    for (const listener of this.cueListeners) listener();
  }
}
