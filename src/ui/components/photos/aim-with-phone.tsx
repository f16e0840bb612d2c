import { useComputed } from '@preact/signals';
import { useEffect, useState } from 'preact/hooks';
import { aimPhotoByReading } from '../../../app/actions/photos.ts';
import { attempt } from '../../../app/attempt.ts';
import { CaptureSession } from '../../../app/capture/capture-session.ts';
import type { CaptureDevices } from '../../../app/capture/sensor-interfaces.ts';
import type { Photo, Survey } from '../../../core/survey/survey.ts';
import { useApp } from '../../app-context.ts';

/** Reads where a photo looks from the phone, held as the camera was. */
export function AimWithPhone(props: { survey: Survey; photo: Photo; name: string; onDone: () => void }) {
  const services = useApp();
  const { survey, photo, name, onDone } = props;
  const [devices, setDevices] = useState<CaptureDevices | null>(null);
  const [session, setSession] = useState<CaptureSession | null>(null);
  useEffect(() => {
    let wanted = true;
    services.capture().then(
      (loaded) => wanted && setDevices(loaded),
      () => undefined, // without that part of the app the direction can still be typed
    );
    return () => {
      wanted = false;
    };
  }, [services]);
  useEffect(() => () => session?.stop(), [session]);
  const begin = () => {
    if (!devices) return;
    const made = new CaptureSession(services, devices.orientation, devices.feedback, survey.id);
    setSession(made);
    // it may ask for permission, and must do so while the tap still counts
    void made.start();
  };
  const take = async (from: CaptureSession) => {
    const reading = await from.hold();
    if (!reading) return;
    await attempt(services.state, () =>
      aimPhotoByReading(services, from.record.survey, photo, name, reading.id),
    );
    onDone();
  };
  const state = session?.sensor.value.state;
  if (session && state === 'on') return <Aiming session={session} onTake={() => void take(session)} />;
  return (
    <div>
      <button type="button" disabled={!devices || state === 'starting'} onClick={begin}>
        Read it with the phone
      </button>
      <p class="small" role="status">
        {state === 'failed' && 'The sensor gives no direction here. It can be typed.'}
      </p>
    </div>
  );
}

function Aiming({ session, onTake }: { session: CaptureSession; onTake: () => void }) {
  const words = useComputed(() => {
    const azimuth = session.live.value?.azimuth ?? null;
    return azimuth === null ? 'no north yet' : `${Math.round(azimuth) % 360}°`;
  });
  const news = session.news.value;
  return (
    <div class="stack">
      <p>
        Hold the phone upright with its back to what the photo shows: <strong>{words}</strong>
      </p>
      <p role="status">
        {news?.kind === 'refused' && 'Not taken: hold still and tap again. It can be typed as well.'}
      </p>
      <button type="button" class="main" disabled={session.phase.value !== 'idle'} onClick={onTake}>
        {session.phase.value === 'idle' ? 'Take this direction' : 'Hold still…'}
      </button>
    </div>
  );
}
