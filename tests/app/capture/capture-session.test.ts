import { describe, expect, it } from 'vitest';
import { turnBetween } from '../../../src/core/angles/angles.ts';
import { AppError } from '../../../src/app/app-error.ts';
import { CaptureSession } from '../../../src/app/capture/capture-session.ts';
import { takeCheck, takeMark } from '../../../src/app/capture/heading-takes.ts';
import { OpenTake } from '../../../src/app/capture/open-take.ts';
import { takePlacing } from '../../../src/app/capture/plane-takes.ts';
import { PointTrace } from '../../../src/app/capture/point-trace.ts';
import { SweepTake } from '../../../src/app/capture/sweep-take.ts';
import type { TraceChoice } from '../../../src/app/capture/trace-choice.ts';
import { undoLast } from '../../../src/app/capture/undo-last.ts';
import { stationHorizon } from '../../../src/core/horizon/station-horizon.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { cameraAt, laidOn } from '../../sensors/posed-phone.ts';
import { inventedSitting } from './invented-sitting.ts';

const choice = (part: Partial<TraceChoice> = {}): TraceChoice => ({
  obstruction: 'maple',
  shape: 'skyline',
  way: 'sweep',
  angularWidth: 1,
  ...part,
});
const held = (azimuth: number, elevation: number) => () => cameraAt(azimuth, elevation);

describe('a hold', () => {
  it('stores its reading with all its rows, and is told only then', async () => {
    const { session, sensor, feedback, stored } = await inventedSitting();
    const taking = takeMark(session, 'A', 'gable tip');
    sensor.give(held(120, 15), 300);
    expect(session.phase.value).toBe('holding');
    expect(feedback.takes).toBe(0);
    sensor.give(held(120, 15), 500);
    await taking;
    expect(session.news.value).toMatchObject({ kind: 'stored', what: 'mark', name: 'gable tip' });
    expect([feedback.takes, session.stored.value]).toEqual([1, 1]);
    const { readings, runs, stations } = await stored();
    expect(readings).toHaveLength(1);
    expect(readings[0].samples!.length).toBeGreaterThan(20);
    expect(runs).toMatchObject([{ frame: 'magnetic', device: 'Invented phone' }]);
    expect(stations[0].markSightings).toMatchObject([{ mark: 'gable tip', reading: readings[0].id }]);
  });

  it('is refused while the phone moves, with nothing stored', async () => {
    const { session, sensor, feedback, stored } = await inventedSitting();
    const taking = takeMark(session, 'A', 'gable tip');
    sensor.give((at) => cameraAt(120 + 20 * at, 15), 700);
    await taking;
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'moving' });
    expect(feedback).toMatchObject({ takes: 0, refusals: 1 });
    expect((await stored()).readings).toEqual([]);
  });

  it('of angles that stand still is refused once, and taken when tapped again', async () => {
    const { session, sensor } = await inventedSitting();
    const pose = held(120, 15);
    sensor.give(pose, 2000, true);
    const first = session.hold();
    sensor.give(pose, 700, true);
    expect(await first).toBeNull();
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'frozen' });
    const second = session.hold();
    sensor.give(pose, 700, true);
    expect(await second).not.toBeNull();
  });

  it('that is broken off stores nothing, and what follows is another run', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const taking = takeMark(session, 'A', 'one');
    sensor.give(held(120, 15), 300);
    sensor.break();
    await taking;
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'broken' });
    for (const name of ['two', 'three']) {
      const again = takeMark(session, 'A', name);
      sensor.give(held(120, 15), 700);
      await again;
      sensor.break();
    }
    expect((await stored()).runs).toHaveLength(2);
  });

  it('is not told as stored where the device is full', async () => {
    const { session, sensor, services, feedback } = await inventedSitting();
    services.store.applyChanges = () => Promise.reject(new AppError('storage-full'));
    const taking = takeMark(session, 'A', 'gable tip');
    sensor.give(held(120, 15), 700);
    await taking;
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'not-stored' });
    expect(services.state.trouble.value).toMatchObject({ code: 'storage-full' });
    expect([feedback.takes, session.stored.value]).toEqual([0, 0]);
  });
});

