import type { CaptureSession } from './capture-session.ts';

/** A compass beside the angles is read with the phone nearer to flat than this, degrees. */
export const FLAT_ENOUGH = 30;

/** Reads the compass of a phone that has one beside its angles: laid flat, where it is good. */
export async function takeCompass(session: CaptureSession): Promise<void> {
  if ((session.live.value?.fromFlat ?? 90) > FLAT_ENOUGH) {
    session.refuse('not-flat');
    return;
  }
  if (await session.hold()) session.tell({ what: 'compass' });
}
