import type {
  OrientationKind,
  OrientationSensor,
  OrientationStart,
  SensorSample,
} from '../app/capture/sensor-interfaces.ts';
import { anglesOf, mayUseOrientation, type EventAngles } from './orientation-events.ts';
import { SampleClock } from './sample-clock.ts';

/** No event, or none with angles, after this long: there is no sensor. */
const WATCHDOG_MS = 1500;
/** The compass's angles may come a little after the others. */
const COMPASS_WAIT_MS = 600;

type Stamped = EventAngles & { eventMs: number };

/** The angles of this device: those tied to magnetic north where it has them, else those from an arbitrary start. */
export class DeviceOrientation implements OrientationSensor {
  readonly recording = null;
  readonly device = deviceWords(navigator.userAgent);
  private absolute: Stamped | null = null;
  private plain: Stamped | null = null;
  private kind: OrientationKind | null = null;
  private sawEmpty = false;
  private absoluteIsEmpty = false;
  private settle: (() => void) | null = null;
  private readonly breakListeners = new Set<() => void>();
  private readonly clock = new SampleClock(() => this.sample());

  async start(): Promise<OrientationStart> {
    this.stop();
    if (!(await mayUseOrientation())) return { ok: false, why: 'refused' };
    addEventListener('deviceorientationabsolute', this.onAbsolute);
    addEventListener('deviceorientation', this.onPlain);
    document.addEventListener('visibilitychange', this.onVisibility);
    await this.anglesCome();
    this.kind = this.kindNow();
    if (this.kind) return { ok: true, kind: this.kind };
    const why = this.sawEmpty ? 'no-angles' : 'no-sensor';
    this.stop();
    return { ok: false, why };
  }

  listen(listener: (sample: SensorSample) => void): () => void {
    return this.clock.listen(listener);
  }

  onBreak(listener: () => void): () => void {
    this.breakListeners.add(listener);
    return () => this.breakListeners.delete(listener);
  }

  stop(): void {
    removeEventListener('deviceorientationabsolute', this.onAbsolute);
    removeEventListener('deviceorientation', this.onPlain);
    document.removeEventListener('visibilitychange', this.onVisibility);
    this.absolute = this.plain = this.kind = null;
    this.sawEmpty = this.absoluteIsEmpty = false;
  }

  private sample(): SensorSample | null {
    if (document.visibilityState !== 'visible') return null;
    const now = this.kind === 'magnetic' ? (this.absolute ?? this.plain) : this.plain;
    if (!now) return null;
    const gyroscope = this.kind === 'magnetic' && this.plain && !this.plain.absolute ? this.plain : null;
    return {
      ...now,
      timeMs: Date.now(),
      byGyroscope: gyroscope && { alpha: gyroscope.alpha, beta: gyroscope.beta, gamma: gyroscope.gamma },
      screenAngle: screen.orientation?.angle ?? 0,
    };
  }

  private kindNow(): OrientationKind | null {
    if (this.absolute || this.plain?.absolute) return 'magnetic';
    if (!this.plain) return null;
    return this.plain.compassHeading === null ? 'relative' : 'carried';
  }

  /** Waits until it is clear what this device gives, at most until the watchdog barks. */
  private anglesCome(): Promise<void> {
    return new Promise((resolve) => {
      let compassTimer: ReturnType<typeof setTimeout> | undefined;
      const done = () => {
        clearTimeout(watchdog);
        clearTimeout(compassTimer);
        this.settle = null;
        resolve();
      };
      const watchdog = setTimeout(done, WATCHDOG_MS);
      this.settle = () => {
        const kind = this.kindNow();
        if (kind === 'magnetic' || kind === 'carried' || (kind && this.absoluteIsEmpty)) done();
        else if (kind) compassTimer ??= setTimeout(done, COMPASS_WAIT_MS);
      };
    });
  }

  private readonly onAbsolute = (event: DeviceOrientationEvent) => {
    const angles = anglesOf(event);
    if (!angles) {
      this.absoluteIsEmpty = this.sawEmpty = true;
      if (this.absolute) this.broke();
    }
    this.absolute = angles && { ...angles, eventMs: Date.now() };
    this.settle?.();
  };

  private readonly onPlain = (event: DeviceOrientationEvent) => {
    const angles = anglesOf(event);
    if (!angles) {
      this.sawEmpty = true;
      if (this.plain && this.kind !== 'magnetic') this.broke();
    }
    this.plain = angles && { ...angles, eventMs: Date.now() };
    this.settle?.();
  };

  private readonly onVisibility = () => {
    if (document.visibilityState === 'hidden') this.broke();
  };

  private broke(): void {
    for (const listener of this.breakListeners) listener();
  }
}

/** The platform of a browser in a few words, without its version numbers. */
export function deviceWords(userAgent: string): string {
  const [, system = 'unknown device'] = /\(([^)]*)\)/.exec(userAgent) ?? [];
  return system.slice(0, 120);
}
