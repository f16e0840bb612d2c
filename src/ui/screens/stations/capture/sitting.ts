import { signal } from '@preact/signals';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { FacesTake } from '../../../../app/capture/faces-take.ts';
import { checkMethodLast, checksOf, tracedLast } from '../../../../app/capture/last-ways.ts';
import { OpenTake } from '../../../../app/capture/open-take.ts';
import { PointTrace } from '../../../../app/capture/point-trace.ts';
import { SweepTake } from '../../../../app/capture/sweep-take.ts';
import type { TraceChoice } from '../../../../app/capture/trace-choice.ts';
import type { HeadingMethodId, Reading, SightingAxis } from '../../../../core/survey/survey.ts';

/** The way of a heading check, or the test of the phone's own inclination. */
export type CheckWay = HeadingMethodId | 'two-face';

export type Task = 'trace' | 'open' | 'mark' | 'check';

/** All that one sitting at one station works with. */
export class Sitting {
  readonly task = signal<Task>('trace');
  readonly checkWay = signal<CheckWay>('sun-shadow');
  /** Opened with the heading, as at the stations before: a good check leads on to tracing. */
  headingFirst = false;
  readonly choice = signal<TraceChoice>({
    obstruction: null,
    shape: 'skyline',
    way: 'sweep',
    angularWidth: 1,
  });
  /** The obstruction traced last, offered again in one tap. */
  readonly last = signal<string | null>(null);
  readonly sweep: SweepTake;
  readonly points: PointTrace;
  readonly open: OpenTake;
  readonly faces: FacesTake;
  /** The heading check taken last. */
  readonly lastCheck = signal<string | null>(null);
  /** What things are sighted with while a shadow is laid along the phone's edge. */
  sightingAxis: SightingAxis;
  constructor(
    readonly session: CaptureSession,
    readonly stationId: string,
  ) {
    this.sweep = new SweepTake(session, stationId);
    this.points = new PointTrace(session, stationId);
    this.open = new OpenTake(session, stationId);
    this.faces = new FacesTake(session, stationId);
    this.sightingAxis = session.axis.peek();
    const { survey } = session.record;
    this.checkWay.value = checkMethodLast(survey) ?? 'sun-shadow';
    this.last.value = tracedLast(survey);
  }

  /** Whether the shadow of the sun is laid along the phone's edge: nobody needs a picture then. */
  get byShadow(): boolean {
    return this.task.value === 'check' && this.checkWay.value === 'sun-shadow';
  }

  /** After a heading check: once in a survey on to the two-face check; else on to tracing, if the check was good. */
  checked({ id, reading }: { id: string; reading: Reading }, mark: string): void {
    this.lastCheck.value = id;
    const axis = reading.axis ?? 'camera';
    const { session } = this;
    const sighted = this.byShadow ? this.sightingAxis : session.axis.value;
    const isOfMark = mark !== '' && axis === sighted;
    const isFirst = checksOf(session.record.survey).length === 1;
    if (isFirst && this.faces.leadOn(sighted, isOfMark ? reading : null, mark))
      this.checkWay.value = 'two-face';
    else if (this.headingFirst && this.isGood(id)) this.task.value = 'trace';
  }

  /** Whether a check counts and nothing speaks against it. */
  private isGood(id: string): boolean {
    const pointed = this.session.pointed.value;
    const found = pointed?.runs.flatMap(({ checks }) => checks).find(({ check }) => check === id);
    return (
      found !== undefined &&
      found.offset !== null &&
      !found.refused &&
      !pointed?.warnings.some(({ path }) => path.startsWith(found.path))
    );
  }

  choose(part: Partial<TraceChoice>): void {
    this.choice.value = { ...this.choice.value, ...part };
  }

  nameOf(id: string | null): string {
    return this.session.record.survey.obstructions.find((one) => one.id === id)?.name ?? '';
  }

  /** After a trace is stored: the next one is asked about anew, with this one in reach. */
  traced(): void {
    this.last.value = this.choice.value.obstruction;
    this.choose({ obstruction: null });
  }
}
