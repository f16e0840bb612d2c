import type { SensorSample } from '../app/capture/sensor-interfaces.ts';

/** Between samples; the platform gives about as many events, and none while the phone is still. */
const EVERY_MS = 20;

/** Hands out samples on a timer while anybody listens. */
export class SampleClock {
  private readonly listeners = new Set<(sample: SensorSample) => void>();
  private timer: ReturnType<typeof setInterval> | null = null;

  /** `sample` gives the angles as they are now, or null where there are none. */
  constructor(private readonly sample: () => SensorSample | null) {}

  listen(listener: (sample: SensorSample) => void): () => void {
    this.listeners.add(listener);
    this.timer ??= setInterval(() => this.tick(), EVERY_MS);
    return () => {
      this.listeners.delete(listener);
      if (this.listeners.size === 0) this.stop();
    };
  }

  private tick(): void {
    const sample = this.sample();
    if (sample) for (const listener of this.listeners) listener(sample);
  }

  private stop(): void {
    if (this.timer !== null) clearInterval(this.timer);
    this.timer = null;
  }
}
