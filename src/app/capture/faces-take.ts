import { signal } from '@preact/signals-core';
import { turnBetween } from '../../core/angles/angles.ts';
import type { Reading, SightingAxis } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { storeFaces } from './heading-takes.ts';
import type { LivePointing } from './live-pointing.ts';

/** Leaning the other way by this much the phone counts as turned over, degrees. */
const OVER = 30;
/** The phone must have pointed within `wander` degrees for so long before the second face is taken by itself [ms]. */
const QUIET = { ms: 900, wander: 1.2 };

/**
 * The two-face check: one mark twice, the phone turned over between. After a heading check by a mark the check's own
 * reading is the first face. The second is taken by itself once the phone lies still, since its screen is upside down then.
 */
export class FacesTake {
  /** The first face; null while it is still to be taken. */
  readonly upright = signal<Reading | null>(null);
  /** Led on to from a heading check: with the mark that was sighted there, or empty where it was a shadow. */
  readonly ledFrom = signal<string | null>(null);
  /** Id of the check stored last. */
  readonly done = signal<string | null>(null);
  /** Nobody is led here twice in one sitting. */
  private offered = false;
  private quiet: { since: number; azimuth: number; elevation: number } | null = null;

  constructor(
    private readonly session: CaptureSession,
    private readonly stationId: string,
  ) {}

  /** Leads on from a heading check, where this phone's index is not known in this survey; `reading` is of its mark. */
  leadOn(axis: SightingAxis, reading: Reading | null, mark: string): boolean {
    const index = this.session.runNow?.index[axis];
    if (this.offered || index?.source === 'two-face') return false;
    this.offered = true;
    this.ledFrom.value = mark;
    this.upright.value = reading;
    this.done.value = null;
    return true;
  }

  /** Takes the face that is due. */
  async take(): Promise<void> {
    const { session } = this;
    const upright = this.upright.value;
    this.quiet = null;
    this.done.value = null;
    const reading = await session.hold();
    if (!reading) return;
    if (!upright) {
      this.upright.value = reading;
      session.tell({ what: 'face-upright' });
      return;
    }
    this.done.value = await storeFaces(session, this.stationId, upright, reading);
    if (this.done.value !== null) this.upright.value = null;
  }

  /** Sees the phone move; takes the second face once it is turned over and lies still. */
  async follow(live: LivePointing): Promise<void> {
    const { session } = this;
    if (!this.upright.value || session.phase.value !== 'idle' || !isTurnedOver(live, session.axis.value)) {
      this.quiet = null;
      return;
    }
    const { timeMs, azimuthInRun: azimuth, elevation } = live;
    this.quiet ??= { since: timeMs, azimuth, elevation };
    const apart = Math.hypot(turnBetween(this.quiet.azimuth, azimuth), elevation - this.quiet.elevation);
    if (apart > QUIET.wander) this.quiet = { since: timeMs, azimuth, elevation };
    else if (timeMs - this.quiet.since >= QUIET.ms) await this.take();
  }

  /** Leaves it: the first face stays among the raw readings. */
  skip(): void {
    this.upright.value = null;
    this.ledFrom.value = null;
  }
}

/** Whether the phone is upside down about the line of sight: top edge down, or lying on its top edge's line, face down. */
export const isTurnedOver = ({ topEdge, fromFlat }: LivePointing, axis: SightingAxis): boolean =>
  axis === 'camera' ? topEdge < -OVER : fromFlat > 90 + OVER;
