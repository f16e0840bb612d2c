import type { CaptureNews, RefusedWhy, StoredNews } from '../../../../app/capture/capture-news.ts';
import type { SensorState } from '../../../../app/capture/capture-session.ts';
import type { Capture } from './use-capture.ts';

const points = (count = 0) => (count === 1 ? '1 point' : `${count} points`);

const STORED: Record<StoredNews['what'], (news: StoredNews) => string> = {
  compass: () => 'Compass read. Stored.',
  'first-point': ({ count }) => `Point ${count} stored. Sight the next one.`,
  point: ({ name, count }) => `${name}: ${points(count)} stored.`,
  trace: ({ name, count }) => `${name} traced with ${points(count)}. Stored.`,
  sweep: () => 'Sweep stored.',
  open: () => 'Looked, and open. Stored.',
  'open-start': () => 'Turn along the open horizon, then tap where it ends.',
  mark: ({ name }) => `Mark ${name} stored.`,
  check: () => 'Heading check stored.',
  'face-upright': () => 'First face stored. Turn the phone upside down and sight the same mark.',
  'face-turned': () => 'Both faces stored.',
  placing: ({ name }) => `Placing on ${name} stored.`,
  edge: ({ name }) => `Sighting along ${name} stored.`,
  photo: ({ name }) => `Photo of ${name} stored, with its direction.`,
  undone: ({ name }) => `Taken back: ${name}.`,
};

const REFUSED: Record<RefusedWhy, (degrees?: number) => string> = {
  moving: (degrees) =>
    `Not taken: the phone moved${degrees === undefined ? '' : ` by ${degrees.toFixed(1)}°`}. Hold still and tap again.`,
  broken: () => 'Not taken: the sensor stopped for a moment. Tap again.',
  frozen: () =>
    'Not taken: the angles stand quite still. Does the phone rest on something? Then tap again. If not, the sensor has stopped: leave this screen and come back.',
  'not-stored': () => 'Not stored. What is wrong is told above; what was stored before is safe.',
  'too-short': () => 'Not taken: too short to be a trace.',
  'no-north': () => 'Not taken: nothing ties the phone to north yet. Take a heading check first.',
  'too-far-apart': () =>
    'Not taken as part of this trace: half the horizon lies between. Sight a point in between first.',
  'no-picture': () => 'Not taken: the camera gave no picture. Tap again.',
  'not-flat': () => 'Not taken: lay the phone flat in your hand, screen up, and tap again.',
  'too-steep': () =>
    'Not taken: the phone pointed too steeply to have a direction. Hold it nearer to level, along the shadow or at the mark, and tap again.',
  'mark-unnamed': () => 'Not taken: name the mark first, so that it is known again when it is sighted again.',
  'no-bearing': () => 'Not taken: type the bearing of the mark first, 0 to 360 degrees.',
  'nothing-to-undo': () => 'Nothing of this sitting to take back.',
};

/** What came of the last tap, as a sentence. */
export const newsWords = (news: CaptureNews): string =>
  news.kind === 'stored' ? STORED[news.what](news) : REFUSED[news.why](news.degrees);

type SensorFailure = Extract<SensorState, { state: 'failed' }>['why'];

/** Why there is no direction, and what to do. */
export const SENSOR_FAILED: Record<SensorFailure, { what: string; remedy: string }> = {
  refused: {
    what: 'This browser was not allowed to use the motion sensors.',
    remedy: 'Allow motion sensors for this address in the browser’s settings, then try again.',
  },
  'no-sensor': {
    what: 'This device tells nothing of how it is held.',
    remedy: 'Open the survey on a phone, or type sightings in the field book.',
  },
  'no-angles': {
    what: 'The orientation sensor gives no angles.',
    remedy:
      'Close other apps that use it, restart the phone, then try again. Sightings can be typed in the field book.',
  },
};

/** Why there is no picture; sighting goes on along the phone's top edge. */
export const NO_CAMERA: Record<NonNullable<Capture['noCamera']>, string> = {
  refused: 'The camera was not allowed. Sight along the phone’s top edge instead.',
  'no-camera': 'No camera was found. Sight along the phone’s top edge instead.',
  busy: 'Another app holds the camera. Sight along the phone’s top edge instead.',
};
