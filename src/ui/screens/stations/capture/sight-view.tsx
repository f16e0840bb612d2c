import { useEffect, useRef } from 'preact/hooks';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { NO_CAMERA } from './capture-words.ts';
import type { Capture } from './use-capture.ts';

/** What is sighted: through the camera with a cross-hair, or a reminder to sight along the top edge. */
export function SightView({ capture, session }: { capture: Capture; session: CaptureSession }) {
  const video = useRef<HTMLVideoElement>(null);
  const { camera, noCamera } = capture;
  const byCamera = session.axis.value === 'camera' && camera !== null;
  useEffect(() => {
    if (byCamera && video.current) camera.showIn(video.current);
  }, [byCamera, camera]);
  useEffect(() => {
    // without a picture there is nothing to put a cross-hair on
    if (noCamera && session.axis.value === 'camera') session.axis.value = 'top-edge';
  }, [noCamera, session]);
  return (
    <div class="sight">
      {byCamera ? (
        <>
          <video ref={video} muted playsInline aria-label="View through the camera" />
          <svg class="sight-cross" viewBox="-50 -50 100 100" aria-hidden="true">
            <path class="rim" d="M-46 0H-8M8 0H46M0 -46V-8M0 8V46" />
            <path d="M-46 0H-8M8 0H46M0 -46V-8M0 8V46" />
            <circle class="rim" r="1.6" />
            <circle class="dot" r="1.2" />
          </svg>
        </>
      ) : (
        <TopEdge noCamera={noCamera} />
      )}
      <button
        type="button"
        class="sight-way"
        aria-label={byCamera ? 'Sight along the top edge' : 'Sight with the camera'}
        disabled={session.phase.value !== 'idle'}
        onClick={() => capture.sightWith(byCamera ? 'top-edge' : 'camera')}
      >
        {byCamera ? 'Top edge' : 'Camera'}
      </button>
    </div>
  );
}

function TopEdge({ noCamera }: { noCamera: Capture['noCamera'] }) {
  return (
    <div class="sight-words">
      {noCamera && <p>{NO_CAMERA[noCamera]}</p>}
      <p>
        <strong aria-hidden="true">↑</strong> Sight along the top edge of the phone, like along a ruler.
      </p>
    </div>
  );
}
