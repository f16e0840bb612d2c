import type { CaptureDevices } from '../app/capture/sensor-interfaces.ts';
import { DeviceOrientation } from './device-orientation.ts';
import { openRearCamera } from './rear-camera.ts';
import type { RecordedStream } from './recorded-stream.ts';
import { ReplayedOrientation } from './replayed-orientation.ts';
import { ToneAndBuzz } from './tone-and-buzz.ts';
import { keepAwake } from './wake-lock.ts';

/** What this device has for a capture; `recording` gives the recorded movement when it is asked for. */
export function captureDevices(recording: () => Promise<RecordedStream>): CaptureDevices {
  return {
    orientation: new DeviceOrientation(),
    openCamera: openRearCamera,
    feedback: new ToneAndBuzz(),
    keepAwake,
    openRecording: async () => new ReplayedOrientation(await recording()),
  };
}
