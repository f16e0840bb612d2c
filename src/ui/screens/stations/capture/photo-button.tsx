import { takePhoto } from '../../../../app/capture/photo-take.ts';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import type { PhotoSubject } from '../../../../core/survey/survey.ts';
import { useApp } from '../../../app-context.ts';
import type { Capture } from './use-capture.ts';

/** Takes what the cross-hair stands on as a photo; nothing where no camera is open. */
export function PhotoButton(props: {
  capture: Capture;
  session: CaptureSession;
  subject: PhotoSubject;
  /** What it is of, in words. */
  name: string;
}) {
  const services = useApp();
  const { capture, session, subject, name } = props;
  const { camera } = capture;
  if (!camera || session.axis.value !== 'camera') return null;
  return (
    <button
      type="button"
      aria-label={`Take a photo of ${name}`}
      disabled={session.phase.value !== 'idle'}
      onClick={() => void takePhoto(services, session, camera, subject, name)}
    >
      Photo
    </button>
  );
}
