import { signal } from '@preact/signals-core';
import { fullCircle, turnBetween } from '../../core/angles/angles.ts';
import type { CaptureSession } from './capture-session.ts';
import type { LookedRange } from './heading-takes.ts';
import { rawReading } from './raw-reading.ts';
import { withStation } from './station-edits.ts';
import { SweepStream } from './sweep-stream.ts';

/** Looked from here to there, and it is open. The stream of the look is kept as evidence. */
export class OpenTake {
  /** Azimuth where the look began; null while none is at work. */
  readonly from = signal<number | null>(null);
  /** Ranges of this sitting, which a later heading check of the same run moves. */
  readonly looked: LookedRange[] = [];
  private turned = 0;
  private last = 0;
  private run = '';

  constructor(
    private readonly session: CaptureSession,
    private readonly stationId: string,
  ) {}

  begin(): void {
    const { session } = this;
    const azimuth = session.live.value?.azimuth ?? null;
    if (session.phase.value !== 'idle') return;
    if (azimuth === null) {
      session.refuse('no-north');
      return;
    }
    this.from.value = this.last = azimuth;
    this.turned = 0;
    const stream = new SweepStream('', session.axis.value);
    session.onBreak = () => this.cancel();
    session.watchSamples((sample, run) => {
      this.run = run.id;
      const now = session.live.value?.azimuth ?? this.last;
      this.turned += turnBetween(this.last, now);
      this.last = now;
      const chunk = stream.push(sample);
      if (!chunk) return;
      const reading = rawReading(session.services.newId(), run.id, stream.axis, chunk);
      void session.record.addReading(run, reading).then((stored) => stored && session.countStored());
    });
    session.tell({ what: 'open-start' });
  }

  async end(): Promise<void> {
    const from = this.from.value;
    if (from === null) return;
    const { turned, run } = this;
    this.cancel();
    await this.session.record.settled();
    await this.store(rangeOf(from, turned), run);
  }

  /** One tap for a whole gap between what was looked at. */
  gap(from: number, to: number): Promise<void> {
    return this.store(rangeOf(from, fullCircle(to - from)), this.session.runNow?.id ?? '');
  }

  cancel(): void {
    this.from.value = null;
    this.session.onBreak = null;
    this.session.watchSamples(null);
  }

  private async store(range: [number, number], run: string): Promise<void> {
    const stored = await this.session.act({
      edit: (survey) =>
        withStation(survey, this.stationId, (station) => ({
          ...station,
          observedOpen: [...(station.observedOpen ?? []), range],
        })),
      code: 'entry-added',
      title: 'Open horizon',
      news: { what: 'open' },
    });
    if (stored) this.looked.push({ run, range });
  }
}

/** A range clockwise, whichever way it was turned, to a tenth of a degree. */
export function rangeOf(from: number, turned: number): [number, number] {
  if (Math.abs(turned) >= 360) return [0, 360];
  const [start, end] = turned >= 0 ? [from, from + turned] : [from + turned, from];
  return [tenths(start), tenths(end)];
}

const tenths = (azimuth: number) => fullCircle(Math.round(fullCircle(azimuth) * 10) / 10);
