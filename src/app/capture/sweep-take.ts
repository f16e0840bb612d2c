import { signal } from '@preact/signals-core';
import type { Reading, Run, Sighting, Survey } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import { rawReading } from './raw-reading.ts';
import type { SensorSample } from './sensor-interfaces.ts';
import { sampleRow } from './sensor-interfaces.ts';
import {
  looseSightings,
  stationOf,
  withOwnSighting,
  withStation,
  withTrace,
  withoutOwnSightings,
} from './station-edits.ts';
import { marksInSweep, sweepSightings, withMarksIn } from './swept-sightings.ts';
import { SweepStream } from './sweep-stream.ts';
import type { TraceChoice } from './trace-choice.ts';
import { FEWEST, traceFields } from './trace-choice.ts';

/**
 * A sweep along an edge. Its stream is stored in chunks as it comes, under one loose sighting of the station, so that a
 * sweep that is cut off is still there after a restart and can be made a trace of then.
 */
export class SweepTake {
  private stream: SweepStream | null = null;
  private chunks: string[] = [];
  private failed = false;
  private lastRun: Run | null = null;
  /** Id of the mark noted last in a sweep. */
  readonly lastMark = signal<string | null>(null);

  constructor(
    private readonly session: CaptureSession,
    private readonly stationId: string,
  ) {}

  /** The sweep cut off or not yet said to be of anything, if there is one. */
  unfinished(survey = this.session.record.survey): Sighting | null {
    const loose = looseSightings(stationOf(survey, this.stationId));
    return loose.find(({ readings }) => readings !== undefined) ?? null;
  }

  /** Samples of the sweep at work, for the live figures. */
  get samples(): readonly SensorSample[] {
    return this.stream?.samples ?? [];
  }

  begin(): void {
    if (this.session.phase.value !== 'idle') return;
    this.stream = new SweepStream(this.session.services.newId(), this.session.axis.value);
    this.chunks = [];
    this.failed = false;
    this.lastMark.value = null;
    this.session.news.value = null;
    this.session.onBreak = () => void this.end();
    this.lastRun = null;
    this.session.watchSamples((sample, run) => {
      this.lastRun = run;
      const chunk = this.stream?.push(sample);
      if (chunk) void this.store(chunk, run);
    });
  }

  /** Notes where the phone points now as a mark of that name; the stream up to it is stored at once. */
  async noteMark(mark: string): Promise<void> {
    const { stream, session, lastRun: run } = this;
    const chunk = stream?.cut();
    if (!stream || !run || !chunk) return;
    const id = session.services.newId();
    const [sampleAt] = sampleRow(chunk[chunk.length - 1], Math.round(chunk[0].timeMs));
    if (!(await this.store(chunk, run, stream, { id, sampleAt, mark }))) return;
    this.lastMark.value = id;
    session.tell({ what: 'mark', name: mark });
  }

  /** Ends the sweep and waits until all of it is stored. False where there is nothing to make a trace of. */
  async end(): Promise<boolean> {
    const { stream, session } = this;
    if (!stream) return false;
    this.stream = null;
    session.onBreak = null;
    session.watchSamples(null);
    const rest = stream.cut();
    const run = this.lastRun;
    if (rest && run) await this.store(rest, run, stream);
    await session.record.settled();
    if (this.failed) return session.refuse('not-stored') !== null;
    session.refresh();
    if (stream.samples.length < 2 || stream.isFrozen) {
      await this.drop();
      return session.refuse(stream.isFrozen ? 'frozen' : 'too-short') !== null;
    }
    session.tell({ what: 'sweep' });
    return true;
  }

  /** Makes a trace of the unfinished sweep. */
  async finish(choice: TraceChoice, name: string): Promise<boolean> {
    const { session, stationId } = this;
    const sweep = this.unfinished();
    const { obstruction } = choice;
    if (!sweep || obstruction === null) return false;
    const chunks = readingsOf(session.record.survey, sweep);
    const marks = marksInSweep(stationOf(session.record.survey, stationId), sweep);
    const swept = sweepSightings(chunks, session.services.newId);
    if (swept.sightings.length < FEWEST[choice.shape]) {
      await this.drop();
      return session.refuse('too-short') !== null;
    }
    const sightings = withMarksIn(swept.sightings, marks, chunks);
    const without = (ids: string[]) => (survey: Survey) =>
      withStation(survey, stationId, (station) => withoutOwnSightings(station, ids));
    const fullCircle = swept.fullCircle && choice.shape === 'skyline';
    return session.act({
      edit: (survey) =>
        withStation(without([sweep.id, ...marks.map(({ id }) => id)])(survey), stationId, (station) =>
          withTrace(station, {
            id: session.services.newId(),
            obstruction,
            ...traceFields({ ...choice, way: 'sweep' }),
            ...(fullCircle && { fullCircle }),
            sightings,
          }),
        ),
      back: without([sweep.id]),
      code: 'entry-added',
      title: name,
      news: { what: 'trace', name, count: sightings.length },
    });
  }

  /** Leaves the unfinished sweep out; its raw readings stay. */
  async drop(): Promise<void> {
    const sweep = this.unfinished();
    if (!sweep) return;
    await this.session.record.act(
      (survey) => withStation(survey, this.stationId, (station) => withoutOwnSightings(station, [sweep.id])),
      { code: 'entry-deleted', title: 'Sweep' },
    );
  }

  private async store(
    chunk: readonly SensorSample[],
    run: Run,
    stream = this.stream,
    mark?: Pick<Sighting, 'id' | 'sampleAt' | 'mark'>,
  ): Promise<boolean> {
    if (!stream) return false;
    const { session, stationId } = this;
    const id = session.services.newId();
    this.chunks = [...this.chunks, id];
    const sighting: Sighting = { id: stream.sightingId, readings: this.chunks };
    const reading: Reading = rawReading(id, run.id, stream.axis, chunk);
    const stored = await session.record.addReading(run, reading, (survey) =>
      withStation(survey, stationId, (station) => {
        const swept = withOwnSighting(station, sighting);
        return mark ? withOwnSighting(swept, { ...mark, reading: id }) : swept;
      }),
    );
    if (stored) session.countStored();
    else {
      this.failed = true;
      void this.end();
    }
    return stored;
  }
}

/** Raw readings of a sweep in the order they were taken. */
export function readingsOf(survey: Survey, { readings = [] }: Sighting): Reading[] {
  const byId = new Map(survey.readings.map((reading) => [reading.id, reading]));
  return readings.flatMap((id) => byId.get(id) ?? []);
}
