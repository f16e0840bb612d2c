import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { sightingWay } from '../../../device/sighting-way.ts';
import { SENSOR_FAILED } from './capture-words.ts';
import type { Capture } from './use-capture.ts';

const WAYS = [
  { axis: 'top-edge', label: 'Along the top edge' },
  { axis: 'camera', label: 'With the camera' },
] as const;

/** The first tap: it may ask for permission, and says how to sight. */
export function StartCard({ capture, children }: { capture: Capture; children?: preact.ComponentChildren }) {
  const { devices, session } = capture;
  const state = session?.sensor.value;
  if (state?.state === 'failed') return <Failed why={state.why} capture={capture} />;
  const waiting = devices === null || state?.state === 'starting';
  return (
    <div class="start-card">
      {children ?? (
        <>
          <p>
            <strong>Both feet safe first.</strong> Sight only from where you would stand without a phone, and
            never step while looking at it. Never look at the sun, nor point the camera at it.
          </p>
          <p>Hold the phone upright, at the height where a module will lie.</p>
        </>
      )}
      {capture.mayPlay && (
        <button type="button" class="thumb main" disabled={waiting} onClick={capture.practise}>
          Play the recording
        </button>
      )}
      <p role="status">{waiting ? 'Asking the sensor…' : ''}</p>
      <div class="thumbs">
        {WAYS.map(({ axis, label }) => (
          <button
            key={axis}
            type="button"
            class={`thumb ${!capture.mayPlay && axis === sightingWay.value ? 'main' : ''}`}
            disabled={waiting}
            onClick={() => capture.begin(axis)}
          >
            {label}
          </button>
        ))}
      </div>
    </div>
  );
}

function Failed({ why, capture }: { why: keyof typeof SENSOR_FAILED; capture: Capture }) {
  const { what, remedy } = SENSOR_FAILED[why];
  return (
    <div class="start-card">
      <p role="alert">
        <strong>{what}</strong> {remedy}
      </p>
      <div class="thumbs">
        <button type="button" class="thumb" onClick={capture.again}>
          Try again
        </button>
        <button type="button" class="thumb" onClick={capture.practise}>
          Practise with a recording
        </button>
      </div>
    </div>
  );
}

/** Whether the session gives directions. */
export const isOn = (session: CaptureSession | null): session is CaptureSession =>
  session?.sensor.value.state === 'on';
