import { keepPicture, withPhoto } from '../actions/photos.ts';
import type { AppServices } from '../app-services.ts';
import { attempt } from '../attempt.ts';
import type { PhotoSubject } from '../../core/survey/survey.ts';
import type { CaptureSession } from './capture-session.ts';
import type { CameraView } from './sensor-interfaces.ts';

/**
 * Takes what the cross-hair stands on as a photo, with the raw reading of that instant: where the camera looked is
 * computed from it, now and after any heading check.
 */
export async function takePhoto(
  services: Pick<AppServices, 'state' | 'photos' | 'now'>,
  session: CaptureSession,
  view: CameraView,
  subject: PhotoSubject,
  name: string,
): Promise<void> {
  if (session.phase.value !== 'idle') return;
  const takenAtMs = services.now();
  // both are of this instant: what is awaited is only that they are written
  const [picture, reading] = await Promise.all([view.grab(), session.readNow()]);
  if (!picture || !reading) {
    if (reading) session.refuse('no-picture');
    return;
  }
  const id = session.services.newId();
  let sha256 = '';
  const kept = await attempt(
    services.state,
    async () => void (sha256 = await keepPicture(services, picture)),
  );
  if (!kept) {
    session.refuse('not-stored');
    return;
  }
  await session.act({
    edit: (survey) =>
      withPhoto(survey, { ...picture, id, of: subject, takenAtMs, sha256, reading: reading.id }),
    code: 'entry-added',
    title: `Photo of ${name}`,
    news: { what: 'photo', name },
  });
}
