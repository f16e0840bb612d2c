import type { TakenPicture } from '../../app/actions/photos.ts';

/** Longer side of a kept picture, dots. */
const LONGEST_SIDE = 1600;
const QUALITY = 0.82;
/** More than any phone's camera makes; past this the browser itself may fall over. */
const LARGEST_FILE = 150_000_000;
const DAY_MS = 86_400_000;

export type PictureFault = 'not-a-picture' | 'unknown-sort' | 'too-large' | 'no-canvas';

export type PictureOutcome = { ok: true; picture: TakenPicture } | { ok: false; why: PictureFault };

function scaledSize(width: number, height: number): [number, number] {
  const scale = Math.min(1, LONGEST_SIDE / Math.max(width, height));
  return [Math.max(1, Math.round(width * scale)), Math.max(1, Math.round(height * scale))];
}

/** Draws a picture smaller and writes it as JPEG; what the camera wrote beside it (place, owner) stays behind. */
async function encoded(bitmap: ImageBitmap): Promise<Omit<TakenPicture, 'takenAtMs'> | null> {
  const [width, height] = scaledSize(bitmap.width, bitmap.height);
  const canvas = document.createElement('canvas');
  canvas.width = width;
  canvas.height = height;
  const context = canvas.getContext('2d');
  if (!context) return null;
  // What is see-through would turn black.
  context.fillStyle = '#fff';
  context.fillRect(0, 0, width, height);
  context.imageSmoothingQuality = 'high';
  context.drawImage(bitmap, 0, 0, width, height);
  const blob = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/jpeg', QUALITY));
  return blob && { contents: await blob.arrayBuffer(), type: blob.type, width, height };
}

/** A picked file as a picture to keep: at most 1600 dots long, JPEG. */
export async function pictureOf(file: File, nowMs: number): Promise<PictureOutcome> {
  if (file.size > LARGEST_FILE) return { ok: false, why: 'too-large' };
  if (file.type !== '' && !file.type.startsWith('image/')) return { ok: false, why: 'not-a-picture' };
  let bitmap: ImageBitmap;
  try {
    bitmap = await createImageBitmap(file, { imageOrientation: 'from-image' });
  } catch {
    return { ok: false, why: file.type.startsWith('image/') ? 'unknown-sort' : 'not-a-picture' };
  }
  const picture = await encoded(bitmap);
  bitmap.close();
  if (!picture) return { ok: false, why: 'no-canvas' };
  const { lastModified } = file;
  const isPlausible = lastModified > 0 && lastModified < nowMs + DAY_MS;
  return { ok: true, picture: { ...picture, takenAtMs: isPlausible ? lastModified : nowMs } };
}

/** Why a file is no photo, and what to do. */
export const PICTURE_FAULTS: Record<PictureFault, string> = {
  'not-a-picture': 'is no picture. Choose a photo.',
  'unknown-sort':
    'is damaged, or a sort of picture that this browser does not read (some phones write HEIC). Take it with the camera from here, or save it as JPEG first.',
  'too-large': 'has over 150 MB. Take it with the camera from here, or make it smaller first.',
  'no-canvas': 'could not be made smaller: the device is short of memory. Close other apps and try again.',
};
