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

/** A picture with what is noted of it. */
type NewPhoto = TakenPicture & Pick<Photo, 'id' | 'of' | 'sha256' | 'reading'>;

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
  let after = survey;
  for (const picture of pictures) {
    const sha256 = await keepPicture(services, picture);
    after = withPhoto(after, { ...picture, id: services.newId(), of: subject, sha256 });
  }
  await changeSurvey(services, survey, after, 'entry-added', `Photo of ${name}`);
}

/** Keeps a picture; gives its hash. */
export const keepPicture = (
  { photos }: Pick<Needs, 'photos'>,
  { contents, type }: Pick<TakenPicture, 'contents' | 'type'>,
): Promise<string> => photos.keep({ contents, type });

/** The survey with a photo after the others. */
export function withPhoto(
  survey: Survey,
  { contents, takenAtMs, width, height, ...photo }: NewPhoto,
): Survey {
  const { id, of, sha256, reading } = photo;
  const row: Photo = {
    id,
    order: nextOrder(survey.photos),
    of,
    takenAt: new Date(takenAtMs).toISOString(),
    ...(reading !== undefined && { reading }),
    width,
    height,
    bytes: contents.byteLength,
    sha256,
  };
  return { ...survey, photos: [...(survey.photos ?? []), row] };
}

/** Notes the raw reading of where the camera looked, in place of what was typed. */
export async function aimPhotoByReading(
  services: Needs,
  survey: Survey,
  photo: Photo,
  name: string,
  reading: string,
): Promise<void> {
  const photos = survey.photos?.map((other) =>
    other.id === photo.id ? { ...other, azimuth: undefined, reading } : other,
  );
  await changeSurvey(services, survey, { ...survey, photos }, 'entry-changed', `Photo of ${name}`);
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
