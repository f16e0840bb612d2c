import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type { Parsed } from '../core/survey/problem.ts';
import type { Photo } from '../core/survey/survey.ts';
import type { PhotoImage } from '../report/contents/report-contents.ts';

/** Larger files are no photo that the app has taken. */
const LARGEST = 20_000_000;

/**
 * Pictures of a survey's photos out of a folder, by the hash of their bytes, whatever the files are called. A photo whose
 * picture is not there is told.
 */
export function readPhotos(folder: string, photos: readonly Photo[]): Parsed<Map<string, PhotoImage>> {
  const wanted = new Map(photos.map((photo) => [photo.sha256.toLowerCase(), photo]));
  const found = new Map<string, PhotoImage>();
  try {
    for (const name of readdirSync(folder)) {
      const file = join(folder, name);
      const stat = statSync(file, { throwIfNoEntry: false });
      if (!stat?.isFile() || stat.size > LARGEST) continue;
      const bytes = readFileSync(file);
      const photo = wanted.get(createHash('sha256').update(bytes).digest('hex'));
      const type = pictureType(bytes);
      if (photo && type) found.set(photo.sha256, { type, bytes, width: photo.width, height: photo.height });
    }
  } catch (error) {
    const message = `The folder ${folder} cannot be read: ${(error as Error).message}`;
    return { ok: false, problems: [{ path: '--photos', message }] };
  }
  const missing = photos.filter(({ sha256 }) => !found.has(sha256)).length;
  const warning = {
    path: 'photos',
    message: `${missing} of ${photos.length} photos have no picture (JPEG or PNG) in ${folder}.`,
  };
  return { ok: true, value: found, warnings: missing > 0 ? [warning] : [] };
}

function pictureType(bytes: Uint8Array): PhotoImage['type'] | null {
  const begins = (...start: number[]) => start.every((byte, i) => bytes[i] === byte);
  if (begins(0xff, 0xd8, 0xff)) return 'image/jpeg';
  return begins(0x89, 0x50, 0x4e, 0x47) ? 'image/png' : null;
}