describe('a sweep', () => {
  it('is stored in chunks of at most half a second as it comes, and becomes a trace of few points', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sensor.give(held(200, 5), 100);
    sweep.begin();
    const crown = (at: number) => cameraAt(200 + 30 * at, 5 + 20 * Math.sin(Math.PI * at));
    sensor.give(crown, 3000);
    await session.record.settled();
    expect((await stored()).readings.length).toBeGreaterThanOrEqual(6);
    expect(await sweep.end()).toBe(true);
    expect(await sweep.finish(choice(), 'Maple')).toBe(true);
    const survey = await stored();
    for (const { samples } of survey.readings) expect(samples!.at(-1)![0]).toBeLessThanOrEqual(500);
    const rows = survey.readings.reduce((sum, { samples }) => sum + samples!.length, 0);
    expect(rows).toBe(150);
    const [trace] = survey.stations[0].traces;
    expect(trace).toMatchObject({ obstruction: 'maple', shape: 'skyline', edge: 'drawn' });
    expect(trace.sightings.length).toBeGreaterThan(4);
    expect(trace.sightings.length).toBeLessThan(25);
    expect(survey.stations[0].markSightings).toBeUndefined();
  });

  it('cut off in the middle is found again, and can be made a trace of', async () => {
    const { session, sensor, services, stored } = await inventedSitting();
    new SweepTake(session, 'A').begin();
    sensor.give((at) => cameraAt(200 + 30 * at, 10), 2000);
    await session.record.settled();
    // another session on the same survey, as after a restart
    const later = await inventedSitting();
    const found = await stored();
    await later.services.store.erase('bare');
    await later.services.store.create(found);
    later.services.state.open.value = {
      id: 'bare',
      stored: { id: 'bare', deletedAt: null, state: 'readable', survey: found, warnings: [] },
    };
    const sweep = new SweepTake(later.session, 'A');
    expect(sweep.unfinished()).not.toBeNull();
    expect(await sweep.finish(choice(), 'Maple')).toBe(true);
    expect((await later.stored()).stations[0].traces).toHaveLength(1);
    expect(services.state.trouble.value).toBeNull();
  });

  it('all around over north is a full circle', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sweep.begin();
    sensor.give((at) => cameraAt((300 + 358 * at) % 360, 8), 8000);
    await sweep.end();
    await sweep.finish(choice(), 'Maple');
    expect((await stored()).stations[0].traces[0].fullCircle).toBe(true);
  });

  it('of a phone that did not move at all is refused', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sweep.begin();
    sensor.give(held(100, 10), 1000, true);
    expect(await sweep.end()).toBe(false);
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'frozen' });
    expect((await stored()).stations[0].markSightings).toBeUndefined();
  });
});

describe('points', () => {
  const sight = async (
    { session, sensor }: Awaited<ReturnType<typeof inventedSitting>>,
    points: PointTrace,
    azimuth: number,
    part: Partial<TraceChoice>,
  ) => {
    const taking = points.sight(choice(part));
    sensor.give(held(azimuth, 15), 700);
    await taking;
    return session.news.value;
  };

  it('wait until they can stand by themselves, then are a trace; a ridge ends with its second', async () => {
    const sitting = await inventedSitting();
    const points = new PointTrace(sitting.session, 'A');
    await sight(sitting, points, 100, { way: 'ridge' });
    expect((await sitting.stored()).stations[0].traces).toEqual([]);
    expect(points.waiting()).toHaveLength(1);
    await sight(sitting, points, 150, { way: 'ridge' });
    expect(points.trace.value).toBeNull();
    const [trace] = (await sitting.stored()).stations[0].traces;
    expect(trace).toMatchObject({ edge: 'straight', sightings: [{ order: 0 }, { order: 1 }] });
    expect(points.waiting()).toEqual([]);
  });

  it('half the horizon apart are not joined', async () => {
    const sitting = await inventedSitting();
    const points = new PointTrace(sitting.session, 'A');
    await sight(sitting, points, 10, { way: 'points' });
    expect(await sight(sitting, points, 190, { way: 'points' })).toMatchObject({ why: 'too-far-apart' });
    expect(points.waiting()).toHaveLength(1);
  });

  it('are taken back one by one; their readings stay with the survey', async () => {
    const sitting = await inventedSitting();
    const points = new PointTrace(sitting.session, 'A');
    for (const azimuth of [100, 120, 140]) await sight(sitting, points, azimuth, { way: 'points' });
    expect((await sitting.stored()).stations[0].traces[0].sightings).toHaveLength(3);
    await undoLast(sitting.services, sitting.session);
    expect((await sitting.stored()).stations[0].traces[0].sightings).toHaveLength(2);
    expect((await sitting.stored()).readings).toHaveLength(3);
  });

  it('are taken back no further than this sitting goes: an earlier act is left alone', async () => {
    const sitting = await inventedSitting();
    await sight(sitting, new PointTrace(sitting.session, 'A'), 100, { way: 'points' });
    const { services, sensor, feedback, stored } = sitting;
    const next = new CaptureSession(services, sensor, feedback, 'bare');
    await undoLast(services, next);
    expect(next.news.value).toMatchObject({ kind: 'refused', why: 'nothing-to-undo' });
    expect(services.state.steps.value.undo).not.toBeNull();
    expect((await stored()).stations).toHaveLength(1);
  });
});

