import type { AppServices } from '../../../app/app-services.ts';
import { makeBackup } from '../../../app/backup/make-backup.ts';
import { dayAt } from '../../../app/actions/start-survey.ts';
import { saveBlob } from '../../device/save-file.ts';

/** Pieces are handed to the browser in lumps of this size, which it may keep outside its memory. */
const LUMP_BYTES = 8_000_000;

/** Packs surveys into an archive and hands it to the browser as a file. */
export async function saveBackup(services: AppServices, ids: readonly string[], name: string): Promise<void> {
  const lumps: Blob[] = [];
  let pieces: Uint8Array<ArrayBuffer>[] = [];
  let bytes = 0;
  const lump = () => {
    lumps.push(new Blob(pieces));
    pieces = [];
    bytes = 0;
  };
  await makeBackup(services, ids, (piece) => {
    pieces.push(Uint8Array.from(piece));
    bytes += piece.byteLength;
    if (bytes >= LUMP_BYTES) lump();
  });
  lump();
  const zone = Intl.DateTimeFormat().resolvedOptions().timeZone;
  saveBlob(
    `noonmark-${name}-${dayAt(services.now(), zone)}.zip`,
    new Blob(lumps, { type: 'application/zip' }),
  );
}
