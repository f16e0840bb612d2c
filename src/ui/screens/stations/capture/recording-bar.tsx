import { useEffect, useState } from 'preact/hooks';
import type { Recording } from '../../../../app/capture/sensor-interfaces.ts';

/** What the recording shows now, and the way on. */
export function RecordingBar({ recording }: { recording: Recording }) {
  const [cue, setCue] = useState(() => recording.cue());
  useEffect(() => recording.onCue(() => setCue(recording.cue())), [recording]);
  const isLast = cue.place + 1 === cue.count;
  return (
    <div class="banner recording">
      <p aria-live="polite">
        <strong>
          Recording, {cue.place + 1} of {cue.count}:
        </strong>{' '}
        {cue.text}
      </p>
      <button type="button" disabled={isLast || !cue.resting} onClick={() => recording.goOn()}>
        {isLast ? 'The end' : 'Go on'}
      </button>
    </div>
  );
}
