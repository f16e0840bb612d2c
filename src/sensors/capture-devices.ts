import type { CaptureDevices } from '../app/capture/sensor-interfaces.ts';
import { DeviceOrientation } from './device-orientation.ts';
import { openRearCamera } from './rear-camera.ts';
import type { Recordings } from './recorded-stream.ts';
import { ReplayedOrientation } from './replayed-orientation.ts';
import { ToneAndBuzz } from './tone-and-buzz.ts';
import { keepAwake } from './wake-lock.ts';

/** What this device has for a capture; `recordings` gives the recorded movements when one is asked for. */
export function captureDevices(recordings: () => Promise<Recordings>): CaptureDevices {
  return {
    orientation: new DeviceOrientation(),
    openCamera: openRearCamera,
    feedback: new ToneAndBuzz(),
    keepAwake,
    openRecording: async (of) => new ReplayedOrientation((await recordings())[of]),
  };
}