describe('a heading check', () => {
  it('pointed too steeply to have a direction is refused, and no check is kept', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const taking = takeCheck(session, 'A', { method: 'known-mark', mark: 'church', bearing: 150 });
    sensor.give(held(140, 81), 700);
    expect(await taking).toBeNull();
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'too-steep' });
    expect((await stored()).stations[0].headingChecks).toBeUndefined();
  });

  it('corrects earlier sightings of its run, and moves the open ranges with them', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const open = new OpenTake(session, 'A');
    sensor.give(held(60, 2), 40);
    const before = session.live.value!.azimuth!;
    open.begin();
    sensor.give((at) => cameraAt(60 + 40 * at, 2), 1000);
    await open.end();
    const looked = (survey: Survey) => stationHorizon(survey, survey.stations[0]).observed[0];
    const [found] = (await stored()).stations[0].openLooks!;
    expect(found.azimuths[0]).toBeCloseTo(60, 0);
    expect(found.readings!.length).toBeGreaterThan(1);
    expect(Math.abs(looked(await stored())[0] - before)).toBeLessThan(1);
    const taking = takeCheck(session, 'A', { method: 'known-mark', mark: 'church', bearing: 150 });
    sensor.give(held(140, 5), 700);
    expect(await taking).not.toBeNull();
    const survey = await stored();
    const [run] = pointSurvey(survey).runs;
    expect(run.heading).toMatchObject({ source: 'check' });
    expect(run.heading!.offset).toBeCloseTo(10, 0);
    // the look began at 60 in the frame of the phone
    expect(looked(survey)[0]).toBeCloseTo(70, 0);
    // the last sample of the movement is a fiftieth short of its end
    expect(looked(survey)[1]).toBeCloseTo(109.2, 0);
    expect(survey.stations[0].openLooks).toEqual([found]);
  });

  it('gives what a phone without a compass found open its north, afterwards', async () => {
    const { session, sensor, stored } = await inventedSitting('relative');
    sensor.give(held(60, 2), 100);
    expect(session.live.value).toMatchObject({ azimuth: null, azimuthDeviation: null });
    const open = new OpenTake(session, 'A');
    await open.gap(10, 40);
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'no-north' });
    open.begin();
    sensor.give((at) => cameraAt(60 - 40 * at, 2), 1000);
    await open.end();
    const before = await stored();
    expect(stationHorizon(before, before.stations[0]).observed).toEqual([]);
    expect(pointSurvey(before).warnings.map(({ path }) => path)).toContain('stations[0].openLooks[0]');
    const taking = takeCheck(session, 'A', { method: 'known-mark', mark: 'church', bearing: 90 });
    sensor.give(held(20, 5), 700);
    await taking;
    const after = await stored();
    const [[from, to]] = stationHorizon(after, after.stations[0]).observed;
    // the last sample of the movement is a fiftieth short of its end
    expect(from).toBeCloseTo(90.8, 0);
    expect(to).toBeCloseTo(130, 0);
    expect(pointSurvey(after).warnings).toEqual([]);
  });

  it('turns what was called open in one tap', async () => {
    const { session, sensor, stored } = await inventedSitting();
    sensor.give(held(60, 2), 100);
    const calling = new OpenTake(session, 'A').gap(350, 375);
    sensor.give(held(0, 2), 700);
    await calling;
    const taking = takeCheck(session, 'A', { method: 'known-mark', mark: 'church', bearing: 30 });
    sensor.give(held(20, 5), 700);
    await taking;
    const survey = await stored();
    const turned = pointSurvey(survey).runs[0].checks[0].againstCompass!;
    const [from, to] = stationHorizon(survey, survey.stations[0]).observed[0];
    expect(turnBetween(350, from)).toBeCloseTo(turned, 0);
    expect(turnBetween(15, to)).toBeCloseTo(turned, 0);
  });
});

describe('the phone laid on a plane', () => {
  it('both ways round gives the tilt without the phone’s own error', async () => {
    const { session, sensor, stored } = await inventedSitting();
    session.lies = true;
    const lean = 0.8;
    for (const turned of [false, true]) {
      const { alpha, beta, gamma } = laidOn(35, 170, turned);
      const plane = (await stored()).planes[0];
      const taking = takePlacing(session, plane, 'flat');
      sensor.give(() => ({ alpha, beta: beta + lean, gamma }), 700, true);
      await taking;
    }
    const [plane] = (await stored()).planes;
    expect(plane.tiltPlacings).toHaveLength(2);
    expect(plane.surfaceTilt).toBeCloseTo(35, 0);
  });
});
