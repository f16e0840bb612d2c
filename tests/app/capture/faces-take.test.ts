import { describe, expect, it } from 'vitest';
import { FacesTake } from '../../../src/app/capture/faces-take.ts';
import { takeCheck } from '../../../src/app/capture/heading-takes.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import { cameraAt, cameraTurnedOver } from '../../sensors/posed-phone.ts';
import { inventedSitting } from './invented-sitting.ts';

/** What is wrong with the inclination of the phone under test, degrees. */
const OFF = 0.9;
const upright = (azimuth: number) => () => cameraAt(azimuth, 5 + OFF);
const over = (azimuth: number) => () => cameraTurnedOver(azimuth, 5 - OFF);

async function checkedSitting() {
  const sitting = await inventedSitting();
  const { session, sensor } = sitting;
  const faces = new FacesTake(session, 'A');
  session.live.subscribe((live) => void (live && faces.follow(live)));
  const check = async () => {
    const taking = takeCheck(session, 'A', { method: 'known-mark', mark: 'church', bearing: 150 });
    sensor.give(upright(140), 700);
    return (await taking)!;
  };
  /** Stored writes come between samples. */
  const give = async (pose: ReturnType<typeof upright>, ms: number) => {
    for (let given = 0; given < ms; given += 100) {
      sensor.give(pose, 100);
      await session.record.settled();
      await new Promise((resolve) => setTimeout(resolve));
    }
  };
  return { ...sitting, faces, check, give };
}

describe('a heading check', () => {
  it('leads on to the second face of its mark, which is taken by itself and is an entry of its own', async () => {
    const { faces, check, give, stored, session } = await checkedSitting();
    const { id, reading } = await check();
    expect(faces.leadOn('camera', reading, 'church')).toBe(true);
    await give(upright(140), 1500);
    expect((await stored()).stations[0].indexChecks).toBeUndefined();
    await give(over(140), 2000);
    const survey = await stored();
    const [station] = survey.stations;
    expect(station.headingChecks).toMatchObject([{ id, reading: reading.id }]);
    expect(station.indexChecks).toMatchObject([{ id: faces.done.value, upright: reading.id }]);
    expect(survey.readings.map((one) => one.id)).toEqual([reading.id, station.indexChecks![0].turned]);
    const { index } = pointSurvey(survey).runs[0];
    expect(index.camera).toMatchObject({ source: 'two-face' });
    expect(index.camera.value).toBeCloseTo(-OFF, 1);
    expect(session.news.value).toMatchObject({ kind: 'stored', what: 'face-turned' });
  });

  it('leads on once in a sitting, and not where the phone was turned over before', async () => {
    const { faces, check, give, session } = await checkedSitting();
    const { reading } = await check();
    expect(faces.leadOn('camera', reading, 'church')).toBe(true);
    faces.skip();
    expect(faces.leadOn('camera', reading, 'church')).toBe(false);
    const again = new FacesTake(session, 'A');
    session.live.subscribe((live) => void (live && again.follow(live)));
    expect(again.leadOn('camera', reading, 'church')).toBe(true);
    await give(over(140), 2000);
    expect(new FacesTake(session, 'A').leadOn('camera', reading, 'church')).toBe(false);
    expect(new FacesTake(session, 'A').leadOn('top-edge', null, '')).toBe(true);
  });

  it('that is skipped takes no second face', async () => {
    const { faces, check, give, stored } = await checkedSitting();
    const { reading } = await check();
    faces.leadOn('camera', reading, 'church');
    faces.skip();
    await give(over(140), 2000);
    expect((await stored()).stations[0].indexChecks).toBeUndefined();
    expect((await stored()).readings).toHaveLength(1);
  });

  it('by shadow leads on to both faces', async () => {
    const { faces, give, sensor, stored } = await checkedSitting();
    expect(faces.leadOn('camera', null, '')).toBe(true);
    await give(upright(140), 1200);
    expect((await stored()).readings).toEqual([]);
    const first = faces.take();
    sensor.give(upright(140), 700);
    await first;
    await give(over(140), 2000);
    expect((await stored()).stations[0].indexChecks).toHaveLength(1);
  });

  it('takes no face while the phone is moved', async () => {
    const { faces, check, sensor, session, stored } = await checkedSitting();
    const { reading } = await check();
    faces.leadOn('camera', reading, 'church');
    sensor.give((at) => cameraTurnedOver(100 + 60 * at, 5), 4000);
    await session.record.settled();
    expect((await stored()).readings).toHaveLength(1);
    expect(session.news.value).toMatchObject({ kind: 'stored', what: 'check' });
  });
});
