import { signal } from '@preact/signals-core';
import { pointSurvey } from '../../core/pointing/point-survey.ts';
import type { PointedRun, PointedSurvey } from '../../core/pointing/pointed-survey.ts';
import { steadiness } from '../../core/pointing/steadiness.ts';
import type { Reading, ReadingSample, Run, SightingAxis, Survey } from '../../core/survey/survey.ts';
import type { AppServices } from '../app-services.ts';
import type { CaptureNews, RefusedWhy, StoredNews } from './capture-news.ts';
import { CaptureRecord, type Act } from './capture-record.ts';
import { CompassWatch, MOST_WANDER } from './compass-watch.ts';
import { Hold } from './hold.ts';
import { livePointing, type LivePointing } from './live-pointing.ts';
import { rawReading } from './raw-reading.ts';
import type { Feedback, OrientationKind, OrientationSensor, SensorSample } from './sensor-interfaces.ts';
import { sampleRow } from './sensor-interfaces.ts';

export type SensorState =
  | { state: 'off' | 'starting' }
  | { state: 'on'; kind: OrientationKind }
  | { state: 'failed'; why: 'refused' | 'no-sensor' | 'no-angles' };

type Needs = Pick<AppServices, 'state' | 'store' | 'newId'>;

/** What a take does to the survey once its reading is stored. */
export interface Taking extends Act {
  edit: (survey: Survey) => Survey;
  news: StoredNews;
}

/** Somebody sees every sample, such as a sweep at work. */
type Watcher = (sample: SensorSample, run: Run) => void;

/**
 * One sitting with the sensor: the angles as they come, the run they belong to, holds, and what came of the last tap.
 * Nothing is told as stored before it is durable.
 */
export class CaptureSession {
  readonly sensor = signal<SensorState>({ state: 'off' });
  readonly axis = signal<SightingAxis>('camera');
  readonly phase = signal<'idle' | 'holding' | 'storing' | 'sweeping'>('idle');
  readonly live = signal<LivePointing | null>(null);
  readonly news = signal<CaptureNews | null>(null);
  /** Readings of this sitting that are known to be on the device. */
  readonly stored = signal(0);
  /** Whether compass and gyroscope disagree: a sign of steel. */
  readonly disturbed = signal(false);
  readonly pointed = signal<PointedSurvey | null>(null);
  readonly record: CaptureRecord;
  /** Whether the phone lies on something, where it may well be quite still. */
  lies = false;
  private inHand = true;
  private run: Run | null = null;
  private lastSample: SensorSample | null = null;
  private pointedRun: PointedRun | null = null;
  private held: { hold: Hold; done: (samples: readonly SensorSample[] | null) => void } | null = null;
  private watcher: Watcher | null = null;
  private watch = new CompassWatch();
  private told = 0;
  private readonly endings: (() => void)[] = [];

  constructor(
    readonly services: Needs,
    readonly orientation: OrientationSensor,
    private readonly feedback: Feedback,
    surveyId: string,
  ) {
    this.record = new CaptureRecord(services, surveyId);
  }

  /** Starts the sensor; called inside a tap, since it may ask for permission. */
  async start(): Promise<void> {
    this.feedback.prime();
    this.sensor.value = { state: 'starting' };
    const outcome = await this.orientation.start();
    if (!outcome.ok) {
      this.sensor.value = { state: 'failed', why: outcome.why };
      return;
    }
    this.sensor.value = { state: 'on', kind: outcome.kind };
    this.refresh();
    this.endings.push(
      this.orientation.listen((sample) => this.onSample(sample)),
      this.orientation.onBreak(() => this.breakOff()),
    );
  }

  stop(): void {
    this.breakOff();
    for (const end of this.endings.splice(0)) end();
    this.orientation.stop();
    this.sensor.value = { state: 'off' };
  }

  /** Holds for half a second, stores what was read, and gives it; null where it was refused, which has been told. */
  async hold(): Promise<Reading | null> {
    if (this.phase.value !== 'idle' || this.sensor.value.state !== 'on') return null;
    this.phase.value = 'holding';
    const axis = this.axis.value;
    const samples = await new Promise<readonly SensorSample[] | null>((done) => {
      this.held = { hold: new Hold(axis), done };
    });
    this.held = null;
    const { run } = this;
    if (!samples || !run) return this.refuse('broken');
    const found = steadiness(judgedRows(samples), { axis, handHeld: this.inHand && !this.lies });
    // a phone that rests on something is quite still too: a second tap says so
    const wasFrozen = this.inHand && !found.steady && found.reason === 'frozen';
    this.inHand = !wasFrozen && !this.lies;
    if (!found.steady)
      return found.reason === 'moving'
        ? this.refuse('moving', Math.max(found.turned, found.scatter))
        : this.refuse(wasFrozen ? 'frozen' : 'broken');
    const reading = rawReading(this.services.newId(), run.id, axis, samples);
    return this.storeReading(run, reading);
  }

