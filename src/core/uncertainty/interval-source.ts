/** What an interval comes from. */
export const INTERVAL_SOURCES = [
  'heading',
  'elevation-index',
  'pointing',
  'gaps',
  'unseen',
  'transmittance',
  'diffuse-share',
] as const;

export type IntervalSourceId = (typeof INTERVAL_SOURCES)[number];

/** What would shrink a source. */
export type CureId =
  | 'heading-check'
  | 'second-heading-check'
  | 'known-bearing'
  | 'two-face-check'
  | 'sight-again'
  | 'more-sightings'
  | 'look'
  | 'measure-transmittance'
  | 'weather-file';
