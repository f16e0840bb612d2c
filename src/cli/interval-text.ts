import type { AccessInterval } from '../core/shading/assessment.ts';
import type { CureId, IntervalSourceId } from '../core/uncertainty/interval-source.ts';
import { percent } from './table.ts';

const SOURCES: Record<IntervalSourceId, string> = {
  heading: 'the heading',
  'elevation-index': 'the inclination',
  pointing: 'the hand',
  gaps: 'gaps between sightings',
  unseen: 'sky that nobody looked at',
  transmittance: 'what the trees let through',
  'diffuse-share': 'the climate’s share of diffuse light',
};

const CURES: Record<CureId, string> = {
  'heading-check': 'a heading check',
  'second-heading-check': 'a second heading check',
  'known-bearing': 'comparing a typed azimuth with a known bearing',
  'two-face-check': 'turning the phone about its viewing axis on one mark',
  'sight-again': 'sighting every point four times',
  'more-sightings': 'twice as many sightings along the edges',
  look: 'looking there',
  'measure-transmittance': 'measuring what the crown lets through',
  'weather-file': 'a weather file of a station nearby',
};

/** An access with its interval, percent: "94.2 (92.9 to 95.3)". */
export const withInterval = (annual: number, interval?: AccessInterval): string =>
  interval ? `${percent(annual)} (${percent(interval.low)} to ${percent(interval.high)})` : percent(annual);

/** What the interval mostly comes from, and what would shrink it. */
export function spreadText({ standardDeviation, sources }: AccessInterval): string {
  const [main] = sources;
  if (!main || standardDeviation === 0) return 'Nothing in this survey makes it unsure.';
  const points = (deviation: number) => `±${(100 * deviation).toFixed(1)}`;
  const most = `Most of the spread (${(100 * main.share).toFixed(0)} %) is ${SOURCES[main.source]}`;
  return main.cure === null || main.standardDeviationAfter === null
    ? `${most}.`
    : `${most}; ${CURES[main.cure]} would bring the standard deviation from ${points(standardDeviation)} to ${points(main.standardDeviationAfter)} points.`;
}
