/** What came of the last tap, told on the screen, by sound and by touch. Sentences stand in the screens. */
export type CaptureNews = { number: number } & (
  ({ kind: 'stored' } & StoredNews) | { kind: 'refused'; why: RefusedWhy; degrees?: number }
);

export interface StoredNews {
  what: StoredWhat;
  /** Of what it was stored for. */
  name?: string;
  /** Points of the trace it now has. */
  count?: number;
}

export type StoredWhat =
  | 'compass'
  | 'point'
  | 'first-point'
  | 'trace'
  | 'open'
  | 'open-start'
  | 'mark'
  | 'check'
  | 'face-upright'
  | 'face-turned'
  | 'placing'
  | 'edge'
  | 'sweep'
  | 'photo'
  | 'undone';

export type RefusedWhy =
  /** The phone moved while it was held; `degrees` says how much. */
  | 'moving'
  /** The stream broke off: page hidden, angles gone. */
  | 'broken'
  /** The angles did not change at all in a moving phone. */
  | 'frozen'
  /** Storage refused; the trouble says why. */
  | 'not-stored'
  /** A sweep or trace of too few points. */
  | 'too-short'
  /** Nothing ties the run to north. */
  | 'no-north'
  /** Half the horizon lies between two neighbouring points. */
  | 'too-far-apart'
  /** The camera gave no picture. */
  | 'no-picture'
  /** The phone is not flat enough for its compass. */
  | 'not-flat'
  /** The axis pointed so steeply that it has no azimuth to compare. */
  | 'too-steep'
  /** A mark is known by its name. */
  | 'mark-unnamed'
  /** A known mark's bearing is not typed, or not a bearing. */
  | 'no-bearing'
  | 'nothing-to-undo';
