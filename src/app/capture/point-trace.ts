import { signal } from '@preact/signals-core';
import { turnBetween } from '../../core/angles/angles.ts';
import { pointingOfSighting } from '../../core/pointing/reading-direction.ts';
import type { Reading, Sighting, Station, Survey } from '../../core/survey/survey.ts';
import type { RefusedWhy } from './capture-news.ts';
import type { CaptureSession, Taking } from './capture-session.ts';
import { withNotedMarks } from './marks.ts';
import {
  inOrder,
  looseSightings,
  stationOf,
  withOwnSighting,
  withStation,
  withTrace,
  withTracePoint,
  withoutOwnSightings,
} from './station-edits.ts';
import type { TraceChoice } from './trace-choice.ts';
import { FEWEST, traceFields } from './trace-choice.ts';

/** Neighbouring points this far apart or more have no edge between them, degrees; half the horizon is the limit. */
const FURTHEST = 175;

/**
 * A trace made point by point. Until it has enough of them to stand by itself, its points are loose sightings of the
 * station: safe on the device, and taken up again after a restart.
 */
export class PointTrace {
  /** The trace that the next point goes to; null where it begins one. */
  readonly trace = signal<string | null>(null);
  /** Id of the sighting taken last, which may be a mark. */
  readonly last = signal<string | null>(null);

  constructor(
    private readonly session: CaptureSession,
    private readonly stationId: string,
  ) {}

  /** Loose points that wait for a trace. */
  waiting(survey = this.session.record.survey): Sighting[] {
    return looseSightings(stationOf(survey, this.stationId)).filter(({ readings }) => readings === undefined);
  }

  /** Takes the next point. */
  async sight(choice: TraceChoice): Promise<void> {
    const id = this.session.services.newId();
    const taken = await this.session.takeHeld((reading, survey) => this.taking(id, reading, survey, choice));
    if (taken) this.last.value = id;
    const trace = this.traceNow(this.session.record.survey);
    if (choice.way === 'ridge' && trace && trace.sightings.length >= 2) this.trace.value = null;
  }

  /** Makes a trace of the waiting points, once it is known of what. */
  async finish(choice: TraceChoice, name: string): Promise<void> {
    const { obstruction } = choice;
    const waiting = this.waiting();
    this.trace.value = null;
    if (waiting.length === 0) return;
    if (obstruction === null) return;
    await this.session.act({
      edit: (survey) =>
        withStation(survey, this.stationId, (station) =>
          this.gathered(station, waiting, obstruction, choice, this.session.services.newId()),
        ),
      code: 'entry-added',
      title: name,
      news: { what: 'trace', name, count: waiting.length },
    });
  }

  /** Whether the waiting points are enough to stand by themselves. */
  enough({ shape }: TraceChoice): boolean {
    return this.waiting().length >= FEWEST[shape];
  }

  /** Leaves the waiting points out, too few to be a trace; their raw readings stay. */
  async drop(): Promise<void> {
    const ids = this.waiting().map(({ id }) => id);
    this.trace.value = null;
    await this.session.record.act(
      (survey) => withStation(survey, this.stationId, (station) => withoutOwnSightings(station, ids)),
      { code: 'entry-deleted', title: 'Sighting' },
    );
    this.session.refuse('too-short');
  }

  /** Ends the trace at work; the next point begins another. */
  end(): void {
    this.trace.value = null;
  }

  private traceNow(survey: Survey) {
    const { traces } = stationOf(survey, this.stationId);
    return traces.find(({ id }) => id === this.trace.value) ?? null;
  }

  private taking(
    sightingId: string,
    reading: Reading,
    survey: Survey,
    choice: TraceChoice,
  ): Taking | RefusedWhy {
    const sighting: Sighting = { id: sightingId, reading: reading.id };
    const trace = this.traceNow(survey);
    const waiting = this.waiting(survey);
    const last = (trace?.sightings ?? waiting).at(-1);
    if (last && isTooFar(survey, last, sighting)) return 'too-far-apart';
    const count = (trace?.sightings ?? waiting).length + 1;
    const named = survey.obstructions.find(({ id }) => id === choice.obstruction);
    const title = named?.name ?? 'Sighting';
    const act = { code: 'entry-added', title } as const;
    const edit = (change: (station: Station) => Station) => (one: Survey) =>
      withStation(one, this.stationId, change);
    if (trace)
      return {
        ...act,
        edit: edit((station) => withTracePoint(station, trace.id, sighting)),
        news: { what: 'point', name: title, count },
      };
    if (!named || count < FEWEST[choice.shape])
      return {
        ...act,
        edit: edit((station) => withOwnSighting(station, sighting)),
        news: { what: 'first-point', name: title, count },
      };
    const id = this.session.services.newId();
    this.trace.value = id;
    return {
      ...act,
      edit: edit((station) => this.gathered(station, [...waiting, sighting], named.id, choice, id)),
      news: { what: 'point', name: title, count },
    };
  }

  private gathered(
    station: Station,
    points: readonly Sighting[],
    obstruction: string,
    choice: TraceChoice,
    id: string,
  ): Station {
    const { points: marked, noted } = withNotedMarks(station, points);
    const without = withoutOwnSightings(station, [...points.map((point) => point.id), ...noted]);
    return withTrace(without, { id, obstruction, ...traceFields(choice), sightings: inOrder(marked) });
  }
}

/** Whether half the horizon lies between two sightings of one run. */
function isTooFar(survey: Survey, last: Sighting, next: Sighting): boolean {
  const readings = new Map(survey.readings.slice(-50).map((reading) => [reading.id, reading]));
  const [a, b] = [pointingOfSighting(last, readings), pointingOfSighting(next, readings)];
  return (
    a !== null && b !== null && a.run === b.run && Math.abs(turnBetween(a.azimuth, b.azimuth)) >= FURTHEST
  );
}
