import type { Photo, PhotoSubject, Survey } from '../../core/survey/survey.ts';
import type { AppServices } from '../app-services.ts';
import { nextOrder } from '../capture/station-edits.ts';
import { changeSurvey } from './change-survey.ts';

type Needs = Pick<AppServices, 'state' | 'store' | 'photos' | 'newId'>;

/** A picture ready to be kept, and when it was taken. */
export interface TakenPicture {
  contents: ArrayBuffer;
  type: string;
  width: number;
  height: number;
  takenAtMs: number;
}

/** The photos of one thing, in their order. */
export const photosOf = (survey: Survey, { kind, id }: PhotoSubject): Photo[] =>
  (survey.photos ?? []).filter(({ of }) => of.kind === kind && of.id === id);

/** Keeps pictures, then notes them in the survey as one step; `name` says of what they are. */
export async function addPhotos(
  services: Needs,
  survey: Survey,
  subject: PhotoSubject,
  name: string,
  pictures: readonly TakenPicture[],
): Promise<void> {
  const photos = [...(survey.photos ?? [])];
  for (const { contents, type, width, height, takenAtMs } of pictures) {
    const sha256 = await services.photos.keep({ contents, type });
    photos.push({
      id: services.newId(),
      order: nextOrder(photos),
      of: subject,
      takenAt: new Date(takenAtMs).toISOString(),
      width,
      height,
      bytes: contents.byteLength,
      sha256,
    });
  }
  await changeSurvey(services, survey, { ...survey, photos }, 'entry-added', `Photo of ${name}`);
}

/** Notes where the camera looked; undefined takes that away. */
export async function aimPhoto(
  services: Needs,
  survey: Survey,
  photo: Photo,
  name: string,
  azimuth: number | undefined,
): Promise<void> {
  const photos = survey.photos?.map((other) => (other.id === photo.id ? { ...other, azimuth } : other));
  await changeSurvey(services, survey, { ...survey, photos }, 'entry-changed', `Photo of ${name}`);
}

/** Takes a photo out of the survey. Its picture stays on the device until the unused ones are erased. */
export async function deletePhoto(
  services: Needs,
  survey: Survey,
  photo: Photo,
  name: string,
): Promise<void> {
  const { photos, ...rest } = survey;
  const left = photos?.filter(({ id }) => id !== photo.id) ?? [];
  const after = left.length > 0 ? { ...rest, photos: left } : rest;
  await changeSurvey(services, survey, after, 'entry-deleted', `Photo of ${name}`);
}
