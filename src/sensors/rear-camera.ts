import type { CameraStart } from '../app/capture/sensor-interfaces.ts';

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

function viewOf(stream: MediaStream) {
  return {
    showIn(video: object) {
      if (!(video instanceof HTMLVideoElement)) return;
      video.srcObject = stream;
      // A browser may hold back what plays by itself; the cross-hair then stands on a still picture.
      void video.play().catch(() => undefined);
    },
    close() {
      for (const track of stream.getTracks()) track.stop();
    },
  };
}
