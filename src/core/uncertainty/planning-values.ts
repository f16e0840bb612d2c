/**
 * What is assumed of errors that the record does not tell; those of pointing stand in `pointing/planning-values.ts`.
 * Common practice, no source, where none is named.
 */

/** Draws for an interval. 1,000 put each end of a 95 % interval within about 9 % of a standard deviation (one sigma). */
export const DRAWS = 1000;
/** Draws made again with one source changed, to see what that source does. */
export const SOURCE_DRAWS = 256;
/** Draws, each with its opposite, to find the mean error of pointing. */
export const BIAS_PAIRS = 48;

/**
 * How far the middle of an edge strays from how it is joined, degrees (standard deviation) per square root of the gap
 * between its two sightings [degrees]: a random walk held at both ends. Drawn edges (crowns, hills): a gap of 4° strays by
 * 0.5°, one of 25° by 1.25°. Straight ones: what a gutter or a sagging board adds.
 */
export const DRAWN_STRAY = 0.25;
export const STRAIGHT_STRAY = 0.03;

/**
 * The outline of a crown bulges outward between its sightings as a circle of this radius does, degrees: by gap² / (8
 * radius) at the middle, no more than `most`. Drawn evenly from nothing to twice that.
 */
export const BULGE = { radius: 20, most: 6 };

/**
 * How much worse than planned a survey may have been pointed: before its own repeats are looked at, a factor of two either
 * way (the deviation of its logarithm, ln 2). Repeats that agree do not prove a steadier hand than `least`. A repeat
 * further out than `farthest` planned deviations counts as that far.
 */
export const NOISE = { logDeviation: Math.LN2, least: 0.8, farthest: 5 };

/**
 * Sky that nobody looked at is cut into patches no wider than `patch`, degrees. In each one stands, apart from the others:
 * nothing (a share `open`); or where something was traced right beside it, more of that (a share `alike`, at 0.6 to 1.4
 * times its height); or else something opaque of a height with a falling exponential distribution, degrees. A gap of one
 * patch between two traces of one obstruction has the shares `between`.
 */
export const UNSEEN = {
  patch: 20,
  open: 0.45,
  alike: 0.3,
  between: { open: 0.1, alike: 0.8 },
  alikeFrom: 0.6,
  alikeTo: 1.4,
  height: 10,
  highest: 60,
};

/** A typed share of light that passes may be off by so much either way (a triangle); a typed 0 is opaque. */
export const TYPED_PASSING = 0.1;

/**
 * Diffuse light of a year on the horizontal, one standard deviation as a share of it, the global light kept. Monthly
 * diffuse fractions from clearness alone scatter by 5 to 10 % of themselves; a weather file's own split by about 5 %; a
 * clear sky is no forecast of cloud.
 */
export const DIFFUSE_SPREAD = { world: 0.08, 'weather-file': 0.05, 'clear-sky': 0.15 } as const;

/** What is left of each source's deviation, as a share, after what would shrink it. */
export const LEFT_AFTER = {
  /** A second check of the same kind: the mean of two. */
  secondCheck: Math.SQRT1_2,
  /** Each point sighted four times. */
  sightedAgain: 0.5,
  /** Twice as many sightings along each edge: half the gap, and two halves that stray apart from each other. */
  moreSightings: 0.5,
  /** A look at what was not seen. */
  look: 0,
  /** Light measured under the crown, or a photograph of it judged by share of sky. */
  measuredPassing: 0.4,
  /** A weather file of a station nearby instead of the world's climate. */
  weatherFile: DIFFUSE_SPREAD['weather-file'] / DIFFUSE_SPREAD.world,
};

/** What a heading check by shadow leaves at a usual hour, one standard deviation, degrees: aligning and clock. */
export const CHECKED_HEADING = 0.9;
