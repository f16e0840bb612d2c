import type {
  Feedback,
  OrientationSensor,
  SensorSample,
} from '../../../src/app/capture/sensor-interfaces.ts';
import type { DeviceAngles } from '../../../src/core/pointing/attitude.ts';

const STARTED_MS = Date.parse('2026-05-14T09:00:00.000Z');

/** A sensor that gives samples when a test says so, fifty a second by its own clock. */
export class HandHeldSensor implements OrientationSensor {
  readonly device = 'Invented phone';
  readonly recording = null;
  timeMs = STARTED_MS;
  private beat = 0;
  private readonly listeners = new Set<(sample: SensorSample) => void>();
  private readonly breakers = new Set<() => void>();

  constructor(readonly kind: 'magnetic' | 'carried' | 'relative' = 'magnetic') {}

  start() {
    return Promise.resolve({ ok: true, kind: this.kind } as const);
  }

  listen(listener: (sample: SensorSample) => void) {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  }

  onBreak(listener: () => void) {
    this.breakers.add(listener);
    return () => this.breakers.delete(listener);
  }

  stop() {
    this.listeners.clear();
  }

  break() {
    for (const listener of this.breakers) listener();
  }

  /** Gives samples for some time along a path from 0 to 1, with a tremor; `still` leaves the tremor out. */
  give(path: (at: number) => DeviceAngles, ms: number, still = false): void {
    const steps = Math.round(ms / 20);
    for (let step = 0; step < steps; step++) {
      this.beat++;
      this.timeMs += 20;
      const shake = still ? 0 : 0.1 * Math.sin(this.beat);
      const { alpha, beta, gamma } = path(step / steps);
      const sample: SensorSample = {
        timeMs: this.timeMs,
        eventMs: still ? STARTED_MS : this.timeMs,
        alpha: alpha + shake,
        beta: beta + shake,
        gamma,
        absolute: this.kind === 'magnetic',
        compassHeading: null,
        compassAccuracy: null,
        byGyroscope: null,
        screenAngle: 0,
      };
      for (const listener of this.listeners) listener(sample);
    }
  }
}

/** Counts what it is told. */
export class CountedFeedback implements Feedback {
  takes = 0;
  refusals = 0;
  prime() {}
  taken() {
    this.takes++;
  }
  refused() {
    this.refusals++;
  }
}
