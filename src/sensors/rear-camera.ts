import type { CameraStart, CameraView, GrabbedPicture } from '../app/capture/sensor-interfaces.ts';

/** Enough to see an edge by; more only warms the phone. */
const VIDEO: MediaTrackConstraints = {
  facingMode: { ideal: 'environment' },
  width: { ideal: 1280 },
  height: { ideal: 720 },
};

const REASONS: Record<string, 'refused' | 'busy'> = {
  NotAllowedError: 'refused',
  SecurityError: 'refused',
  NotReadableError: 'busy',
  AbortError: 'busy',
};

/** Opens the view through the rear camera; a refusal is an answer, not an error. */
export async function openRearCamera(): Promise<CameraStart> {
  const devices = navigator.mediaDevices as MediaDevices | undefined;
  if (!devices?.getUserMedia) return { ok: false, why: 'no-camera' };
  try {
    const stream = await devices.getUserMedia({ video: VIDEO, audio: false });
    return { ok: true, view: viewOf(stream) };
  } catch (error) {
    const name = error instanceof DOMException ? error.name : '';
    return { ok: false, why: REASONS[name] ?? 'no-camera' };
  }
}

const QUALITY = 0.82;

function viewOf(stream: MediaStream): CameraView {
  let shown: HTMLVideoElement | null = null;
  return {
    grab: () => (shown ? pictureIn(shown) : Promise.resolve(null)),
    showIn(video: object) {
      if (!(video instanceof HTMLVideoElement)) return;
      shown = video;
      video.srcObject = stream;
      // A browser may hold back what plays by itself; the cross-hair then stands on a still picture.
      void video.play().catch(() => undefined);
    },
    close() {
      for (const track of stream.getTracks()) track.stop();
    },
  };
}

/** What a video shows at this instant, as JPEG. */
async function pictureIn(video: HTMLVideoElement): Promise<GrabbedPicture | null> {
  const { videoWidth: width, videoHeight: height } = video;
  if (width === 0 || height === 0) return null;
  const canvas = document.createElement('canvas');
  canvas.width = width;
  canvas.height = height;
  const context = canvas.getContext('2d');
  if (!context) return null;
  context.drawImage(video, 0, 0);
  const blob = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/jpeg', QUALITY));
  return blob && { contents: await blob.arrayBuffer(), type: blob.type, width, height };
}
