import { airMassOfNodes, INTERVALS } from './light-by-height.ts';

/**
 * Air of relative mass m leaves exp(-c m^p) of the beam; Meinel and Meinel, Applied Solar Energy (1976), eq. 2.3, have
 * p = 0.678 for clear days, and clouds steepen it.
 */
const AIR_MASS_POWER = 0.8;
const powers = airMassOfNodes.map((airMass) => airMass ** AIR_MASS_POWER);

/** Share of the beam left at each node of cos zenith, for an extinction c. */
export const beamLeft = (extinction: number): Float64Array =>
  powers.map((power) => Math.exp(-extinction * power));

/**
 * Constants of the closure below and the power above, fitted to the hours of seven typical-year files (Barrow, Chicago,
 * Colombo, Phoenix, San Francisco, Sand Point, Tucson) from their monthly means alone. Fitted to any six of them, they
 * give the seventh's access under uniform horizons within 0.75 points on flat and south-facing planes.
 */
const BEAM_OUTSIDE_AIR = 0.73;
const SUNNY_SHARE = 2.64;
const HEIGHT_POWER = 0.22;
const USUAL_HEIGHT = 0.55;
const LARGEST_EXTINCTION = 2.5;

/**
 * How steeply a month's beam falls toward the horizon: the extinction c at which a sunny sky gives the month's beam.
 * The sunny share of the time grows with the square of the clearness index `kt`; what beam is then missing has been
 * taken by the air. A hazy month so gets a steep fall, a clear one a gentle one. `heights` is the month's light by cos
 * zenith (`lightByHeight`), `beamShare` its mean beam on the horizontal over extraterrestrial, 0 to 1.
 */
export function beamExtinction(heights: Float64Array, kt: number, beamShare: number): number {
  const sunnyShare = Math.min(1, Math.max(0.05, SUNNY_SHARE * kt * kt));
  const wanted = beamShare / (BEAM_OUTSIDE_AIR * sunnyShare);
  let low = 0;
  let high = LARGEST_EXTINCTION;
  for (let halving = 0; halving < 24; halving++) {
    const middle = (low + high) / 2;
    if (meanOver(heights, beamLeft(middle)) > wanted) low = middle;
    else high = middle;
  }
  return low * (meanHeight(heights) / USUAL_HEIGHT) ** HEIGHT_POWER;
}

/** Mean of a value by node, weighted with the light there; 0 without light. */
export function meanOver(heights: Float64Array, values: Float64Array): number {
  let sum = 0;
  let weights = 0;
  for (let node = 0; node < heights.length; node++) {
    sum += heights[node] * values[node];
    weights += heights[node];
  }
  return weights > 0 ? sum / weights : 0;
}

const cosines = airMassOfNodes.map((_, node) => node / INTERVALS);
const meanHeight = (heights: Float64Array) => meanOver(heights, cosines);
