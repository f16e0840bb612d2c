import type { PhotoStore } from '../../../app/photo-store.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import type { PhotoImage } from '../../../report/contents/report-contents.ts';

/** Longer side of a picture in a report, dots; at most so many bytes, so that six go in a mail. */
const LONGEST_SIDE = 1000;
const MOST_BYTES = 130_000;
const QUALITIES = [0.78, 0.66, 0.54, 0.42];

/** The pictures of a survey's photos, made small enough for a report; what is not on this device is left out. */
export async function reportPhotos(photos: PhotoStore, survey: Survey): Promise<Map<string, PhotoImage>> {
  const images = new Map<string, PhotoImage>();
  for (const { sha256 } of survey.photos ?? []) {
    const picture = await photos.picture(sha256);
    const image = picture && (await smallImage(new Blob([picture.contents], { type: picture.type })));
    if (image) images.set(sha256, image);
  }
  return images;
}

async function smallImage(picture: Blob): Promise<PhotoImage | null> {
  const bitmap = await createImageBitmap(picture).catch(() => null);
  if (!bitmap) return null;
  const scale = Math.min(1, LONGEST_SIDE / Math.max(bitmap.width, bitmap.height));
  const canvas = document.createElement('canvas');
  canvas.width = Math.max(1, Math.round(bitmap.width * scale));
  canvas.height = Math.max(1, Math.round(bitmap.height * scale));
  canvas.getContext('2d')?.drawImage(bitmap, 0, 0, canvas.width, canvas.height);
  bitmap.close();
  let smallest: Blob | null = null;
  for (const quality of QUALITIES) {
    smallest = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/jpeg', quality));
    if (smallest && smallest.size <= MOST_BYTES) break;
  }
  if (!smallest) return null;
  const bytes = new Uint8Array(await smallest.arrayBuffer());
  return { type: 'image/jpeg', bytes, width: canvas.width, height: canvas.height };
}