  /** Stores how the camera looks at this instant, moving or not; null where it could not be, which has been told. */
  async readNow(): Promise<Reading | null> {
    const { run, lastSample } = this;
    if (!run || !lastSample) return this.refuse('broken');
    return this.storeReading(run, rawReading(this.services.newId(), run.id, 'camera', [lastSample]));
  }

  /** A hold and one act on the survey with its reading. */
  async takeHeld(taking: (reading: Reading, survey: Survey) => Taking | RefusedWhy): Promise<Reading | null> {
    const reading = await this.hold();
    return reading && (await this.act(taking(reading, this.record.survey))) ? reading : null;
  }

  /** One act on the survey, told as stored once it is. */
  async act(taking: Taking | RefusedWhy): Promise<boolean> {
    if (typeof taking === 'string') return this.refuse(taking) !== null;
    const { edit, news, ...act } = taking;
    if (!(await this.record.act(edit, act))) return this.refuse('not-stored') !== null;
    this.refresh();
    this.tell(news);
    return true;
  }

  /** Lets somebody see every sample from now on; the phase is theirs until they let go. */
  watchSamples(watcher: Watcher | null): void {
    this.watcher = watcher;
    this.phase.value = watcher ? 'sweeping' : 'idle';
  }

  /** Counts a reading that is known to be stored. */
  countStored(): void {
    this.stored.value++;
  }

  tell(news: StoredNews): void {
    this.news.value = { ...news, kind: 'stored', number: ++this.told };
    this.feedback.taken();
  }

  refuse(why: RefusedWhy, degrees?: number): null {
    this.phase.value = 'idle';
    this.news.value = { kind: 'refused', why, degrees, number: ++this.told };
    this.feedback.refused();
    return null;
  }

  /** Points the survey anew, with the run at work even before it has a reading. */
  refresh(): void {
    const { survey } = this.record;
    const { run } = this;
    const isNew = run && !survey.runs.some(({ id }) => id === run.id);
    this.pointed.value = pointSurvey(isNew ? { ...survey, runs: [...survey.runs, run] } : survey);
    this.pointedRun = this.pointed.value.runs.find(({ id }) => id === run?.id) ?? null;
  }

  /** The run at work, as pointed; null before the first sample. */
  get runNow(): PointedRun | null {
    return this.pointedRun;
  }

  private async storeReading(run: Run, reading: Reading): Promise<Reading | null> {
    this.phase.value = 'storing';
    if (!(await this.record.addReading(run, reading))) return this.refuse('not-stored');
    this.phase.value = 'idle';
    this.countStored();
    this.refresh();
    return reading;
  }

  private onSample(sample: SensorSample): void {
    const run = (this.run ??= this.newRun(sample));
    this.lastSample = sample;
    this.live.value = livePointing(sample, this.axis.value, this.pointedRun);
    const apart = this.watch.apart(sample);
    if (apart !== null && apart > MOST_WANDER) this.disturbed.value = true;
    const samples = this.held?.hold.push(sample);
    if (samples) this.held?.done(samples);
    this.watcher?.(sample, run);
  }

  private newRun(sample: SensorSample): Run {
    const { sensor, orientation } = this;
    const kind = sensor.value.state === 'on' ? sensor.value.kind : 'relative';
    this.run = {
      id: this.services.newId(),
      device: orientation.device,
      frame: kind === 'magnetic' ? 'magnetic' : 'relative',
      startedAt: new Date(Math.round(sample.timeMs)).toISOString(),
    };
    this.refresh();
    return this.run;
  }

  /** What comes after belongs to another run: nobody knows how the phone was turned meanwhile. */
  private breakOff(): void {
    this.held?.done(null);
    this.run = null;
    this.lastSample = null;
    this.pointedRun = null;
    this.disturbed.value = false;
    this.watch = new CompassWatch();
    this.onBreak?.();
  }

  /** Told when the run ends, so that a sweep at work ends too. */
  onBreak: (() => void) | null = null;
}

/** Rows to judge a hold by: the last event of the platform first, since it is silent while nothing moves. */
function judgedRows(samples: readonly SensorSample[]): ReadingSample[] {
  const [first] = samples;
  const startMs = Math.min(first.eventMs, first.timeMs);
  const event = { ...first, timeMs: startMs };
  return [event, ...samples].map((sample) => sampleRow(sample, startMs));
}
