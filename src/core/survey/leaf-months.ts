import type { Months } from './survey.ts';

/** Latitude of the tropics, degrees: the obliquity of the ecliptic. */
const TROPIC = 23.44;

/**
 * Share of full leaf, January to December, of deciduous trees in the northern hemisphere, from a latitude up. Common
 * practice, no source: leaf-out in the month the mean temperature passes about 10 °C, fall where it sinks below.
 */
const NORTHERN: readonly { from: number; shares: Months }[] = [
  { from: 60, shares: [0, 0, 0, 0, 0.25, 1, 1, 1, 0.5, 0, 0, 0] },
  { from: 50, shares: [0, 0, 0, 0.25, 0.75, 1, 1, 1, 1, 0.5, 0, 0] },
  { from: 35, shares: [0, 0, 0, 0.5, 1, 1, 1, 1, 1, 0.5, 0.25, 0] },
  { from: TROPIC, shares: [0, 0, 0.5, 1, 1, 1, 1, 1, 1, 1, 0.5, 0.25] },
  { from: 0, shares: [1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1] },
];

/**
 * Share of full leaf of deciduous trees, January to December, 0 (bare) to 1, at a latitude [degrees, north positive,
 * -90 to 90]. Between the tropics always in leaf; in the south as in the north half a year later. Throws RangeError
 * outside.
 */
export function leafShares(latitude: number): Months {
  if (!(Math.abs(latitude) <= 90)) throw new RangeError(`latitude must be -90 to 90, got ${latitude}`);
  const { shares } = NORTHERN.find(({ from }) => Math.abs(latitude) >= from)!;
  return latitude >= 0 ? [...shares] : ([...shares.slice(6), ...shares.slice(0, 6)] as Months);
}
