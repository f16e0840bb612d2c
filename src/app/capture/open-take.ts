import { signal } from '@preact/signals-core';
import { fullCircle, turnBetween } from '../../core/angles/angles.ts';
import { offsetAt } from '../../core/pointing/run-ties.ts';
import type { OpenLook, Run } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { rawReading } from './raw-reading.ts';
import type { SensorSample } from './sensor-interfaces.ts';
import { nextOrder, withStation } from './station-edits.ts';
import { SweepStream } from './sweep-stream.ts';

/** A look at work. */
interface Looking {
  /** Where it began, in the frame of its run, and how far the phone was turned since; degrees. */
  from: number;
  turned: number;
  last: number;
  stream: SweepStream;
  run: Run | null;
  readings: string[];
}

/**
 * Looked from here to there, and it is open. The look is kept as read in its run, with its stream, so that it turns with
 * whatever the run's heading turns out to be; a phone without a compass may look before its check.
 */
export class OpenTake {
  /** Whether a look is at work. */
  readonly looking = signal(false);
  private look: Looking | null = null;

  constructor(
    private readonly session: CaptureSession,
    private readonly stationId: string,
  ) {}

  begin(): void {
    const { session } = this;
    const live = session.live.value;
    if (session.phase.value !== 'idle' || !live) return;
    const from = live.azimuthInRun;
    const stream = new SweepStream('', session.axis.value);
    const look: Looking = { from, turned: 0, last: from, stream, run: null, readings: [] };
    this.look = look;
    this.looking.value = true;
    session.onBreak = () => this.cancel();
    session.watchSamples((sample, run) => {
      look.run = run;
      const now = session.live.value?.azimuthInRun ?? look.last;
      look.turned += turnBetween(look.last, now);
      look.last = now;
      const chunk = stream.push(sample);
      if (chunk) void this.storeChunk(look, run, chunk);
    });
    session.tell({ what: 'open-start' });
  }

  async end(): Promise<void> {
    const { look, session } = this;
    if (!look?.run) return;
    this.cancel();
    const rest = look.stream.cut();
    if (rest) await this.storeChunk(look, look.run, rest);
    await session.record.settled();
    await this.store({
      run: look.run.id,
      azimuths: rangeOf(look.from, look.turned),
      lookedAt: new Date(Math.round(look.stream.samples[0].timeMs)).toISOString(),
      readings: look.readings,
    });
  }

  /** One tap for a whole gap between what was looked at, true azimuths. The phone points into it. */
  async gap(from: number, to: number): Promise<void> {
    const { session } = this;
    const heading = session.runNow?.heading;
    if (!heading) {
      session.refuse('no-north');
      return;
    }
    const reading = await session.hold();
    if (!reading) return;
    const offset = offsetAt(heading, Date.parse(reading.takenAt));
    await this.store({
      run: reading.run,
      azimuths: rangeOf(from - offset, to - from),
      lookedAt: reading.takenAt,
      readings: [reading.id],
    });
  }

  cancel(): void {
    this.look = null;
    this.looking.value = false;
    this.session.onBreak = null;
    this.session.watchSamples(null);
  }

  private async storeChunk(look: Looking, run: Run, chunk: readonly SensorSample[]): Promise<void> {
    const { session } = this;
    const reading = rawReading(session.services.newId(), run.id, look.stream.axis, chunk);
    if (!(await session.record.addReading(run, reading))) return;
    look.readings.push(reading.id);
    session.countStored();
  }

  private async store(facts: Omit<OpenLook, 'id' | 'order'>): Promise<void> {
    const id = this.session.services.newId();
    await this.session.act({
      edit: (survey) =>
        withStation(survey, this.stationId, (station) => ({
          ...station,
          openLooks: [...(station.openLooks ?? []), { id, order: nextOrder(station.openLooks), ...facts }],
        })),
      code: 'entry-added',
      title: 'Open horizon',
      news: { what: 'open' },
    });
  }
}

/** A range clockwise, whichever way it was turned, to a hundredth of a degree. */
export function rangeOf(from: number, turned: number): [number, number] {
  if (Math.abs(turned) >= 360) return [0, 360];
  const [start, end] = turned >= 0 ? [from, from + turned] : [from + turned, from];
  return [hundredths(start), hundredths(end)];
}

const hundredths = (azimuth: number) => fullCircle(Math.round(fullCircle(azimuth) * 100) / 100);
