import { describe, expect, it } from 'vitest';
import { aimPhoto, aimPhotoByReading } from '../../../src/app/actions/photos.ts';
import { takeCheck } from '../../../src/app/capture/heading-takes.ts';
import { takePhoto } from '../../../src/app/capture/photo-take.ts';
import type { CameraView } from '../../../src/app/capture/sensor-interfaces.ts';
import type { PhotoStore } from '../../../src/app/photo-store.ts';
import { photoAzimuth } from '../../../src/core/pointing/photo-azimuth.ts';
import { pointSurvey } from '../../../src/core/pointing/point-survey.ts';
import type { Survey } from '../../../src/core/survey/survey.ts';
import { cameraAt } from '../../sensors/posed-phone.ts';
import { inventedSitting } from './invented-sitting.ts';

const NOW = Date.parse('2026-05-14T09:30:00.000Z');
const HASH = 'b'.repeat(64);
const view = (works = true): CameraView => ({
  showIn: () => undefined,
  close: () => undefined,
  grab: () =>
    Promise.resolve(works ? { contents: new ArrayBuffer(9), type: 'image/jpeg', width: 4, height: 3 } : null),
});
const photos: PhotoStore = {
  keep: () => Promise.resolve(HASH),
  picture: () => Promise.resolve(null),
  unused: () => Promise.resolve({ count: 0, bytes: 0 }),
  eraseUnused: () => Promise.resolve(),
};
const STATION = { kind: 'station', id: 'A' } as const;

async function photographed(works = true) {
  const sitting = await inventedSitting();
  const services = { ...sitting.services, photos, now: () => NOW };
  sitting.sensor.give(() => cameraAt(140, 10), 200);
  await takePhoto(services, sitting.session, view(works), STATION, 'A');
  return { ...sitting, services };
}

const direction = (survey: Survey, place = 0) =>
  photoAzimuth(survey.photos![place], survey, pointSurvey(survey));

describe('a photo taken while sighting', () => {
  it('is noted with its instant and the raw reading of where the camera looked', async () => {
    const { stored, session, feedback } = await photographed();
    const survey = await stored();
    expect(survey.photos).toMatchObject([
      { of: STATION, takenAt: '2026-05-14T09:30:00.000Z', sha256: HASH, width: 4, height: 3, bytes: 9 },
    ]);
    expect(survey.readings.map(({ id }) => id)).toEqual([survey.photos![0].reading]);
    expect(survey.readings[0]).toMatchObject({ axis: 'camera' });
    expect(session.news.value).toMatchObject({ kind: 'stored', what: 'photo', name: 'A' });
    expect(feedback.takes).toBe(1);
  });

  it('looks where the camera looked, and turns with its run after a heading check', async () => {
    const { stored, session, sensor } = await photographed();
    const before = direction(await stored())!;
    expect(before.standardDeviation).toBeGreaterThan(2);
    const taking = takeCheck(session, 'A', { method: 'known-mark', mark: 'church', bearing: 150 });
    sensor.give(() => cameraAt(146, 5), 700);
    await taking;
    const after = direction(await stored())!;
    // the camera looked 6 degrees to the left of the church
    expect(after.azimuth).toBeCloseTo(144, 0);
    expect(after.standardDeviation).toBeLessThan(before.standardDeviation!);
  });

  it('is refused where the camera shows nothing', async () => {
    const { stored, session } = await photographed(false);
    expect((await stored()).photos).toBeUndefined();
    expect(session.news.value).toMatchObject({ kind: 'refused', why: 'no-picture' });
  });
});

describe('the direction of a photo', () => {
  it('is what somebody typed, until the phone reads it again', async () => {
    const { stored, services, session, sensor } = await photographed();
    let survey = await stored();
    await aimPhoto(services, survey, survey.photos![0], 'A', 33);
    survey = await stored();
    expect(direction(survey)).toEqual({ azimuth: 33, standardDeviation: null });
    const holding = session.hold();
    sensor.give(() => cameraAt(80, 5), 700);
    const reading = (await holding)!;
    survey = await stored();
    await aimPhotoByReading(services, survey, survey.photos![0], 'A', reading.id);
    survey = await stored();
    expect(survey.photos![0]).not.toHaveProperty('azimuth');
    expect(direction(survey)!.azimuth).toBeCloseTo(80 + pointSurvey(survey).runs[0].heading!.offset, 0);
  });

  it('is not told of a photo of the ground, nor by a run without north', async () => {
    const { stored, session, sensor, services } = await photographed();
    sensor.give(() => cameraAt(80, -85), 200);
    await takePhoto(services, session, view(), STATION, 'A');
    const survey = await stored();
    expect(direction(survey, 0)).not.toBeNull();
    expect(direction(survey, 1)).toBeNull();
    const relative = { ...survey, runs: survey.runs.map((run) => ({ ...run, frame: 'relative' as const })) };
    expect(direction(relative)).toBeNull();
  });
});
