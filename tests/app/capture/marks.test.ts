import { describe, expect, it } from 'vitest';
import { freeMarkName, markOf, marksOf, nameSighting } from '../../../src/app/capture/marks.ts';
import { PointTrace } from '../../../src/app/capture/point-trace.ts';
import { SweepTake } from '../../../src/app/capture/sweep-take.ts';
import type { TraceChoice } from '../../../src/app/capture/trace-choice.ts';
import { undoLast } from '../../../src/app/capture/undo-last.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import { cameraAt } from '../../sensors/posed-phone.ts';
import { inventedSitting } from './invented-sitting.ts';

const choice = (way: TraceChoice['way']): TraceChoice => ({
  obstruction: 'maple',
  shape: 'skyline',
  way,
  angularWidth: 1,
});
const held = (azimuth: number, elevation: number) => () => cameraAt(azimuth, elevation);

type Sitting = Awaited<ReturnType<typeof inventedSitting>>;

async function sight({ sensor }: Sitting, points: PointTrace, azimuth: number): Promise<void> {
  const taking = points.sight(choice('points'));
  sensor.give(held(azimuth, 12), 700);
  await taking;
}

describe('a point of a trace that is a mark', () => {
  it('is named after it was sighted, and is a sighting of its trace and of the mark', async () => {
    const sitting = await inventedSitting();
    const points = new PointTrace(sitting.session, 'A');
    await sight(sitting, points, 100);
    await sight(sitting, points, 120);
    await nameSighting(sitting.session, 'A', points.last.value!, 'gable tip');
    const [station] = (await sitting.stored()).stations;
    expect(station.traces[0].sightings.map(({ mark }) => mark)).toEqual([undefined, 'gable tip']);
    expect(station.markSightings).toBeUndefined();
    expect(sitting.session.news.value).toMatchObject({ what: 'mark', name: 'gable tip' });
  });

  it('may be named while it waits for its trace, and has its mark there', async () => {
    const sitting = await inventedSitting();
    const points = new PointTrace(sitting.session, 'A');
    await sight(sitting, points, 100);
    const first = points.last.value!;
    for (const name of ['gable tip', 'chimney']) await nameSighting(sitting.session, 'A', first, name);
    const waiting = (await sitting.stored()).stations[0];
    expect(markOf(waiting, first)).toBe('chimney');
    expect(points.waiting().map(({ id }) => id)).toEqual([first]);
    await sight(sitting, points, 120);
    const [station] = (await sitting.stored()).stations;
    expect(station.traces[0].sightings).toMatchObject([{ id: first, mark: 'chimney' }, { order: 1 }]);
    expect(station.markSightings).toBeUndefined();
  });

  it('loses its name again when that is taken back', async () => {
    const sitting = await inventedSitting();
    const points = new PointTrace(sitting.session, 'A');
    await sight(sitting, points, 100);
    await sight(sitting, points, 120);
    await nameSighting(sitting.session, 'A', points.last.value!, 'gable tip');
    await undoLast(sitting.services, sitting.session);
    const survey = await sitting.stored();
    expect(marksOf(survey)).toEqual([]);
    expect(survey.stations[0].traces[0].sightings).toHaveLength(2);
  });

  it('ties a run without north to one that has it', async () => {
    const sitting = await inventedSitting();
    const { session, sensor, stored } = sitting;
    const points = new PointTrace(session, 'A');
    await sight(sitting, points, 100);
    await nameSighting(session, 'A', points.last.value!, 'gable tip');
    await sight(sitting, points, 120);
    sensor.break();
    session.sensor.value = { state: 'on', kind: 'relative' };
    points.end();
    for (const azimuth of [40, 60]) {
      await sight(sitting, points, azimuth);
      if (azimuth === 40) await nameSighting(session, 'A', points.last.value!, 'gable tip');
    }
    const { runs, sightings } = pointSurvey(await stored());
    expect(runs.map(({ heading }) => heading?.source)).toEqual(['compass', 'tied']);
    const azimuths = [...sightings.values()].map(({ direction }) => direction!.azimuth);
    expect(azimuths[2]).toBeCloseTo(azimuths[0], 0);
    expect(azimuths[3]).toBeCloseTo(azimuths[1], 0);
  });
});

describe('a mark noted in a sweep', () => {
  const edge = (at: number) => cameraAt(100 + 60 * at, 20);

  it('is stored at once, and a sighting of the trace at its place in time', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sensor.give(edge, 20);
    sweep.begin();
    sensor.give((at) => edge(at / 2), 2000);
    await sweep.noteMark('M1');
    const during = (await stored()).stations[0];
    expect(during.markSightings).toMatchObject([{ readings: expect.any(Array) as [] }, { mark: 'M1' }]);
    sensor.give((at) => edge(0.5 + at / 2), 2000);
    await sweep.end();
    expect(freeMarkName(await stored())).toBe('M2');
    await sweep.finish(choice('sweep'), 'Maple');
    const survey = await stored();
    const [station] = survey.stations;
    const place = station.traces[0].sightings.findIndex(({ mark }) => mark === 'M1');
    expect(place).toBeGreaterThan(0);
    expect(place).toBeLessThan(station.traces[0].sightings.length - 1);
    expect(station.markSightings).toBeUndefined();
    const { sightings } = pointSurvey(survey);
    const azimuths = station.traces[0].sightings.map(({ id }) => sightings.get(id)!.direction!.azimuth);
    expect(azimuths[place] - azimuths[0]).toBeCloseTo(30, -1);
    expect(azimuths).toEqual([...azimuths].sort((a, b) => a - b));
    await nameSighting(session, 'A', sweep.lastMark.value!, 'spire');
    expect(marksOf(await stored())).toEqual(['spire']);
  });

  it('stays a sighting of the mark where the sweep is left out', async () => {
    const { session, sensor, stored } = await inventedSitting();
    const sweep = new SweepTake(session, 'A');
    sensor.give(edge, 20);
    sweep.begin();
    sensor.give(edge, 1000);
    await sweep.noteMark('M1');
    sensor.give(edge, 1000);
    await sweep.end();
    await sweep.drop();
    const survey = await stored();
    expect(survey.stations[0].markSightings).toMatchObject([{ mark: 'M1' }]);
    expect([...pointSurvey(survey).sightings.values()].every(({ direction }) => direction)).toBe(true);
  });
});
