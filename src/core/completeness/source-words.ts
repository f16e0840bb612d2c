import type { CureId, IntervalSourceId } from '../uncertainty/interval-source.ts';

/** What an interval comes from, as a part of a sentence; the one place for these words, on screens and on the command line. */
export const SOURCE_WORDS: Record<IntervalSourceId, string> = {
  heading: 'the heading of the azimuths',
  'elevation-index': 'the phone’s inclination',
  pointing: 'the hand that points',
  gaps: 'what stands between the sightings',
  unseen: 'sky that nobody looked at',
  transmittance: 'what the trees let through',
  'diffuse-share': 'the climate’s share of diffuse light',
};

/** What would shrink it, as the subject of a sentence. */
export const CURE_WORDS: Record<CureId, string> = {
  'heading-check': 'a heading check',
  'second-heading-check': 'a second heading check',
  'known-bearing': 'one typed azimuth held against a known bearing',
  'two-face-check': 'one mark sighted with the phone upright and turned over',
  'sight-again': 'every point sighted four times',
  'more-sightings': 'twice as many sightings along the edges',
  look: 'a look there',
  'measure-transmittance': 'measuring what the crowns let through',
  'weather-file': 'a weather file of a station nearby',
};
