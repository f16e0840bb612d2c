import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { takeCompass } from '../../../../app/capture/compass-take.ts';

const CHECK_LATER = {
  words: 'Sightings are kept, and one heading check in this sitting gives all of them their north.',
  action: 'Heading check',
};

/** What stands between the figures and north, and what to do. */
export function HeadingBanner({
  session,
  onCheck,
  withoutCompass = CHECK_LATER,
}: {
  session: CaptureSession;
  onCheck: () => void;
  withoutCompass?: { words: string; action: string };
}) {
  const sensor = session.sensor.value;
  // pointed anew after each take, which is when the heading may have come
  const heading = session.pointed.value && session.runNow?.heading;
  if (session.disturbed.value)
    return (
      <div class="banner">
        <p>
          <strong>Compass and gyroscope disagree:</strong> steel is near. Move away from rails, ladders and
          inverters, or take a heading check by shadow.
        </p>
        <button type="button" onClick={() => (session.disturbed.value = false)}>
          Seen
        </button>
      </div>
    );
  if (heading || sensor.state !== 'on') return null;
  if (sensor.kind === 'carried')
    return (
      <div class="banner">
        <p>
          <strong>No north yet.</strong> Lay the phone flat in your hand, away from steel, and read the
          compass.
        </p>
        <button type="button" onClick={() => void takeCompass(session)}>
          Read the compass
        </button>
      </div>
    );
  return (
    <div class="banner">
      <p>
        <strong>This phone has no compass.</strong> {withoutCompass.words}
      </p>
      <button type="button" onClick={onCheck}>
        {withoutCompass.action}
      </button>
    </div>
  );
}
