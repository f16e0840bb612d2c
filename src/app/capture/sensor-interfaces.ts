import type { ReadingSample } from '../../core/survey/survey.ts';

/** Angles of the phone at one instant, as the platform gave them; degrees, W3C Device Orientation. */
export interface SensorSample {
  /** When it was sampled, Unix time [ms]. The platform is silent while nothing moves, so the last event may be older. */
  timeMs: number;
  /** When the platform last gave an event. */
  eventMs: number;
  alpha: number;
  beta: number;
  gamma: number;
  absolute: boolean;
  /** Top edge of the phone from magnetic north, where the platform has a compass of its own beside the angles. */
  compassHeading: number | null;
  /** Greatest deviation of that heading by its own account; negative where it has none. */
  compassAccuracy: number | null;
  /** Angles by the gyroscope alone, beside ones that lean on the compass. */
  byGyroscope: { alpha: number; beta: number; gamma: number } | null;
  screenAngle: number;
}

/**
 * `magnetic`: angles tied to magnetic north; `carried`: angles from an arbitrary start, with a compass heading that is
 * good while the phone lies flat; `relative`: no compass.
 */
export type OrientationKind = 'magnetic' | 'carried' | 'relative';

export type OrientationStart =
  { ok: true; kind: OrientationKind } | { ok: false; why: 'refused' | 'no-sensor' | 'no-angles' };

/** A person is told what a recording shows now, and lets it go on. */
export interface Recording {
  title: string;
  /** What it shows now, and what to do. */
  cue(): { text: string; place: number; count: number; resting: boolean };
  /** Moves on to the next pose. */
  goOn(): void;
  onCue(listener: () => void): () => void;
}

export interface OrientationSensor {
  /** Asks for permission, so it is called inside a tap, and waits until angles come. */
  start(): Promise<OrientationStart>;
  /** Calls with the phone's angles about fifty times a second while the page is seen. */
  listen(listener: (sample: SensorSample) => void): () => void;
  /** Calls when the stream broke off: page hidden, angles gone. What comes after belongs to another run. */
  onBreak(listener: () => void): () => void;
  stop(): void;
  /** Words for the record. */
  readonly device: string;
  /** Set where it is no sensor but a recording. */
  readonly recording: Recording | null;
}

/** A picture as it is kept. */
export interface GrabbedPicture {
  contents: ArrayBuffer;
  type: string;
  width: number;
  height: number;
}

/** A view through the rear camera. */
export interface CameraView {
  /** Shows it in a video element. */
  showIn(video: object): void;
  /** The picture it shows at this instant; null where it shows none. */
  grab(): Promise<GrabbedPicture | null>;
  close(): void;
}

export type CameraStart =
  { ok: true; view: CameraView } | { ok: false; why: 'refused' | 'no-camera' | 'busy' };

/** Tells the hand and the ear what came of a tap. */
export interface Feedback {
  /** Makes sound possible; called inside a tap. */
  prime(): void;
  taken(): void;
  refused(): void;
}

/** What a capture needs of the device; loaded when a capture is opened. */
export interface CaptureDevices {
  orientation: OrientationSensor;
  openCamera(): Promise<CameraStart>;
  feedback: Feedback;
  /** Keeps the screen on until the returned function is called; quietly does nothing where that is not offered. */
  keepAwake(): () => void;
  /** A recorded movement in place of the sensor: sighting from a station, or measuring a plane. */
  openRecording(of: 'sighting' | 'plane'): Promise<OrientationSensor>;
}

/** A row of a reading from a sample: whole milliseconds, angles to a ten-thousandth. */
export const sampleRow = ({ timeMs, alpha, beta, gamma }: SensorSample, startMs: number): ReadingSample => [
  Math.max(0, Math.round(timeMs - startMs)),
  rounded(alpha),
  rounded(beta),
  rounded(gamma),
];

const rounded = (angle: number) => Math.round(angle * 10_000) / 10_000;
